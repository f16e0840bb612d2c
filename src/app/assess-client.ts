import type { Assessment } from '../core/shading/assessment.ts';
import type { StationShade } from '../core/shading/station-shade.ts';
import type { ObstructionChange } from '../core/shading/what-if.ts';
import type { Problem } from '../core/survey/problem.ts';
import type { Survey, TranspositionId } from '../core/survey/survey.ts';

/** The part of an AbortSignal that a long calculation needs. */
export interface CancelSignal {
  readonly aborted: boolean;
  addEventListener(type: 'abort', listener: () => void): void;
  removeEventListener(type: 'abort', listener: () => void): void;
}

export interface AssessRequest {
  survey: Survey;
  /** Stands over the survey's own choice. */
  transposition?: TranspositionId;
  /** Contents of the weather file that the survey's climate names. */
  weatherFile?: { name: string; contents: ArrayBuffer };
  stepMinutes?: number;
}

/** Share done, 0 to 1, and the name of the step at work. */
export type ProgressListener = (share: number, stage: string) => void;

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

/** Where a weather file's station is, once read. */
export interface WeatherFileFacts {
  place: string;
  warnings: Problem[];
}

/** The long calculations, off the main thread. None rejects; what goes wrong is in the outcome. */
export interface AssessClient {
  assess(
    request: AssessRequest,
    onProgress: ProgressListener,
    signal: CancelSignal,
  ): Promise<Outcome<Assessment>>;
  /** One station over one plane, measured and with changes imagined. */
  shade(
    request: AssessRequest,
    at: { plane: string; station: string; changes: readonly ObstructionChange[] },
    signal: CancelSignal,
  ): Promise<Outcome<StationShade>>;
  /** Reads a weather file without keeping it. */
  readWeatherFile(name: string, contents: ArrayBuffer): Promise<Outcome<WeatherFileFacts>>;
}
