import type { Amendment, Sighting, Station, Survey, Trace } from './survey.ts';

/** The list of sightings a row stands in: of a trace, or (null) of a station's marks. */
export interface SightingList {
  station: string;
  trace: string | null;
}

/** The survey with one list of sightings changed. */
function withSightings(
  survey: Survey,
  { station: stationId, trace: traceId }: SightingList,
  change: (sightings: Sighting[]) => Sighting[],
): Survey {
  const inTrace = (trace: Trace) =>
    trace.id === traceId ? { ...trace, sightings: change(trace.sightings) } : trace;
  const inStation = (station: Station): Station =>
    traceId === null
      ? { ...station, markSightings: change(station.markSightings ?? []) }
      : { ...station, traces: station.traces.map(inTrace) };
  const stations = survey.stations.map((station) =>
    station.id === stationId ? inStation(station) : station,
  );
  return { ...survey, stations };
}

/** The survey with a sighting put over the one of its id. */
export const withSighting = (survey: Survey, list: SightingList, sighting: Sighting): Survey =>
  withSightings(survey, list, (rows) => rows.map((row) => (row.id === sighting.id ? sighting : row)));

/** The survey with a sighting added after another of the list; at the end where `after` is null. */
export const withSightingAfter = (
  survey: Survey,
  list: SightingList,
  sighting: Sighting,
  after: string | null,
): Survey =>
  withSightings(survey, list, (rows) => {
    const place = after === null ? rows.length : rows.findIndex(({ id }) => id === after) + 1;
    const all = [...rows.slice(0, place), sighting, ...rows.slice(place)];
    // Counted anew: what stands between two rows of the old order may have no number left.
    return all.map((row, order) => ({ ...row, order }));
  });

export const withoutSighting = (survey: Survey, list: SightingList, id: string): Survey =>
  withSightings(survey, list, (rows) => rows.filter((row) => row.id !== id));

/** The survey without one trace of a station; raw readings stay. */
export const withoutTrace = (survey: Survey, stationId: string, traceId: string): Survey => ({
  ...survey,
  stations: survey.stations.map((station) =>
    station.id === stationId
      ? { ...station, traces: station.traces.filter(({ id }) => id !== traceId) }
      : station,
  ),
});

/** A sighting with a correction over what was read; earlier corrections stay, the last one counts. */
export const amended = (sighting: Sighting, amendment: Amendment): Sighting => ({
  ...sighting,
  amendments: [...(sighting.amendments ?? []), amendment],
});

/** A sighting without its corrections: what was read or typed counts again. */
export function unamended(sighting: Sighting): Sighting {
  const plain = { ...sighting };
  delete plain.amendments;
  return plain;
}
