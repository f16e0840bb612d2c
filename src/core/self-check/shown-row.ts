import type { CheckRow } from './check-row.ts';

/** Unit of rows that hold a time of day. */
export const CLOCK_UNIT = 'min after midnight';

export interface ShownRow {
  published: string;
  computed: string;
  difference: string;
  allowed: string;
}

/** The numbers of a row as a person reads them: times of day as clock times, the rest with the row's decimals. */
export function shownRow(row: CheckRow): ShownRow {
  if (row.unit === CLOCK_UNIT)
    return {
      published: clock(row.published),
      computed: clock(row.computed),
      difference: `${signed(row.difference * 60, 0)} s`,
      allowed: `${(row.allowed * 60).toFixed(0)} s`,
    };
  const unit = row.unit === '°' ? '°' : row.unit && ` ${row.unit}`;
  return {
    published: `${row.published.toFixed(row.decimals)}${unit}`,
    computed: `${row.computed.toFixed(row.decimals)}${unit}`,
    difference: `${signed(row.difference, row.decimals)}${unit}`,
    allowed: `${row.allowed.toFixed(row.decimals)}${unit}`,
  };
}

function signed(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return value > 0 ? `+${text}` : text;
}

function clock(minutes: number): string {
  if (!Number.isFinite(minutes)) return 'none';
  const seconds = Math.round(minutes * 60);
  const two = (value: number) => String(value).padStart(2, '0');
  return `${Math.floor(seconds / 3600)}:${two(Math.floor(seconds / 60) % 60)}:${two(seconds % 60)}`;
}
