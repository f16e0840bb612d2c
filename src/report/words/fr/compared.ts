/** Two results side by side. */
export const FR_COMPARED = {
  'compared.heading': 'Qu’est-ce qui est différent\u202f?',
  'compared.without': (obstruction: string) => `Sans\u202f: ${obstruction}`,
  'compared.more': (roof: string, now: string, other: string, name: string) =>
    `${roof}\u202f: ici, il arrive ${now} de la lumière du soleil. Dans «\u202f${name}\u202f», c’est ${other}. Il y en a donc plus ici.`,
  'compared.less': (roof: string, now: string, other: string, name: string) =>
    `${roof}\u202f: ici, il arrive ${now} de la lumière du soleil. Dans «\u202f${name}\u202f», c’est ${other}. Il y en a donc moins ici.`,
  'compared.same': (roof: string, now: string, name: string) =>
    `${roof}\u202f: ici, il arrive ${now} de la lumière du soleil, et autant dans «\u202f${name}\u202f».`,
  'compared.not-sure':
    'Les deux chiffres ont une fourchette, et les fourchettes se touchent. La différence peut donc venir de la mesure seule.',
  'compared.shared':
    'Les deux chiffres viennent de la même mesure. La différence est donc plus sûre que les fourchettes ne le laissent croire.',
  'compared.not-both': (roof: string) =>
    `${roof}\u202f: pas de mesure dans les deux cas. La comparaison n’est donc pas possible.`,
  'compared.this': 'Ici',
  'compared.months-caption': (roof: string) => `${roof}\u202f: lumière du soleil qui arrive, mois par mois`,
  'compared.month': 'Mois',
  'compared.only-here': (roof: string) => `Seulement dans ce rapport\u202f: ${roof}.`,
  'compared.only-there': (roof: string, name: string) =>
    `Seulement dans «\u202f${name}\u202f»\u202f: ${roof}.`,
} as const;
