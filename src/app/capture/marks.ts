import { ordered } from '../../core/survey/order.ts';
import type { HeadingCheck, Sighting, Station, Survey } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { checksOf } from './last-ways.ts';
import { nextOrder, stationOf, withOwnSighting, withStation } from './station-edits.ts';

/** Names of marks sighted anywhere in the survey. */
export function marksOf({ stations }: Pick<Survey, 'stations'>): string[] {
  const names = stations.flatMap(({ traces, markSightings = [] }) =>
    [...traces.flatMap(({ sightings }) => sightings), ...markSightings].flatMap(({ mark }) => mark ?? []),
  );
  return [...new Set(names)];
}

/** Marks a heading may be checked by: those of earlier checks, the last one first, then those sighted. */
export const checkMarksOf = (survey: Pick<Survey, 'stations'>): string[] => [
  ...new Set([
    ...checksOf(survey)
      .flatMap(({ mark }) => mark ?? [])
      .reverse(),
    ...marksOf(survey),
  ]),
];

/** The bearing of a mark as it was given at that station last; null where it was not. */
export function bearingFrom(
  { headingChecks = [] }: Station,
  mark: string,
): { bearing: number; frame: NonNullable<HeadingCheck['frame']> } | null {
  const { bearing, frame = 'true' } =
    ordered(headingChecks).findLast((one) => one.mark === mark && one.bearing !== undefined) ?? {};
  return bearing === undefined ? null : { bearing, frame };
}

/** A name for one more mark: `M` and the next number that is free. */
export function freeMarkName(survey: Pick<Survey, 'stations'>): string {
  const taken = new Set(marksOf(survey));
  for (let number = 1; ; number++) if (!taken.has(`M${number}`)) return `M${number}`;
}

/** The mark that a sighting of a station has been given; null for none, and for a sighting that is not there. */
export function markOf(station: Station, id: string): string | null {
  const own = station.markSightings ?? [];
  const sighting = [...station.traces.flatMap(({ sightings }) => sightings), ...own].find(
    (one) => one.id === id,
  );
  return sighting?.mark ?? (sighting && copyOf(own, sighting))?.mark ?? null;
}

/** Whether a station has a sighting of that id. */
export const hasSighting = (station: Station, id: string): boolean =>
  [...station.traces.flatMap(({ sightings }) => sightings), ...(station.markSightings ?? [])].some(
    (one) => one.id === id,
  );

/** Gives a sighting a mark's name, in a trace or before it has one. */
export async function nameSighting(
  session: CaptureSession,
  stationId: string,
  sightingId: string,
  mark: string,
): Promise<void> {
  const { survey } = session.record;
  if (!hasSighting(stationOf(survey, stationId), sightingId)) return;
  await session.act({
    edit: (one) =>
      withStation(one, stationId, (station) => withMark(station, sightingId, mark, session.services.newId())),
    code: 'entry-changed',
    title: mark,
    news: { what: 'mark', name: mark },
  });
}

/**
 * A point that waits for its trace is not given the mark itself, since it would count as a sighting of the mark alone
 * then: a sighting of the mark by the same reading stands beside it until there is a trace.
 */
function withMark(station: Station, id: string, mark: string, newId: string): Station {
  const own = station.markSightings ?? [];
  const waiting = own.find((one) => one.id === id);
  if (waiting && waiting.mark === undefined) {
    const copy = copyOf(own, waiting) ?? { id: newId, reading: waiting.reading, order: nextOrder(own) };
    return withOwnSighting(station, { ...copy, mark });
  }
  const named = (one: Sighting) => (one.id === id ? { ...one, mark } : one);
  return {
    ...station,
    ...(waiting && { markSightings: own.map(named) }),
    traces: station.traces.map((trace) =>
      trace.sightings.some((one) => one.id === id)
        ? { ...trace, sightings: trace.sightings.map(named) }
        : trace,
    ),
  };
}

const copyOf = (own: readonly Sighting[], { reading }: Sighting): Sighting | undefined =>
  own.find((one) => one.mark !== undefined && reading !== undefined && one.reading === reading);

/** Points that become a trace, with the marks that were noted beside them; and the ids of those notes. */
export function withNotedMarks(
  station: Station,
  points: readonly Sighting[],
): { points: Sighting[]; noted: string[] } {
  const own = (station.markSightings ?? []).filter(({ sampleAt }) => sampleAt === undefined);
  const noted: string[] = [];
  const marked = points.map((point) => {
    const copy = copyOf(own, point);
    if (!copy) return point;
    noted.push(copy.id);
    return { ...point, mark: copy.mark };
  });
  return { points: marked, noted };
}
