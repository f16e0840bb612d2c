import type { Assessment } from '../core/shading/assessment.ts';
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

/** The long calculation, off the main thread. */
export interface AssessClient {
  assess(request: AssessRequest, onProgress: ProgressListener, signal: CancelSignal): Promise<Assessment>;
}
