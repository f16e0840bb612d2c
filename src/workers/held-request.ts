import type { DirectionOf } from '../core/horizon/station-horizon.ts';
import { pointedDirections } from '../core/horizon/station-horizon.ts';
import { pointSurvey } from '../core/pointing/point-survey.ts';
import type { AssessRequest } from '../core/shading/calculation.ts';
import { contentHash } from './content-hash.ts';

/** A survey at work, with what is found out of it once for all questions about it. */
export class HeldRequest {
  private directions: DirectionOf | null = null;
  private weather: string | null = null;

  constructor(readonly request: AssessRequest) {}

  /** The true directions of its sightings. */
  directionOf(): DirectionOf {
    this.directions ??= pointedDirections(pointSurvey(this.request.survey));
    return this.directions;
  }

  /** Tells its weather file from any other, by name and contents; empty where it has none. */
  weatherKey(): string {
    this.weather ??= weatherKeyOf(this.request.weatherFile);
    return this.weather;
  }
}

function weatherKeyOf(file: AssessRequest['weatherFile']): string {
  if (!file) return '';
  const bytes = new Uint8Array(file.contents);
  return `${file.name} ${bytes.length} ${contentHash(bytes)}`;
}
