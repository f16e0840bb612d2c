/** Sunlight of a year, in figures. */
export const EN_EXPECT = {
  'expect.heading': 'How much sunlight can you expect in a year?',
  'expect.answer': (roof: string, light: string) =>
    `${roof} gets about ${light} of sunlight in a usual year.`,
  'expect.answer-clear-sky': (roof: string, light: string) =>
    `${roof} would get about ${light} of sunlight in a year without clouds.`,
  'expect.caption': 'Sunlight of a year, shade counted',
  'expect.roof': 'Roof',
  'expect.light': (unit: string) => `Sunlight, ${unit}`,
  'expect.range': 'Range',
  'expect.size': 'Size',
  'expect.whole': 'Whole roof, kWh',
  'expect.whole-range': 'Range, kWh',
  'expect.not-known': 'not known',
  'expect.kwh-means': 'One kWh is what a heater of 1,000 watts uses in an hour.',
  'expect.range-note':
    'The range tells how well the shade is known. Sunny and dull years come on top of it. We make no promise for any one year.',
  'expect.not-power': 'Sunlight is not yet power. Panels turn only a part of it into power for the house.',
  'expect.clear-sky':
    'These figures are for a sky without clouds. The true amount is less. The shares of shade stay a fair guide.',
} as const;
