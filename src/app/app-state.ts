import { signal, type Signal } from '@preact/signals-core';
import type { Problem } from '../core/survey/problem.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { AppErrorCode } from './app-error.ts';
import type { MergeResult } from './backup/backup-store.ts';
import type { StepCode, Steps, StoredSurvey, SurveySummary } from './survey-store.ts';
import type { WeatherFileSummary } from './weather-store.ts';

/** What the last act was, so that it can be told and taken back. */
export interface Notice {
  code:
    | StepCode
    | 'survey-deleted'
    | 'survey-duplicated'
    | 'survey-restored'
    | 'step-undone'
    | 'step-redone'
    | 'weather-file-forgotten';
  title: string;
  undo?: () => Promise<void>;
  /** The step of a survey it tells of; once that is no longer the last one, its undo would do nothing. */
  of?: { survey: string; step: number };
}

/** What came of one picked file. */
export type ImportResult =
  | { file: string; outcome: 'stored'; id: string; title: string; warnings: Problem[] }
  | { file: string; outcome: 'refused'; problems: Problem[] }
  | { file: string; outcome: 'failed'; code: AppErrorCode }
  | { file: string; outcome: 'left-out'; title: string };

/** What came of one survey of an archive. */
export type RestoredSurvey = { id: string; title: string } & (
  MergeResult | { outcome: 'refused'; code: AppErrorCode; detail?: string }
);

/** What came of one archive. */
export type RestoreResult =
  | { file: string; outcome: 'restored'; surveys: RestoredSurvey[]; photos: number }
  | { file: string; outcome: 'damaged'; problems: Problem[] }
  | { file: string; outcome: 'failed'; code: AppErrorCode };

/** A good file whose id is on this device already; a person decides. */
export interface ImportConflict {
  file: string;
  survey: Survey;
  warnings: Problem[];
  storedTitle: string;
  storedIsDeleted: boolean;
}

/** `elsewhere`: another tab took the new version into use; this one still runs the old one. */
export type UpdateState = 'none' | 'ready' | 'changing' | 'elsewhere';

export interface Trouble {
  code: AppErrorCode;
  /** What the browser said, for a report. */
  detail?: string;
}

/** All that screens show. Actions write it, screens read it. */
export interface AppState {
  /** Null until first read. */
  surveys: Signal<SurveySummary[] | null>;
  /** Weather files kept on this device, as far as read. */
  weatherFiles: Signal<WeatherFileSummary[]>;
  /** The survey on screen; null while it is read; `missing` where the id is not on this device. */
  open: Signal<{ id: string; stored: StoredSurvey | 'missing' | null } | null>;
  /** What can be taken back and done again in the survey on screen. */
  steps: Signal<Steps>;
  notice: Signal<Notice | null>;
  imports: Signal<ImportResult[]>;
  conflicts: Signal<ImportConflict[]>;
  restores: Signal<RestoreResult[]>;
  /** Ids of surveys found unreadable, with why. */
  unreadable: Signal<ReadonlyMap<string, Problem[]>>;
  /** When each survey had last been changed when it was looked at for that; for actions only. */
  lookedAt: Map<string, number>;
  trouble: Signal<Trouble | null>;
  /** Where the database stands, when it is not simply open. */
  database: Signal<'storage-waiting' | 'storage-taken-over' | null>;
  update: Signal<UpdateState>;
  busy: Signal<boolean>;
}

export function appState(): AppState {
  return {
    surveys: signal(null),
    weatherFiles: signal([]),
    open: signal(null),
    steps: signal({ undo: null, redo: null }),
    notice: signal(null),
    imports: signal([]),
    conflicts: signal([]),
    restores: signal([]),
    unreadable: signal(new Map()),
    lookedAt: new Map(),
    trouble: signal(null),
    database: signal(null),
    update: signal('none'),
    busy: signal(false),
  };
}
