/** The eight compass points in words, from north clockwise, and as letters. */
export const DE_COMPASS = {
  'compass.words': ['Norden', 'Nordosten', 'Osten', 'Südosten', 'Süden', 'Südwesten', 'Westen', 'Nordwesten'],
  'compass.letters': ['N', 'NO', 'O', 'SO', 'S', 'SW', 'W', 'NW'],
} as const;
