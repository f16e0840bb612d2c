/** The eight compass points in words, from north clockwise, and as letters. */
export const ES_COMPASS = {
  'compass.words': ['norte', 'noreste', 'este', 'sureste', 'sur', 'suroeste', 'oeste', 'noroeste'],
  'compass.letters': ['N', 'NE', 'E', 'SE', 'S', 'SO', 'O', 'NO'],
} as const;
