/** With and without shade, month by month. */
export const ES_MONTH_COLUMNS = {
  'columns.heading': '¿Qué meses tienen sol y cuáles tienen sombra?',
  'columns.answer': (roof: string, best: string, worst: string) =>
    `${roof}: el mes con más sol es ${best} y el mes con menos sol es ${worst}.`,
  'columns.shade-most': (month: string, access: string) =>
    `La sombra pesa más en ${month}. Entonces llega el ${access} de la luz del sol.`,
  'columns.no-shade': 'La sombra no quita casi nada en ningún mes.',
  'columns.dark': (months: string) => `En ${months} casi no hay sol.`,
  'columns.caption': (unit: string) =>
    `Luz del sol de cada mes, en ${unit}. El contorno es la que llegaría si nada hiciera sombra. La parte rellena es la que llega.`,
  'columns.alternative': (roof: string) => `${roof}: doce columnas. Las cifras están en la tabla que sigue.`,
  'columns.table-caption': (roof: string, unit: string) => `${roof}: luz del sol de cada mes, ${unit}`,
  'columns.month': 'Mes',
  'columns.open': 'Sin sombra',
  'columns.arrives': 'Llega',
  'columns.share': 'Parte',
} as const;
