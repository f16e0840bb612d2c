import { useEffect, useMemo, useState } from 'preact/hooks';
import { liveSurvey, sweptDirections, type LiveSweep } from '../../../../app/capture/live-survey.ts';
import type { AzimuthRange } from '../../../../core/angles/azimuth-ranges.ts';
import { rangesBetween } from '../../../../core/angles/azimuth-ranges.ts';
import type { RoofPlane, Station } from '../../../../core/survey/survey.ts';
import type { SectionProps } from '../../../section.ts';
import { HorizonStrip } from '../strip/horizon-strip.tsx';
import { sunBand } from '../strip/sun-band.ts';
import { useLiveAccess } from '../strip/use-live-access.ts';
import { CheckPanel } from './check-panel.tsx';
import { Figures } from './figures.tsx';
import { HeadingBanner } from './heading-banner.tsx';
import { MarkPanel } from './mark-panel.tsx';
import { NextStation } from './next-station.tsx';
import { NewsLine } from './news-line.tsx';
import { OpenPanel } from './open-panel.tsx';
import { RecordingBar } from './recording-bar.tsx';
import { SightView } from './sight-view.tsx';
import type { Sitting, Task } from './sitting.ts';
import { Switches } from './thumb.tsx';
import { TracePanel } from './trace-panel.tsx';
import type { Capture } from './use-capture.ts';

const TASKS: { value: Task; label: string }[] = [
  { value: 'trace', label: 'Trace' },
  { value: 'open', label: 'Open' },
  { value: 'mark', label: 'Mark' },
  { value: 'check', label: 'Heading' },
];

type Props = SectionProps & { station: Station; capture: Capture; sitting: Sitting };

/** The plane whose figures are shown: the first this station speaks for, else the first of all. */
const planeOf = ({ survey, station }: Props): RoofPlane | null =>
  survey.planes.find(({ id }) => station.serves.includes(id)) ?? survey.planes[0] ?? null;

/** What a sweep that was cut off asks for; null where there is none. */
const waitingWords = ({ sweep }: Sitting): string | null =>
  sweep.unfinished() ? 'A sweep was interrupted: say what it was, under Trace.' : null;

/** A sitting at work: picture, figures, strip, and the panel of the task in hand. */
export function SittingView(props: Props) {
  const { capture, sitting, survey } = props;
  const { session } = sitting;
  const task = sitting.task.value;
  const plane = planeOf(props);
  const { strip, gaps } = useStrip(props, plane);
  const { recording } = session.orientation;
  return (
    <div class="sitting">
      <div class="sitting-scene" role="group" aria-label="What the phone says" tabIndex={0}>
        {recording && <RecordingBar recording={recording} />}
        {!recording && !sitting.byShadow && <SightView capture={capture} session={session} />}
        <Figures session={session} />
        {plane && task !== 'check' && (
          <HorizonStrip session={session} latitude={survey.site.latitude} plane={plane.name} {...strip} />
        )}
      </div>
      <div class="sitting-hand">
        {task !== 'check' && (
          <HeadingBanner session={session} onCheck={() => (sitting.task.value = 'check')} />
        )}
        <NewsLine session={session} waiting={waitingWords(sitting)}>
          <NextStation {...props} live={strip.live} />
        </NewsLine>
        <Switches
          label="Task"
          value={task}
          options={TASKS}
          disabled={session.phase.value === 'sweeping'}
          onChoose={(wanted) => {
            session.news.value = null;
            sitting.task.value = wanted;
          }}
        />
        {task === 'trace' && <TracePanel sitting={sitting} />}
        {task === 'open' && <OpenPanel sitting={sitting} gaps={gaps} />}
        {task === 'mark' && <MarkPanel sitting={sitting} />}
        {task === 'check' && <CheckPanel sitting={sitting} />}
      </div>
    </div>
  );
}

/** How often the live figures look at a sweep at work [ms]. */
const LOOK_MS = 350;

/** The sweep as far as it has gone, looked at a few times a second. */
function useLiveSweep(sitting: Sitting): LiveSweep | null {
  const { session, sweep } = sitting;
  const sweeping = session.phase.value === 'sweeping' && sitting.task.value === 'trace';
  const [live, setLive] = useState<LiveSweep | null>(null);
  useEffect(() => {
    if (!sweeping) return setLive(null);
    const look = () => {
      const run = session.runNow;
      const axis = session.axis.value;
      if (run)
        setLive({
          swept: sweptDirections(sweep.samples, axis, run),
          axis,
          run,
          choice: sitting.choice.value,
        });
    };
    const timer = setInterval(look, LOOK_MS);
    return () => clearInterval(timer);
  }, [sweeping, session, sweep, sitting]);
  return live;
}

const NOTHING: readonly AzimuthRange[] = [];
const NOWHERE: LiveSweep['swept'] = [];

function useStrip(props: Props, plane: RoofPlane | null) {
  const { services, survey, station, sitting } = props;
  const pointed = sitting.session.pointed.value;
  const sweep = useLiveSweep(sitting);
  const light = useMemo(
    () => pointed && liveSurvey(survey, station.id, pointed, sweep),
    [survey, station.id, pointed, sweep],
  );
  const question = useMemo(
    () => (light && plane ? { ...light, station: station.id, plane: plane.id } : null),
    [light, plane, station.id],
  );
  const live = useLiveAccess(services, question);
  const observed = live.found?.observed ?? NOTHING;
  const band = useMemo(
    () => (plane ? sunBand(survey.site.latitude, plane.surfaceTilt, plane.surfaceAzimuth) : []),
    [survey.site.latitude, plane?.surfaceTilt, plane?.surfaceAzimuth],
  );
  const gaps = useMemo(() => rangesBetween(observed), [observed]);
  return { gaps, strip: { band, live, observed, sweep: sweep?.swept ?? NOWHERE } };
}
