import { atAGlance } from './at-a-glance.ts';
import type { SectionKind } from './section-kind.ts';

/** The sections in the order of the report: the letter, then the evidence. */
export const SECTIONS: readonly SectionKind[] = [atAGlance];
