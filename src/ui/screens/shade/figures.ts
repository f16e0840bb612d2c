/** A share as percent with one decimal, such as `82.4 %`; the space does not break. */
export const percent = (share: number, decimals = 1): string => `${(share * 100).toFixed(decimals)}\u00a0%`;

/** kWh/m2 with three digits or so. */
export const energy = (kwh: number): string => kwh.toFixed(kwh < 10 ? 1 : 0);

/** Clock in 24 hours, such as `9:05`. */
export const clock = (hour: number, minute: number): string => `${hour}:${String(minute).padStart(2, '0')}`;

/** Minutes ahead of UTC as `UTC+1` or `UTC−3:30`. */
export function utcOffset(minutes: number): string {
  const [sign, size] = [minutes < 0 ? '−' : '+', Math.abs(minutes)];
  const rest = size % 60;
  return `UTC${sign}${Math.floor(size / 60)}${rest ? `:${String(rest).padStart(2, '0')}` : ''}`;
}

/** Names as a list in a sentence. */
export const listed = (names: readonly string[]): string =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;
