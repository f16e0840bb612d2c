/** The next of 1, 2, 5, 10, 20 … at or above a size over 0. */
export function roundStep(size: number): number {
  const power = 10 ** Math.floor(Math.log10(size));
  const digit = [1, 2, 5, 10].find((least) => least * power >= size * (1 - 1e-9))!;
  return Number((digit * power).toPrecision(6));
}
