/** Removing, trimming, moving; and what belongs to others. */
export const FR_DONE = {
  'done.heading': 'Que pourrait-on faire contre l’ombre\u202f?',
  'done.answer': (obstruction: string, gain: string, roof: string) =>
    `Le plus utile serait que ceci ne soit plus là\u202f: ${obstruction}. On retrouverait ${gain} de la lumière du soleil d’une année (${roof}).`,
  'done.answer-together': (obstructions: string, gain: string, roof: string) =>
    `Enlever une seule chose aiderait peu. Sans tout cela, on retrouverait ${gain} de la lumière du soleil d’une année (${roof})\u202f: ${obstructions}.`,
  'done.answer-nothing': 'Rien de ce qu’on pourrait changer ici n’apporterait beaucoup plus de soleil.',
  'done.answer-clear': 'Il n’y a rien à faire. L’ombre ne prend presque rien.',
  'done.table-caption': (roof: string) =>
    `${roof}\u202f: lumière du soleil d’une année que l’on retrouverait`,
  'done.what': 'Si ceci changeait',
  'done.gain': 'On retrouverait',
  'done.light': 'En lumière du soleil',
  'done.gone': (obstruction: string) => `Sans ${obstruction}`,
  'done.moved': (obstruction: string) => `${obstruction}\u202f: à une autre place`,
  'done.lower': (obstruction: string, metres: string) => `${obstruction}\u202f: ${metres} de moins en haut`,
  'done.clear': (obstruction: string, metres: string) =>
    `${obstruction}\u202f: ${metres} de moins en haut, et il ne reste presque pas d’ombre`,
  'done.unless': (obstruction: string, others: string) =>
    `${obstruction}\u202f: enlever seulement cela ne sert à rien. Il faudrait enlever aussi\u202f: ${others}.`,
  'done.hidden': (obstruction: string) =>
    `${obstruction}\u202f: enlever seulement cela ne sert à rien. D’autres choses font de l’ombre aux mêmes heures.`,
  'done.together': (obstructions: string, gain: string) =>
    `Sans tout cela, on retrouverait ${gain} de la lumière du soleil d’une année\u202f: ${obstructions}.`,
  'done.no-distance': (obstruction: string) =>
    `${obstruction}\u202f: la distance n’a pas été mesurée. Nous ne pouvons donc pas dire ce qu’une taille apporterait.`,
  'done.stays': (obstructions: string) => `Nous supposons que ceci restera\u202f: ${obstructions}.`,
  'done.place': (roof: string, best: string, most: string, lowest: string, least: string) =>
    `${roof}\u202f: l’endroit compte. Au point «\u202f${best}\u202f», il arrive ${most} de la lumière du soleil. Au point «\u202f${lowest}\u202f», c’est ${least}. Les panneaux donnent plus là où il arrive plus de lumière.`,
  'done.before': 'Avant de couper ou de déplacer quoi que ce soit',
  'done.owner':
    'Chaque arbre est à quelqu’un. Demandez d’abord. Si l’arbre n’est pas à vous, seul son propriétaire décide. Nous ne demandons à personne de renoncer à un arbre.',
  'done.protected': 'Beaucoup d’arbres sont protégés. Demandez à votre mairie avant de couper une branche.',
  'done.nesting':
    'Des oiseaux nichent dans les arbres. Dans bien des endroits, la loi interdit de couper pendant cette saison.',
  'done.trained': 'Travailler en haut d’un arbre, c’est l’affaire de gens formés.',
  'done.permit':
    'Déplacer ou construire quelque chose sur la maison peut demander une autorisation. Demandez à votre mairie.',
} as const;
