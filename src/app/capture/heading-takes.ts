import { fullCircle, turnBetween } from '../../core/angles/angles.ts';
import { pointSurvey } from '../../core/pointing/point-survey.ts';
import { offsetAt } from '../../core/pointing/run-ties.ts';
import type { PointedSurvey } from '../../core/pointing/pointed-survey.ts';
import type { HeadingCheck, Reading, Station, Survey } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { nextOrder, withOwnSighting, withStation } from './station-edits.ts';

/** What a person says of a check before it is taken. */
export type CheckFacts = Omit<HeadingCheck, 'id' | 'order' | 'reading'>;

/** An open range that was looked at in a run; a check of that run moves it too. */
export interface LookedRange {
  run: string;
  range: [number, number];
}

const withCheck = (survey: Survey, stationId: string, check: HeadingCheck): Survey =>
  withStation(survey, stationId, (station) => ({
    ...station,
    headingChecks: [...(station.headingChecks ?? []), { ...check, order: nextOrder(station.headingChecks) }],
  }));

/** Takes a heading check; gives its id. Open ranges of the same run move with the heading. */
export async function takeCheck(
  session: CaptureSession,
  station: Station,
  facts: CheckFacts,
  looked: LookedRange[],
): Promise<string | null> {
  const id = session.services.newId();
  const taken = await session.takeHeld((reading) => ({
    edit: (survey) => {
      const check = { ...facts, id, reading: reading.id };
      const after = withCheck(survey, station.id, check);
      return moveLooked(after, station.id, looked, turnOfRun(session.pointed.value, after, reading));
    },
    code: 'entry-added',
    title: 'Heading check',
    news: { what: 'check' },
  }));
  return taken && id;
}

/** How much a check turns the azimuths of its run, degrees, at the instant of its reading. */
function turnOfRun(before: PointedSurvey | null, after: Survey, reading: Reading) {
  const atMs = Date.parse(reading.takenAt);
  const heading = (pointed: PointedSurvey | null) =>
    pointed?.runs.find(({ id }) => id === reading.run)?.heading ?? null;
  const [old, now] = [heading(before), heading(pointSurvey(after))];
  return { run: reading.run, turn: old && now ? turnBetween(offsetAt(old, atMs), offsetAt(now, atMs)) : 0 };
}

function moveLooked(
  survey: Survey,
  stationId: string,
  looked: LookedRange[],
  { run, turn }: { run: string; turn: number },
): Survey {
  if (turn === 0) return survey;
  const moved = (range: [number, number]): [number, number] => {
    const known = looked.find((one) => one.run === run && one.range.join() === range.join());
    if (!known) return range;
    known.range = [tenths(range[0] + turn), tenths(range[1] + turn)];
    return known.range;
  };
  return withStation(survey, stationId, (station) =>
    station.observedOpen ? { ...station, observedOpen: station.observedOpen.map(moved) } : station,
  );
}

const tenths = (azimuth: number) => fullCircle(Math.round(fullCircle(azimuth) * 10) / 10);

/** Sights a mark by name. Sighted again in the same run, it closes the horizon; in another, it ties the two. */
export async function takeMark(session: CaptureSession, stationId: string, mark: string): Promise<void> {
  await session.takeHeld((reading) => ({
    edit: (survey) =>
      withStation(survey, stationId, (station) =>
        withOwnSighting(station, { id: session.services.newId(), reading: reading.id, mark }),
      ),
    code: 'entry-added',
    title: mark,
    news: { what: 'mark', name: mark },
  }));
}

/** Stores the two readings of a mark, the phone turned upside down between them. */
export async function storeFaces(
  session: CaptureSession,
  stationId: string,
  upright: Reading,
  turned: Reading,
): Promise<void> {
  await session.act({
    edit: (survey) =>
      withStation(survey, stationId, (station) => ({
        ...station,
        indexChecks: [
          ...(station.indexChecks ?? []),
          {
            id: session.services.newId(),
            order: nextOrder(station.indexChecks),
            upright: upright.id,
            turned: turned.id,
          },
        ],
      })),
    code: 'entry-added',
    title: 'Two-face check',
    news: { what: 'face-turned' },
  });
}
