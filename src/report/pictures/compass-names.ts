const WORDS = [
  'north',
  'north-east',
  'east',
  'south-east',
  'south',
  'south-west',
  'west',
  'north-west',
] as const;

/** The nearest of the eight compass points, in words. */
export const compassWord = (azimuth: number): string =>
  WORDS[Math.round((((azimuth % 360) + 360) % 360) / 45) % 8];
