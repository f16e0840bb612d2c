import type { FieldChange } from '../core/survey/field-changes.ts';
import type { Problem } from '../core/survey/problem.ts';
import type { Survey } from '../core/survey/survey.ts';

/** A line of the list of surveys, had without reading the survey itself. */
export interface SurveySummary {
  id: string;
  title: string;
  surveyedOn?: string;
  address?: string;
  planes: number;
  stations: number;
  obstructions: number;
  /** Milliseconds since 1970. */
  changedAt: number;
  /** When it was deleted (milliseconds since 1970), or null; a deleted survey can be restored until it is erased. */
  deletedAt: number | null;
}

/**
 * A survey as stored. One that this version cannot read keeps its document, whole, so that it can be exported and
 * read by the version that wrote it.
 */
export type StoredSurvey = { id: string; deletedAt: number | null } & (
  | { state: 'readable'; survey: Survey; warnings: Problem[] }
  | { state: 'unreadable'; document: unknown; problems: Problem[] }
);

/** What an act was, so that it can be told when it is taken back. */
export type StepCode =
  'survey-renamed' | 'survey-replaced' | 'survey-changed' | 'entry-added' | 'entry-changed' | 'entry-deleted';

/** One act on a survey, in the order of the acts. */
export interface Step {
  number: number;
  code: StepCode;
  /** Name of what was acted on. */
  title: string;
}

/** The act that would be taken back next, and the one that would be done again. */
export interface Steps {
  undo: Step | null;
  redo: Step | null;
}

/** How an act is remembered: the changes that take it back, and what it was. */
export interface StepRecord extends Pick<Step, 'code' | 'title'> {
  back: FieldChange[];
}

/**
 * Where surveys are kept. Each call is all or nothing: it rejects with an `AppError` and leaves what was stored as it
 * was, or resolves when the change is durable.
 */
export interface SurveyStore {
  /** Deleted ones too; last changed first. */
  list(): Promise<SurveySummary[]>;
  load(id: string): Promise<StoredSurvey | null>;
  /** Rejects with `survey-exists` where the id is taken, also by a deleted survey. */
  create(survey: Survey): Promise<void>;
  /**
   * Sets each field, or clears it where the value is undefined. Raw readings are added, never put over. With a step,
   * the act is remembered so that it can be taken back, also after a restart, and is refused with `change-refused`
   * where the survey could not be read after it. Gives the step's number, or null.
   */
  applyChanges(id: string, changes: FieldChange[], step?: StepRecord): Promise<number | null>;
  steps(id: string): Promise<Steps>;
  /**
   * Takes the last act back (only where it is the one of that number, if one is given), or does the last one taken
   * back again. Null where there is none. Rejects with `change-refused` where the survey could not be read after it.
   */
  undo(id: string, number?: number): Promise<Step | null>;
  redo(id: string): Promise<Step | null>;
  /** Marks as deleted; nothing is lost. */
  remove(id: string): Promise<void>;
  restore(id: string): Promise<void>;
  /** Removes for good; only the id is remembered. */
  erase(id: string): Promise<void>;
}
