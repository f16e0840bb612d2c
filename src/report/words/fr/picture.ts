/** On the pictures; months, hours and numbers come from the language itself. */
export const FR_PICTURE = {
  'picture.unseen': 'personne n’a regardé ici',
  'picture.gone': (name: string) => `sans ${name}`,
  'picture.lower': (name: string) => `${name}, moins de hauteur`,
} as const;
