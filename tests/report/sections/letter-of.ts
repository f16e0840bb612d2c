import { assert } from 'vitest';
import type { Block, Section } from '../../../src/report/contents/report-contents.ts';
import { reportContents } from '../../../src/report/report-contents.ts';
import type { ReportInput } from '../../../src/report/report-input.ts';

export const letterOf = (report: ReportInput): Section[] =>
  reportContents(report).sections.filter(({ part }) => part === 'letter');

export function letterSection(report: ReportInput, id: string): Section {
  const section = letterOf(report).find((one) => one.id === id);
  assert(section, `the letter has no section ${id}`);
  return section;
}

/** Every text of a block, without what is drawn. */
export function textsOf(block: Block): string[] {
  switch (block.kind) {
    case 'answer':
    case 'paragraph':
    case 'subheading':
      return [block.text];
    case 'key-figures':
      return block.figures.flatMap(({ label, value, range, note }) => [label, value, range ?? '', note]);
    case 'picture':
      return [block.caption, block.alternative];
    case 'table': {
      const { caption, columns, rows, sums = [] } = block.table;
      return [caption, ...columns.map(({ head }) => head), ...rows.flat(), ...sums.flat()];
    }
    case 'list':
      return block.items;
    case 'pairs':
      return block.pairs.flatMap(({ term, text }) => [term, text]);
    case 'caution':
      return [block.heading, ...block.items];
    case 'photos':
      return block.photos.flatMap(({ caption, alternative }) => [caption, alternative]);
  }
}

/** The sentences a homeowner reads from left to right: no tables, no labels. */
export const runningText = (section: Section): string[] => [
  section.heading,
  ...section.blocks.flatMap((block) =>
    block.kind === 'picture'
      ? [block.caption]
      : ['answer', 'paragraph', 'list', 'caution'].includes(block.kind)
        ? textsOf(block)
        : [],
  ),
];

/** The letter as lines of text, a heading a line, a table row a line; pictures by their captions. */
export function letterText(report: ReportInput): string {
  return letterOf(report)
    .flatMap(({ heading, blocks }) => ['', heading, ...blocks.flatMap(linesOf)])
    .join('\n')
    .trim()
    .concat('\n');
}

export function linesOf(block: Block): string[] {
  if (block.kind === 'table') {
    const { caption, columns, rows, sums = [] } = block.table;
    return [caption, ...[columns.map(({ head }) => head), ...rows, ...sums].map((row) => row.join(' | '))];
  }
  if (block.kind === 'key-figures')
    return block.figures.map(
      ({ label, value, range, note }) => `${label}: ${value} (${range ?? '-'}) ${note}`,
    );
  return textsOf(block);
}
