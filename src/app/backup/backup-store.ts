import type { FieldVersions } from '../../core/sync-protocol/field-versions.ts';
import type { ReadingState } from '../../core/sync-protocol/reading-state.ts';
import type { Stamp } from '../../core/sync-protocol/stamp.ts';

/** A survey as it is stored: every field and raw reading with its stamp, so that it can be merged with another copy. */
export interface SurveyRows {
  id: string;
  /** Milliseconds since 1970; null where it is not deleted. */
  deletedAt: number | null;
  deletionStamp: Stamp | null;
  fields: (FieldVersions & { path: string })[];
  readings: (ReadingState & { id: string })[];
}

/** `added`: it was not on this device; `merged`: something of it was newer; `same`: nothing was. */
export interface MergeResult {
  outcome: 'added' | 'merged' | 'same';
  /** It is among the deleted surveys of this device, by a newer act than the copy knows. */
  isDeleted: boolean;
}

/** The rows of surveys, whole. Rejects with an `AppError`. */
export interface BackupStore {
  rows(id: string): Promise<SurveyRows | null>;
  /**
   * Brings a copy of a survey in, all or nothing: of each field the later one counts and the other stays beside
   * it, raw readings are joined by their ids. Rejects with `reading-conflict` where a reading differs from the stored one of its id, and with
   * `change-refused` where what comes out could not be read.
   */
  merge(rows: SurveyRows): Promise<MergeResult>;
}
