/** Where the work can hurt someone, who decides, and what this letter is not. */
export const ES_CAUTIONS = {
  'cautions.heading': '¿Qué debe tener en cuenta antes de empezar?',
  'cautions.answer': 'Deje el trabajo en tejados, cables y árboles a gente con formación.',
  'cautions.roof': 'Tejado y escalera',
  'cautions.roof-fall':
    'Una caída desde un tejado o una escalera puede matar. Suba solo si tiene formación y lleva protección contra caídas.',
  'cautions.roof-wet':
    'No pise tejados mojados, helados o débiles. Las claraboyas y las placas finas pueden romperse bajo sus pies.',
  'cautions.roof-lines': 'Mantenga escaleras, varas y ramas muy lejos de los cables eléctricos.',
  'cautions.power': 'Electricidad',
  'cautions.power-light':
    'Los paneles solares tienen tensión mientras les dé la luz. Pueden dar una descarga mortal.',
  'cautions.power-licensed': 'Solo un electricista autorizado puede conectarlos.',
  'cautions.sun': 'Sus ojos',
  'cautions.sun-look': 'No mire nunca al sol, ni apunte nunca un teléfono hacia él para mirar a través.',
  'cautions.codes':
    'Las normas y leyes del lugar donde vive son lo primero. También la palabra de los profesionales autorizados. Si dicen algo distinto de esta carta, siga lo que digan.',
  'cautions.not':
    'Esta carta trata de la luz del sol. No dice que el tejado pueda soportar paneles. No dice que la instalación eléctrica sirva para ellos. Las dos cosas las deben revisar profesionales autorizados.',
} as const;
