import { DEGREES, RADIANS, fullCircle, safeAcos } from '../angles/angles.ts';
import type { ReadingSample } from '../survey/survey.ts';
import type { Vector } from '../angles/vectors.ts';
import { dot, scaled } from '../angles/vectors.ts';
import { attitude } from './attitude.ts';
import type { AveragedDirection } from './average-direction.ts';
import { meanDirection } from './average-direction.ts';
import { PLANNING } from './planning-values.ts';

/** The phone as it was put to a plane once: the rows of the hold. */
export interface Placing {
  rows: readonly ReadingSample[];
  held: 'flat' | 'edge';
}

/** What placings say of a plane, degrees. */
export interface LaidPlane {
  tilt: number;
  tiltDeviation: number;
  /** Azimuth down the slope in the frame of the run; null where the plane is level. */
  facing: number | null;
  facingDeviation: number;
  /** Root mean square departure of the placings from their mean. */
  scatter: number;
  count: number;
  /** Placed both ways round, so that the sensor's own tilt cancels. */
  bothWays: boolean;
}

/** A plane flatter than this has no facing that a phone could tell, degrees. */
const LEVEL = 1;

/**
 * Tilt and facing of a plane from placings of one phone in one frame, all held alike: flat on it, by the mean of its
 * normals; or its long edge along a verge, by the mean of the line down the slope. The two ways round count alike,
 * however often each was taken. Null for no rows, and where the ways cancel out.
 */
export function laidPlane(placings: readonly Placing[]): LaidPlane | null {
  const laid = placings.flatMap((placing) => laidPlacing(placing) ?? []);
  if (laid.length === 0) return null;
  const first = laid[0].top;
  const ways = [
    laid.filter(({ top }) => dot(top, first) >= 0),
    laid.filter(({ top }) => dot(top, first) < 0),
  ].filter((way) => way.length > 0);
  const means = ways.map((way) => meanDirection(way.map(({ mark }) => mark)));
  const mean = means.every((one) => one !== null) ? meanDirection(means.map(({ vector }) => vector)) : null;
  if (!mean) return null;
  const scatter = Math.sqrt(
    ways.reduce((sum, way, i) => sum + way.length * means[i]!.scatter ** 2, 0) / laid.length,
  );
  return planeOf(mean, placings[0].held, scatter, laid.length, ways.length === 2);
}

function planeOf(
  mean: AveragedDirection,
  held: Placing['held'],
  scatter: number,
  count: number,
  bothWays: boolean,
): LaidPlane {
  const tilt =
    held === 'flat' ? safeAcos(Math.max(0, mean.vector[2])) * DEGREES : Math.max(0, -mean.elevation);
  const index = bothWays ? PLANNING.elevationIndexTurned : PLANNING.elevationIndex;
  const across = Math.hypot(index, Math.max(scatter, PLANNING.placing) / Math.sqrt(count));
  return {
    tilt,
    tiltDeviation: across,
    facing: tilt < LEVEL ? null : mean.azimuth,
    facingDeviation: Math.min(
      90,
      held === 'flat' ? across / Math.sin(Math.max(tilt, LEVEL) * RADIANS) : across,
    ),
    scatter,
    count,
    bothWays,
  };
}

/** The plane's mark (its normal; or the line down the slope) in one placing, and which way the phone's top pointed. */
function laidPlacing({ rows, held }: Placing): { mark: Vector; top: Vector } | null {
  const attitudes = rows.map(([, alpha, beta, gamma]) => attitude({ alpha, beta, gamma }));
  const [top, out] = [meanDirection(attitudes.map(({ y }) => y)), meanDirection(attitudes.map(({ z }) => z))];
  if (!top || !out) return null;
  if (held === 'flat')
    return { mark: out.vector[2] < 0 ? scaled(out.vector, -1) : out.vector, top: top.vector };
  return { mark: top.elevation > 0 ? scaled(top.vector, -1) : top.vector, top: top.vector };
}

/**
 * Facing of a plane from an azimuth along its eave or ridge, either way: of the two square to it, the one nearer to
 * what is thought. From an azimuth up or down the slope: that one or its opposite. All in degrees.
 */
export function facingFromEdge(azimuth: number, along: 'eave' | 'fall', thought: number): number {
  const one = along === 'eave' ? azimuth + 90 : azimuth;
  const isNear = Math.cos((one - thought) * RADIANS) >= 0;
  return fullCircle(isNear ? one : one + 180);
}
