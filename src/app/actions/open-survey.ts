import type { AppServices } from '../app-services.ts';

/** Brings a survey on screen. A later call wins over an earlier one that is still reading. */
export async function openSurvey(
  { state, store }: Pick<AppServices, 'state' | 'store'>,
  id: string,
): Promise<void> {
  if (state.open.value?.id !== id) state.open.value = { id, stored: null };
  const [stored, steps] = await Promise.all([store.load(id), store.steps(id)]);
  if (state.open.value?.id !== id) return;
  state.open.value = { id, stored: stored ?? 'missing' };
  state.steps.value = steps;
}
