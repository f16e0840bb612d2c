import type { Plural } from '../plural.ts';

/** The first page. */
export const EN_GLANCE = {
  'glance.heading': 'How much sun does your roof get?',
  'glance.answer': (roof: string, access: string) =>
    `${roof} gets ${access} of the sunlight it would get with nothing in the way.`,
  'glance.answer-clear': (roof: string) =>
    `Nothing that stands around ${roof} takes a noticeable part of its sunlight.`,
  'glance.unknown': (roof: string) =>
    `Nobody has measured from ${roof} yet what stands in its way, so how much sun it gets is not known.`,
  'glance.access': 'Sunlight that arrives',
  'glance.access-note': 'of what would come with nothing in the way',
  'glance.facing': 'How the roof lies',
  'glance.facing-note': 'of what a roof at the best slope and direction would get here',
  'glance.light': 'Sunlight on each square metre',
  'glance.light-note': 'in a usual year, shade counted',
  'glance.range-note': (plural: Plural, stations: number) =>
    plural(stations, {
      one: 'The range in brackets is where we expect the truth, 95 times in 100. It comes from one place measured on the roof.',
      other: `The range in brackets is where we expect the truth, 95 times in 100. It comes from ${stations} places measured on the roof.`,
    }),
} as const;
