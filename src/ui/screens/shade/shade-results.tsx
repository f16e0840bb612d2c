import { useMemo } from 'preact/hooks';
import type { PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { Headline, HeadlineFacts } from './headline.tsx';
import { HorizonView } from './horizon-view.tsx';
import { HourTable } from './hour-table.tsx';
import { MonthView } from './month-view.tsx';
import { ObstructionList } from './obstruction-list.tsx';
import { PlanInset } from './plan-inset.tsx';

interface Props {
  survey: Survey;
  year: number;
  plane: PlaneAssessment;
  shade: StationShade;
  gone: ReadonlySet<string>;
  onToggle: (id: string) => void;
  onPutBack: () => void;
}

/** Everything there is to see of one station and plane. */
export function ShadeResults({ survey, year, plane, shade, gone, onToggle, onPutBack }: Props) {
  const names = useMemo(() => new Map(survey.obstructions.map(({ id, name }) => [id, name])), [survey]);
  const goneNames = [...gone].map((id) => names.get(id) ?? id);
  return (
    <>
      <Headline shade={shade} goneNames={goneNames} onPutBack={onPutBack} />
      <HorizonView site={survey.site} shade={shade} names={names} gone={gone} year={year} />
      <HeadlineFacts plane={plane} shade={shade} />
      <ObstructionList survey={survey} shade={shade} gone={gone} onToggle={onToggle} />
      <div class="shade-side">
        <MonthView shade={shade} />
        <HourTable shade={shade} timeZone={survey.site.timeZone} imagined={gone.size > 0} />
      </div>
      <PlanInset site={survey.site} shade={shade} names={names} gone={gone} />
    </>
  );
}
