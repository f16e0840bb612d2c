/** The one table of what device, storage and network can refuse. `ui/messages.ts` turns each code into sentences. */
export const APP_ERROR_CODES = [
  /** The browser does not let this page store anything (private window, site data blocked). */
  'storage-refused',
  /** No room left on the device. */
  'storage-full',
  /** The database connection was lost and could not be had again. */
  'storage-lost',
  /** Another tab holds an older database open; waiting for it. */
  'storage-waiting',
  /** A newer version of the app, in another tab, took the database over; this tab let go of it. */
  'storage-taken-over',
  /** The database was written by a newer version of the app than this one. */
  'storage-newer',
  /** The survey is not on this device. */
  'survey-missing',
  /** A survey with this id is on this device already. */
  'survey-exists',
  /** A stored raw reading would have been put over by another one of the same id. */
  'reading-conflict',
  /** The stored survey cannot be read by this version, so it cannot be changed either. */
  'survey-unreadable',
  /** The survey could not be read after the change, so it was not made; the cause says why. */
  'change-refused',
  /** The picked file could not be read from the device. */
  'file-unreadable',
  /** Files are being imported already. */
  'import-running',
  /** A part of the app did not load. */
  'part-missing',
  'report-not-written',
  /** None of the above; the cause says what. */
  'unexpected',
] as const;

export type AppErrorCode = (typeof APP_ERROR_CODES)[number];

/** An error with a code from the table; `cause` keeps what the browser said. */
export class AppError extends Error {
  readonly code: AppErrorCode;

  constructor(code: AppErrorCode, cause?: unknown) {
    super(code, { cause });
    this.name = 'AppError';
    this.code = code;
  }
}

/** The error as one of the table; anything unknown is `unexpected`. */
export function asAppError(error: unknown): AppError {
  return error instanceof AppError ? error : new AppError('unexpected', error);
}
