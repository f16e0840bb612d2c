/** With and without shade, month by month. */
export const EN_MONTH_COLUMNS = {
  'columns.heading': 'Which months are sunny, and which lie in shade?',
  'columns.answer': (roof: string, best: string, worst: string) =>
    `${roof} gets the most sun in ${best} and the least in ${worst}.`,
  'columns.shade-most': (month: string, access: string) =>
    `Shade counts most in ${month}. Then ${access} of the sunlight arrives.`,
  'columns.no-shade': 'Shade takes almost nothing in any month.',
  'columns.dark': (months: string) => `No sun worth naming comes in ${months}.`,
  'columns.caption': (unit: string) =>
    `Sunlight of each month, in ${unit}. The outline is what would come with nothing in the way. The solid part is what arrives.`,
  'columns.alternative': (roof: string) =>
    `Twelve columns for ${roof}. The figures stand in the table that follows.`,
  'columns.table-caption': (roof: string, unit: string) => `${roof}: sunlight of each month, ${unit}`,
  'columns.month': 'Month',
  'columns.open': 'Nothing in the way',
  'columns.arrives': 'Arrives',
  'columns.share': 'Share',
} as const;
