import type { AppServices } from '../app-services.ts';

/** Reads the list of surveys again. */
export async function refreshList({ state, store }: Pick<AppServices, 'state' | 'store'>): Promise<void> {
  state.surveys.value = await store.list();
}
