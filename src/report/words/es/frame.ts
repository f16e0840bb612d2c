/** Around the sections: title, foot, names that many sections use. */
export const ES_FRAME = {
  'frame.title': (of: string) => `El sol en su tejado: ${of}`,
  'frame.visited': (day: string) => `Visita del ${day}`,
  'frame.made': (day: string) => `Informe del ${day}`,
  'frame.page': (page: number, pages: number) => `Página ${page} de ${pages}`,
  'frame.contents': 'Qué contiene este informe',
  'frame.letter': 'La carta',
  'frame.evidence': 'Los datos que la respaldan',
  'frame.foot': (fingerprint: string) => `Huella digital del levantamiento ${fingerprint}`,
  'frame.boxes':
    'Un recuadro en este archivo ocupa el lugar de un carácter que falta en su tipo de letra. La página web de este informe muestra el carácter.',
  'frame.range': (low: string, high: string) => `${low} a ${high}`,
  'frame.year': 'Año',
} as const;
