import { dated } from './dated.ts';

/** Around the sections: title, foot, names that many sections use. */
export const FR_FRAME = {
  'frame.title': (of: string) => `Le soleil sur votre toit\u202f: ${of}`,
  'frame.visited': (day: string) => `Visite du ${dated(day)}`,
  'frame.made': (day: string) => `Rapport du ${dated(day)}`,
  'frame.page': (page: number, pages: number) => `Page ${page} sur ${pages}`,
  'frame.contents': 'Ce que contient ce rapport',
  'frame.letter': 'La lettre',
  'frame.evidence': 'Les données qui l’appuient',
  'frame.foot': (fingerprint: string) => `Empreinte du relevé ${fingerprint}`,
  'frame.boxes':
    'Dans ce fichier, une case remplace un caractère absent de sa police. La page web de ce rapport montre le caractère lui-même.',
  'frame.range': (low: string, high: string) => `${low} à ${high}`,
  'frame.year': 'Année',
} as const;
