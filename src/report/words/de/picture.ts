/** On the pictures; months, hours and numbers come from the language itself. */
export const DE_PICTURE = {
  'picture.unseen': 'hier hat niemand geschaut',
  'picture.gone': (name: string) => `${name}, weg`,
  'picture.lower': (name: string) => `${name}, niedriger`,
} as const;
