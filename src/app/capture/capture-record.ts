import { changesBetween } from '../../core/survey/field-changes.ts';
import type { Reading, Run, Survey } from '../../core/survey/survey.ts';
import { AppError, asAppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import type { StepCode } from '../survey-store.ts';

type Needs = Pick<AppServices, 'state' | 'store'>;
type Edit = (survey: Survey) => Survey;

export interface Act {
  code: StepCode;
  /** Name of what is acted on. */
  title: string;
  /** The survey to go back to, where that is not the one before the act. */
  back?: Edit;
}

/**
 * The survey in hand. Each write is durable when its promise gives true; what went wrong is in the state's trouble.
 * Writes follow each other in the order they were asked for, each on the survey that the one before left.
 */
export class CaptureRecord {
  private queue: Promise<unknown> = Promise.resolve();
  /** The newest step when this sitting began; null for none. */
  private readonly begunAfter: number | null;

  constructor(
    private readonly services: Needs,
    readonly surveyId: string,
  ) {
    this.begunAfter = services.state.steps.value.undo?.number ?? null;
  }

  /** The survey as last stored. Throws AppError where it is not open and readable. */
  get survey(): Survey {
    const open = this.services.state.open.value;
    const stored = open?.id === this.surveyId ? open.stored : null;
    if (!stored || stored === 'missing') throw new AppError('survey-missing', this.surveyId);
    if (stored.state !== 'readable') throw new AppError('survey-unreadable', this.surveyId);
    return stored.survey;
  }

  /** Adds raw readings, and their run where it is new. They stay whatever is taken back later. */
  addReading(run: Run, reading: Reading, edit: Edit = (survey) => survey): Promise<boolean> {
    return this.next(async () => {
      const before = this.survey;
      const known = before.runs.some(({ id }) => id === run.id);
      const runs = known ? before.runs : [...before.runs, run];
      const after = edit({ ...before, runs, readings: [...before.readings, reading] });
      await this.services.store.applyChanges(this.surveyId, changesWith(before, after, [reading]));
      this.show(after);
    });
  }

  /** Changes the survey as one act that can be taken back. */
  act(edit: Edit, { code, title, back }: Act): Promise<boolean> {
    return this.next(async () => {
      const before = this.survey;
      const after = edit(before);
      const goBack = changesWith(after, back ? back(before) : before, []);
      const changes = changesWith(before, after, []);
      if (changes.length === 0) return;
      const { state, store } = this.services;
      const number = await store.applyChanges(this.surveyId, changes, { back: goBack, code, title });
      this.show(after);
      if (number !== null) state.steps.value = { undo: { number, code, title }, redo: null };
    });
  }

  /** Whether a step was made since this sitting began. */
  isOfSitting(step: number): boolean {
    return this.begunAfter === null || step > this.begunAfter;
  }

  /** Resolves when all that was asked for is written or refused. */
  settled(): Promise<void> {
    return this.queue.then(() => undefined);
  }

  private next(write: () => Promise<void>): Promise<boolean> {
    const done = this.queue.then(async () => {
      try {
        await write();
        this.services.state.trouble.value = null; // such as a full device that has room again
        return true;
      } catch (error) {
        const { code, cause } = asAppError(error);
        this.services.state.trouble.value = {
          code,
          detail: cause instanceof Error ? cause.message : undefined,
        };
        return false;
      }
    });
    this.queue = done;
    return done;
  }

  /** Reading it all again after each of a thousand readings would cost seconds; what was written is known. */
  private show(survey: Survey): void {
    const { open } = this.services.state;
    const stored = open.value?.stored;
    if (open.value?.id !== this.surveyId || !stored || stored === 'missing' || stored.state !== 'readable')
      return;
    open.value = { id: this.surveyId, stored: { ...stored, survey } };
  }
}

/** The changes between two states whose readings are the same but for those added. */
function changesWith(before: Survey, after: Survey, added: readonly Reading[]) {
  return changesBetween({ ...before, readings: [] }, { ...after, readings: [...added] });
}
