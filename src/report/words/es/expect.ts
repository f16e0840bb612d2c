/** Sunlight of a year, in figures. */
export const ES_EXPECT = {
  'expect.heading': '¿Cuánta luz del sol puede esperar en un año?',
  'expect.answer': (roof: string, light: string) =>
    `${roof}: en un año normal recibe unos ${light} de luz del sol.`,
  'expect.answer-clear-sky': (roof: string, light: string) =>
    `${roof}: en un año sin nubes recibiría unos ${light} de luz del sol.`,
  'expect.caption': 'Luz del sol en un año, con la sombra descontada',
  'expect.roof': 'Tejado',
  'expect.light': (unit: string) => `Luz del sol, ${unit}`,
  'expect.range': 'Margen',
  'expect.size': 'Tamaño',
  'expect.whole': 'Todo el tejado, kWh',
  'expect.whole-range': 'Margen, kWh',
  'expect.not-known': 'no se sabe',
  'expect.kwh-means': 'Un kWh es lo que gasta en una hora una estufa eléctrica de 1000 vatios.',
  'expect.range-note':
    'El margen indica lo bien que se conoce la sombra. Aparte están los años con más sol o con menos. No prometemos nada para un año concreto.',
  'expect.not-power':
    'La luz del sol todavía no es electricidad. Los paneles solo convierten una parte en electricidad para la casa.',
  'expect.clear-sky':
    'Estas cifras son para un cielo sin nubes. En realidad llega menos. La parte que quita la sombra sí sirve como buena guía.',
} as const;
