/** Two results side by side. */
export const ES_COMPARED = {
  'compared.heading': '¿Qué es distinto?',
  'compared.without': (obstruction: string) => `Sin: ${obstruction}`,
  'compared.more': (roof: string, now: string, other: string, name: string) =>
    `${roof}: aquí llega el ${now} de la luz del sol. En «${name}» llega el ${other}. Aquí llega más.`,
  'compared.less': (roof: string, now: string, other: string, name: string) =>
    `${roof}: aquí llega el ${now} de la luz del sol. En «${name}» llega el ${other}. Aquí llega menos.`,
  'compared.same': (roof: string, now: string, name: string) =>
    `${roof}: aquí llega el ${now} de la luz del sol, y lo mismo en «${name}».`,
  'compared.not-sure':
    'Las dos cifras tienen un margen, y los márgenes se tocan. Así que la diferencia puede venir solo de la medición.',
  'compared.shared':
    'Las dos cifras salen de la misma medición. Por eso la diferencia es más segura de lo que hacen pensar los márgenes.',
  'compared.not-both': (roof: string) =>
    `${roof} no se midió en los dos casos. Así que no se puede comparar.`,
  'compared.this': 'Aquí',
  'compared.months-caption': (roof: string) => `${roof}: luz del sol que llega, mes a mes`,
  'compared.month': 'Mes',
  'compared.only-here': (roof: string) => `Solo en este informe: ${roof}.`,
  'compared.only-there': (roof: string, name: string) => `Solo en «${name}»: ${roof}.`,
} as const;
