import type { JsonValue } from '../core/survey/json-value.ts';

/** What was typed into a form and not saved yet. */
export interface FormDraft {
  /** Id of the survey the form belongs to; empty for a survey that is not there yet. */
  survey: string;
  /** Which form of it, such as `plane/new`. */
  form: string;
  /** Its name, as a person knows it. */
  label: string;
  /** The texts as typed. */
  typed: JsonValue;
  /** The texts as they stood before anything was typed, to tell whether the survey was changed since. */
  over: JsonValue;
}

/** Where half-typed forms are kept, so that they survive the end of the app. */
export interface DraftStore {
  read(survey: string, form: string): Promise<FormDraft | null>;
  /** All of one survey, without their texts. */
  list(survey: string): Promise<Pick<FormDraft, 'form' | 'label'>[]>;
  keep(draft: FormDraft): Promise<void>;
  drop(survey: string, form: string): Promise<void>;
}
