import type { Part, Section } from '../contents/report-contents.ts';
import type { ReportInput } from '../report-input.ts';
import type { Speech } from '../speech.ts';

/** One section of the report: one file and a row in `section-table.ts`. */
export interface SectionKind {
  id: string;
  part: Part;
  startsPage?: boolean;
  /** Null where the survey gives it nothing to say; it is then left out. */
  write: (report: ReportInput, speech: Speech) => Pick<Section, 'heading' | 'blocks'> | null;
}
