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
  let row = 0;
  for (let y = frame.below - rowHeight / 2; y > frame.above; y -= rowHeight, row++)
    for (let x = frame.left + (row % 2 ? pitch : pitch / 2); x < frame.right; x += pitch) {
      const { azimuth, elevation } = directionAt(frame, x, y);
      const size = Math.round(Math.sqrt(densityAt(density, azimuth, elevation) / density.highest) * SIZES);
      if (size > 0) bySize[Math.min(size, SIZES) - 1].push(x, y);
    }
  return bySize.flatMap((at, i): DotsMark[] =>
    at.length > 0 ? [{ kind: 'dots', at, radius: (largest * (i + 1)) / SIZES, tone: 'ink' }] : [],
  );
}
