import { fullCircle } from '../core/angles/angles.ts';
import type { ReportChoices } from './report-input.ts';
import type { Catalogue } from './words/catalogue.ts';
import type { Language } from './words/languages.ts';
import { LANGUAGES } from './words/languages.ts';
import type { Plural } from './words/plural.ts';

const FOOT = 0.3048;
const SQUARE_FOOT = FOOT * FOOT;
/** Between a number and its unit, so that a line does not break there. */
const THIN = '\u00a0';

/** Writes numbers, days and units in one language and one system of units. */
export class Speech {
  readonly words: Catalogue;
  readonly tag: string;
  private readonly dateFormats = new Map<string, Intl.DateTimeFormat>();
  private readonly numberFormats = new Map<string, Intl.NumberFormat>();

  constructor(readonly choices: Pick<ReportChoices, 'language' | 'units'>) {
    const language: Language = LANGUAGES.find(({ id }) => id === choices.language)!;
    this.words = language.words;
    this.tag = choices.units === 'us' ? (language.usTag ?? language.tag) : language.tag;
  }

  readonly plural: Plural = (count, forms) =>
    forms[new Intl.PluralRules(this.tag).select(count)] ?? forms.other;

  number(value: number, decimals = 0): string {
    return this.numbers(decimals).format(value);
  }

  /** A share as percent. */
  percent(share: number, decimals = 0): string {
    return this.numbers(decimals, 'percent').format(share);
  }

  /** kWh/m2, or kWh to the square foot. */
  irradiation(kwhPerSquareMetre: number): string {
    const value = this.irradiationNumber(kwhPerSquareMetre);
    return `${this.number(value, value < 10 ? 1 : 0)}${THIN}${this.irradiationUnit}`;
  }

  /** The same in the chosen unit, for axes and tables that name the unit once. */
  irradiationNumber(kwhPerSquareMetre: number): number {
    return this.choices.units === 'us' ? kwhPerSquareMetre * SQUARE_FOOT : kwhPerSquareMetre;
  }

  get irradiationUnit(): string {
    return `kWh/${this.choices.units === 'us' ? 'ft²' : 'm²'}`;
  }

  /** Degrees; whole ones by default. */
  angle(degrees: number, decimals = 0): string {
    return `${this.number(degrees, decimals)}°`;
  }

  azimuth(degrees: number, decimals = 0): string {
    const step = 10 ** decimals;
    return this.angle(fullCircle(Math.round(degrees * step) / step), decimals);
  }

  /** The nearest of eight compass points, in words. */
  compass(azimuth: number): string {
    return this.words['compass.words'][Math.round(fullCircle(azimuth) / 45) % 8];
  }

  /** A length in metres, or in feet and inches. */
  length(metres: number, decimals = 1): string {
    if (this.choices.units !== 'us') return `${this.number(metres, decimals)}${THIN}m`;
    const inches = Math.round(metres / (FOOT / 12));
    const [feet, rest] = [Math.trunc(inches / 12), Math.abs(inches % 12)];
    return `${feet}${THIN}ft${rest ? ` ${rest}${THIN}in` : ''}`;
  }

  area(squareMetres: number): string {
    return this.choices.units === 'us'
      ? `${this.number(squareMetres / SQUARE_FOOT)}${THIN}ft²`
      : `${this.number(squareMetres, 1)}${THIN}m²`;
  }

  /** A calendar day YYYY-MM-DD written out. */
  day(date: string): string {
    return this.date(Date.parse(`${date}T00:00:00Z`), { dateStyle: 'long', timeZone: 'UTC' });
  }

  /** A day of any year, month 0 to 11. */
  dayOfYear(month: number, day: number): string {
    return this.date(Date.UTC(2025, month, day), { month: 'long', day: 'numeric', timeZone: 'UTC' });
  }

  /** Day and clock time of an instant at a place. */
  instant(timeMs: number, timeZone: string): string {
    return this.date(timeMs, { dateStyle: 'medium', timeStyle: 'short', timeZone });
  }

  /** Minutes after midnight as the clock shows them. */
  clock(minutes: number): string {
    return this.date(minutes * 60_000, { timeStyle: 'short', timeZone: 'UTC' });
  }

  /** An hour of the day for an axis: "7", or "7 AM" where the day has twice twelve. */
  hour(hour: number): string {
    const format = this.dates({ hour: 'numeric', timeZone: 'UTC' });
    return format.resolvedOptions().hour12 ? format.format(hour * 3_600_000) : String(hour);
  }

  month(month: number, style: 'long' | 'short' | 'narrow' = 'long'): string {
    return this.date(Date.UTC(2025, month, 15), { month: style, timeZone: 'UTC' });
  }

  list(items: readonly string[]): string {
    return new Intl.ListFormat(this.tag, { type: 'conjunction' }).format(items);
  }

  range(low: string, high: string): string {
    return low === high ? low : this.words['frame.range'](low, high);
  }

  private date(timeMs: number, options: Intl.DateTimeFormatOptions): string {
    return this.dates(options).format(timeMs);
  }

  private dates(options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
    return kept(this.dateFormats, JSON.stringify(options), () => new Intl.DateTimeFormat(this.tag, options));
  }

  private numbers(decimals: number, style: 'decimal' | 'percent' = 'decimal'): Intl.NumberFormat {
    return kept(
      this.numberFormats,
      `${style} ${decimals}`,
      () =>
        new Intl.NumberFormat(this.tag, {
          style,
          minimumFractionDigits: decimals,
          maximumFractionDigits: decimals,
        }),
    );
  }
}

/** Formats are slow to make and asked for thousands of times. */
function kept<T>(made: Map<string, T>, key: string, make: () => T): T {
  const known = made.get(key) ?? make();
  made.set(key, known);
  return known;
}
