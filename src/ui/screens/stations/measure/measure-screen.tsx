import { useEffect, useState } from 'preact/hooks';
import { takeEdge, takePlacing } from '../../../../app/capture/plane-takes.ts';
import { undoLast } from '../../../../app/capture/undo-last.ts';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import type { RoofPlane } from '../../../../core/survey/survey.ts';
import { navigate } from '../../../router.ts';
import type { SectionProps } from '../../../section.ts';
import { surveyPath } from '../../../survey-path.ts';
import { Figures } from '../capture/figures.tsx';
import { FullScreen } from '../capture/full-screen.tsx';
import { HeadingBanner } from '../capture/heading-banner.tsx';
import { NewsLine } from '../capture/news-line.tsx';
import { PhotoButton } from '../capture/photo-button.tsx';
import { RecordingBar } from '../capture/recording-bar.tsx';
import { SightView } from '../capture/sight-view.tsx';
import { isOn, StartCard } from '../capture/start-card.tsx';
import { Switches, Thumb } from '../capture/thumb.tsx';
import { useCapture, type Capture } from '../capture/use-capture.ts';
import { LiveTilt } from './live-tilt.tsx';
import { PlaneWords } from './plane-words.tsx';

type Way = 'flat' | 'edge' | 'eave' | 'fall';

const WAYS: { value: Way; label: string }[] = [
  { value: 'flat', label: 'Laid flat' },
  { value: 'edge', label: 'Along a verge' },
  { value: 'eave', label: 'Eave or ridge' },
  { value: 'fall', label: 'Down the slope' },
];

const HOW: Record<Way, string> = {
  flat: 'Lay a straight board or a long level along the slope and the phone on it, screen up. Take it twice, the second time turned end for end: then the phone’s own error cancels.',
  edge: 'Hold the phone’s long edge along a gable verge or a rafter. Take it twice, top up and top down.',
  eave: 'Sight along the eave or the ridge, from end to end. The plane faces square to it.',
  fall: 'Stand in line with a verge and sight along it, up or down the slope.',
};

/** An edge sighted in a sitting of its own, without a compass, stays without north. */
const TYPE_INSTEAD = {
  words: 'An edge sighted here would have no north. Type the bearing of the eave from a plan or a map.',
  action: 'Type the bearing',
};

/** Tilt and facing of a plane by the phone. */
export function MeasureScreen(props: SectionProps & { plane: RoofPlane }) {
  const { services, surveyId, plane } = props;
  const capture = useCapture(services, props.survey, 'plane');
  const { session } = capture;
  return (
    <FullScreen
      title={plane.name}
      mark={session?.orientation.recording ? 'Practice' : null}
      action={
        isOn(session) && (
          <PhotoButton
            capture={capture}
            session={session}
            subject={{ kind: 'plane', id: plane.id }}
            name={plane.name}
          />
        )
      }
      onLeave={() => navigate(surveyPath(surveyId, 'stations'))}
    >
      {isOn(session) ? (
        <Measuring {...props} capture={capture} session={session} />
      ) : (
        <StartCard capture={capture}>
          <p>
            <strong>The safest climb is the one not made.</strong> The tilt can be had from a verge by the
            ladder or the ground, the facing from along an eave. Work at height only as your training, your
            local code and a fall arrest allow.
          </p>
        </StartCard>
      )}
    </FullScreen>
  );
}

function Measuring(props: SectionProps & { plane: RoofPlane; capture: Capture; session: CaptureSession }) {
  const { services, surveyId, plane, capture, session } = props;
  const [way, setWay] = useState<Way>('flat');
  const laid = way === 'flat' || way === 'edge';
  useEffect(() => {
    session.lies = laid;
  }, [laid, session]);
  const take = () => (laid ? takePlacing(session, plane, way) : takeEdge(session, plane, way));
  const { recording } = session.orientation;
  const found = session.pointed.value?.planes.find(({ id }) => id === plane.id) ?? null;
  return (
    <div class="sitting">
      <div class="sitting-scene" role="group" aria-label="What the phone says" tabIndex={0}>
        {recording && <RecordingBar recording={recording} />}
        {laid ? (
          <LiveTilt session={session} held={way} />
        ) : (
          <>
            {!recording && <SightView capture={capture} session={session} />}
            <Figures session={session} />
          </>
        )}
        <PlaneWords plane={plane} found={found} />
      </div>
      <div class="sitting-hand">
        {!laid && (
          <>
            <HeadingBanner
              session={session}
              onCheck={() => navigate(surveyPath(surveyId, 'roof'))}
              withoutCompass={TYPE_INSTEAD}
            />
            <p class="small">Never by the compass on metal: keep the phone off the roofing.</p>
          </>
        )}
        <NewsLine session={session} />
        <Switches label="What is measured" value={way} options={WAYS} onChoose={setWay} />
        <p class="small">{HOW[way]}</p>
        <div class="thumbs">
          <button type="button" class="thumb" onClick={() => void undoLast(services, session)}>
            Undo
          </button>
          <Thumb
            session={session}
            label={laid ? 'Take the placing' : 'Sight the edge'}
            onPress={() => void take()}
          />
        </div>
      </div>
    </div>
  );
}
