import { dated } from './dated.ts';

/** What stands in the way, and when its shade falls. */
export const FR_SUN = {
  'sun.heading': 'Qu’est-ce qui cache le soleil, et quand\u202f?',
  'sun.answer': (obstruction: string, roof: string) =>
    `Voici ce qui fait le plus d’ombre\u202f: ${obstruction}. Le toit concerné\u202f: ${roof}.`,
  'sun.answer-clear': 'Rien d’important ne cache le soleil.',
  'sun.answer-sky': 'Certaines choses cachent une partie du ciel clair, mais aucune ne cache le soleil.',
  'sun.from-lowest': (station: string) =>
    `L’image montre le ciel vu depuis «\u202f${station}\u202f». De tous les points mesurés sur ce toit, c’est celui qui a le moins de soleil.`,
  'sun.from-only': (station: string) => `L’image montre le ciel vu depuis «\u202f${station}\u202f».`,
  'sun.caption':
    'Traits fins\u202f: le chemin du soleil le 21 de chaque mois. Traits interrompus\u202f: les heures, sans l’heure d’été. Hachures\u202f: ce qui cache le ciel. Plus il y a de points, plus il vient de lumière de là.',
  'sun.caption-rings': 'Petits ronds\u202f: personne n’a regardé par là.',
  'sun.alternative': (roof: string, names: string) =>
    `${roof}\u202f: le ciel, avec le chemin du soleil au fil de l’année. Devant\u202f: ${names}.`,
  'sun.alternative-open': (roof: string) =>
    `${roof}\u202f: le ciel, avec le chemin du soleil au fil de l’année. Il n’y a rien devant.`,
  'sun.shades': (obstruction: string, roof: string, when: string, part: string) =>
    `${obstruction}\u202f: l’ombre tombe sur le toit (${roof}) ${when}, ${part}.`,
  'sun.longest': (day: string, hours: string) =>
    `Elle dure le plus longtemps vers le ${dated(day)}\u202f: ${hours}.`,
  'sun.all-year': 'toute l’année',
  'sun.from-to': (from: string, to: string) => `du ${dated(from)} au ${dated(to)}`,
  'sun.on': (day: string) => `vers le ${dated(day)}`,
  'sun.now-and-then': (from: string, to: string) =>
    `de temps en temps entre le ${dated(from)} et le ${dated(to)}`,
  'sun.hours': (from: string, to: string) => `de ${from} à ${to}`,
  'sun.hours-short': (from: string, to: string) => `${from}–${to}`,
  'sun.all-day': 'jour et nuit',
  'sun.no-hours': '–',
  'sun.in-the-night': 'la nuit',
  'sun.in-the-morning': 'le matin',
  'sun.at-midday': 'vers midi',
  'sun.in-the-afternoon': 'l’après-midi',
  'sun.in-the-evening': 'le soir',
  'sun.at-changing-hours': 'à des heures qui changent',
  'sun.never-the-sun': (obstruction: string) =>
    `${obstruction}\u202f: derrière se trouve une partie du ciel clair, mais jamais le soleil.`,
  'sun.little': (names: string) => `Presque aucune lumière n’est perdue à cause de ceci\u202f: ${names}.`,
  'sun.leaves':
    'Les arbres laissent passer un peu de lumière, et plus encore quand ils n’ont pas de feuilles. C’est compté.',
  'sun.table-caption': (roof: string) => `${roof}\u202f: heures d’ombre le 21 de chaque mois`,
  'sun.month': 'Mois',
  'sun.clock': 'Les heures sont celles de la montre. L’heure d’été est comptée.',
} as const;
