import type { TranspositionId } from '../survey/survey.ts';
import { hayDavies } from './hay-davies.ts';
import { isotropic } from './isotropic.ts';
import { perez } from './perez.ts';
import type { Transposition } from './transposition.ts';

/** The ways of laying sky light on a plane, the default first; screens and commands list these rows. */
export const TRANSPOSITIONS: readonly Transposition[] = [hayDavies, perez, isotropic];

/** Throws RangeError for an id that is not in the table. */
export function transpositionOf(id: TranspositionId): Transposition {
  const found = TRANSPOSITIONS.find((model) => model.id === id);
  if (!found)
    throw new RangeError(
      `transposition must be one of ${TRANSPOSITIONS.map((m) => m.id).join(', ')}, got ${id}`,
    );
  return found;
}
