/** What stands in the way, and when its shade falls. */
export const DE_SUN = {
  'sun.heading': 'Was steht der Sonne im Weg, und wann?',
  'sun.answer': (obstruction: string, roof: string) =>
    `Der meiste Schatten kommt von: ${obstruction}. Er fällt auf: ${roof}.`,
  'sun.answer-clear': 'Nichts von Bedeutung steht der Sonne im Weg.',
  'sun.answer-sky': 'Einiges verdeckt einen Teil des hellen Himmels, aber nichts davon die Sonne.',
  'sun.from-lowest': (station: string) =>
    `Das Bild zeigt den Himmel, gesehen von „${station}“. Von den Messstellen auf diesem Dach bekommt diese am wenigsten Sonne.`,
  'sun.from-only': (station: string) => `Das Bild zeigt den Himmel, gesehen von „${station}“.`,
  'sun.caption':
    'Dünne Linien: der Weg der Sonne am 21. jedes Monats. Gestrichelte Linien: die Stunden, ohne Sommerzeit. Schraffiert: was im Weg steht. Je mehr Punkte, desto mehr Sonnenlicht kommt von dort.',
  'sun.caption-rings': 'Ringe: Dorthin hat niemand geschaut.',
  'sun.alternative': (roof: string, names: string) =>
    `${roof}: der Himmel mit dem Weg der Sonne durch das Jahr. Davor stehen: ${names}.`,
  'sun.alternative-open': (roof: string) =>
    `${roof}: der Himmel mit dem Weg der Sonne durch das Jahr. Nichts steht davor.`,
  'sun.shades': (obstruction: string, roof: string, when: string, part: string) =>
    `${obstruction}: Der Schatten trifft das Dach (${roof}) ${when}, ${part}.`,
  'sun.longest': (day: string, hours: string) => `Am längsten dauert er um den ${day}: ${hours}.`,
  'sun.all-year': 'das ganze Jahr über',
  'sun.from-to': (from: string, to: string) => `vom ${from} bis zum ${to}`,
  'sun.on': (day: string) => `um den ${day}`,
  'sun.now-and-then': (from: string, to: string) => `ab und zu zwischen dem ${from} und dem ${to}`,
  'sun.hours': (from: string, to: string) => `von ${from} bis ${to} Uhr`,
  'sun.hours-short': (from: string, to: string) => `${from}–${to}`,
  'sun.all-day': 'Tag und Nacht',
  'sun.no-hours': '–',
  'sun.in-the-night': 'nachts',
  'sun.in-the-morning': 'morgens',
  'sun.at-midday': 'mittags',
  'sun.in-the-afternoon': 'nachmittags',
  'sun.in-the-evening': 'abends',
  'sun.at-changing-hours': 'zu wechselnden Zeiten',
  'sun.never-the-sun': (obstruction: string) =>
    `${obstruction}: Dahinter liegt ein Teil des hellen Himmels, aber nie die Sonne.`,
  'sun.little': (names: string) => `Fast nichts geht verloren durch: ${names}.`,
  'sun.leaves': 'Bäume lassen etwas Licht durch, kahle Bäume noch mehr. Das ist mitgerechnet.',
  'sun.table-caption': (roof: string) => `${roof}: Stunden mit Schatten am 21. jedes Monats`,
  'sun.month': 'Monat',
  'sun.clock': 'Die Stunden sind Uhrzeiten. Die Sommerzeit ist berücksichtigt.',
} as const;
