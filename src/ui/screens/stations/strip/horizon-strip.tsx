import { useSignalEffect } from '@preact/signals';
import { useMemo, useRef } from 'preact/hooks';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import type { AzimuthRange } from '../../../../core/angles/azimuth-ranges.ts';
import type { SkyFrame, SkyPlace } from '../../../../report/pictures/sky-frame.ts';
import { linesOf, xOf, yOf } from '../../../../report/pictures/sky-frame.ts';
import { Drawing } from '../../shade/drawing.tsx';
import { useWidth } from '../../shade/use-width.ts';
import type { BandColumn } from './sun-band.ts';
import { stripPicture } from './strip-picture.ts';
import { AccessLine } from './access-line.tsx';
import { unseenInBand } from './unseen-in-band.ts';
import type { LiveAccess } from './use-live-access.ts';

/** As high as the style makes its box, dots. */
const HEIGHT = 84;

interface Props {
  session: CaptureSession;
  latitude: number;
  band: readonly BandColumn[];
  live: LiveAccess;
  observed: readonly AzimuthRange[];
  sweep: readonly SkyPlace[];
  plane: string;
}

/** The horizon unrolled: where the sun goes, what is traced, what is still unseen, and where the phone points. */
export function HorizonStrip({ session, latitude, band, live, observed, sweep, plane }: Props) {
  const [box, width] = useWidth<HTMLDivElement>();
  const profile = live.found?.profile ?? null;
  const picture = useMemo(
    () => width > 0 && stripPicture({ latitude, band, profile, observed, width, height: HEIGHT }),
    [latitude, band, profile, observed, width],
  );
  return (
    <figure class="strip">
      <div ref={box} class="strip-box">
        {picture && <Drawing picture={picture} id="strip" label="The horizon unrolled" />}
        {picture && <SweepLine frame={picture.frame} sweep={sweep} width={width} />}
        {picture && <Pointer session={session} frame={picture.frame} />}
      </div>
      <figcaption>
        <AccessLine live={live} plane={plane} />
        {live.found && <p class="small">{unseenInBand(live.found.unseen)}</p>}
      </figcaption>
    </figure>
  );
}

/** The sweep at work, over the picture: it grows several times a second, the picture only as figures come. */
function SweepLine(props: { frame: SkyFrame; sweep: readonly SkyPlace[]; width: number }) {
  const { frame, sweep, width } = props;
  const path = linesOf(frame, sweep)
    .map((line) => `M${line.map((at) => at.toFixed(1)).join(' ')}`)
    .join('');
  return (
    <svg class="strip-sweep" width={width} height={HEIGHT} aria-hidden="true">
      <path d={path} />
    </svg>
  );
}

/** Where the phone points now; moved by hand, since it moves with every frame. */
function Pointer({ session, frame }: { session: CaptureSession; frame: Parameters<typeof xOf>[0] }) {
  const mark = useRef<HTMLDivElement>(null);
  useSignalEffect(() => {
    const live = session.live.value;
    const element = mark.current;
    if (!element) return;
    const azimuth = live?.azimuth ?? null;
    element.hidden = azimuth === null;
    if (!live || azimuth === null) return;
    const y = yOf(frame, Math.min(frame.top, Math.max(0, live.elevation)));
    element.style.transform = `translate(${xOf(frame, azimuth)}px, ${y}px)`;
  });
  return <div ref={mark} class="strip-pointer" aria-hidden="true" hidden />;
}
