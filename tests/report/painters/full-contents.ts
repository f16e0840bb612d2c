import type { Block, ReportContents } from '../../../src/report/contents/report-contents.ts';
import type { Picture } from '../../../src/report/marks.ts';
import { hatchFor } from '../../../src/report/pictures/hatches.ts';

/** A picture with every kind of mark; `text` is written in it. */
export const somePicture = (text: string, width = 640): Picture => ({
  width,
  height: 260,
  marks: [
    { kind: 'path', lines: [[10, 240, 630, 240]], pen: { tone: 'ink', width: 1.5 } },
    {
      kind: 'path',
      lines: [[60, 240, 120, 90, 180, 240]],
      closed: true,
      fill: { hatch: hatchFor(0) },
      pen: { tone: 'ink', width: 1 },
    },
    { kind: 'dots', at: [300, 60, 310, 64, 320, 70], radius: 3, tone: 'ink' },
    {
      kind: 'clip',
      x: 340,
      y: 20,
      width: 200,
      height: 150,
      marks: [
        {
          kind: 'path',
          lines: [[330, 10, 700, 10, 700, 300]],
          closed: true,
          fill: { tone: 'faint', opacity: 0.4 },
        },
      ],
    },
    { kind: 'text', x: 120, y: 80, size: 13, anchor: 'middle', text, rim: true },
  ],
});

/** One block of every kind, each with `text` wherever a text stands. */
export const everyBlock = (text: string): Block[] => [
  { kind: 'answer', text },
  { kind: 'key-figures', figures: [{ label: text, value: '94 %', range: '92 % to 96 %', note: text }] },
  { kind: 'paragraph', text },
  { kind: 'paragraph', text, small: true },
  { kind: 'subheading', text },
  { kind: 'picture', picture: somePicture(text), caption: text, alternative: text },
  {
    kind: 'table',
    table: {
      caption: text,
      columns: [{ head: text }, { head: text, number: true }, { head: '' }],
      rows: [[text, '1', text]],
      sums: [[text, '2', '']],
    },
  },
  { kind: 'list', items: [text, text] },
  { kind: 'pairs', pairs: [{ term: text, text }] },
  { kind: 'caution', heading: text, items: [text] },
  {
    kind: 'photos',
    photos: [
      { image: null, caption: text, alternative: text },
      {
        image: { type: 'image/jpeg', bytes: new Uint8Array([255, 216, 255, 217]), width: 400, height: 300 },
        caption: text,
        alternative: text,
      },
    ],
  },
];

/** A report with every kind of block in both parts, and `text` in every place that takes one. */
export const fullContents = (text: string, changes: Partial<ReportContents> = {}): ReportContents => ({
  language: 'en-GB',
  paper: 'a4',
  title: text,
  firm: { name: text, lines: [text, text], colour: '#7a1f2b' },
  about: [text, text],
  sections: [
    { id: 'first', part: 'letter', heading: text, blocks: everyBlock(text) },
    { id: 'second', part: 'letter', heading: text, startsPage: true, blocks: everyBlock(text) },
    { id: 'third', part: 'evidence', heading: text, startsPage: true, blocks: everyBlock(text) },
  ],
  foot: text,
  frame: {
    contents: 'What is in this report',
    page: (page, pages) => `Page ${page} of ${pages}`,
    letter: 'The letter',
    evidence: 'The evidence',
    boxes: 'A box stands for a letter.',
  },
  ...changes,
});
