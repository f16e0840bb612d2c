import type { AppServices } from '../app-services.ts';

/** Brings a survey on screen. A later call wins over an earlier one that is still reading. */
export async function openSurvey(services: Pick<AppServices, 'state' | 'store'>, id: string): Promise<void> {
  const { state, store } = services;
  if (state.open.value?.id !== id) state.open.value = { id, stored: null };
  const before = state.open.value;
  const [stored, steps] = await Promise.all([store.load(id), store.steps(id)]);
  if (state.open.value?.id !== id) return;
  // a capture stored something meanwhile, which may not be in what was read
  if (state.open.value !== before) return openSurvey(services, id);
  state.open.value = { id, stored: stored ?? 'missing' };
  state.steps.value = steps;
}
