/** Two results side by side. */
export const EN_COMPARED = {
  'compared.heading': 'What is different?',
  'compared.without': (obstruction: string) => `Without: ${obstruction}`,
  'compared.more': (roof: string, now: string, other: string, name: string) =>
    `${roof} gets ${now} of its sunlight here. In “${name}” it gets ${other}. That is more sunlight here.`,
  'compared.less': (roof: string, now: string, other: string, name: string) =>
    `${roof} gets ${now} of its sunlight here. In “${name}” it gets ${other}. That is less sunlight here.`,
  'compared.same': (roof: string, now: string, name: string) =>
    `${roof} gets ${now} of its sunlight here, and the same in “${name}”.`,
  'compared.not-sure':
    'Both figures have a range, and the ranges meet. So the difference may come from measuring alone.',
  'compared.shared':
    'Both figures come from the same measuring. So the difference is surer than the ranges look.',
  'compared.not-both': (roof: string) => `${roof} was not measured in both. So we cannot compare it.`,
  'compared.this': 'Here',
  'compared.months-caption': (roof: string) => `${roof}: sunlight that arrives, month by month`,
  'compared.month': 'Month',
  'compared.only-here': (roof: string) => `${roof} is only in this report.`,
  'compared.only-there': (roof: string, name: string) => `${roof} is only in “${name}”.`,
} as const;
