import type { Site, Survey } from '../../core/survey/survey.ts';

/** Where the practice recording plays: an invented house near an invented village. */
export const PRACTICE_SITE = {
  latitude: 47.25,
  longitude: 8.55,
  altitude: 520,
  timeZone: 'Europe/Zurich',
} as const satisfies Site;

/** Whether a survey is one to practise in: it stands where the recording was made. */
export const isPracticeSurvey = ({ site }: Pick<Survey, 'site'>): boolean =>
  site.latitude === PRACTICE_SITE.latitude && site.longitude === PRACTICE_SITE.longitude;
