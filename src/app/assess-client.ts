import type { Assessment } from '../core/shading/assessment.ts';
import type { StationSoFar } from '../core/assessment/station-so-far.ts';
import type { SurveyEvidence } from '../core/assessment/survey-evidence.ts';
import type {
  AssessRequest,
  Outcome,
  PlaceQuestion,
  ShadeQuestion,
  WeatherFileFacts,
} from '../core/shading/calculation.ts';
import type { StationShade } from '../core/shading/station-shade.ts';

/** The part of an AbortSignal that a long calculation needs. */
export interface CancelSignal {
  readonly aborted: boolean;
  addEventListener(type: 'abort', listener: () => void): void;
  removeEventListener(type: 'abort', listener: () => void): void;
}

/** Share done, 0 to 1, and the name of the step at work. */
export type ProgressListener = (share: number, stage: string) => void;

/** The long calculations, off the main thread. None rejects; what goes wrong is in the outcome. */
export interface AssessClient {
  assess(
    request: AssessRequest,
    onProgress: ProgressListener,
    signal: CancelSignal,
  ): Promise<Outcome<Assessment>>;
  /** The same with what a report shows besides the figures. */
  evidence(
    request: AssessRequest,
    onProgress: ProgressListener,
    signal: CancelSignal,
  ): Promise<Outcome<SurveyEvidence>>;
  /** One station over one plane, measured and with changes imagined. */
  shade(
    request: AssessRequest,
    question: ShadeQuestion,
    signal: CancelSignal,
  ): Promise<Outcome<StationShade>>;
  /** The year's figures of one station before one plane, for somebody who traces there. */
  soFar(
    request: AssessRequest,
    question: PlaceQuestion,
    signal: CancelSignal,
  ): Promise<Outcome<StationSoFar>>;
  /** Reads a weather file without keeping it. */
  readWeatherFile(name: string, contents: ArrayBuffer): Promise<Outcome<WeatherFileFacts>>;
}
