/** What stands in the way, and when its shade falls. */
export const EN_SUN = {
  'sun.heading': 'What stands in the way, and when?',
  'sun.answer': (obstruction: string, roof: string) => `The most shade on ${roof} comes from ${obstruction}.`,
  'sun.answer-clear': 'Nothing that counts stands in the way of the sun.',
  'sun.answer-sky': 'Some things hide a part of the bright sky, but none of them the sun.',
  'sun.from-lowest': (station: string) =>
    `The picture shows the sky from “${station}”. This is the measured place with the least sun on this roof.`,
  'sun.from-only': (station: string) => `The picture shows the sky from “${station}”.`,
  'sun.caption':
    'Thin lines: the way of the sun on the 21st of each month. Broken lines: the hours, without summer time. Hatched: what stands in the way. The more dots, the more sunlight comes from there.',
  'sun.caption-rings': 'Rings: nobody looked there.',
  'sun.alternative': (roof: string, names: string) =>
    `The sky before ${roof}, with the way of the sun through the year. In front of it: ${names}.`,
  'sun.alternative-open': (roof: string) =>
    `The sky before ${roof}, with the way of the sun through the year. Nothing is in front of it.`,
  'sun.shades': (obstruction: string, roof: string, when: string, part: string) =>
    `Shade from ${obstruction} falls on ${roof} ${when}, ${part}.`,
  'sun.longest': (day: string, hours: string) => `It lasts longest about ${day}: ${hours}.`,
  'sun.all-year': 'all year',
  'sun.from-to': (from: string, to: string) => `from ${from} to ${to}`,
  'sun.on': (day: string) => `about ${day}`,
  'sun.now-and-then': (from: string, to: string) => `now and then between ${from} and ${to}`,
  'sun.hours': (from: string, to: string) => `from ${from} to ${to}`,
  'sun.hours-short': (from: string, to: string) => `${from}–${to}`,
  'sun.all-day': 'day and night',
  'sun.no-hours': '–',
  'sun.in-the-night': 'in the night',
  'sun.in-the-morning': 'in the morning',
  'sun.at-midday': 'at midday',
  'sun.in-the-afternoon': 'in the afternoon',
  'sun.in-the-evening': 'in the evening',
  'sun.at-changing-hours': 'at changing hours',
  'sun.never-the-sun': (obstruction: string) =>
    `Behind ${obstruction} lies a part of the bright sky, but never the sun.`,
  'sun.little': (names: string) => `Almost nothing is lost to ${names}.`,
  'sun.leaves': 'Trees let some light through, and bare trees let more through. This is counted.',
  'sun.table-caption': (roof: string) => `${roof}: hours of shade on the 21st of each month`,
  'sun.month': 'Month',
  'sun.clock': 'Hours are clock time. Summer time is counted in.',
} as const;
