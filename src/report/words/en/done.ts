/** Removing, trimming, moving; and what belongs to others. */
export const EN_DONE = {
  'done.heading': 'What could be done about the shade?',
  'done.answer': (obstruction: string, gain: string, roof: string) =>
    `On ${roof}, the largest gain would come without ${obstruction}: ${gain} of the year’s sunlight.`,
  'done.answer-together': (obstructions: string, gain: string, roof: string) =>
    `One alone would not help much. Without ${obstructions}, ${gain} of the year’s sunlight would come back to ${roof}.`,
  'done.answer-nothing': 'Nothing that could be changed here would bring much more sun.',
  'done.answer-clear': 'There is no need to do anything. Shade takes almost nothing.',
  'done.table-caption': (roof: string) => `${roof}: what would come back of the year’s sunlight`,
  'done.what': 'If this changed',
  'done.gain': 'Would come back',
  'done.light': 'As sunlight',
  'done.gone': (obstruction: string) => `${obstruction} gone`,
  'done.moved': (obstruction: string) => `${obstruction} moved away`,
  'done.lower': (obstruction: string, metres: string) => `${obstruction}, ${metres} off the top`,
  'done.clear': (obstruction: string, metres: string) => `${obstruction}, ${metres} off: as good as no shade`,
  'done.unless': (obstruction: string, others: string) =>
    `Taking away ${obstruction} alone brings no gain. ${others} would have to go too.`,
  'done.hidden': (obstruction: string) =>
    `Taking away ${obstruction} alone brings no gain. Other things shade the same hours.`,
  'done.together': (obstructions: string, gain: string) =>
    `With ${obstructions} all gone, ${gain} of the year’s sunlight would come back.`,
  'done.no-distance': (obstruction: string) =>
    `The distance to ${obstruction} was not measured. So we cannot say what a trim would bring.`,
  'done.stays': (obstructions: string) => `We take it that this will stay: ${obstructions}.`,
  'done.place': (roof: string, best: string, most: string, lowest: string, least: string) =>
    `On ${roof} the place counts. At “${best}”, ${most} of the sunlight arrives. At “${lowest}” it is ${least}. Panels do better where more arrives.`,
  'done.before': 'Before anyone cuts or moves a thing',
  'done.owner':
    'Each tree has an owner. Ask first. If it is not yours, only its owner can decide. We do not ask that anyone give up a tree.',
  'done.protected': 'Many trees are under protection. Ask your town or council before a branch is cut.',
  'done.nesting': 'Birds nest in trees. In many places the law forbids cutting in the nesting season.',
  'done.trained': 'Work high in a tree is for trained people.',
  'done.permit': 'To move or build a thing on the house may need a permit. Ask your town or council.',
} as const;
