/** The range, where it comes from, and what nobody could see. */
export const DE_SURE = {
  'sure.heading': 'Wie sicher sind wir?',
  'sure.answer': (low: string, high: string, roof: string) =>
    `${roof}: Wir erwarten, dass ${low} bis ${high} des Sonnenlichts ankommen.`,
  'sure.answer-same': (access: string, roof: string) =>
    `${roof}: Wir erwarten, dass ${access} des Sonnenlichts ankommen, auf weniger als ein Hundertstel genau.`,
  'sure.times': 'In 95 von 100 Fällen sollte der wahre Wert in so einer Spanne liegen.',
  'sure.answer-none': 'Für diesen Bericht wurde keine Spanne berechnet.',
  'sure.why': 'Das macht die Zahlen unsicher, das Wichtigste zuerst:',
  'sure.source-heading': 'Wohin das Telefon gezeigt hat. Ein Kompass stimmt nie ganz genau.',
  'sure.source-elevation-index': 'Was das Telefon für waagerecht hält.',
  'sure.source-pointing': 'Die Hand, die zielt. Sie zittert ein wenig.',
  'sure.source-gaps': 'Die Form der Dinge zwischen den Punkten, auf die gezielt wurde.',
  'sure.source-unseen': 'Teile des Himmels, in die niemand geschaut hat.',
  'sure.source-transmittance': 'Wie viel Licht die Bäume durchlassen.',
  'sure.source-diffuse-share':
    'Wie viel vom Licht aus dem ganzen Himmel kommt und nicht direkt von der Sonne.',
  'sure.cures': 'So würden die Zahlen sicherer:',
  'sure.cure-heading-check':
    'Den Kompass prüfen: am Schatten eines Gegenstands oder an einem Punkt, dessen Lage bekannt ist.',
  'sure.cure-second-heading-check': 'Den Kompass ein zweites Mal prüfen.',
  'sure.cure-known-bearing': 'Eine Richtung auf einer Karte nachprüfen.',
  'sure.cure-two-face-check':
    'Zweimal auf denselben Punkt zielen: einmal mit dem Telefon aufrecht, einmal auf dem Kopf.',
  'sure.cure-sight-again': 'Jeden Punkt viermal anzielen.',
  'sure.cure-more-sightings': 'An jeder Kante doppelt so viele Punkte anzielen.',
  'sure.cure-look': 'In die Teile des Himmels schauen, die noch fehlen.',
  'sure.cure-measure-transmittance': 'Messen, wie viel Licht die Bäume durchlassen.',
  'sure.cure-weather-file': 'Die Daten einer Wetterstation in der Nähe verwenden.',
  'sure.unseen': 'Was niemand sehen konnte',
  'sure.unseen-note':
    'Diese Teile des Himmels haben wir als frei gerechnet. Die Spanne lässt Raum für Schatten dort.',
  'sure.unseen-from': (roof: string, station: string, share: string, places: string) =>
    `${roof}: Von „${station}“ aus kommen ${share} des Lichts aus Teilen des Himmels, in die niemand geschaut hat. Sie liegen ${places}.`,
  'sure.unseen-place': (where: string, share: string) => `${where} (${share})`,
  'sure.unseen-least':
    'Hat ein Dach mehr als eine Messstelle, so ist dies die, von der am wenigsten zu sehen war.',
  'sure.toward': (point: string) => `im ${point}`,
  'sure.between': (from: string, to: string) => `von ${from} bis ${to}`,
  'sure.all-around': 'ringsum',
  'sure.all-seen': 'In jeden Teil des Himmels, auf den es ankommt, hat jemand geschaut.',
  'sure.unmeasured': (roofs: string) => `Nicht gemessen und darum nicht bekannt: ${roofs}.`,
} as const;
