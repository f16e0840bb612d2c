import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { DraftStore, FormDraft } from '../../../src/app/draft-store.ts';
import { DraftKeeper, draftTurns } from '../../../src/ui/components/form/draft-keeper.ts';
import { hasShapeOf } from '../../../src/ui/components/form/draft-shape.ts';

const NAME = { survey: 'a', form: 'site', label: 'Change the site', over: { latitude: 44.9 } };

function plainDrafts() {
  const kept = new Map<string, FormDraft>();
  const key = (survey: string, form: string) => JSON.stringify([survey, form]);
  const store: DraftStore = {
    read: (survey, form) => Promise.resolve(kept.get(key(survey, form)) ?? null),
    list: (survey) => Promise.resolve([...kept.values()].filter((draft) => draft.survey === survey)),
    keep: (draft) => Promise.resolve(void kept.set(key(draft.survey, draft.form), draft)),
    drop: (survey, form) => Promise.resolve(void kept.delete(key(survey, form))),
  };
  return { kept, store };
}

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('what is typed', () => {
  it('is kept a moment after the last key, as it then stands', async () => {
    const { kept, store } = plainDrafts();
    const keeper = new DraftKeeper(store, NAME);
    keeper.type({ address: 'M' });
    keeper.type({ address: 'Mi' });
    expect(kept.size).toBe(0);
    await vi.runAllTimersAsync();
    expect([...kept.values()]).toEqual([{ ...NAME, typed: { address: 'Mi' } }]);
  });

  it('is kept at once where the app goes out of sight, and read by the next form of that name', async () => {
    const { store } = plainDrafts();
    const keeper = new DraftKeeper(store, NAME);
    keeper.type({ address: 'Mill' });
    keeper.flush();
    expect((await new DraftKeeper(store, NAME).read())?.typed).toEqual({ address: 'Mill' });
  });

  it('is gone once the form is saved or given up, whatever is still on its way', async () => {
    const { kept, store } = plainDrafts();
    const keeper = new DraftKeeper(store, NAME);
    keeper.type({ address: 'Mill' });
    keeper.flush();
    keeper.type({ address: 'Mill lane' });
    const turns = draftTurns.value;
    keeper.finish();
    keeper.type({ address: 'Mill lane 4' });
    keeper.flush();
    await vi.runAllTimersAsync();
    expect(kept.size).toBe(0);
    expect(draftTurns.value).toBeGreaterThan(turns);
  });

  it('found from before is gone too once the form is given up untouched', async () => {
    const { kept, store } = plainDrafts();
    await store.keep({ ...NAME, typed: { address: 'Mill' } });
    const keeper = new DraftKeeper(store, NAME);
    await keeper.read();
    keeper.finish();
    await vi.runAllTimersAsync();
    expect(kept.size).toBe(0);
  });

  it('goes on where nothing can be kept', async () => {
    const refusing: DraftStore = {
      read: () => Promise.reject(new Error('refused')),
      list: () => Promise.reject(new Error('refused')),
      keep: () => Promise.reject(new Error('refused')),
      drop: () => Promise.reject(new Error('refused')),
    };
    const keeper = new DraftKeeper(refusing, NAME);
    expect(await keeper.read()).toBeNull();
    keeper.type({ address: 'Mill' });
    await vi.runAllTimersAsync();
    keeper.finish();
    await vi.runAllTimersAsync();
  });
});

describe('a draft of another version', () => {
  const model = { name: '', corners: [{ key: 0, x: '' }], serves: null, unit: 'feet', answers: { roof: [] } };

  it('is taken where its shape is the same', () => {
    expect(hasShapeOf(model, model)).toBe(true);
    expect(hasShapeOf({ ...model, corners: [], serves: ['a'], name: 'x' }, model)).toBe(true);
    expect(hasShapeOf({ ...model, more: 1 }, model)).toBe(true);
  });

  it.each([
    ['a text', 'typed'],
    ['no field', { name: '' }],
    ['another kind', { ...model, name: 3 }],
    ['another row', { ...model, corners: [{ key: '0', x: '' }] }],
    ['a list for an object', { ...model, answers: [] }],
  ])('is left where there is %s', (_, draft) => expect(hasShapeOf(draft, model)).toBe(false));
});
