import { fieldBook } from './evidence/field-book.ts';
import { headingEvidence } from './evidence/heading-evidence.ts';
import { method } from './evidence/method.ts';
import { monthTables } from './evidence/month-tables.ts';
import { obstructionCosts } from './evidence/obstruction-costs.ts';
import { photoPages } from './evidence/photo-pages.ts';
import { planesAndStations } from './evidence/planes-and-stations.ts';
import { programmeTable } from './evidence/programme-table.ts';
import { siteFacts } from './evidence/site-facts.ts';
import { atAGlance } from './letter/at-a-glance.ts';
import { cautions } from './letter/cautions.ts';
import { compared } from './letter/compared.ts';
import { howItMayChange } from './letter/how-it-may-change.ts';
import { howSure } from './letter/how-sure.ts';
import { monthByMonth } from './letter/month-by-month.ts';
import { sunAndRoof } from './letter/sun-and-roof.ts';
import { whatCouldBeDone } from './letter/what-could-be-done.ts';
import { whatToExpect } from './letter/what-to-expect.ts';
import type { SectionKind } from './section-kind.ts';

const LETTER: readonly SectionKind[] = [
  atAGlance,
  sunAndRoof,
  monthByMonth,
  whatCouldBeDone,
  whatToExpect,
  howItMayChange,
  compared,
  howSure,
  cautions,
];

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
