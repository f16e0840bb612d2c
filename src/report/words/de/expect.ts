/** Sunlight of a year, in figures. */
export const DE_EXPECT = {
  'expect.heading': 'Mit wie viel Sonnenlicht können Sie im Jahr rechnen?',
  'expect.answer': (roof: string, light: string) =>
    `${roof}: In einem üblichen Jahr kommen etwa ${light} Sonnenlicht an.`,
  'expect.answer-clear-sky': (roof: string, light: string) =>
    `${roof}: In einem Jahr ohne Wolken kämen etwa ${light} Sonnenlicht an.`,
  'expect.caption': 'Sonnenlicht eines Jahres, Schatten mitgerechnet',
  'expect.roof': 'Dach',
  'expect.light': (unit: string) => `Sonnenlicht, ${unit}`,
  'expect.range': 'Spanne',
  'expect.size': 'Größe',
  'expect.whole': 'Ganzes Dach, kWh',
  'expect.whole-range': 'Spanne, kWh',
  'expect.not-known': 'nicht bekannt',
  'expect.kwh-means': 'Eine kWh ist das, was ein Heizlüfter mit 1000 Watt in einer Stunde verbraucht.',
  'expect.range-note':
    'Die Spanne sagt, wie gut der Schatten bekannt ist. Sonnige und trübe Jahre kommen noch dazu. Für ein einzelnes Jahr versprechen wir nichts.',
  'expect.not-power':
    'Sonnenlicht ist noch kein Strom. Solarmodule machen nur einen Teil davon zu Strom für das Haus.',
  'expect.clear-sky':
    'Diese Zahlen gelten für einen Himmel ohne Wolken. In Wirklichkeit ist es weniger. Wie viel der Schatten davon nimmt, lässt sich trotzdem recht gut ablesen.',
} as const;
