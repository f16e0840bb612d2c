import { useMemo } from 'preact/hooks';
import type { Station } from '../../../../core/survey/survey.ts';
import { navigate } from '../../../router.ts';
import type { SectionProps } from '../../../section.ts';
import { stationPath } from '../station-path.ts';
import { FullScreen } from './full-screen.tsx';
import { Sitting } from './sitting.ts';
import { SittingView } from './sitting-view.tsx';
import { isOn, StartCard } from './start-card.tsx';
import { useCapture } from './use-capture.ts';

/** Sighting from a station with the phone. */
export function CaptureScreen(props: SectionProps & { station: Station }) {
  const { services, surveyId, station } = props;
  const capture = useCapture(services, props.survey);
  const { session } = capture;
  const sitting = useMemo(() => session && new Sitting(session, station.id), [session, station.id]);
  const practised = session?.orientation.recording ? 'Practice' : null;
  return (
    <FullScreen
      title={station.name}
      mark={practised}
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
