/** Sunlight of a year, in figures. */
export const FR_EXPECT = {
  'expect.heading': 'Combien de lumière du soleil pouvez-vous attendre en un an\u202f?',
  'expect.answer': (roof: string, light: string) =>
    `${roof}\u202f: dans une année normale, il arrive environ ${light} de lumière du soleil.`,
  'expect.answer-clear-sky': (roof: string, light: string) =>
    `${roof}\u202f: dans une année sans nuages, il arriverait environ ${light} de lumière du soleil.`,
  'expect.caption': 'Lumière du soleil en un an, ombre déduite',
  'expect.roof': 'Toit',
  'expect.light': (unit: string) => `Lumière du soleil, ${unit}`,
  'expect.range': 'Fourchette',
  'expect.size': 'Taille',
  'expect.whole': 'Tout le toit, kWh',
  'expect.whole-range': 'Fourchette, kWh',
  'expect.not-known': 'pas connu',
  'expect.kwh-means': 'Un kWh, c’est ce que consomme en une heure un radiateur électrique de 1000 watts.',
  'expect.range-note':
    'La fourchette dit à quel point l’ombre est connue. Les années plus ou moins ensoleillées s’y ajoutent. Nous ne promettons rien pour une année précise.',
  'expect.not-power':
    'La lumière du soleil n’est pas encore de l’électricité. Les panneaux n’en changent qu’une partie en électricité pour la maison.',
  'expect.clear-sky':
    'Ces chiffres valent pour un ciel sans nuages. En réalité, il arrive moins de lumière. La part que prend l’ombre reste un bon repère.',
} as const;
