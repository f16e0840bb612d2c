import { useEffect, useMemo, useRef, useState } from 'preact/hooks';
import { standardOffsetMinutes } from '../../../core/solar-position/time-zone.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { Site } from '../../../core/survey/survey.ts';
import { clamp, directionAt, xOf, yOf } from '../../../report/pictures/sky-frame.ts';
import { smoothDensity } from '../../../report/pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../../report/pictures/sun-lines.ts';
import type { HorizonPicture } from '../../../report/pictures/unrolled-horizon.ts';
import { unrolledHorizon } from '../../../report/pictures/unrolled-horizon.ts';
import { Drawing } from './drawing.tsx';
import { listed, utcOffset } from './figures.ts';
import type { Direction } from './readout.ts';
import { readoutAt } from './readout.ts';
import { useWidth } from './use-width.ts';

interface Props {
  site: Site;
  shade: StationShade;
  names: ReadonlyMap<string, string>;
  year: number;
}

/** The unrolled horizon, and what a finger, a pointer or the arrow keys read off it. */
export function HorizonView({ site, shade, names, year }: Props) {
  const [box, width] = useWidth<HTMLDivElement>();
  const [whole, setWhole] = useState(false);
  const [at, setAt] = useState<Direction | null>(null);
  const lines = useMemo(() => ({ days: dayLines(site), hours: hourLines(site) }), [site]);
  const density = useMemo(() => smoothDensity(shade.density), [shade.density]);
  const height = Math.round(clamp(width * 0.56, 300, 480));
  const picture = useMemo(
    () => width > 0 && unrolledHorizon({ site, shade, density, ...lines, names, width, height, whole }),
    [site, shade, density, lines, names, width, height, whole],
  );
  const standard = utcOffset(standardOffsetMinutes(site.timeZone));
  return (
    <figure class="horizon">
      <div ref={box}>
        {picture && (
          <Readable picture={picture} at={at} onPoint={setAt}>
            <Drawing picture={picture} id="horizon" />
          </Readable>
        )}
      </div>
      <ReadoutLines at={at} context={{ site, shade, names, year }} />
      {picture && (whole || picture.frame.span < 360) && (
        <div class="row">
          <button type="button" class="switch" aria-pressed={whole} onClick={() => setWhole(!whole)}>
            Whole circle
          </button>
          {picture.outside.length > 0 && <p class="small">Outside this view: {listed(picture.outside)}.</p>}
        </div>
      )}
      <figcaption class="small">
        The more ink, the more direct light comes from there; bold numbers are kWh/m² a year from 10° by 10°.
        <details>
          <summary>More on this picture</summary>
          <p>
            Thin lines are the sun’s way on the 21st of each month, broken lines the hours of standard time (
            {standard}). Shapes are what was traced, with the hatch of the list below; what lets light through
            lets the ink under it show. Rings mean that nobody looked there. Below the line of dashes and dots
            the sky lies behind the roof.
          </p>
        </details>
      </figcaption>
    </figure>
  );
}

const KEYS: Record<string, [azimuth: number, elevation: number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

interface ReadableProps {
  picture: HorizonPicture;
  at: Direction | null;
  onPoint: (at: Direction | null) => void;
  children: preact.ComponentChildren;
}

/** Turns pointing at a picture into directions, and shows the cross-hair there. */
function Readable({ picture, at, onPoint, children }: ReadableProps) {
  const { frame } = picture;
  const surface = useRef<HTMLDivElement>(null);
  const point = (event: PointerEvent) => {
    const box = surface.current!.getBoundingClientRect();
    onPoint(directionAt(frame, event.clientX - box.left, event.clientY - box.top));
  };
  const step = (event: KeyboardEvent) => {
    if (event.key === 'Escape') return onPoint(null);
    const move = KEYS[event.key];
    if (!move) return;
    event.preventDefault();
    const size = event.shiftKey ? 5 : 1;
    const from = at ?? { azimuth: frame.centre, elevation: Math.min(30, frame.top) };
    if (!at) return onPoint({ azimuth: Math.round(from.azimuth), elevation: from.elevation });
    const azimuth = (Math.round(from.azimuth) + move[0] * size + 360) % 360;
    const elevation = clamp(Math.round(from.elevation) + move[1] * size, 0, frame.top);
    const x = xOf(frame, azimuth);
    if (x >= frame.left - 0.01 && x <= frame.right + 0.01) onPoint({ azimuth, elevation });
  };
  return (
    <div
      ref={surface}
      class="readable"
      role="application"
      tabIndex={0}
      aria-label="The sky from this station. Arrow keys move the cross-hair by one degree, with shift by five; what it points at is read out below."
      aria-describedby="readout"
      onPointerDown={(event) => {
        surface.current!.setPointerCapture(event.pointerId);
        point(event);
      }}
      onPointerMove={(event) => (event.pointerType === 'mouse' || event.buttons > 0) && point(event)}
      onKeyDown={step}
    >
      {children}
      {at && (
        <svg class="cross-hair" viewBox={`0 0 ${picture.width} ${picture.height}`} aria-hidden="true">
          <path class="cross-hair-rim" d={crossHair(picture, at)} />
          <path d={crossHair(picture, at)} />
        </svg>
      )}
    </div>
  );
}

function crossHair({ frame }: HorizonPicture, { azimuth, elevation }: Direction): string {
  const [x, y] = [xOf(frame, azimuth), yOf(frame, elevation)];
  const gap = 6;
  return `M${x} ${frame.above}V${y - gap}M${x} ${y + gap}V${frame.below}M${frame.left} ${y}H${x - gap}M${x + gap} ${y}H${frame.right}M${x - gap} ${y}a${gap} ${gap} 0 1 0 ${2 * gap} 0a${gap} ${gap} 0 1 0 ${-2 * gap} 0`;
}

/** While the finger moves, sentences follow it; they are computed once a frame at most. */
function ReadoutLines({ at, context }: { at: Direction | null; context: Parameters<typeof readoutAt>[1] }) {
  const [settled, setSettled] = useState(at);
  useEffect(() => {
    const frame = requestAnimationFrame(() => setSettled(at));
    return () => cancelAnimationFrame(frame);
  }, [at]);
  const { site, shade, names, year } = context;
  const readout = useMemo(() => settled && readoutAt(settled, context), [settled, site, shade, names, year]);
  return (
    <div class="readout" id="readout" aria-live="polite">
      {readout ? (
        <>
          <p>
            <strong>{readout.direction}.</strong> {readout.inTheWay}
          </p>
          <p>{readout.when}</p>
          <p>{readout.light}</p>
        </>
      ) : (
        <p class="faint">
          Touch the sky, or use the arrow keys, to read off when the sun stands there and what is in the way.
        </p>
      )}
    </div>
  );
}
