import { stationsOf } from '../../survey/served-planes.ts';
import { ordered } from '../../survey/order.ts';
import type { PlanePoint, RoofPlane, Station } from '../../survey/survey.ts';
import { listed } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';

interface ArrayPlace extends PlanePoint {
  name: string;
}

/** The corners and the centre of a plane that has width and slope length; looking up the slope. */
function placesOf({ width, slopeLength, outline }: RoofPlane): ArrayPlace[] {
  if (outline || width === undefined || slopeLength === undefined) return [];
  return [
    { name: 'lower left corner', x: 0, y: 0 },
    { name: 'lower right corner', x: width, y: 0 },
    { name: 'upper left corner', x: 0, y: slopeLength },
    { name: 'upper right corner', x: width, y: slopeLength },
    { name: 'centre', x: width / 2, y: slopeLength / 2 },
  ];
}

export const arrayPlaces: OpenPointKind = {
  id: 'array-places',
  title: 'Corners or centre not sighted',
  isGrave: false,
  find: ({ survey }) =>
    ordered(survey.planes).flatMap((plane) => {
      const stations = stationsOf(survey, plane);
      const missing = missingPlaces(plane, stations);
      if (stations.length === 0 || missing.length === 0) return [];
      return [
        {
          subject: plane.name,
          sentence: `Not sighted: ${listed(missing)}. What stands near shades one end of an array and not the other.`,
          effect: null,
          cure: { at: 'new-station', plane: plane.id, words: 'Add a station' },
        },
      ];
    }),
};

/** The places to which no station on the plane is nearest; none where there are as many stations as places. */
function missingPlaces(plane: RoofPlane, stations: readonly Station[]): string[] {
  const places = placesOf(plane);
  if (stations.length >= places.length) return [];
  const taken = stations.flatMap(({ position }) =>
    position && 'on' in position && position.on === plane.id ? [nearest(places, position)] : [],
  );
  return places.filter((place) => !taken.includes(place)).map(({ name }) => name);
}

const nearest = (places: readonly ArrayPlace[], { x, y }: PlanePoint): ArrayPlace =>
  places.reduce((best, one) =>
    Math.hypot(one.x - x, one.y - y) < Math.hypot(best.x - x, best.y - y) ? one : best,
  );
