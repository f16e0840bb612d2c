import type { AppServices } from '../app-services.ts';
import type { Problem } from '../../core/survey/problem.ts';

/** Reads every stored survey once and marks in the list those that this version cannot read. */
export async function findUnreadable({ state, store }: Pick<AppServices, 'state' | 'store'>): Promise<void> {
  const found = new Map<string, Problem[]>();
  for (const { id } of await store.list()) {
    const stored = await store.load(id);
    if (stored?.state === 'unreadable') found.set(id, stored.problems);
  }
  state.unreadable.value = found;
}
