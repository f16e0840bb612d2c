import type { CalculationFault, Outcome } from '../core/shading/calculation.ts';

/** Thrown where a call finds that nobody waits for it any more. */
export class Cancelled extends Error {}

/** A fault to be handed back as it is. */
export class Faulty extends Error {
  constructor(readonly fault: CalculationFault) {
    super(fault.code);
  }
}

/** What came of some work; whatever it threw becomes a fault, since errors lose their kind between threads. */
export async function outcomeOf<T>(work: () => Promise<Outcome<T>>): Promise<Outcome<T>> {
  try {
    return await work();
  } catch (error) {
    if (error instanceof Cancelled) return { ok: false, fault: { code: 'cancelled' } };
    if (error instanceof Faulty) return { ok: false, fault: error.fault };
    const detail = error instanceof Error ? `${error.name}: ${error.message}` : String(error);
    return { ok: false, fault: { code: 'failed', detail } };
  }
}
