import fc from 'fast-check';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { changesBetween } from '../../src/core/survey/field-changes.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { inventedSurvey, rawReading } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

afterEach(() => vi.restoreAllMocks());

/** States of one survey as a day brings them: renamed, planes and readings added, an obstruction gone. */
const state = fc
  .record({
    title: fc.string({ minLength: 1, maxLength: 20 }),
    tilts: fc.array(fc.integer({ min: 0, max: 90 }), { maxLength: 4 }),
    readings: fc.integer({ min: 1, max: 5 }),
    notes: fc.option(fc.string({ maxLength: 30 }), { nil: undefined }),
  })
  .map(({ title, tilts, readings, notes }): Survey => {
    const base = inventedSurvey();
    const more = tilts.map((surfaceTilt, place) => ({
      id: `p${place}`,
      name: `Plane ${place}`,
      surfaceTilt,
      surfaceAzimuth: 10 * place,
    }));
    const raw = Array.from({ length: readings }, (_, place) => rawReading(`raw-${place + 1}`));
    return { ...base, title, planes: [...base.planes, ...more], readings: raw, ...(notes && { notes }) };
  });

async function stored({ surveys }: ReturnType<typeof tab>): Promise<Survey> {
  const found = await surveys.load('invented-1');
  if (found?.state !== 'readable') throw new Error(`not readable: ${JSON.stringify(found)}`);
  return found.survey;
}

/** From the nth write on, the device is full. */
function fullAfter(writes: number): void {
  const prototype = IDBObjectStore.prototype;
  const put = Reflect.get(prototype, 'put') as (...given: unknown[]) => IDBRequest<IDBValidKey>;
  let left = writes;
  vi.spyOn(prototype, 'put').mockImplementation(function (this: IDBObjectStore, ...given) {
    if (left-- <= 0) throw new DOMException('no room', 'QuotaExceededError');
    return put.apply(this, given);
  });
}

describe('any run of edits', () => {
  it('ends at the last state, and back at the first when all are taken back', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(state, { minLength: 2, maxLength: 6 }), async (states) => {
        emptyBrowser();
        const device = tab();
        await device.surveys.create(states[0]);
        for (let place = 1; place < states.length; place++)
          await device.surveys.applyChanges('invented-1', changesBetween(states[place - 1], states[place]));
        expect(await stored(device)).toEqual(states.at(-1));
        for (let place = states.length - 1; place > 0; place--)
          await device.surveys.applyChanges('invented-1', changesBetween(states[place], states[place - 1]));
        expect(await stored(device)).toEqual(states[0]);
      }),
      { numRuns: 30 },
    );
  });
});

describe('a device that runs full at any write', () => {
  it('keeps the state before, whole, or has the state after, whole', async () => {
    await fc.assert(
      fc.asyncProperty(state, state, fc.integer({ min: 0, max: 40 }), async (before, after, writes) => {
        emptyBrowser();
        const device = tab();
        await device.surveys.create(before);
        fullAfter(writes);
        const outcome = await device.surveys
          .applyChanges('invented-1', changesBetween(before, after))
          .then(() => 'stored')
          .catch((error: { code: string }) => error.code);
        vi.restoreAllMocks();
        expect(['stored', 'storage-full']).toContain(outcome);
        expect(await stored(device)).toEqual(outcome === 'stored' ? after : before);
        expect((await device.surveys.list())[0].title).toBe((outcome === 'stored' ? after : before).title);
      }),
      { numRuns: 60 },
    );
  });
});
