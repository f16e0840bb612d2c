import { fc, it as property } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { tableWidths } from '../../../src/report/painters/pdf/blocks/table-widths.ts';
import { hatchShapes } from '../../../src/report/painters/pdf/hatch-strokes.ts';
import { paginate } from '../../../src/report/painters/pdf/paginate.ts';
import type { Slug } from '../../../src/report/painters/pdf/slug.ts';
import { STYLES } from '../../../src/report/painters/pdf/text-style.ts';
import { Typesetter } from '../../../src/report/painters/pdf/typesetter.ts';
import { wrapText } from '../../../src/report/painters/pdf/wrap-text.ts';
import { fontsOnDisk } from './pdf-fonts-on-disk.ts';

const setter = new Typesetter(fontsOnDisk(), undefined);
const style = STYLES.body;
const solid = (text: string) => text.replace(/ /g, '');

describe('lines of a text', () => {
  const words = fc.array(fc.string({ unit: 'grapheme', minLength: 1, maxLength: 40 }), { maxLength: 20 });

  property.prop([words, fc.integer({ min: 30, max: 480 })])(
    'lose no letter and are no wider than asked',
    (some, width) => {
      const text = some.join(' ');
      const lines = wrapText(text, width, style, setter);
      const whole = wrapText(text, Infinity, style, setter).join('');
      expect(solid(lines.join(''))).toBe(solid(whole));
      for (const line of lines) expect(setter.width(line, style)).toBeLessThanOrEqual(width + 1e-6);
    },
  );

  it('break at spaces and behind hyphens, never between a number and its unit', () => {
    const within = (text: string, widest: string) =>
      wrapText(text, setter.width(widest, style) + 1, style, setter);
    expect(within('sum of 1234\u00a0kWh/m²', '1234\u00a0kWh/m²')).toEqual(['sum of', '1234\u00a0kWh/m²']);
    expect(within('sum of 1234 kWh/m²', 'sum of 1234')).toEqual(['sum of 1234', 'kWh/m²']);
    expect(within('South-facing', 'South-')).toEqual(['South-', 'facing']);
  });

  it('break a name of ten thousand letters', () => {
    const lines = wrapText('W'.repeat(10_000), 450, style, setter);
    expect(lines.join('')).toHaveLength(10_000);
    expect(lines.length).toBeGreaterThan(100);
  });
});

describe('pages', () => {
  const HEIGHT = 100;
  const slug = fc.record({
    height: fc.integer({ min: 1, max: 120 }),
    gap: fc.integer({ min: 0, max: 20 }),
    keep: fc.boolean(),
    startsPage: fc.boolean(),
  });
  const painted = (plain: Pick<Slug, 'height'> & Partial<Slug>): Slug => ({
    ...plain,
    paint: () => undefined,
  });

  property.prop([fc.array(slug, { maxLength: 40 })])(
    'hold every slug once, in order, below one another',
    (some) => {
      const slugs = some.map(painted);
      const pages = paginate(slugs, HEIGHT);
      expect(pages.flat().map(({ slug: placed }) => placed)).toEqual(slugs);
      for (const page of pages)
        page.forEach(({ slug: placed, y }, place) => {
          const above = page[place - 1];
          expect(y).toBe(above ? above.y + above.slug.height + (placed.gap ?? 0) : 0);
          if (place > 0) expect(y + placed.height).toBeLessThanOrEqual(HEIGHT);
          if (placed.startsPage && place > 0) expect(above.slug).toBeUndefined();
        });
    },
  );

  it('keep a heading with what follows', () => {
    const [text, heading, row] = [{ height: 80 }, { height: 15, keep: true }, { height: 30 }].map(painted);
    expect(paginate([text, heading, row], HEIGHT).map((page) => page.length)).toEqual([1, 2]);
  });

  it('have the heads of a table again where its rows go on', () => {
    const head = painted({ height: 20 });
    const rows = Array.from({ length: 10 }, () => painted({ height: 30, repeat: [head] }));
    const pages = paginate([{ ...head, keep: true }, ...rows], HEIGHT);
    expect(pages.map((page) => page.length)).toEqual([3, 3, 3, 3, 3]);
    for (const page of pages.slice(1)) expect(page[0].slug).toBe(head);
  });
});

describe('columns of a table', () => {
  const need = fc
    .record({ word: fc.integer({ min: 5, max: 200 }), more: fc.integer({ min: 0, max: 400 }) })
    .map(({ word, more }) => ({ word, whole: word + more }));

  property.prop([fc.array(need, { minLength: 1, maxLength: 14 }), fc.integer({ min: 200, max: 500 })])(
    'fill the width, and none is narrower than its longest word where there is room for all',
    (needs, width) => {
      const widths = tableWidths(needs, width);
      const sum = widths.reduce((total, one) => total + one, 0);
      const words = needs.reduce((total, { word }) => total + word, 0);
      expect(sum).toBeLessThanOrEqual(width + 1e-6);
      expect(Math.min(...widths)).toBeGreaterThan(0);
      if (words > width) return;
      expect(sum).toBeCloseTo(width, 6);
      widths.forEach((one, column) => expect(one).toBeGreaterThanOrEqual(needs[column].word - 1e-9));
    },
  );
});

describe('a hatch', () => {
  const HATCH = { angle: 0, spacing: 6, width: 1, tone: 'ink' } as const;

  it('has upright strokes in the middle of each tile, over all of the box', () => {
    const { strokes } = hatchShapes(HATCH, [10, 10, 22, 30]);
    expect(strokes.map(([x]) => x)).toEqual([9, 15, 21, 27]);
    for (const [, top, , bottom] of strokes) expect([top, bottom]).toEqual([10, 30]);
  });

  it('is turned clockwise, y being down: a quarter turn makes upright strokes level', () => {
    const { strokes } = hatchShapes({ ...HATCH, angle: 90 }, [0, 0, 12, 12]);
    for (const [, y1, , y2] of strokes) expect(y1).toBeCloseTo(y2, 9);
    const [x1, y1, x2, y2] = hatchShapes({ ...HATCH, angle: 45 }, [0, 0, 60, 60]).strokes[8];
    expect((y2 - y1) / (x2 - x1)).toBeCloseTo(-1, 9);
  });

  it('crossed has as many strokes the other way on a square, ringed has rings instead', () => {
    const box = [0, 0, 36, 36];
    const single = hatchShapes(HATCH, box).strokes.length;
    expect(hatchShapes({ ...HATCH, crossed: true }, box).strokes).toHaveLength(2 * single);
    const { strokes, rings } = hatchShapes({ ...HATCH, ringed: true }, box);
    expect(strokes).toEqual([]);
    expect(rings).toHaveLength(2 * single * single);
  });
});
