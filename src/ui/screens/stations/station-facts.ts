import type { PointedSurvey } from '../../../core/pointing/pointed-survey.ts';
import { rangesBetween } from '../../../core/angles/azimuth-ranges.ts';
import type { Station, Survey } from '../../../core/survey/survey.ts';

const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count} ${count === 1 ? one : many}`;

/** What a station has, as parts of a sentence. */
export function hasParts({
  traces,
  observedOpen = [],
  openLooks = [],
  headingChecks = [],
  markSightings = [],
}: Station): string[] {
  const marks = markSightings.filter(({ mark }) => mark !== undefined).length;
  const open = observedOpen.length + openLooks.length;
  const loose = markSightings.length - marks;
  return [
    traces.length > 0 && counted(traces.length, 'trace'),
    open > 0 && counted(open, 'open range'),
    headingChecks.length > 0 && counted(headingChecks.length, 'heading check'),
    marks > 0 && counted(marks, 'mark'),
    loose > 0 && `${counted(loose, 'sighting')} in no trace yet`,
  ].filter((part) => part !== false);
}

/** Where a station stands, in words. */
export function placeWords({ position, instrumentHeight }: Station, survey: Survey): string {
  const height = instrumentHeight ? `, ${instrumentHeight} m above the surface` : '';
  if (!position) return `Place unknown${height}`;
  if (!('on' in position))
    return `${position.east} m east, ${position.north} m north, ${position.up} m up${height}`;
  const plane = survey.planes.find(({ id }) => id === position.on);
  return `On ${plane?.name ?? position.on}, ${position.x} m along the eave, ${position.y} m up the slope${height}`;
}

/** Azimuth ranges nobody looked at, whole degrees; ranges narrower than a degree are left out. */
export function unseenWords(observed: readonly (readonly [number, number])[]): string[] {
  return rangesBetween(observed)
    .filter(([from, to]) => to - from >= 1)
    .map(([from, to]) =>
      to - from >= 360 ? 'all around' : `${Math.round(from) % 360}° to ${Math.round(to) % 360}°`,
    );
}

/** Names of planes a station speaks for. */
export const servedNames = ({ serves }: Station, { planes }: Survey): string[] =>
  planes.filter(({ id }) => serves.includes(id)).map(({ name }) => name);

/** Sightings of a station that point nowhere yet, since nothing ties their run to north. */
export const withoutNorth = (station: Station, pointed: PointedSurvey): number =>
  [...pointed.sightings.values()].filter(
    (sighting) => sighting.station === station.id && sighting.undirected?.code === 'no-heading',
  ).length;
