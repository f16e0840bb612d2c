import type { Survey } from '../survey/survey.ts';

/** Names as a list in a sentence. */
export const listed = (names: readonly string[]): string =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;

export const stationName = ({ stations }: Survey, id: string): string =>
  stations.find((station) => station.id === id)?.name ?? id;

export const stationNames = (survey: Survey, ids: Iterable<string>): string =>
  listed([...ids].map((id) => stationName(survey, id)));

/** `1 sighting`, `4 sightings`. */
export const counted = (count: number, one: string): string => `${count} ${count === 1 ? one : `${one}s`}`;
