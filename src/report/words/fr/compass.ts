/** The eight compass points in words with their articles, from north clockwise, and as letters. */
export const FR_COMPASS = {
  'compass.words': [
    'le nord',
    'le nord-est',
    'l’est',
    'le sud-est',
    'le sud',
    'le sud-ouest',
    'l’ouest',
    'le nord-ouest',
  ],
  'compass.letters': ['N', 'NE', 'E', 'SE', 'S', 'SO', 'O', 'NO'],
} as const;
