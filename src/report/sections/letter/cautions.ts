import type { SectionKind } from '../section-kind.ts';

/** Where the work can hurt someone, who decides, and what the letter is not. */
export const cautions: SectionKind = {
  id: 'cautions',
  part: 'letter',
  startsPage: true,
  write: (_report, { words }) => ({
    heading: words['cautions.heading'],
    blocks: [
      { kind: 'answer', text: words['cautions.answer'] },
      {
        kind: 'caution',
        heading: words['cautions.roof'],
        items: [words['cautions.roof-fall'], words['cautions.roof-wet'], words['cautions.roof-lines']],
      },
      {
        kind: 'caution',
        heading: words['cautions.power'],
        items: [words['cautions.power-light'], words['cautions.power-licensed']],
      },
      { kind: 'caution', heading: words['cautions.sun'], items: [words['cautions.sun-look']] },
      { kind: 'paragraph', text: words['cautions.codes'] },
      { kind: 'paragraph', text: words['cautions.not'] },
    ],
  }),
};
