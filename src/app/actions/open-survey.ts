import type { AppServices } from '../app-services.ts';

/** Brings a survey on screen. A later call wins over an earlier one that is still reading. */
export async function openSurvey(
  { state, store }: Pick<AppServices, 'state' | 'store'>,
  id: string,
): Promise<void> {
  if (state.open.value?.id !== id) state.open.value = { id, stored: null };
  const stored = (await store.load(id)) ?? 'missing';
  if (state.open.value?.id === id) state.open.value = { id, stored };
}
