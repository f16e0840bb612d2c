import type { DBSchema } from 'idb';
import type { FieldVersions } from '../core/sync-protocol/field-versions.ts';
import type { ReadingState } from '../core/sync-protocol/reading-state.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import type { FieldChange } from '../core/survey/field-changes.ts';
import type { FormDraft } from '../app/draft-store.ts';
import type { ReportSettings } from '../app/report-settings.ts';
import type { Step, SurveySummary } from '../app/survey-store.ts';
import type { WeatherFileSummary } from '../app/weather-store.ts';

export const DATABASE_NAME = 'noonmark';
export const DATABASE_VERSION = 3;

/** One line of the list, kept beside the fields it is drawn from, in the same transaction. */
export interface SurveyRow extends SurveySummary {
  /** When the survey was last deleted or restored, for merging with other devices. */
  deletionStamp: Stamp | null;
}

/** A field of a survey. A cleared field keeps its row, without `value`, so that its stamp still counts. */
export interface FieldRow extends FieldVersions {
  survey: string;
  path: string;
}

/** A raw reading: evidence. Its contents are written once; only the marks that it was taken out or put back change. */
export interface ReadingRow extends ReadingState {
  survey: string;
  id: string;
}

/**
 * An act on a survey that can be taken back and done again. Raw readings stay in their rows, so a step only says
 * whether they stand after it.
 */
export interface HistoryRow extends Step {
  survey: string;
  back: FieldChange[];
  forth: FieldChange[];
  readings: { id: string; standing: boolean }[];
  undone: boolean;
}

/** A picture, by the hash of its bytes; a plain buffer, since some phones spoil stored Blobs. */
export interface PhotoRow {
  sha256: string;
  type: string;
  contents: ArrayBuffer;
  /** Milliseconds since 1970. */
  keptAt: number;
}

/** What this device remembers of itself. */
export type DeviceRow =
  | { name: 'device'; id: string }
  | { name: 'last-stamp'; stamp: Stamp }
  | { name: 'report-settings'; settings: ReportSettings };

/** The stores of the database, in one description. */
export interface NoonmarkSchema extends DBSchema {
  surveys: { key: string; value: SurveyRow };
  fields: { key: [survey: string, path: string]; value: FieldRow };
  readings: { key: [survey: string, id: string]; value: ReadingRow };
  history: { key: [survey: string, number: number]; value: HistoryRow };
  photos: { key: string; value: PhotoRow };
  /** Ids of surveys erased for good. */
  erased: { key: string; value: { id: string; stamp: Stamp } };
  'weather-files': { key: string; value: WeatherFileSummary };
  /** Apart from the list, so that listing reads no megabytes. */
  'weather-bytes': { key: string; value: { sha256: string; contents: ArrayBuffer } };
  device: { key: DeviceRow['name']; value: DeviceRow };
  /** Forms half typed; of this device alone. */
  drafts: { key: [survey: string, form: string]; value: FormDraft };
}
