import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { Problem } from '../survey/problem.ts';
import type { Survey, TranspositionId } from '../survey/survey.ts';
import type { ObstructionChange } from './what-if.ts';

/** All that an assessment is made from. */
export interface AssessRequest {
  survey: Survey;
  /** The survey as pointed, where the caller has it: its raw readings may be left out of the survey then. */
  pointed?: PointedSurvey;
  /** Stands over the survey's own choice. */
  transposition?: TranspositionId;
  /** Contents of the weather file that the survey's climate names. */
  weatherFile?: { name: string; contents: ArrayBuffer };
  stepMinutes?: number;
}

/** Which plane and station to look at, and what to imagine changed. */
export interface ShadeQuestion {
  plane: string;
  station: string;
  changes: readonly ObstructionChange[];
}

/** Which plane and station somebody is at work on. */
export type PlaceQuestion = Pick<ShadeQuestion, 'plane' | 'station'>;

/** Where a weather file's station is, once read. */
export interface WeatherFileFacts {
  place: string;
  warnings: Problem[];
}

/** Why a calculation gave nothing. `detail` is what the platform said, for a report. */
export interface CalculationFault {
  code:
    | 'cancelled'
    /** The world's climate did not load. */
    | 'climate-missing'
    /** The survey names a weather file that was not given. */
    | 'weather-file-missing'
    /** The weather file cannot be read; `problems` say where. */
    | 'weather-file-refused'
    | 'failed';
  problems?: Problem[];
  detail?: string;
}

export type Outcome<T> = { ok: true; value: T } | { ok: false; fault: CalculationFault };
