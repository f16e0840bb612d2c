import type { AppServices } from '../app-services.ts';
import type { Problem } from '../../core/survey/problem.ts';

/**
 * Marks in the list the surveys that this version cannot read. Each is read once, and again only after it was changed:
 * a long survey takes a while.
 */
export async function findUnreadable({ state, store }: Pick<AppServices, 'state' | 'store'>): Promise<void> {
  const { lookedAt, unreadable } = state;
  const found = new Map<string, Problem[]>(unreadable.value);
  for (const { id, changedAt } of await store.list()) {
    if (lookedAt.get(id) === changedAt) continue;
    const stored = await store.load(id);
    if (stored?.state === 'unreadable') found.set(id, stored.problems);
    else found.delete(id);
    lookedAt.set(id, changedAt);
  }
  unreadable.value = found;
}
