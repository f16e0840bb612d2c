/** The range, where it comes from, and what nobody could see. */
export const FR_SURE = {
  'sure.heading': 'À quel point sommes-nous sûrs\u202f?',
  'sure.answer': (low: string, high: string, roof: string) =>
    `${roof}\u202f: nous pensons qu’il y arrive entre ${low} et ${high} de la lumière du soleil.`,
  'sure.answer-same': (access: string, roof: string) =>
    `${roof}\u202f: nous pensons qu’il y arrive ${access} de la lumière du soleil, à moins d’un centième près.`,
  'sure.times': 'Une telle fourchette devrait contenir la vraie valeur 95 fois sur 100.',
  'sure.answer-none': 'Aucune fourchette n’a été calculée pour ce rapport.',
  'sure.why': 'Ce qui rend les chiffres moins sûrs, le plus important d’abord\u202f:',
  'sure.source-heading':
    'La direction où pointait le téléphone. Une boussole n’est jamais tout à fait juste.',
  'sure.source-elevation-index': 'Ce que le téléphone prend pour l’horizontale.',
  'sure.source-pointing': 'La main qui vise. Elle tremble un peu.',
  'sure.source-gaps': 'La forme des choses entre les points visés.',
  'sure.source-unseen': 'Des parties du ciel que personne n’a regardées.',
  'sure.source-transmittance': 'La lumière que les arbres laissent passer.',
  'sure.source-diffuse-share': 'La part de lumière qui vient de tout le ciel et non du soleil lui-même.',
  'sure.cures': 'Ce qui rendrait les chiffres plus sûrs\u202f:',
  'sure.cure-heading-check':
    'Vérifier la boussole avec l’ombre d’un objet, ou avec un repère dont la place est connue.',
  'sure.cure-second-heading-check': 'Vérifier la boussole une deuxième fois.',
  'sure.cure-known-bearing': 'Vérifier une direction sur une carte.',
  'sure.cure-two-face-check':
    'Viser deux fois le même repère\u202f: avec le téléphone à l’endroit, puis à l’envers.',
  'sure.cure-sight-again': 'Viser quatre fois chaque point.',
  'sure.cure-more-sightings': 'Viser deux fois plus de points le long de chaque bord.',
  'sure.cure-look': 'Regarder les parties du ciel qui manquent encore.',
  'sure.cure-measure-transmittance': 'Mesurer la lumière que les arbres laissent passer.',
  'sure.cure-weather-file': 'Utiliser les relevés d’une station météo proche.',
  'sure.unseen': 'Ce que personne n’a pu voir',
  'sure.unseen-note':
    'Nous avons compté ces parties du ciel comme dégagées. La fourchette tient compte d’une ombre possible là-bas.',
  'sure.unseen-from': (roof: string, station: string, share: string, places: string) =>
    `${roof}\u202f: depuis le point «\u202f${station}\u202f», ${share} de la lumière vient de parties du ciel que personne n’a regardées. Elles se trouvent ${places}.`,
  'sure.unseen-place': (where: string, share: string) => `${where} (${share})`,
  'sure.unseen-least': 'Si un toit a plus d’un point mesuré, il s’agit de celui d’où l’on a vu le moins.',
  'sure.toward': (point: string) => `vers ${point}`,
  'sure.between': (from: string, to: string) => `depuis ${from} jusque vers ${to}`,
  'sure.all-around': 'tout autour',
  'sure.all-seen': 'Toutes les parties du ciel qui comptent ont été regardées.',
  'sure.unmeasured': (roofs: string) => `Pas mesuré, donc pas connu\u202f: ${roofs}.`,
} as const;
