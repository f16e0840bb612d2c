/** What the years may bring. */
export const EN_CHANGE = {
  'change.heading': 'What may change over the years?',
  'change.answer-trees': 'Trees grow, and their shade grows with them.',
  'change.answer': 'Little changes by itself. New things nearby can bring new shade.',
  'change.table-caption': (roof: string) => `${roof}: what a growing tree would take of the year’s sunlight`,
  'change.tree': 'Tree',
  'change.grown': (metres: string) => `${metres} taller`,
  'change.more': (share: string) => `${share} more`,
  'change.no-more': 'no more',
  'change.no-distance': (trees: string) =>
    `The distance to ${trees} was not measured. So we cannot say what growth would take. Count on some more shade each year.`,
  'change.buildings':
    'A new house or a new floor next door can bring shade. Ask your town or council what may be built there.',
  'change.own-trees': (side: string) =>
    `Think of the sun before you plant a tree. On the ${side} side of the house its shade falls away from the roof.`,
  'change.own-trees-tropics':
    'Think of the sun before you plant a tree. Here the sun comes from both sides, so any tall tree close by can shade the roof.',
  'change.years':
    'Some years are sunny and some are dull. Our figures are for a usual year, so a single year can be more or less.',
  'change.again': 'When trees have grown or a house was built, have the roof measured again.',
} as const;
