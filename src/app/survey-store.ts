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
  /** Sets each field, or clears it where the value is undefined. Raw readings are added, never put over. */
  applyChanges(id: string, changes: FieldChange[]): Promise<void>;
  /** Marks as deleted; nothing is lost. */
  remove(id: string): Promise<void>;
  restore(id: string): Promise<void>;
  /** Removes for good; only the id is remembered. */
  erase(id: string): Promise<void>;
}
