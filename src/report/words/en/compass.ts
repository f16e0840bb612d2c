/** The eight compass points in words, from north clockwise, and as letters. */
export const EN_COMPASS = {
  'compass.words': ['north', 'north-east', 'east', 'south-east', 'south', 'south-west', 'west', 'north-west'],
  'compass.letters': ['N', 'NE', 'E', 'SE', 'S', 'SW', 'W', 'NW'],
} as const;
