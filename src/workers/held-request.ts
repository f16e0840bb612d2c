import { pointSurvey } from '../core/pointing/point-survey.ts';
import type { PointedSurvey } from '../core/pointing/pointed-survey.ts';
import type { AssessRequest } from '../core/shading/calculation.ts';
import { contentHash } from './content-hash.ts';

/** A survey at work, with what is found out of it once for all questions about it. */
export class HeldRequest {
  private found: PointedSurvey | null = null;
  private weather: string | null = null;

  constructor(readonly request: AssessRequest) {}

  /** The true directions of its sightings, and what they may err by. */
  pointed(): PointedSurvey {
    this.found ??= this.request.pointed ?? pointSurvey(this.request.survey);
    return this.found;
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
