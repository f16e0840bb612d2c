/** Removing, trimming, moving; and what belongs to others. */
export const ES_DONE = {
  'done.heading': '¿Qué se podría hacer con la sombra?',
  'done.answer': (obstruction: string, gain: string, roof: string) =>
    `Lo que más ayudaría es que esto no estuviera: ${obstruction}. Se recuperaría el ${gain} de la luz del sol de un año (${roof}).`,
  'done.answer-together': (obstructions: string, gain: string, roof: string) =>
    `Quitar una sola cosa ayudaría poco. Sin todo esto se recuperaría el ${gain} de la luz del sol de un año (${roof}): ${obstructions}.`,
  'done.answer-nothing': 'Nada de lo que aquí se puede cambiar daría mucho más sol.',
  'done.answer-clear': 'No hace falta hacer nada. La sombra no quita casi nada.',
  'done.table-caption': (roof: string) => `${roof}: luz del sol de un año que se recuperaría`,
  'done.what': 'Si esto cambiara',
  'done.gain': 'Se recuperaría',
  'done.light': 'En luz del sol',
  'done.gone': (obstruction: string) => `Sin ${obstruction}`,
  'done.moved': (obstruction: string) => `${obstruction}: en otro sitio`,
  'done.lower': (obstruction: string, metres: string) => `${obstruction}: ${metres} menos de altura`,
  'done.clear': (obstruction: string, metres: string) =>
    `${obstruction}: ${metres} menos de altura, y casi no queda sombra`,
  'done.unless': (obstruction: string, others: string) =>
    `${obstruction}: quitar solo esto no sirve de nada. También habría que quitar: ${others}.`,
  'done.hidden': (obstruction: string) =>
    `${obstruction}: quitar solo esto no sirve de nada. Otras cosas dan sombra a las mismas horas.`,
  'done.together': (obstructions: string, gain: string) =>
    `Sin todo esto se recuperaría el ${gain} de la luz del sol de un año: ${obstructions}.`,
  'done.no-distance': (obstruction: string) =>
    `${obstruction}: no se midió a qué distancia está. Por eso no podemos decir qué se ganaría con una poda.`,
  'done.stays': (obstructions: string) => `Suponemos que esto se queda como está: ${obstructions}.`,
  'done.place': (roof: string, best: string, most: string, lowest: string, least: string) =>
    `${roof}: importa el lugar. En el punto «${best}» llega el ${most} de la luz del sol. En el punto «${lowest}» llega el ${least}. Los paneles rinden más donde llega más luz.`,
  'done.before': 'Antes de cortar o mover nada',
  'done.owner':
    'Todo árbol tiene dueño. Pregunte primero. Si el árbol no es suyo, solo decide su dueño. No pedimos a nadie que renuncie a un árbol.',
  'done.protected':
    'Muchos árboles están protegidos. Pregunte en su ayuntamiento o municipio antes de cortar una sola rama.',
  'done.nesting':
    'Los pájaros anidan en los árboles. En muchos lugares la ley prohíbe cortar en época de cría.',
  'done.trained': 'El trabajo en lo alto de un árbol es para gente con formación.',
  'done.permit':
    'Mover o construir algo en la casa puede necesitar un permiso. Pregunte en su ayuntamiento o municipio.',
} as const;
