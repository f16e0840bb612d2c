import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { surveyFromJson } from '../../src/core/survey/parse-survey.ts';
import { Connection, type ConnectionReport } from '../../src/storage/connection.ts';
import { backupDatabase } from '../../src/storage/backup-database.ts';
import { draftDatabase } from '../../src/storage/draft-database.ts';
import { photoDatabase } from '../../src/storage/photo-database.ts';
import { sha256Of } from '../../src/storage/sha256-of.ts';
import { surveyDatabase } from '../../src/storage/survey-database.ts';
import { weatherDatabase } from '../../src/storage/weather-database.ts';

/** Starts from a browser that has never stored anything. */
export function emptyBrowser(): void {
  globalThis.indexedDB = new IDBFactory();
}

/** One tab of the app: its connection and its stores, with a clock that moves on by a second an act. */
export function tab(report: ConnectionReport = () => undefined, name = 'device') {
  let timeMs = Date.UTC(2026, 4, 14, 9, 30);
  let made = 0;
  const now = () => (timeMs += 1000);
  const newId = () => `${name}-${++made}`;
  const connection = new Connection(report);
  const checker = () => Promise.resolve(surveyFromJson);
  return {
    connection,
    surveys: surveyDatabase({ connection, checker, now, newId }),
    weather: weatherDatabase(connection, now),
    photos: photoDatabase(connection, now),
    backup: backupDatabase({ connection, checker, now }),
    drafts: draftDatabase(connection),
    hash: sha256Of,
    now,
    setClock: (ms: number) => (timeMs = ms),
  };
}
