import type { DotsMark } from '../marks.ts';
import type { SkyFrame } from './sky-frame.ts';
import { directionAt } from './sky-frame.ts';
import type { SmoothDensity } from './smooth-density.ts';
import { densityAt } from './smooth-density.ts';

/** Share of the paper that ink covers where most energy comes from. */
const DARKEST = 0.5;
const SIZES = 12;

/** Energy as printer's dots: the ink on a patch is in proportion to the energy from there. */
export function halftone(frame: SkyFrame, density: SmoothDensity, pitch: number): DotsMark[] {
  const rowHeight = pitch * Math.sqrt(0.75);
  const largest = Math.sqrt((DARKEST * pitch * rowHeight) / Math.PI);
  const bySize = Array.from({ length: SIZES }, (): number[] => []);
  if (density.highest <= 0) return [];
  const shifted = [pitch / 2, pitch].map((start) => acrossFrom(start, frame, pitch));
  let row = 0;
  for (let y = frame.below - rowHeight / 2; y > frame.above; y -= rowHeight, row++) {
    const { xs, azimuths } = shifted[row % 2];
    const { elevation } = directionAt(frame, frame.left, y);
    for (let i = 0; i < xs.length; i++) {
      const share = densityAt(density, azimuths[i], elevation) / density.highest;
      const size = Math.min(SIZES, Math.round(Math.sqrt(share) * SIZES));
      if (size > 0) bySize[size - 1].push(xs[i], y);
    }
  }
  return bySize.flatMap((at, i): DotsMark[] =>
    at.length > 0 ? [{ kind: 'dots', at, radius: (largest * (i + 1)) / SIZES, tone: 'ink' }] : [],
  );
}

/** Places of the dots of a row, the same in every other row. */
function acrossFrom(start: number, frame: SkyFrame, pitch: number): { xs: number[]; azimuths: number[] } {
  const xs: number[] = [];
  for (let x = frame.left + start; x < frame.right; x += pitch) xs.push(x);
  return { xs, azimuths: xs.map((x) => directionAt(frame, x, frame.below).azimuth) };
}
