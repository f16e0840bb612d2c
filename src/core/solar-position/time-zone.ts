/** Time zones by IANA name. What a zone's clocks show comes from the platform's own tables (ECMA-402). */

const formats = new Map<string, Intl.DateTimeFormat>();

/** Throws RangeError for a name the platform does not know. */
function format(timeZone: string): Intl.DateTimeFormat {
  let made = formats.get(timeZone);
  if (!made) {
    try {
      made = new Intl.DateTimeFormat('en-US', {
        timeZone,
        hourCycle: 'h23',
        era: 'short',
        year: 'numeric',
        month: 'numeric',
        day: 'numeric',
        hour: 'numeric',
        minute: 'numeric',
        second: 'numeric',
      });
    } catch {
      throw new RangeError(
        `unknown time zone ${JSON.stringify(timeZone)}; use an IANA name such as Europe/Lisbon`,
      );
    }
    formats.set(timeZone, made);
  }
  return made;
}

/** Whether the platform knows this IANA name. */
export function isTimeZone(timeZone: string): boolean {
  try {
    format(timeZone);
    return true;
  } catch {
    return false;
  }
}

export interface ClockTime {
  year: number;
  /** 1 to 12. */
  month: number;
  day: number;
  hour: number;
  minute: number;
  second: number;
}

/** What the clocks of a zone show at an instant. */
export function clockTime(timeMs: number, timeZone: string): ClockTime {
  const part: Record<string, string> = {};
  for (const { type, value } of format(timeZone).formatToParts(timeMs)) part[type] = value;
  const year = Number(part.year);
  return {
    year: part.era === 'BC' ? 1 - year : year,
    month: Number(part.month),
    day: Number(part.day),
    hour: Number(part.hour),
    minute: Number(part.minute),
    second: Number(part.second),
  };
}

/** Minutes that a zone's clocks are ahead of UTC at an instant; whole seconds of old zones are kept as fractions. */
export function utcOffsetMinutes(timeMs: number, timeZone: string): number {
  const { year, month, day, hour, minute, second } = clockTime(timeMs, timeZone);
  const shown = Date.UTC(year, month - 1, day, hour, minute, second);
  return (shown - Math.floor(timeMs / 1000) * 1000) / 60_000;
}

/**
 * Minutes of a zone's standard time ahead of UTC in a year: the smaller of January and July, since summer time moves
 * clocks forward in every zone that keeps it at those dates.
 */
export function standardOffsetMinutes(timeZone: string, year = 2025): number {
  return Math.min(
    utcOffsetMinutes(Date.UTC(year, 0, 15), timeZone),
    utcOffsetMinutes(Date.UTC(year, 6, 15), timeZone),
  );
}
