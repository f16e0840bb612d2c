import { createHash } from 'node:crypto';
import { canonicalText } from '../core/survey/canonical-text.ts';
import type { Survey } from '../core/survey/survey.ts';

/** SHA-256 of a survey's document, hexadecimal: the same on every device, another for a changed copy. */
export const fingerprintOf = (survey: Survey): string =>
  createHash('sha256').update(canonicalText(survey), 'utf8').digest('hex');
