/** With and without shade, month by month. */
export const FR_MONTH_COLUMNS = {
  'columns.heading': 'Quels mois sont au soleil, et lesquels à l’ombre\u202f?',
  'columns.answer': (roof: string, best: string, worst: string) =>
    `${roof}\u202f: le mois le plus ensoleillé est ${best}, le moins ensoleillé est ${worst}.`,
  'columns.shade-most': (month: string, access: string) =>
    `L’ombre compte le plus en ${month}. Il arrive alors ${access} de la lumière du soleil.`,
  'columns.no-shade': 'L’ombre ne prend presque rien, quel que soit le mois.',
  'columns.dark': (months: string) => `Presque pas de soleil en ${months}.`,
  'columns.caption': (unit: string) =>
    `Lumière du soleil de chaque mois, en ${unit}. Le contour montre ce qui viendrait si rien ne faisait d’ombre. La partie pleine est ce qui arrive.`,
  'columns.alternative': (roof: string) =>
    `${roof}\u202f: douze colonnes. Les chiffres sont dans le tableau qui suit.`,
  'columns.table-caption': (roof: string, unit: string) =>
    `${roof}\u202f: lumière du soleil de chaque mois, ${unit}`,
  'columns.month': 'Mois',
  'columns.open': 'Sans ombre',
  'columns.arrives': 'Arrive',
  'columns.share': 'Part',
} as const;
