import { DEGREES, RADIANS, safeAsin, turnBetween } from '../angles/angles.ts';
import type { Vector } from '../angles/vectors.ts';
import { blended, cross, dot, length, unit, vectorOf } from '../angles/vectors.ts';
import type { SkyPoint } from './horizon-edge.ts';

/** A long line is laid as strips no longer than this, degrees, so that their straight sides keep its width. */
const LONGEST_STRIP = 5;

/** Degrees. */
const HAIR = 1e-5;
/** A path that reaches the zenith stops this far short of it, so that it has an azimuth, degrees. */
const SHORT_OF_ZENITH = 0.001;

/**
 * The strips of sky, each four corners, that a line of angular width [degrees] covers between neighbouring points:
 * half the width on either side of the path, at right angles to it on the sky.
 */
export function lineStrips(points: readonly SkyPoint[], width: number, straight: boolean): SkyPoint[][] {
  const strips: SkyPoint[][] = [];
  for (let i = 1; i < points.length; i++) {
    const path = pathBetween(points[i - 1], points[i], straight);
    for (let k = 1; k < path.length; k++) {
      const strip = stripAround(path[k - 1], path[k], width);
      if (strip?.some(({ elevation }) => elevation > 0)) strips.push(offTheZenith(strip));
    }
  }
  return strips;
}

/**
 * A side that goes right over the zenith joins azimuths 180° apart, which no edge does in one way only: its second corner
 * is moved aside by a hair.
 */
function offTheZenith(corners: SkyPoint[]): SkyPoint[] {
  return corners.map((corner, i) => {
    const before = corners[(i + corners.length - 1) % corners.length];
    const turn = Math.abs(turnBetween(before.azimuth, corner.azimuth));
    return turn < 180 - HAIR ? corner : { ...corner, azimuth: (corner.azimuth + 2 * HAIR) % 360 };
  });
}

function pathBetween(start: SkyPoint, end: SkyPoint, straight: boolean): Vector[] {
  const [a, b] = [vectorOf(belowZenith(start)), vectorOf(belowZenith(end))];
  const angle = Math.atan2(length(cross(a, b)), dot(a, b));
  const turn = turnBetween(start.azimuth, end.azimuth);
  const reach = straight
    ? angle * DEGREES
    : Math.max(Math.abs(turn), Math.abs(end.elevation - start.elevation));
  const pieces = Math.max(1, Math.ceil(reach / LONGEST_STRIP));
  return Array.from({ length: pieces + 1 }, (_, k) => {
    const share = k / pieces;
    if (!straight)
      return vectorOf({
        azimuth: start.azimuth + share * turn,
        elevation: start.elevation + share * (end.elevation - start.elevation),
      });
    const [u, v] = [Math.sin((1 - share) * angle), Math.sin(share * angle)];
    return unit(blended(a, u, b, v));
  });
}

/** Null where both ends are the same direction. */
function stripAround(a: Vector, b: Vector, width: number): SkyPoint[] | null {
  const normal = cross(a, b);
  if (length(normal) < 1e-12) return null;
  const n = unit(normal);
  const aside = (p: Vector, side: number): SkyPoint => {
    const s = Math.sin((side * width * RADIANS) / 2);
    const c = Math.cos((width * RADIANS) / 2);
    return point(blended(p, c, n, s));
  };
  return [aside(a, 1), aside(b, 1), aside(b, -1), aside(a, -1)];
}

const belowZenith = ({ azimuth, elevation }: SkyPoint): SkyPoint => ({
  azimuth,
  elevation: Math.min(elevation, 90 - SHORT_OF_ZENITH),
});

/** Direction of a unit vector. */
const point = ([east, north, up]: Vector): SkyPoint => ({
  azimuth: (Math.atan2(east, north) * DEGREES + 360) % 360,
  elevation: safeAsin(up) * DEGREES,
});
