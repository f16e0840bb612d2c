import { fullCircle } from '../angles/angles.ts';
import type { Photo, Survey } from '../survey/survey.ts';
import type { PointedSurvey } from './pointed-survey.ts';
import { pointingOfReading } from './reading-direction.ts';
import { deviationAt, offsetAt } from './run-ties.ts';

/** Where a photo's camera looked. */
export interface PhotoAzimuth {
  /** Clockwise from true north, 0 to 360. */
  azimuth: number;
  /** Standard deviation, degrees; null where somebody typed it. */
  standardDeviation: number | null;
}

/** Looking steeper than this up or down, a photo has no azimuth worth telling, degrees. No source. */
const STEEPEST = 75;

/**
 * The azimuth a photo was taken towards: as typed, else by its raw reading and what is known of that reading's run. Null
 * where neither is there, nothing ties the run to north, or the camera looked straight up or down.
 */
export function photoAzimuth(
  photo: Pick<Photo, 'azimuth' | 'reading'>,
  survey: Pick<Survey, 'readings'>,
  { runs }: Pick<PointedSurvey, 'runs'>,
): PhotoAzimuth | null {
  if (photo.azimuth !== undefined) return { azimuth: photo.azimuth, standardDeviation: null };
  const reading = photo.reading && survey.readings.find(({ id }) => id === photo.reading);
  const pointing = reading ? pointingOfReading(reading) : null;
  const run = runs.find(({ id }) => id === pointing?.run);
  if (!pointing || !run?.heading || run.refused || Math.abs(pointing.elevation) > STEEPEST) return null;
  const { azimuth, takenAtMs } = pointing;
  return {
    azimuth: fullCircle(azimuth + offsetAt(run.heading, takenAtMs)),
    standardDeviation: deviationAt(run.heading, takenAtMs),
  };
}
