/** With and without shade, month by month. */
export const DE_MONTH_COLUMNS = {
  'columns.heading': 'Welche Monate sind sonnig, und welche liegen im Schatten?',
  'columns.answer': (roof: string, best: string, worst: string) =>
    `${roof}: Die meiste Sonne kommt im ${best}, die wenigste im ${worst}.`,
  'columns.shade-most': (month: string, access: string) =>
    `Am meisten stört der Schatten im ${month}. Dann kommen ${access} des Sonnenlichts an.`,
  'columns.no-shade': 'Der Schatten nimmt in keinem Monat nennenswert Licht.',
  'columns.dark': (months: string) => `Im ${months} kommt kaum Sonne.`,
  'columns.caption': (unit: string) =>
    `Sonnenlicht in jedem Monat, in ${unit}. Der Umriss zeigt, was ohne Hindernisse käme. Ausgefüllt ist, was ankommt.`,
  'columns.alternative': (roof: string) =>
    `${roof}: zwölf Säulen. Die Zahlen stehen in der Tabelle darunter.`,
  'columns.table-caption': (roof: string, unit: string) => `${roof}: Sonnenlicht in jedem Monat, ${unit}`,
  'columns.month': 'Monat',
  'columns.open': 'Ohne Hindernisse',
  'columns.arrives': 'Kommt an',
  'columns.share': 'Anteil',
} as const;
