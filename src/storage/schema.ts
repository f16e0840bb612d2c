import type { DBSchema } from 'idb';
import type { JsonValue } from '../core/survey/json-value.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import type { SurveySummary } from '../app/survey-store.ts';
import type { WeatherFileSummary } from '../app/weather-store.ts';

export const DATABASE_NAME = 'noonmark';
export const DATABASE_VERSION = 1;

/** One line of the list, kept beside the fields it is drawn from, in the same transaction. */
export interface SurveyRow extends SurveySummary {
  /** When the survey was last deleted or restored, for merging with other devices. */
  deletionStamp: Stamp | null;
}

/** A field of a survey. A cleared field keeps its row, without `value`, so that its stamp still counts. */
export interface FieldRow {
  survey: string;
  path: string;
  stamp: Stamp;
  value?: JsonValue;
}

/** A raw reading: evidence. Its contents are written once; only the mark that it was taken out may change. */
export interface ReadingRow {
  survey: string;
  id: string;
  reading: JsonValue;
  removed: Stamp | null;
}

/** What this device remembers of itself. */
export type DeviceRow = { name: 'device'; id: string } | { name: 'last-stamp'; stamp: Stamp };

/** The stores of the database, in one description. */
export interface NoonmarkSchema extends DBSchema {
  surveys: { key: string; value: SurveyRow };
  fields: { key: [survey: string, path: string]; value: FieldRow };
  readings: { key: [survey: string, id: string]; value: ReadingRow };
  /** Ids of surveys erased for good. */
  erased: { key: string; value: { id: string; stamp: Stamp } };
  'weather-files': { key: string; value: WeatherFileSummary };
  /** Apart from the list, so that listing reads no megabytes. */
  'weather-bytes': { key: string; value: { sha256: string; contents: ArrayBuffer } };
  device: { key: DeviceRow['name']; value: DeviceRow };
}
