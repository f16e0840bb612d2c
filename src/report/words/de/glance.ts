import type { Plural } from '../plural.ts';

/** The first page. */
export const DE_GLANCE = {
  'glance.heading': 'Wie viel Sonne bekommt Ihr Dach?',
  'glance.answer': (roof: string, access: string) =>
    `${roof}: ${access} des Sonnenlichts kommen an. Stünde nichts im Weg, käme alles an.`,
  'glance.answer-clear': (roof: string) => `${roof}: Das Dach liegt frei. Fast nichts nimmt ihm die Sonne.`,
  'glance.each': (roof: string, access: string) => `${roof}: ${access} des Sonnenlichts kommen an.`,
  'glance.unknown': (roof: string) =>
    `${roof}: Hier hat noch niemand gemessen. Darum ist nicht bekannt, wie viel Sonne das Dach bekommt.`,
  'glance.no-roof': 'Es wurde noch kein Dach gemessen.',
  'glance.several': (plural: Plural, count: number, best: string, light: string) =>
    plural(count, {
      other: `Von Ihren ${count} Dächern bekommt dieses die meiste Sonne: ${best}, mit ${light} im Jahr.`,
    }),
  'glance.several-unknown': 'Auf keinem dieser Dächer hat bisher jemand gemessen.',
  'glance.figures-of': (roof: string) => `${roof} in Zahlen`,
  'glance.access': 'So viel Sonnenlicht kommt an',
  'glance.access-note': 'von dem, was ohne Hindernisse käme',
  'glance.facing': 'So gut liegt das Dach',
  'glance.facing-note': 'von dem, was ein Dach mit der besten Neigung und Richtung hier bekäme',
  'glance.light': 'Sonnenlicht auf dem Dach',
  'glance.light-note': 'in einem üblichen Jahr, Schatten mitgerechnet',
  'glance.light-note-clear-sky': 'in einem Jahr ohne Wolken, Schatten mitgerechnet',
  'glance.range-note': (plural: Plural, stations: number) =>
    plural(stations, {
      one: 'In Klammern steht die Spanne, in der wir den wahren Wert erwarten, in 95 von 100 Fällen. Sie beruht auf einer Messstelle auf dem Dach.',
      other: `In Klammern steht die Spanne, in der wir den wahren Wert erwarten, in 95 von 100 Fällen. Sie beruht auf ${stations} Messstellen auf dem Dach.`,
    }),
  'glance.picture-caption':
    'Das Sonnenlicht eines Jahres. Ausgefüllt ist, was ankommt. Schraffiert ist, was der Schatten nimmt. Der dünne Strich mit zwei Enden ist die Spanne.',
  'glance.axis': (unit: string) => `${unit} im Jahr`,
  'glance.bar-unknown': 'nicht gemessen',
} as const;
