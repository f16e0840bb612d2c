/** Degrees with their sign, such as `131.2°`. */
export function degreesText(value: number | undefined, decimals = 1): string {
  return value === undefined ? '–' : `${value.toFixed(decimals)}°`;
}

/** Latitude and longitude with their hemispheres, four decimals (about 10 m). */
export function placeText(latitude: number, longitude: number): string {
  const northSouth = `${Math.abs(latitude).toFixed(4)}° ${latitude < 0 ? 'S' : 'N'}`;
  const eastWest = `${Math.abs(longitude).toFixed(4)}° ${longitude < 0 ? 'W' : 'E'}`;
  return `${northSouth}, ${eastWest}`;
}

/** A share as percent, whole, that does not break before its sign. */
export function percentText(share: number): string {
  return `${Math.round(share * 100)}\u00a0%`;
}

/** A calendar day as words of the reader's language; anything else as it stands. */
export function dayText(day: string): string {
  const date = new Date(`${day}T00:00:00Z`);
  return Number.isNaN(date.getTime())
    ? day
    : date.toLocaleDateString(undefined, { dateStyle: 'medium', timeZone: 'UTC' });
}
