/** On the pictures; months, hours and numbers come from the language itself. */
export const EN_PICTURE = {
  'picture.unseen': 'nobody looked here',
  'picture.gone': (name: string) => `${name}, gone`,
  'picture.lower': (name: string) => `${name}, lower`,
} as const;
