import { stationsOf } from './served-planes.ts';
import type { PlanePoint, RoofPlane, Survey } from './survey.ts';

/** A place of a plane that an array is judged by; metres in the plane. */
export interface ArrayPlace extends PlanePoint {
  name: string;
  /** Whether no station stands nearest to it. */
  isMissing: boolean;
}

/**
 * The corners and the centre of a plane, looking up the slope, those still without a station first. None where the
 * plane has an outline or lacks its width or slope length. A station counts for the place it stands nearest to; where
 * as many stations speak for the plane as it has places, none is missing.
 */
export function arrayPlacesOf(survey: Survey, plane: RoofPlane): ArrayPlace[] {
  const points = pointsOf(plane);
  const stations = stationsOf(survey, plane);
  const taken = stations.flatMap(({ position }) =>
    position && 'on' in position && position.on === plane.id ? [nearest(points, position)] : [],
  );
  const places = points.map((point) => ({
    ...point,
    isMissing: stations.length < points.length && !taken.includes(point),
  }));
  return [...places.filter(({ isMissing }) => isMissing), ...places.filter(({ isMissing }) => !isMissing)];
}

type NamedPoint = PlanePoint & { name: string };

function pointsOf({ width, slopeLength, outline }: RoofPlane): NamedPoint[] {
  if (outline || width === undefined || slopeLength === undefined) return [];
  return [
    { name: 'lower left corner', x: 0, y: 0 },
    { name: 'lower right corner', x: width, y: 0 },
    { name: 'upper left corner', x: 0, y: slopeLength },
    { name: 'upper right corner', x: width, y: slopeLength },
    { name: 'centre', x: width / 2, y: slopeLength / 2 },
  ];
}

function nearest(points: readonly NamedPoint[], { x, y }: PlanePoint): NamedPoint | undefined {
  const away = (one: PlanePoint) => Math.hypot(one.x - x, one.y - y);
  return points.reduce<NamedPoint | undefined>(
    (best, one) => (best && away(best) <= away(one) ? best : one),
    undefined,
  );
}
