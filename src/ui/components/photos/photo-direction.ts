import { photoAzimuth, type PhotoAzimuth } from '../../../core/pointing/photo-azimuth.ts';
import { pointSurvey } from '../../../core/pointing/point-survey.ts';
import type { PointedSurvey } from '../../../core/pointing/pointed-survey.ts';
import type { Photo, Survey } from '../../../core/survey/survey.ts';

/** A survey is pointed once for all its photos on screen. */
const pointed = new WeakMap<Survey, PointedSurvey>();

function pointedOnce(survey: Survey): PointedSurvey {
  const known = pointed.get(survey) ?? pointSurvey(survey);
  pointed.set(survey, known);
  return known;
}

/** Where a photo's camera looked; null where that is not known. */
export function photoDirection(photo: Photo, survey: Survey): PhotoAzimuth | null {
  if (photo.azimuth === undefined && photo.reading === undefined) return null;
  return photoAzimuth(photo, survey, photo.azimuth === undefined ? pointedOnce(survey) : { runs: [] });
}

/** In whole degrees, with how sure it is where the phone read it. */
export function directionText({ azimuth, standardDeviation }: PhotoAzimuth): string {
  const degrees = `${Math.round(azimuth) % 360}°`;
  return standardDeviation === null ? degrees : `${degrees}\u00a0±\u00a0${Math.ceil(2 * standardDeviation)}°`;
}
