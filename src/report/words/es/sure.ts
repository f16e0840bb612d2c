/** The range, where it comes from, and what nobody could see. */
export const ES_SURE = {
  'sure.heading': '¿Hasta qué punto estamos seguros?',
  'sure.answer': (low: string, high: string, roof: string) =>
    `${roof}: esperamos que llegue entre el ${low} y el ${high} de la luz del sol.`,
  'sure.answer-same': (access: string, roof: string) =>
    `${roof}: esperamos que llegue el ${access} de la luz del sol, con un error de menos de uno entre cien.`,
  'sure.times': 'En un margen así debería estar el valor real 95 veces de cada 100.',
  'sure.answer-none': 'Para este informe no se calculó ningún margen.',
  'sure.why': 'Lo que resta certeza a las cifras, empezando por lo que más pesa:',
  'sure.source-heading': 'Hacia dónde apuntaba el teléfono. Una brújula nunca acierta del todo.',
  'sure.source-elevation-index': 'Lo que el teléfono toma por horizontal.',
  'sure.source-pointing': 'La mano que apunta. Tiembla un poco.',
  'sure.source-gaps': 'La forma de las cosas entre los puntos a los que se apuntó.',
  'sure.source-unseen': 'Partes del cielo hacia las que no miró nadie.',
  'sure.source-transmittance': 'Cuánta luz dejan pasar los árboles.',
  'sure.source-diffuse-share': 'Cuánta luz viene de todo el cielo y no directamente del sol.',
  'sure.cures': 'Lo que daría más seguridad:',
  'sure.cure-heading-check':
    'Comprobar la brújula con la sombra de un objeto, o con una referencia cuya posición se conoce.',
  'sure.cure-second-heading-check': 'Comprobar la brújula por segunda vez.',
  'sure.cure-known-bearing': 'Comprobar una dirección en un mapa.',
  'sure.cure-two-face-check':
    'Apuntar dos veces a la misma referencia: con el teléfono derecho y con el teléfono dado la vuelta.',
  'sure.cure-sight-again': 'Apuntar cuatro veces a cada punto.',
  'sure.cure-more-sightings': 'Apuntar al doble de puntos a lo largo de cada borde.',
  'sure.cure-look': 'Mirar hacia las partes del cielo que aún faltan.',
  'sure.cure-measure-transmittance': 'Medir cuánta luz dejan pasar los árboles.',
  'sure.cure-weather-file': 'Usar los datos de una estación meteorológica cercana.',
  'sure.unseen': 'Lo que nadie pudo ver',
  'sure.unseen-note':
    'Hemos contado estas partes del cielo como despejadas. El margen tiene en cuenta que puede haber sombra ahí.',
  'sure.unseen-from': (roof: string, station: string, share: string, places: string) =>
    `${roof}: visto desde el punto «${station}», el ${share} de la luz viene de partes hacia las que no miró nadie. Están ${places}.`,
  'sure.unseen-place': (where: string, share: string) => `${where} (${share})`,
  'sure.unseen-least':
    'Si un tejado tiene más de un punto medido, este es el punto desde el que se vio menos.',
  'sure.toward': (point: string) => `hacia el ${point}`,
  'sure.between': (from: string, to: string) => `desde el ${from} hasta el ${to}`,
  'sure.all-around': 'todo alrededor',
  'sure.all-seen': 'Se miró hacia todas las partes del cielo que cuentan.',
  'sure.unmeasured': (roofs: string) => `Sin medir, así que no se sabe: ${roofs}.`,
} as const;
