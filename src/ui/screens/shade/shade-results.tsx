import { useMemo } from 'preact/hooks';
import type { Assessment, PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { Headline, HeadlineFacts } from './headline.tsx';
import { HorizonView } from './horizon-view.tsx';
import { HourTable } from './hour-table.tsx';
import type { Imagined } from './imagined.ts';
import { MonthView } from './month-view.tsx';
import { ObstructionList } from './obstruction-list.tsx';
import { PlanInset } from './plan-inset.tsx';

interface Props {
  survey: Survey;
  year: number;
  assessment: Assessment;
  plane: PlaneAssessment;
  shade: StationShade;
  imagined: ReadonlyMap<string, Imagined>;
  /** Whether `shade` has all of `imagined` in it. */
  settled: boolean;
  /** Null: as measured again. */
  onImagine: (id: string, imagined: Imagined | null) => void;
  onPutBack: () => void;
}

/** Everything there is to see of one station and plane. */
export function ShadeResults({
  survey,
  year,
  assessment,
  plane,
  shade,
  imagined,
  settled,
  onImagine,
  onPutBack,
}: Props) {
  const names = useMemo(() => new Map(survey.obstructions.map(({ id, name }) => [id, name])), [survey]);
  const list = useMemo(() => [...imagined.values()], [imagined]);
  return (
    <>
      <Headline plane={plane} shade={shade} imagined={settled ? list : []} onPutBack={onPutBack} />
      <HorizonView site={survey.site} shade={shade} names={names} year={year} />
      <HeadlineFacts assessment={assessment} plane={plane} shade={shade} />
      <ObstructionList survey={survey} shade={shade} imagined={imagined} onImagine={onImagine} />
      <div class="shade-side">
        <MonthView shade={shade} />
        <HourTable shade={shade} timeZone={survey.site.timeZone} />
      </div>
      <PlanInset site={survey.site} shade={shade} names={names} />
    </>
  );
}
