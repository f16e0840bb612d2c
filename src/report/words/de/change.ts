/** What the years may bring. */
export const DE_CHANGE = {
  'change.heading': 'Was kann sich mit den Jahren ändern?',
  'change.answer-trees': 'Bäume wachsen, und ihr Schatten wächst mit.',
  'change.answer': 'Von selbst ändert sich wenig. Neues in der Nähe kann neuen Schatten bringen.',
  'change.table-caption': (roof: string) =>
    `${roof}: So viel vom Sonnenlicht eines Jahres würde ein wachsender Baum nehmen`,
  'change.tree': 'Baum',
  'change.grown': (metres: string) => `${metres} höher`,
  'change.more': (share: string) => `${share} mehr`,
  'change.no-more': 'nicht mehr',
  'change.no-distance': (trees: string) =>
    `Hier wurde die Entfernung nicht gemessen: ${trees}. Darum können wir nicht sagen, was das Wachsen ausmacht. Rechnen Sie jedes Jahr mit etwas mehr Schatten.`,
  'change.buildings':
    'Ein neues Haus oder ein neues Stockwerk nebenan kann Schatten bringen. Fragen Sie Ihre Gemeinde, was dort gebaut werden darf.',
  'change.own-trees': (side: string) =>
    `Denken Sie an die Sonne, bevor Sie einen Baum pflanzen. Steht er im ${side} des Hauses, fällt sein Schatten vom Dach weg.`,
  'change.own-trees-tropics':
    'Denken Sie an die Sonne, bevor Sie einen Baum pflanzen. Hier kommt die Sonne von beiden Seiten. Darum kann jeder hohe Baum in der Nähe Schatten auf das Dach werfen.',
  'change.years':
    'Manche Jahre sind sonnig, manche trüb. Unsere Zahlen gelten für ein übliches Jahr. Ein einzelnes Jahr kann darüber oder darunter liegen.',
  'change.again':
    'Sind Bäume gewachsen oder wurde ein Haus gebaut? Dann lassen Sie das Dach noch einmal messen.',
} as const;
