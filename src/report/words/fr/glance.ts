import type { Plural } from '../plural.ts';

/** The first page. */
export const FR_GLANCE = {
  'glance.heading': 'Combien de soleil votre toit reçoit-il\u202f?',
  'glance.answer': (roof: string, access: string) =>
    `${roof}\u202f: il y arrive ${access} de la lumière du soleil. Si rien ne faisait d’ombre, tout arriverait.`,
  'glance.answer-clear': (roof: string) =>
    `${roof}\u202f: le toit est bien dégagé. Presque rien ne lui prend de soleil.`,
  'glance.each': (roof: string, access: string) =>
    `${roof}\u202f: il y arrive ${access} de la lumière du soleil.`,
  'glance.unknown': (roof: string) =>
    `${roof}\u202f: personne n’a encore mesuré ici. On ne sait donc pas combien de soleil arrive.`,
  'glance.no-roof': 'Aucun toit n’a encore été mesuré.',
  'glance.several': (plural: Plural, count: number, best: string, light: string) =>
    plural(count, {
      other: `De vos ${count} toits, voici celui qui reçoit le plus de soleil\u202f: ${best}, avec ${light} par an.`,
    }),
  'glance.several-unknown': 'Personne n’a encore mesuré sur aucun de ces toits.',
  'glance.figures-of': (roof: string) => `${roof}, en chiffres`,
  'glance.access': 'Lumière du soleil qui arrive',
  'glance.access-note': 'de celle qui viendrait si rien ne faisait d’ombre',
  'glance.facing': 'Position du toit',
  'glance.facing-note': 'de ce que recevrait ici un toit avec la meilleure pente et la meilleure direction',
  'glance.light': 'Lumière du soleil sur le toit',
  'glance.light-note': 'dans une année normale, ombre déduite',
  'glance.light-note-clear-sky': 'dans une année sans nuages, ombre déduite',
  'glance.range-note': (plural: Plural, stations: number) =>
    plural(stations, {
      one: 'La fourchette entre parenthèses est celle où la vraie valeur devrait se trouver, 95 fois sur 100. Elle repose sur un seul point mesuré sur le toit.',
      other: `La fourchette entre parenthèses est celle où la vraie valeur devrait se trouver, 95 fois sur 100. Elle repose sur ${stations} points mesurés sur le toit.`,
    }),
  'glance.picture-caption':
    'La lumière du soleil en un an. La partie pleine est ce qui arrive. En hachures, ce que prend l’ombre. Le trait fin à deux bouts est la fourchette.',
  'glance.axis': (unit: string) => `${unit} par an`,
  'glance.bar-unknown': 'pas mesuré',
} as const;
