import { openDB, type IDBPDatabase } from 'idb';
import { DATABASE_NAME, DATABASE_VERSION, type NoonmarkSchema } from './schema.ts';

export type Database = IDBPDatabase<NoonmarkSchema>;

/** What happens to the connection besides being used. */
export interface ConnectionListener {
  /** Another tab holds an older version open; opening goes on once it lets go. */
  waiting(): void;
  opened(): void;
  /** A newer version of the app wants the database; this connection has been closed for it. */
  takenOver(): void;
  /** The browser ended the connection. */
  lost(): void;
}

/** The step at index n brings the stores from version n to n + 1. */
const UPGRADES: ((database: Database) => void)[] = [
  (database) => {
    database.createObjectStore('surveys', { keyPath: 'id' });
    database.createObjectStore('fields', { keyPath: ['survey', 'path'] });
    database.createObjectStore('readings', { keyPath: ['survey', 'id'] });
    database.createObjectStore('erased', { keyPath: 'id' });
    database.createObjectStore('weather-files', { keyPath: 'sha256' });
    database.createObjectStore('weather-bytes', { keyPath: 'sha256' });
    database.createObjectStore('device', { keyPath: 'name' });
  },
  (database) => {
    database.createObjectStore('history', { keyPath: ['survey', 'number'] });
    database.createObjectStore('photos', { keyPath: 'sha256' });
  },
  (database) => {
    database.createObjectStore('drafts', { keyPath: ['survey', 'form'] });
  },
];

/** Opens the database, bringing its stores up to this version. */
export async function openDatabase(listener: ConnectionListener): Promise<Database> {
  let opened: Database | null = null;
  const database = await openDB<NoonmarkSchema>(DATABASE_NAME, DATABASE_VERSION, {
    upgrade: (upgrading, oldVersion) => UPGRADES.slice(oldVersion).forEach((step) => step(upgrading)),
    blocked: () => listener.waiting(),
    blocking: () => {
      // Holding on would keep the newer tab from starting; nothing is lost, each act is committed already.
      opened?.close();
      listener.takenOver();
    },
    terminated: () => listener.lost(),
  });
  opened = database;
  listener.opened();
  return database;
}
