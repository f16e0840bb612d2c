import type { Sighting, Station, Survey, Trace } from '../../core/survey/survey.ts';

/** An `order` key after all of a list. */
export const nextOrder = (rows: readonly { order?: number }[] | undefined): number =>
  (rows ?? []).reduce((most, { order = -1 }) => Math.max(most, order), (rows?.length ?? 0) - 1) + 1;

/** The station of that id. Throws RangeError where the survey has none. */
export function stationOf(survey: Survey, id: string): Station {
  const station = survey.stations.find((one) => one.id === id);
  if (!station) throw new RangeError(`id must be a station of the survey, got ${id}`);
  return station;
}

/** The survey with one station changed. */
export const withStation = (survey: Survey, id: string, change: (station: Station) => Station): Survey => ({
  ...survey,
  stations: survey.stations.map((station) => (station.id === id ? change(station) : station)),
});

/**
 * Sightings of a station that belong to no trace and name no mark: points of a trace that has too few of them yet to
 * stand by itself, and a sweep that is not finished (it has `readings`).
 */
export const looseSightings = ({ markSightings }: Station): Sighting[] =>
  (markSightings ?? []).filter(({ mark }) => mark === undefined);

/** Puts a sighting among the station's own, or over the one of the same id. */
export function withOwnSighting(station: Station, sighting: Sighting): Station {
  const own = station.markSightings ?? [];
  const known = own.some(({ id }) => id === sighting.id);
  const order = sighting.order ?? nextOrder(own);
  return {
    ...station,
    markSightings: known
      ? own.map((one) => (one.id === sighting.id ? { ...sighting, order: one.order ?? order } : one))
      : [...own, { ...sighting, order }],
  };
}

/** The station without some of its own sightings; without the list where none is left. */
export function withoutOwnSightings(station: Station, ids: readonly string[]): Station {
  const { markSightings, ...rest } = station;
  const left = (markSightings ?? []).filter(({ id }) => !ids.includes(id));
  return left.length > 0 ? { ...rest, markSightings: left } : rest;
}

/** The station with a trace after the others. */
export const withTrace = (station: Station, trace: Trace): Station => ({
  ...station,
  traces: [...station.traces, { ...trace, order: nextOrder(station.traces) }],
});

/** The station with a sighting at the end of one of its traces. */
export const withTracePoint = (station: Station, traceId: string, sighting: Sighting): Station => ({
  ...station,
  traces: station.traces.map((trace) =>
    trace.id === traceId
      ? { ...trace, sightings: [...trace.sightings, { ...sighting, order: nextOrder(trace.sightings) }] }
      : trace,
  ),
});

/** Sightings in the order they were taken, with keys that say so. */
export const inOrder = (sightings: readonly Sighting[]): Sighting[] =>
  sightings.map((sighting, order) => ({ ...sighting, order }));
