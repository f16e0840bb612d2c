import type { Plural } from '../plural.ts';

/** The first page. */
export const ES_GLANCE = {
  'glance.heading': '¿Cuánto sol recibe su tejado?',
  'glance.answer': (roof: string, access: string) =>
    `${roof}: llega el ${access} de la luz del sol. Si nada hiciera sombra, llegaría toda.`,
  'glance.answer-clear': (roof: string) =>
    `${roof}: el tejado está despejado. Casi nada le quita luz del sol.`,
  'glance.each': (roof: string, access: string) => `${roof}: llega el ${access} de la luz del sol.`,
  'glance.unknown': (roof: string) =>
    `${roof}: aquí todavía no ha medido nadie. Por eso no se sabe cuánto sol recibe.`,
  'glance.no-roof': 'Todavía no se ha medido ningún tejado.',
  'glance.several': (plural: Plural, count: number, best: string, light: string) =>
    plural(count, {
      other: `De sus ${count} tejados, este es el que recibe más sol: ${best}, con ${light} al año.`,
    }),
  'glance.several-unknown': 'Todavía no ha medido nadie en ninguno de estos tejados.',
  'glance.figures-of': (roof: string) => `${roof}, en cifras`,
  'glance.access': 'Luz del sol que llega',
  'glance.access-note': 'de la que llegaría si nada hiciera sombra',
  'glance.facing': 'Posición del tejado',
  'glance.facing-note': 'de lo que recibiría aquí un tejado con la mejor pendiente y dirección',
  'glance.light': 'Luz del sol en el tejado',
  'glance.light-note': 'en un año normal, con la sombra descontada',
  'glance.light-note-clear-sky': 'en un año sin nubes, con la sombra descontada',
  'glance.range-note': (plural: Plural, stations: number) =>
    plural(stations, {
      one: 'El margen entre paréntesis es donde esperamos que esté el valor real, 95 veces de cada 100. Se basa en un punto medido en el tejado.',
      other: `El margen entre paréntesis es donde esperamos que esté el valor real, 95 veces de cada 100. Se basa en ${stations} puntos medidos en el tejado.`,
    }),
  'glance.picture-caption':
    'La luz del sol en un año. La parte rellena es la que llega. La rayada, la que quita la sombra. La línea fina con dos topes es el margen.',
  'glance.axis': (unit: string) => `${unit} al año`,
  'glance.bar-unknown': 'sin medir',
} as const;
