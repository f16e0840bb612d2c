import { beforeEach, describe, expect, it } from 'vitest';
import { changesBetween } from '../../src/core/survey/field-changes.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { lostVersions } from '../../src/core/sync-protocol/field-versions.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);

const ID = 'invented-1';
type Tab = ReturnType<typeof tab>;

async function stored({ surveys }: Tab): Promise<Survey> {
  const found = await surveys.load(ID);
  if (found?.state !== 'readable') throw new Error(JSON.stringify(found));
  return found.survey;
}

async function change(device: Tab, edit: (survey: Survey) => Partial<Survey>): Promise<void> {
  const before = await stored(device);
  await device.surveys.applyChanges(ID, changesBetween(before, { ...before, ...edit(before) }));
}

/** Rows as another device has them after acts there, an hour later, on a copy of what is here. */
async function elsewhere(device: Tab, acts: (other: Tab) => Promise<void>, laterMs = 3_600_000) {
  const here = globalThis.indexedDB;
  const rows = (await device.backup.rows(ID))!;
  emptyBrowser();
  const other = tab(() => undefined, 'tablet');
  other.setClock(device.now() + laterMs);
  await other.backup.merge(rows);
  await acts(other);
  const result = (await other.backup.rows(ID))!;
  globalThis.indexedDB = here;
  return result;
}

describe('rows of another device', () => {
  it('leave the value that lost beside the one that counts, also after further edits here', async () => {
    const device = tab();
    await device.surveys.create(inventedSurvey());
    const theirs = await elsewhere(device, (other) => change(other, () => ({ title: 'Theirs' })));
    await change(device, () => ({ title: 'Ours' }));
    await device.backup.merge(theirs);
    expect((await stored(device)).title).toBe('Theirs');
    await change(device, () => ({ title: 'Knowing theirs' }));
    await change(device, () => ({ notes: 'Other' }));
    const row = (await device.backup.rows(ID))!.fields.find(({ path }) => path === 'title')!;
    expect(row.value).toBe('Knowing theirs');
    expect(lostVersions(row).map(({ value }) => value)).toEqual(['Ours']);
  });

  it('bring a deleted station back in which they measured', async () => {
    const device = tab();
    await device.surveys.create(inventedSurvey());
    const theirs = await elsewhere(device, (other) =>
      change(other, ({ stations }) => ({ stations: [{ ...stations[0], notes: 'Measured once more' }] })),
    );
    await change(device, () => ({ stations: [] }));
    expect((await stored(device)).stations).toEqual([]);
    expect(await device.backup.merge(theirs)).toMatchObject({ outcome: 'merged' });
    expect((await stored(device)).stations).toEqual([
      { ...inventedSurvey().stations[0], notes: 'Measured once more' },
    ]);
    await change(device, () => ({ stations: [] }));
    await device.backup.merge(theirs);
    expect((await stored(device)).stations).toEqual([]);
  });

  it('say that a reading was taken out, and put back', async () => {
    const device = tab();
    await device.surveys.create(inventedSurvey());
    const bare = ({ stations }: Survey) => ({
      readings: [],
      stations: stations.map((one) => ({ ...one, traces: [] })),
    });
    const without = await elsewhere(device, (other) => change(other, bare));
    const again = await elsewhere(
      device,
      async (other) => {
        await change(other, bare);
        await change(other, () => ({ readings: inventedSurvey().readings }));
      },
      7_200_000,
    );
    await device.backup.merge(without);
    expect((await stored(device)).readings).toEqual([]);
    await device.backup.merge(again);
    await device.backup.merge(without);
    expect((await stored(device)).readings).toEqual(inventedSurvey().readings);
  });
});
