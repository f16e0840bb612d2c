/** Around the sections: title, foot, names that many sections use. */
export const EN_FRAME = {
  'frame.title': (of: string) => `The sun on your roof: ${of}`,
  'frame.visited': (day: string) => `Visited on ${day}`,
  'frame.made': (day: string) => `Report of ${day}`,
  'frame.page': (page: number, pages: number) => `Page ${page} of ${pages}`,
  'frame.contents': 'What is in this report',
  'frame.letter': 'The letter',
  'frame.evidence': 'The evidence behind it',
  'frame.foot': (fingerprint: string) => `Fingerprint of the survey ${fingerprint}`,
  'frame.boxes':
    'A box in this file stands for a letter that its typeface lacks. The web page of this report shows the letter itself.',
  'frame.range': (low: string, high: string) => `${low} to ${high}`,
  'frame.year': 'Year',
} as const;
