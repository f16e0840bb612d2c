import type { CommandCall } from './command.ts';
import { UsageError } from './command.ts';

/** Refuses rows on standard input beside a place by options: one of them would be ignored. */
export function refuseRowsToo({ terminal }: CommandCall): void {
  if (terminal.rowsWait())
    throw new UsageError('Give a place by options or rows on standard input, not both.');
}

/** The rows on standard input; refuses options of one place beside them, which rows bring themselves. */
export async function rowsAlone({ values, terminal }: CommandCall, ofOnePlace: string[]): Promise<string> {
  const given = ofOnePlace.filter((name) => values[name] !== undefined);
  if (given.length > 0)
    throw new UsageError(
      `Give both --latitude and --longitude, or rows on standard input without --${given.join(', --')}.`,
    );
  const csv = await terminal.input();
  if (csv === null) throw new UsageError('Give --latitude and --longitude, or rows on standard input.');
  return csv;
}
