/** Where the work can hurt someone, who decides, and what this letter is not. */
export const DE_CAUTIONS = {
  'cautions.heading': 'Worauf müssen Sie achten, bevor die Arbeit beginnt?',
  'cautions.answer': 'Überlassen Sie Arbeiten an Dach, Strom und Bäumen den Fachleuten.',
  'cautions.roof': 'Dach und Leiter',
  'cautions.roof-fall':
    'Ein Sturz vom Dach oder von der Leiter kann tödlich sein. Steigen Sie nur hinauf, wenn Sie es gelernt haben und gesichert sind.',
  'cautions.roof-wet':
    'Betreten Sie kein nasses, vereistes oder morsches Dach. Dachfenster und dünne Platten können unter Ihnen brechen.',
  'cautions.roof-lines': 'Halten Sie mit Leitern, Stangen und Ästen weiten Abstand zu Stromleitungen.',
  'cautions.power': 'Strom',
  'cautions.power-light':
    'Solarmodule stehen unter Spannung, solange Licht auf sie fällt. Ein Stromschlag kann tödlich sein.',
  'cautions.power-licensed': 'Nur eine zugelassene Elektrofachkraft darf sie anschließen.',
  'cautions.sun': 'Ihre Augen',
  'cautions.sun-look':
    'Schauen Sie nie in die Sonne. Richten Sie auch nie ein Telefon auf sie, um hindurchzuschauen.',
  'cautions.codes':
    'Die Vorschriften und Gesetze an Ihrem Ort gehen vor. Das gilt auch für das, was zugelassene Fachbetriebe sagen. Sagen sie etwas anderes als dieser Brief, dann richten Sie sich danach.',
  'cautions.not':
    'In diesem Brief geht es um Sonnenlicht. Er sagt nicht, dass das Dach Solarmodule trägt. Er sagt auch nicht, dass die Leitungen im Haus dafür taugen. Beides müssen zugelassene Fachleute prüfen.',
} as const;
