import type { AppErrorCode } from '../../../app/app-error.ts';
import { ERROR_MESSAGES } from '../../messages.ts';

/** What was not done with a file, why, and what helps. */
export function NotDone({ what, code }: { what: string; code: AppErrorCode }) {
  const { what: why, remedy } = ERROR_MESSAGES[code];
  return (
    <p>
      {what} {why} {remedy}
    </p>
  );
}
