import { atAGlance } from './at-a-glance.ts';
import { compared } from './compared.ts';
import { fieldBook } from './evidence/field-book.ts';
import { headingEvidence } from './evidence/heading-evidence.ts';
import { method } from './evidence/method.ts';
import { monthTables } from './evidence/month-tables.ts';
import { obstructionCosts } from './evidence/obstruction-costs.ts';
import { photoPages } from './evidence/photo-pages.ts';
import { planesAndStations } from './evidence/planes-and-stations.ts';
import { programmeTable } from './evidence/programme-table.ts';
import { siteFacts } from './evidence/site-facts.ts';
import type { SectionKind } from './section-kind.ts';

const LETTER: readonly SectionKind[] = [atAGlance, compared];

const EVIDENCE: readonly SectionKind[] = [
  programmeTable,
  planesAndStations,
  obstructionCosts,
  monthTables,
  fieldBook,
  headingEvidence,
  siteFacts,
  photoPages,
  method,
];

/** The sections in the order of the report: the letter, then the evidence. */
export const SECTIONS: readonly SectionKind[] = [...LETTER, ...EVIDENCE];
