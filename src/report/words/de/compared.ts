/** Two results side by side. */
export const DE_COMPARED = {
  'compared.heading': 'Was ist anders?',
  'compared.without': (obstruction: string) => `Ohne: ${obstruction}`,
  'compared.more': (roof: string, now: string, other: string, name: string) =>
    `${roof}: Hier kommen ${now} des Sonnenlichts an. Bei „${name}“ sind es ${other}. Hier ist es also mehr.`,
  'compared.less': (roof: string, now: string, other: string, name: string) =>
    `${roof}: Hier kommen ${now} des Sonnenlichts an. Bei „${name}“ sind es ${other}. Hier ist es also weniger.`,
  'compared.same': (roof: string, now: string, name: string) =>
    `${roof}: Hier kommen ${now} des Sonnenlichts an, bei „${name}“ ebenso viel.`,
  'compared.not-sure':
    'Beide Werte haben eine Spanne, und die Spannen überschneiden sich. Der Unterschied kann also allein vom Messen kommen.',
  'compared.shared':
    'Beide Werte beruhen auf derselben Messung. Der Unterschied ist deshalb sicherer, als die Spannen vermuten lassen.',
  'compared.not-both': (roof: string) =>
    `${roof} wurde nicht in beiden Fällen gemessen. Ein Vergleich ist daher nicht möglich.`,
  'compared.this': 'Hier',
  'compared.months-caption': (roof: string) => `${roof}: Sonnenlicht, das ankommt, Monat für Monat`,
  'compared.month': 'Monat',
  'compared.only-here': (roof: string) => `Nur in diesem Bericht: ${roof}.`,
  'compared.only-there': (roof: string, name: string) => `Nur in „${name}“: ${roof}.`,
} as const;
