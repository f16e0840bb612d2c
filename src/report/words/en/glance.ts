import type { Plural } from '../plural.ts';

/** The first page. */
export const EN_GLANCE = {
  'glance.heading': 'How much sun does your roof get?',
  'glance.answer': (roof: string, access: string) =>
    `${roof} gets ${access} of the sunlight it would get with nothing in the way.`,
  'glance.answer-clear': (roof: string) => `${roof} lies open. Almost nothing takes sunlight from it.`,
  'glance.each': (roof: string, access: string) => `${roof}: ${access} of its sunlight arrives.`,
  'glance.unknown': (roof: string) =>
    `Nobody has measured from ${roof} yet. So how much sun it gets is not known.`,
  'glance.no-roof': 'No roof has been measured yet.',
  'glance.several': (plural: Plural, count: number, best: string, light: string) =>
    plural(count, { other: `Of your ${count} roofs, ${best} gets the most sun: ${light} a year.` }),
  'glance.several-unknown': 'Nobody has measured from any of these roofs yet.',
  'glance.figures-of': (roof: string) => `${roof} in figures`,
  'glance.access': 'Sunlight that arrives',
  'glance.access-note': 'of what would come with nothing in the way',
  'glance.facing': 'How the roof lies',
  'glance.facing-note': 'of what a roof at the best slope and direction would get here',
  'glance.light': 'Sunlight on the roof',
  'glance.light-note': 'in a usual year, shade counted',
  'glance.light-note-clear-sky': 'in a year without clouds, shade counted',
  'glance.range-note': (plural: Plural, stations: number) =>
    plural(stations, {
      one: 'The range in brackets is where we expect the truth, 95 times in 100. It comes from one place measured on the roof.',
      other: `The range in brackets is where we expect the truth, 95 times in 100. It comes from ${stations} places measured on the roof.`,
    }),
  'glance.picture-caption':
    'Sunlight of a year. The solid part is what arrives. Hatched is what shade takes. The thin line with two ends is the range.',
  'glance.axis': (unit: string) => `${unit} a year`,
  'glance.bar-unknown': 'not measured',
} as const;
