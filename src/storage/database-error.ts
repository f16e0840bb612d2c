import { AppError, asAppError, type AppErrorCode } from '../app/app-error.ts';

const CODES: Record<string, AppErrorCode> = {
  QuotaExceededError: 'storage-full',
  SecurityError: 'storage-refused',
  NotAllowedError: 'storage-refused',
  VersionError: 'storage-newer',
  InvalidStateError: 'storage-lost',
  UnknownError: 'storage-lost',
  TransactionInactiveError: 'storage-lost',
  // A transaction ends so when its connection goes, and also when room runs out without being named.
  AbortError: 'storage-lost',
};

function nameOf(error: unknown): string {
  return error instanceof Error || error instanceof DOMException ? error.name : '';
}

/** What the database said, as a code of the table. */
export function databaseError(error: unknown): AppError {
  const code = CODES[nameOf(error)];
  return code ? new AppError(code, error) : asAppError(error);
}

/**
 * An error while opening: a lost connection may come back and a full or newer database says so; anything else means
 * that the browser does not let the page store anything (some private windows have no database at all).
 */
export function openingError(error: unknown): AppError {
  if (nameOf(error) === 'UnknownError') return new AppError('storage-lost', error);
  const known = databaseError(error);
  const told = known.code === 'storage-full' || known.code === 'storage-newer';
  return told ? known : new AppError('storage-refused', error);
}
