import { fullCircle } from '../angles/angles.ts';
import { PLANNING } from '../pointing/planning-values.ts';
import type { PointedPlane } from '../pointing/pointed-survey.ts';
import type { Orientation } from '../shading/orientation-factor.ts';
import type { RoofPlane } from '../survey/survey.ts';
import { quantile } from './quantile.ts';
import { randomSource } from './random-source.ts';

const DRAWS = 256;

/**
 * Where a plane's orientation factor is expected 95 times in 100, since its tilt and its azimuth are known only so well:
 * as its readings say, else by the planning values of typed ones. Seeded draws, both angles normal and independent; the
 * factor itself always lies inside. Null at a site without light.
 */
export function orientationInterval(
  { annual, best }: Orientation,
  plane: Pick<RoofPlane, 'id' | 'surfaceTilt' | 'surfaceAzimuth'>,
  read: Pick<PointedPlane, 'tilt' | 'azimuth'> | undefined,
  seed: string,
): { low: number; high: number } | null {
  if (!(best.annual > 0)) return null;
  const tiltDeviation = read?.tilt?.standardDeviation ?? PLANNING.typedTilt;
  const azimuthDeviation = read?.azimuth?.standardDeviation ?? PLANNING.typedFacing;
  const random = randomSource('orientation', seed, plane.id);
  const factorAt = (tilt: number, azimuth: number) => Math.min(1, annual(tilt, azimuth) / best.annual);
  const value = factorAt(plane.surfaceTilt, plane.surfaceAzimuth);
  const factors = Float64Array.from({ length: DRAWS }, () => {
    const tilt = plane.surfaceTilt + tiltDeviation * random.normal();
    const azimuth = plane.surfaceAzimuth + azimuthDeviation * random.normal();
    // past the horizontal a plane faces the other way
    return factorAt(Math.min(90, Math.abs(tilt)), fullCircle(tilt < 0 ? azimuth + 180 : azimuth));
  }).sort();
  return {
    low: Math.min(value, quantile(factors, 0.025)),
    high: Math.max(value, quantile(factors, 0.975)),
  };
}
