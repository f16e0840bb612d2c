import { isTooSteep } from '../../core/pointing/check-results.ts';
import { pointingOfReading } from '../../core/pointing/reading-direction.ts';
import type { HeadingCheck, Reading, Survey } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { nextOrder, withOwnSighting, withStation } from './station-edits.ts';

/** What a person says of a check before it is taken. */
export type CheckFacts = Omit<HeadingCheck, 'id' | 'order' | 'reading'>;

const withCheck = (survey: Survey, stationId: string, check: HeadingCheck): Survey =>
  withStation(survey, stationId, (station) => ({
    ...station,
    headingChecks: [...(station.headingChecks ?? []), { ...check, order: nextOrder(station.headingChecks) }],
  }));

/** Takes a heading check. It corrects all that its run sighted and found open, earlier too. */
export async function takeCheck(
  session: CaptureSession,
  stationId: string,
  facts: CheckFacts,
): Promise<{ id: string; reading: Reading } | null> {
  const id = session.services.newId();
  const reading = await session.takeHeld((reading) => {
    const pointing = pointingOfReading(reading);
    if (pointing && isTooSteep(pointing.elevation)) return 'too-steep';
    return {
      edit: (survey) => withCheck(survey, stationId, { ...facts, id, reading: reading.id }),
      code: 'entry-added',
      title: 'Heading check',
      news: { what: 'check' },
    };
  });
  return reading && { id, reading };
}

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

/** Stores the two readings of a mark, the phone turned upside down between them; gives the check's id. */
export async function storeFaces(
  session: CaptureSession,
  stationId: string,
  upright: Reading,
  turned: Reading,
): Promise<string | null> {
  const id = session.services.newId();
  const stored = await session.act({
    edit: (survey) =>
      withStation(survey, stationId, (station) => ({
        ...station,
        indexChecks: [
          ...(station.indexChecks ?? []),
          {
            id,
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
  return stored ? id : null;
}
