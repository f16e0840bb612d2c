import { beforeEach, describe, expect, it } from 'vitest';
import { changesBetween } from '../../src/core/survey/field-changes.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import type { StepRecord } from '../../src/app/survey-store.ts';
import { MOST_STEPS } from '../../src/storage/history-rows.ts';
import { inventedSurvey, rawReading } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);

type Surveys = ReturnType<typeof tab>['surveys'];
const ID = 'invented-1';

async function stored(surveys: Surveys): Promise<Survey> {
  const found = await surveys.load(ID);
  if (found?.state !== 'readable') throw new Error('not readable');
  return found.survey;
}

/** Makes a change as one step; gives its number. */
const change = async (surveys: Surveys, after: Survey, title = after.title) => {
  const before = await stored(surveys);
  return surveys.applyChanges(ID, changesBetween(before, after), {
    back: changesBetween(after, before),
    code: 'survey-changed',
    title,
  });
};

describe('the history of a survey', () => {
  it('is taken back and done again step by step, after a restart too', async () => {
    const states = [
      inventedSurvey(),
      inventedSurvey(ID, { title: 'Second' }),
      inventedSurvey(ID, { title: 'Second', planes: [], stations: [] }),
      inventedSurvey(ID, { title: 'Fourth', planes: [], stations: [], notes: 'Two dogs' }),
    ];
    const first = tab().surveys;
    await first.create(states[0]);
    for (const state of states.slice(1)) await change(first, state);
    const restarted = tab().surveys;
    for (const state of states.slice(0, -1).reverse()) {
      await restarted.undo(ID);
      expect(await stored(restarted)).toEqual(state);
    }
    expect(await restarted.undo(ID)).toBeNull();
    expect(await restarted.steps(ID)).toMatchObject({ undo: null, redo: { number: 1, title: 'Second' } });
    for (const state of states.slice(1)) {
      await restarted.redo(ID);
      expect(await stored(restarted)).toEqual(state);
    }
    expect(await restarted.redo(ID)).toBeNull();
  });

  it('forgets what was taken back once something else is done', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await change(surveys, inventedSurvey(ID, { title: 'Second' }));
    await surveys.undo(ID);
    await change(surveys, inventedSurvey(ID, { title: 'Third' }));
    expect(await surveys.redo(ID)).toBeNull();
    await surveys.undo(ID);
    expect((await stored(surveys)).title).toBe(inventedSurvey().title);
  });

  it('takes back only the step meant, where one is meant', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    const number = await change(surveys, inventedSurvey(ID, { title: 'Second' }));
    await change(surveys, inventedSurvey(ID, { title: 'Third' }));
    expect(await surveys.undo(ID, number ?? NaN)).toBeNull();
    expect((await stored(surveys)).title).toBe('Third');
  });

  it('takes a raw reading out and puts it back, itself unchanged', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    const readings = [...inventedSurvey().readings, rawReading('raw-22', 44)];
    await change(surveys, inventedSurvey(ID, { readings }));
    await surveys.undo(ID);
    expect(await stored(surveys)).toEqual(inventedSurvey());
    await surveys.redo(ID);
    expect((await stored(surveys)).readings).toEqual(readings);
  });

  it('refuses what would leave the survey unreadable, and changes nothing', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    const roofless = changesBetween(inventedSurvey(), inventedSurvey(ID, { planes: [] }));
    const step: StepRecord = { back: [], code: 'entry-deleted', title: 'South roof' };
    await expect(surveys.applyChanges(ID, roofless, step)).rejects.toMatchObject({ code: 'change-refused' });
    expect(await stored(surveys)).toEqual(inventedSurvey());
    expect(await surveys.steps(ID)).toEqual({ undo: null, redo: null });
  });

  it('refuses to take back what later changes stand on', async () => {
    const { surveys } = tab();
    const bare = inventedSurvey(ID, { planes: [], stations: [] });
    await surveys.create(bare);
    await change(surveys, { ...bare, planes: inventedSurvey().planes });
    // Past the history, as a merge with another device would.
    const whole = inventedSurvey();
    await surveys.applyChanges(ID, changesBetween({ ...whole, stations: [] }, whole));
    await expect(surveys.undo(ID)).rejects.toMatchObject({ code: 'change-refused' });
    expect(await stored(surveys)).toEqual(whole);
  });

  it('keeps the last steps only, and none of an erased survey', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    for (let count = 0; count <= MOST_STEPS; count++)
      await surveys.applyChanges(ID, [{ path: 'title', value: `Title ${count}` }], {
        back: [{ path: 'title', value: `Title ${count - 1}` }],
        code: 'survey-renamed',
        title: `Title ${count}`,
      });
    let taken = 0;
    while (await surveys.undo(ID)) taken++;
    expect(taken).toBe(MOST_STEPS);
    expect((await stored(surveys)).title).toBe('Title 0');
    await surveys.erase(ID);
    expect(await surveys.steps(ID)).toEqual({ undo: null, redo: null });
  });
});
