/** Where the work can hurt someone, who decides, and what this letter is not. */
export const EN_CAUTIONS = {
  'cautions.heading': 'What must you mind before work starts?',
  'cautions.answer': 'Leave work on roofs, wires and trees to trained people.',
  'cautions.roof': 'Roof and ladder',
  'cautions.roof-fall': 'A fall from a roof or a ladder can kill. Go up only if you are trained and secured.',
  'cautions.roof-wet': 'Stay off wet, icy or weak roofs. Roof windows and thin sheets can break under you.',
  'cautions.roof-lines': 'Keep ladders, poles and branches well away from power lines.',
  'cautions.power': 'Electric power',
  'cautions.power-light':
    'Solar panels are live as long as light falls on them. They can give a deadly shock.',
  'cautions.power-licensed': 'Only a licensed electrician may connect them.',
  'cautions.sun': 'Your eyes',
  'cautions.sun-look': 'Never look at the sun, and never aim a phone at it to look through.',
  'cautions.codes':
    'The codes and laws where you live come first. So does the word of the licensed trades. Where they differ from this letter, follow them.',
  'cautions.not':
    'This letter is about sunlight. It does not say that the roof can carry panels. It does not say that the wiring is fit for them. Both need a check by licensed people.',
} as const;
