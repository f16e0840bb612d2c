/** What the years may bring. */
export const FR_CHANGE = {
  'change.heading': 'Qu’est-ce qui peut changer avec les années\u202f?',
  'change.answer-trees': 'Les arbres poussent, et leur ombre grandit avec eux.',
  'change.answer': 'Peu de choses changent d’elles-mêmes. Mais du nouveau à côté peut amener de l’ombre.',
  'change.table-caption': (roof: string) =>
    `${roof}\u202f: lumière du soleil d’une année que prendrait un arbre en poussant`,
  'change.tree': 'Arbre',
  'change.grown': (metres: string) => `${metres} plus haut`,
  'change.more': (share: string) => `${share} de plus`,
  'change.no-more': 'rien de plus',
  'change.no-distance': (trees: string) =>
    `Ici, la distance n’a pas été mesurée\u202f: ${trees}. Nous ne pouvons donc pas dire ce que prendrait la pousse. Comptez sur un peu plus d’ombre chaque année.`,
  'change.buildings':
    'Une nouvelle maison ou un étage de plus à côté peut amener de l’ombre. Demandez à votre mairie ce qui peut y être construit.',
  'change.own-trees': (side: string) =>
    `Pensez au soleil avant de planter un arbre. Si vous le plantez vers ${side} de la maison, son ombre s’éloigne du toit.`,
  'change.own-trees-tropics':
    'Pensez au soleil avant de planter un arbre. Ici, le soleil vient des deux côtés. Tout grand arbre proche peut donc faire de l’ombre sur le toit.',
  'change.years':
    'Certaines années ont beaucoup de soleil, d’autres peu. Nos chiffres valent pour une année normale. Une année donnée peut donner plus ou moins.',
  'change.again':
    'Quand des arbres auront poussé ou qu’une maison aura été construite, faites mesurer le toit de nouveau.',
} as const;
