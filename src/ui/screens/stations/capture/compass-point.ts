const POINTS = ['N', 'NE', 'E', 'SE', 'S', 'SW', 'W', 'NW'];

/** The nearest of eight points of the compass; nothing where there is no azimuth. */
export const compassPoint = (azimuth: number | null): string =>
  azimuth === null ? '' : POINTS[Math.round(azimuth / 45) % 8];
