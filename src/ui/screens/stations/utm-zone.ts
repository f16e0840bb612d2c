import type { Site } from '../../../core/survey/survey.ts';

/** The UTM zone of a site, of which a map's grid is taken to be. */
export const utmZone = ({ latitude, longitude }: Site): string =>
  `${(Math.floor((longitude + 180) / 6) % 60) + 1}${latitude < 0 ? 'S' : 'N'}`;
