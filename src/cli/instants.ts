/** Years the positions of the sun hold for. */
const FIRST = Date.UTC(1900, 0, 1);
const LAST = Date.UTC(2101, 0, 1);

const SHAPE = /^(\d{4})-(\d\d)-(\d\d)(?:[T ](\d\d):(\d\d)(?::(\d\d)(?:[.]\d+)?)?)?\s*(Z|[+-]\d\d:?\d\d)?$/i;

export const INSTANT_FORM = 'must be an instant of 1900 to 2100 such as 2026-06-21T12:00:00Z';

/** Unix time [ms] of an ISO 8601 date or date and time; UTC where no offset is given. Null for anything else. */
export function instantOf(text: string): number | null {
  const [, year, month, day, hour = '0', minute = '0', second = '0', zone = 'Z'] =
    SHAPE.exec(text.trim()) ?? [];
  if (year === undefined) return null;
  const inDay = Number(hour) < 24 && Number(minute) < 60 && Number(second) < 61;
  const date = new Date(Date.UTC(Number(year), Number(month) - 1, Number(day)));
  if (!inDay || date.getUTCMonth() !== Number(month) - 1 || date.getUTCDate() !== Number(day)) return null;
  const fraction = Number(/[.]\d+/.exec(text)?.[0] ?? 0);
  const seconds = Number(hour) * 3600 + Number(minute) * 60 + Number(second) + fraction;
  const timeMs = date.getTime() + Math.round(seconds * 1000) - offsetMs(zone);
  return timeMs >= FIRST && timeMs < LAST ? timeMs : null;
}

function offsetMs(zone: string): number {
  if (zone.toUpperCase() === 'Z') return 0;
  const minutes = Number(zone.slice(1, 3)) * 60 + Number(zone.slice(-2));
  return (zone.startsWith('-') ? -minutes : minutes) * 60_000;
}

/** Unix time [ms] of a date, an instant, or a decimal year such as 2027.5. */
export function dateOf(text: string): number | null {
  if (!/^\d{4}([.]\d+)?$/.test(text.trim())) return instantOf(text);
  const year = Math.floor(Number(text));
  const start = Date.UTC(year, 0, 1);
  const timeMs = start + (Number(text) - year) * (Date.UTC(year + 1, 0, 1) - start);
  return timeMs >= FIRST && timeMs < LAST ? timeMs : null;
}
