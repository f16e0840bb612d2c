import { afterEach, describe, expect, it, vi } from 'vitest';
import type { SurveyStore } from '../../src/app/survey-store.ts';
import { AppError } from '../../src/app/app-error.ts';
import { OtherTabs, toldStore } from '../../src/storage/other-tabs.ts';

const tabs: OtherTabs[] = [];
afterEach(() => tabs.splice(0).forEach((tab) => tab.close()));
function tab(): OtherTabs {
  const made = new OtherTabs();
  tabs.push(made);
  return made;
}

describe('tabs of one device', () => {
  it('hear once of each survey that another one changed, and not of their own', async () => {
    const [one, other] = [tab(), tab()];
    const [heardByOne, heardByOther] = [vi.fn(), vi.fn()];
    one.listen(heardByOne);
    other.listen(heardByOther);
    for (const id of ['a', 'b', 'a']) one.tell(id);
    await vi.waitFor(() => expect(heardByOther.mock.calls).toEqual([['a'], ['b']]), 10_000);
    one.tell('a');
    await vi.waitFor(() => expect(heardByOther).toHaveBeenCalledTimes(3), 10_000);
    expect(heardByOne).not.toHaveBeenCalled();
  });
});

describe('a store that tells', () => {
  it('tells after a change is durable, and not of one that failed', async () => {
    const told: string[] = [];
    const bare = {
      remove: () => Promise.resolve(void told.push('stored')),
      restore: () => Promise.reject(new AppError('storage-full')),
    } as unknown as SurveyStore;
    const store = toldStore(bare, (id) => void told.push(id));
    await store.remove('a');
    await expect(store.restore('b')).rejects.toThrow(AppError);
    expect(told).toEqual(['stored', 'a']);
  });
});
