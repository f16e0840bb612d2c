import * as v from 'valibot';
import { isTimeZone } from '../solar-position/time-zone.ts';
import { LIMITS } from './limits.ts';

// Every message here is the phrase that follows "must be".

/** A finite number within a range, ends included. */
export function numberBetween(min: number, max: number, unit = '') {
  const phrase = `a number from ${min} to ${max}${unit && ` ${unit}`}`;
  return v.pipe(v.number(phrase), v.minValue(min, phrase), v.maxValue(max, phrase));
}

/** A finite number over a bound, to a greatest one. */
export function numberOver(bound: number, max: number, unit = '') {
  const phrase = `a number over ${bound}, at most ${max}${unit && ` ${unit}`}`;
  return v.pipe(v.number(phrase), v.gtValue(bound, phrase), v.maxValue(max, phrase));
}

/** Degrees clockwise from true north. 360 is taken as 0. */
export const azimuth = numberBetween(0, 360, 'degrees');
export const elevation = numberBetween(-90, 90, 'degrees');
export const share = numberBetween(0, 1);
export const orderKey = v.optional(numberBetween(-1e12, 1e12));
/** Metres in the site's or a plane's frame. */
export const coordinate = numberBetween(-100_000, 100_000, 'metres');

const idPhrase = `a text of 1 to ${LIMITS.idLength} characters`;
/** Any text that names one thing. */
export const identifier = v.pipe(
  v.string(idPhrase),
  v.minLength(1, idPhrase),
  v.maxLength(LIMITS.idLength, idPhrase),
);

/** A text up to a length. */
export function textUpTo(length: number) {
  const phrase = `a text of at most ${length} characters`;
  return v.pipe(v.string(phrase), v.maxLength(length, phrase));
}

export const name = textUpTo(LIMITS.nameLength);

export const yesOrNo = v.boolean('true or false');

const zonePhrase = 'a UTM zone with its hemisphere, such as "33N" or "56S"';
/** Zone 1 to 60 with N or S. */
export const utmZone = v.pipe(v.string(zonePhrase), v.regex(/^(?:0?[1-9]|[1-5]\d|60)[NS]$/, zonePhrase));

const countryPhrase = 'a country by two capital letters, such as "PT"';
/** ISO 3166-1 alpha-2. */
export const countryCode = v.pipe(v.string(countryPhrase), v.regex(/^[A-Z]{2}$/, countryPhrase));

const sha256Phrase = 'a SHA-256 in 64 hexadecimal digits';
export const sha256 = v.pipe(v.string(sha256Phrase), v.regex(/^[0-9a-f]{64}$/, sha256Phrase));

/** A list of one sort of thing. */
export const listOf = <const Item extends v.GenericSchema>(item: Item) => v.array(item, 'a list');

/** One of some texts. */
export function oneOf<const Options extends readonly string[]>(options: Options) {
  const quoted = options.map((option) => `"${option}"`);
  return v.picklist(options, quoted.length > 1 ? `one of ${quoted.join(', ')}` : quoted[0]);
}

const twelve = 'a list of twelve numbers, January to December';
/** Twelve values, January to December. */
export const monthsOf = <const Item extends v.GenericSchema>(item: Item) =>
  v.strictTuple([item, item, item, item, item, item, item, item, item, item, item, item], twelve);

export const timeZone = v.pipe(
  v.string('the IANA name of a time zone, such as "Europe/Lisbon"'),
  v.check(isTimeZone, 'the IANA name of a time zone that this device knows, such as "Europe/Lisbon"'),
);

const dayPhrase = 'a calendar day such as "2026-05-14"';
/** YYYY-MM-DD, a day that exists. */
export const calendarDay = v.pipe(
  v.string(dayPhrase),
  v.regex(/^\d{4}-\d{2}-\d{2}$/, dayPhrase),
  v.check((day) => isCalendarDay(day), dayPhrase),
);

const instantPhrase = 'an instant in UTC such as "2026-05-14T09:30:00Z"';
/** ISO 8601 in UTC, with or without a fraction of the second. */
export const instant = v.pipe(
  v.string(instantPhrase),
  v.regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d{1,9})?Z$/, instantPhrase),
  v.check((text) => isCalendarDay(text.slice(0, 10)) && !Number.isNaN(Date.parse(text)), instantPhrase),
);

/** Whether a day of the form YYYY-MM-DD is in the calendar (31 April is not). */
function isCalendarDay(day: string): boolean {
  const timeMs = Date.parse(`${day}T00:00:00Z`);
  return !Number.isNaN(timeMs) && new Date(timeMs).toISOString().startsWith(day);
}
