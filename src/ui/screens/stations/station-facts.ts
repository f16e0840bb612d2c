import type { PointedSurvey } from '../../../core/pointing/pointed-survey.ts';
import { rangesBetween } from '../../../core/angles/azimuth-ranges.ts';
import type { Sighting, Station, Survey } from '../../../core/survey/survey.ts';
import { unmeasuredPlace } from '../../components/field-book/unmeasured-place.ts';

export const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count} ${count === 1 ? one : many}`;

/** Sweeps of a station that are in no trace: they were cut off, and nobody has said what they were of. */
export const sweptLoose = ({ markSightings = [] }: Station): Sighting[] =>
  markSightings.filter(({ mark, readings }) => mark === undefined && readings !== undefined);

/** What a station has, as parts of a sentence. */
export function hasParts(station: Station): string[] {
  const { traces, observedOpen = [], openLooks = [], headingChecks = [], markSightings = [] } = station;
  const marks = markSightings.filter(({ mark }) => mark !== undefined).length;
  const open = observedOpen.length + openLooks.length;
  const swept = sweptLoose(station).length;
  const loose = markSightings.length - marks - swept;
  return [
    traces.length > 0 && counted(traces.length, 'trace'),
    open > 0 && counted(open, 'open range'),
    headingChecks.length > 0 && counted(headingChecks.length, 'heading check'),
    marks > 0 && counted(marks, 'mark'),
    swept > 0 && counted(swept, 'interrupted sweep'),
    loose > 0 && `${counted(loose, 'sighting')} in no trace yet`,
  ].filter((part) => part !== false);
}

/** Where a station stands, in words. */
export function placeWords(station: Station, survey: Survey): string {
  const { position, instrumentHeight } = station;
  const height = instrumentHeight ? `, ${instrumentHeight} m above the surface` : '';
  if (!position) return `${unmeasuredPlace(station, survey)}${height}`;
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
