import { asAppError } from './app-error.ts';
import type { AppState } from './app-state.ts';

function causeText(cause: unknown): string | undefined {
  if (cause instanceof Error) return `${cause.name}: ${cause.message}`;
  return typeof cause === 'string' ? cause : undefined;
}

/** Runs an act; what goes wrong is shown instead of thrown. True when it went well. */
export async function attempt(state: AppState, act: () => Promise<void>): Promise<boolean> {
  try {
    await act();
    state.trouble.value = null;
    return true;
  } catch (error) {
    const { code, cause } = asAppError(error);
    state.trouble.value = { code, detail: causeText(cause) };
    return false;
  }
}
