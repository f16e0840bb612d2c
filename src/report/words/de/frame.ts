/** Around the sections: title, foot, names that many sections use. */
export const DE_FRAME = {
  'frame.title': (of: string) => `Die Sonne auf Ihrem Dach: ${of}`,
  'frame.visited': (day: string) => `Vor Ort am ${day}`,
  'frame.made': (day: string) => `Bericht vom ${day}`,
  'frame.page': (page: number, pages: number) => `Seite ${page} von ${pages}`,
  'frame.contents': 'Was in diesem Bericht steht',
  'frame.letter': 'Der Brief',
  'frame.evidence': 'Die Belege dazu',
  'frame.foot': (fingerprint: string) => `Prüfsumme der Aufnahme ${fingerprint}`,
  'frame.boxes':
    'Ein Kästchen in dieser Datei steht für ein Zeichen, das ihrer Schrift fehlt. Die Webseite dieses Berichts zeigt das Zeichen selbst.',
  'frame.range': (low: string, high: string) => `${low} bis ${high}`,
  'frame.year': 'Jahr',
} as const;
