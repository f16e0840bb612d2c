import { expect, it } from 'vitest';
import type { Mark } from '../../../src/report/marks.ts';
import { reportOf } from '../report-of.ts';
import { sampleSurvey, underClearSky } from '../sample-shades.ts';
import { letterOf } from './letter-of.ts';

const sizesIn = (marks: readonly Mark[]): number[] =>
  marks.flatMap((mark) =>
    mark.kind === 'text' ? [mark.size] : mark.kind === 'clip' ? sizesIn(mark.marks) : [],
  );

/** On a phone of 390 pixels a picture fills the width but for a quarter of a rem, 17 pixels, on each side. */
const PHONE = 390 - 2 * 0.25 * 17;

it.each(['suburban-maple-and-gable.json', 'flat-roof-parapet.json'])(
  'words in the pictures of the letter of %s are over ten pixels high on a phone',
  async (file) => {
    const blocks = letterOf(await reportOf(underClearSky(sampleSurvey(file)))).flatMap((one) => one.blocks);
    const pictures = blocks.flatMap((block) => (block.kind === 'picture' ? [block.picture] : []));
    expect(pictures.length).toBeGreaterThan(2);
    for (const { marks, width } of pictures)
      expect((Math.min(...sizesIn(marks)) * PHONE) / width).toBeGreaterThan(10);
  },
);
