/** What the years may bring. */
export const ES_CHANGE = {
  'change.heading': '¿Qué puede cambiar con los años?',
  'change.answer-trees': 'Los árboles crecen, y su sombra crece con ellos.',
  'change.answer': 'Por sí solo cambia poco. Pero algo nuevo cerca puede dar sombra nueva.',
  'change.table-caption': (roof: string) => `${roof}: luz del sol de un año que quitaría un árbol al crecer`,
  'change.tree': 'Árbol',
  'change.grown': (metres: string) => `${metres} más de altura`,
  'change.more': (share: string) => `${share} más`,
  'change.no-more': 'nada más',
  'change.no-distance': (trees: string) =>
    `No se midió a qué distancia está: ${trees}. Por eso no podemos decir cuánto quitaría al crecer. Cuente con algo más de sombra cada año.`,
  'change.buildings':
    'Una casa nueva o un piso más al lado puede dar sombra. Pregunte en su ayuntamiento o municipio qué se puede construir allí.',
  'change.own-trees': (side: string) =>
    `Piense en el sol antes de plantar un árbol. Al ${side} de la casa, su sombra no cae hacia el tejado.`,
  'change.own-trees-tropics':
    'Piense en el sol antes de plantar un árbol. Aquí el sol viene de los dos lados. Por eso cualquier árbol alto y cercano puede dar sombra al tejado.',
  'change.years':
    'Hay años con mucho sol y años con poco. Nuestras cifras son para un año normal. Un año concreto puede dar más o menos.',
  'change.again':
    'Cuando los árboles hayan crecido o se haya construido una casa, pida que midan el tejado otra vez.',
} as const;
