import type { ObstructionProspects } from '../../../core/shading/prospects.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { ObstructionKind } from '../../../core/survey/survey.ts';
import type { ReportInput } from '../../report-input.ts';

/** What a person could sensibly do about a kind of thing; what is not here is taken to stay. */
const CHANGES: Partial<Record<ObstructionKind, 'trim' | 'move'>> = {
  'deciduous-tree': 'trim',
  'evergreen-tree': 'trim',
  mast: 'move',
  other: 'move',
};

export type Change = 'trim' | 'move' | 'stays';

/** Whether an obstruction could be trimmed or moved, or stays. */
export function changeOf({ survey }: ReportInput): (id: string) => Change {
  const known = obstructionsById(survey);
  return (id) => CHANGES[known.get(id)?.kind ?? 'building'] ?? 'stays';
}

/** Whether the distance to an obstruction is known. */
export function hasDistance({ survey }: ReportInput): (row: Pick<ObstructionProspects, 'id'>) => boolean {
  const known = obstructionsById(survey);
  return ({ id }) => known.get(id)?.distance !== undefined;
}
