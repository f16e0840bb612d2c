import { monthlyTransmittance } from '../../../core/survey/obstruction-kinds.ts';
import type { Months, Obstruction, ObstructionKind } from '../../../core/survey/survey.ts';
import { numberOf, type Typed } from '../../typed.ts';

/** What passes through an obstruction, as it is typed: in percent. */
export interface TransmittanceDraft {
  by: 'kind' | 'one' | 'months';
  one: string;
  months: string[];
}

const percent = (share: number) => String(Math.round(share * 1000) / 10);

/** What the kind itself lets through, January to December, 0 to 1. */
export const kindMonths = (kind: ObstructionKind, latitude: number): Months =>
  monthlyTransmittance({ id: '', name: '', kind }, latitude);

export function transmittanceDraft(obstruction: Obstruction | null, latitude: number): TransmittanceDraft {
  const value = obstruction?.transmittance;
  const months = obstruction
    ? monthlyTransmittance(obstruction, latitude)
    : kindMonths('deciduous-tree', latitude);
  return {
    by: value === undefined ? 'kind' : typeof value === 'number' ? 'one' : 'months',
    one: typeof value === 'number' ? percent(value) : '',
    months: months.map(percent),
  };
}

function share(text: string): number | null {
  const value = numberOf(text);
  return value !== null && value >= 0 && value <= 100 ? Math.round(value * 1000) / 100_000 : null;
}

export function typedTransmittance({
  by,
  one,
  months,
}: TransmittanceDraft): Typed<number | Months | undefined> {
  if (by === 'kind') return { value: undefined };
  if (by === 'one') {
    const value = share(one);
    return value === null ? { fault: 'A number from 0 to 100 % is needed.' } : { value };
  }
  const values = months.map(share);
  return values.every((value) => value !== null)
    ? { value: values as Months }
    : { fault: 'Each month needs a number from 0 to 100 %.' };
}
