/** What stands in the way, and when its shade falls. */
export const ES_SUN = {
  'sun.heading': '¿Qué le tapa el sol, y cuándo?',
  'sun.answer': (obstruction: string, roof: string) =>
    `La mayor sombra viene de aquí: ${obstruction}. Cae sobre: ${roof}.`,
  'sun.answer-clear': 'No hay nada importante que tape el sol.',
  'sun.answer-sky': 'Algunas cosas tapan parte del cielo claro, pero ninguna tapa el sol.',
  'sun.from-lowest': (station: string) =>
    `El dibujo muestra el cielo visto desde «${station}». Es el punto medido con menos sol de este tejado.`,
  'sun.from-only': (station: string) => `El dibujo muestra el cielo visto desde el punto «${station}».`,
  'sun.caption':
    'Líneas finas: el camino del sol el día 21 de cada mes. Líneas a trazos: las horas, sin horario de verano. Zonas rayadas: lo que tapa. Cuantos más puntos, más luz del sol llega desde ahí.',
  'sun.caption-rings': 'Círculos: nadie miró hacia ahí.',
  'sun.alternative': (roof: string, names: string) =>
    `${roof}: el cielo, con el camino del sol durante el año. Delante están: ${names}.`,
  'sun.alternative-open': (roof: string) =>
    `${roof}: el cielo, con el camino del sol durante el año. No hay nada delante.`,
  'sun.shades': (obstruction: string, roof: string, when: string, part: string) =>
    `${obstruction}: la sombra cae sobre el tejado (${roof}) ${when}, ${part}.`,
  'sun.longest': (day: string, hours: string) =>
    `Dura más tiempo hacia el ${day}: ${hours.replace(/\.$/, '')}.`,
  'sun.all-year': 'todo el año',
  'sun.from-to': (from: string, to: string) => `del ${from} al ${to}`,
  'sun.on': (day: string) => `hacia el ${day}`,
  'sun.now-and-then': (from: string, to: string) => `de vez en cuando entre el ${from} y el ${to}`,
  'sun.hours': (from: string, to: string) => `de ${from} a ${to}`,
  'sun.hours-short': (from: string, to: string) => `${from}–${to}`,
  'sun.all-day': 'día y noche',
  'sun.no-hours': '–',
  'sun.in-the-night': 'por la noche',
  'sun.in-the-morning': 'por la mañana',
  'sun.at-midday': 'al mediodía',
  'sun.in-the-afternoon': 'por la tarde',
  'sun.in-the-evening': 'al final del día',
  'sun.at-changing-hours': 'a horas que van cambiando',
  'sun.never-the-sun': (obstruction: string) =>
    `${obstruction}: detrás queda una parte del cielo claro, pero nunca el sol.`,
  'sun.little': (names: string) => `Casi no se pierde luz por esto: ${names}.`,
  'sun.leaves':
    'Los árboles dejan pasar algo de luz, y más cuando no tienen hojas. Eso está tenido en cuenta.',
  'sun.table-caption': (roof: string) => `${roof}: horas de sombra el día 21 de cada mes`,
  'sun.month': 'Mes',
  'sun.clock': 'Las horas son las del reloj, con el horario de verano incluido.',
} as const;
