import { AppError } from '../app/app-error.ts';
import { databaseError, openingError } from './database-error.ts';
import { openDatabase, type Database } from './open-database.ts';

/** What the connection tells the app; null means that all is well again. */
export type ConnectionReport = (state: 'storage-waiting' | 'storage-taken-over' | null) => void;

/**
 * The one connection of this tab: opened on first use, opened again once where the browser lost it, and never again
 * after a newer version of the app took the database over.
 */
export class Connection {
  #database: Promise<Database> | null = null;
  #takenOver = false;
  readonly #report: ConnectionReport;

  constructor(report: ConnectionReport) {
    this.#report = report;
  }

  /** Runs work on the database. Work may run twice, so it must be one transaction or only reading. */
  async run<T>(work: (database: Database) => Promise<T>): Promise<T> {
    try {
      return await this.#once(work);
    } catch (error) {
      const known = databaseError(error);
      if (known.code !== 'storage-lost' || this.#takenOver) throw this.#told(known);
    }
    // Some phones drop the connection of an app that slept: open anew, and try once more.
    await this.close();
    try {
      return await this.#once(work);
    } catch (error) {
      throw this.#told(databaseError(error));
    }
  }

  async close(): Promise<void> {
    const closing = this.#database;
    this.#database = null;
    await closing?.then(
      (database) => database.close(),
      () => undefined,
    );
  }

  async #once<T>(work: (database: Database) => Promise<T>): Promise<T> {
    if (this.#takenOver) throw new AppError('storage-taken-over');
    return work(await this.#open());
  }

  #told(error: AppError): AppError {
    return this.#takenOver ? new AppError('storage-taken-over', error) : error;
  }

  #open(): Promise<Database> {
    this.#database ??= openDatabase({
      waiting: () => this.#report('storage-waiting'),
      opened: () => this.#report(null),
      takenOver: () => {
        this.#takenOver = true;
        this.#report('storage-taken-over');
      },
      lost: () => (this.#database = null),
    }).catch((error: unknown) => {
      this.#database = null;
      throw openingError(error);
    });
    return this.#database;
  }
}
