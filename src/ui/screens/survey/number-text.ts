/** A number with a fixed count of decimals; a dash where there is none. */
export function fixed(value: number | undefined, decimals: number): string {
  return value === undefined ? '–' : value.toFixed(decimals);
}

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
