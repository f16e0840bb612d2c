/** On the pictures; months, hours and numbers come from the language itself. */
export const ES_PICTURE = {
  'picture.unseen': 'aquí no miró nadie',
  'picture.gone': (name: string) => `sin ${name}`,
  'picture.lower': (name: string) => `${name}, con menos altura`,
} as const;
