/** Removing, trimming, moving; and what belongs to others. */
export const DE_DONE = {
  'done.heading': 'Was ließe sich gegen den Schatten tun?',
  'done.answer': (obstruction: string, gain: string, roof: string) =>
    `Am meisten brächte es, wenn dies weg wäre: ${obstruction}. Dann kämen ${gain} des Sonnenlichts eines Jahres zurück (${roof}).`,
  'done.answer-together': (obstructions: string, gain: string, roof: string) =>
    `Eines allein würde wenig helfen. Wäre dies alles weg, kämen ${gain} des Sonnenlichts eines Jahres zurück (${roof}): ${obstructions}.`,
  'done.answer-nothing': 'Nichts, was sich hier ändern ließe, brächte viel mehr Sonne.',
  'done.answer-clear': 'Sie müssen nichts tun. Der Schatten nimmt fast nichts weg.',
  'done.table-caption': (roof: string) => `${roof}: So viel vom Sonnenlicht eines Jahres käme zurück`,
  'done.what': 'Wenn sich dies änderte',
  'done.gain': 'Käme zurück',
  'done.light': 'Als Sonnenlicht',
  'done.gone': (obstruction: string) => `${obstruction}: ganz weg`,
  'done.moved': (obstruction: string) => `${obstruction}: an einem anderen Platz`,
  'done.lower': (obstruction: string, metres: string) => `${obstruction}: oben ${metres} weniger`,
  'done.clear': (obstruction: string, metres: string) =>
    `${obstruction}: oben ${metres} weniger, dann so gut wie kein Schatten`,
  'done.unless': (obstruction: string, others: string) =>
    `${obstruction}: Nur dies zu entfernen, bringt nichts. Auch dies müsste weg: ${others}.`,
  'done.hidden': (obstruction: string) =>
    `${obstruction}: Nur dies zu entfernen, bringt nichts. Zur selben Zeit wirft auch anderes Schatten.`,
  'done.together': (obstructions: string, gain: string) =>
    `Wäre dies alles weg, kämen ${gain} des Sonnenlichts eines Jahres zurück: ${obstructions}.`,
  'done.no-distance': (obstruction: string) =>
    `${obstruction}: Die Entfernung wurde nicht gemessen. Darum können wir nicht sagen, was ein Rückschnitt brächte.`,
  'done.stays': (obstructions: string) => `Wir gehen davon aus, dass dies bleibt: ${obstructions}.`,
  'done.place': (roof: string, best: string, most: string, lowest: string, least: string) =>
    `${roof}: Es kommt auf die Stelle an. Bei „${best}“ kommen ${most} des Sonnenlichts an. Bei „${lowest}“ sind es ${least}. Solarmodule bringen mehr, wo mehr ankommt.`,
  'done.before': 'Bevor jemand etwas fällt, schneidet oder versetzt',
  'done.owner':
    'Jeder Baum gehört jemandem. Fragen Sie zuerst. Ist es nicht Ihr Baum, entscheidet nur der Eigentümer. Wir verlangen von niemandem, einen Baum aufzugeben.',
  'done.protected':
    'Viele Bäume stehen unter Schutz. Fragen Sie Ihre Gemeinde, bevor auch nur ein Ast geschnitten wird.',
  'done.nesting': 'In Bäumen brüten Vögel. Vielerorts ist das Schneiden in der Brutzeit verboten.',
  'done.trained': 'Arbeiten hoch im Baum sind etwas für Fachleute.',
  'done.permit':
    'Wer am Haus etwas versetzt oder anbaut, braucht dafür vielleicht eine Genehmigung. Fragen Sie Ihre Gemeinde.',
} as const;
