import type { SightingDirection } from '../../../core/survey/sighting-direction.ts';
import type { SightingList } from '../../../core/survey/sighting-edits.ts';
import type { Sighting } from '../../../core/survey/survey.ts';

/** What is being typed in the field book. */
export type BookEdit =
  | {
      what: 'sighting';
      list: SightingList;
      sighting: Sighting;
      direction: SightingDirection | null;
      /** Its number in the table. */
      number: number;
    }
  | { what: 'new-sighting'; list: SightingList; after: string | null; name: string }
  | { what: 'trace' };
