import { useMemo } from 'preact/hooks';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { checksOf } from '../../../../app/capture/last-ways.ts';
import { stationOf } from '../../../../app/capture/station-edits.ts';
import { isEmpty } from '../../../../core/completeness/kinds/station-empty.ts';
import type { Station } from '../../../../core/survey/survey.ts';
import { navigate } from '../../../router.ts';
import type { SectionProps } from '../../../section.ts';
import { stationPath } from '../station-path.ts';
import { FullScreen } from './full-screen.tsx';
import { PhotoButton } from './photo-button.tsx';
import { Sitting } from './sitting.ts';
import { SittingView } from './sitting-view.tsx';
import { isOn, StartCard } from './start-card.tsx';
import { useCapture } from './use-capture.ts';

type Props = SectionProps & { station: Station; start?: string };

/** Sighting from a station with the phone. `start`: what somebody came for, as the address has it. */
export function CaptureScreen(props: Props) {
  const { services, surveyId, station, start } = props;
  const capture = useCapture(services, props.survey);
  const { session } = capture;
  const sitting = useMemo(() => session && sittingFor(session, station.id, start), [session, station.id]);
  const practised = session?.orientation.recording ? 'Practice' : null;
  return (
    <FullScreen
      title={station.name}
      mark={practised}
      action={
        isOn(session) &&
        sitting && <PhotoButton capture={capture} session={session} {...subjectOf(sitting, props)} />
      }
      onLeave={() => navigate(stationPath(surveyId, station.id))}
    >
      {isOn(session) && sitting ? (
        <SittingView {...props} capture={capture} sitting={sitting} />
      ) : (
        <StartCard capture={capture} />
      )}
    </FullScreen>
  );
}

/** What a photo taken now is of: the obstruction in hand, else the station. */
function subjectOf({ task, choice }: Sitting, { survey, station }: Pick<Props, 'survey' | 'station'>) {
  const traced = task.value === 'trace' ? choice.value.obstruction : null;
  const obstruction = survey.obstructions.find(({ id }) => id === traced);
  const kind = obstruction ? ('obstruction' as const) : ('station' as const);
  const { id, name } = obstruction ?? station;
  return { subject: { kind, id }, name };
}

function sittingFor(session: CaptureSession, stationId: string, start: string | undefined): Sitting {
  const sitting = new Sitting(session, stationId);
  const { survey } = session.record;
  const station = stationOf(survey, stationId);
  sitting.headingFirst =
    start === undefined &&
    isEmpty(station) &&
    (station.headingChecks ?? []).length === 0 &&
    checksOf(survey).length > 0;
  if (sitting.headingFirst) sitting.task.value = 'check';
  if (start === 'mark') sitting.task.value = 'mark';
  if (start === 'check' || start === 'faces') sitting.task.value = 'check';
  if (start === 'faces') sitting.checkWay.value = 'two-face';
  return sitting;
}
