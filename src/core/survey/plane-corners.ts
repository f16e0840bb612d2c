import { RADIANS } from '../angles/angles.ts';
import type { LocalPoint, PlanePoint, RoofPlane } from './survey.ts';

/** Corners of a plane, in the plane, metres: its outline, else its width by its slope length; null without either. */
export function planeOutline({ outline, width, slopeLength }: RoofPlane): PlanePoint[] | null {
  if (outline) return outline;
  if (width === undefined || slopeLength === undefined) return null;
  return [
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: slopeLength },
    { x: 0, y: slopeLength },
  ];
}

/**
 * A point of a plane in the site's frame, metres, where its lower-left corner stands at `corner` (absent: at the
 * frame's zero). Looking up the slope, x runs to the right along the eave and y up the slope.
 */
export function planePointAt(
  { surfaceTilt, surfaceAzimuth, corner }: Pick<RoofPlane, 'surfaceTilt' | 'surfaceAzimuth' | 'corner'>,
  { x, y }: PlanePoint,
): LocalPoint {
  const { east, north, up } = corner ?? { east: 0, north: 0, up: 0 };
  const [sine, cosine] = [Math.sin(surfaceAzimuth * RADIANS), Math.cos(surfaceAzimuth * RADIANS)];
  const level = y * Math.cos(surfaceTilt * RADIANS);
  return {
    east: east - x * cosine - level * sine,
    north: north + x * sine - level * cosine,
    up: up + y * Math.sin(surfaceTilt * RADIANS),
  };
}
