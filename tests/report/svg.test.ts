import { describe, expect, it } from 'vitest';
import type { Picture } from '../../src/report/marks.ts';
import { svgText } from '../../src/report/painters/svg.ts';
import { hatchFor } from '../../src/report/pictures/hatches.ts';

const square = [0, 0, 10, 0, 10, 10, 0, 10];
const hatched = (count: number): Picture => ({
  width: 10,
  height: 10,
  marks: Array.from({ length: count }, (_, i) => ({
    kind: 'path' as const,
    lines: [square],
    closed: true,
    fill: { hatch: hatchFor(i) },
  })),
});

describe('the SVG painter', () => {
  it('gives every hatch one id of its own and uses no other', () => {
    const svg = svgText(hatched(30), { idPrefix: 'a' });
    const ids = [...svg.matchAll(/<pattern id="([^"]+)"/g)].map(([, id]) => id);
    const used = [...svg.matchAll(/url\(#([^)]+)\)/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(30);
    expect(new Set(used)).toEqual(new Set(ids));
  });

  it('defines a hatch once, however often it is used', () => {
    const twice = { ...hatched(1), marks: [...hatched(1).marks, ...hatched(1).marks] };
    expect(svgText(twice, { idPrefix: 'a' }).match(/<pattern/g)).toHaveLength(1);
  });

  it('keeps two pictures on one page apart by their prefix', () => {
    const [a, b] = ['a', 'b'].map((idPrefix) => svgText(hatched(2), { idPrefix }));
    const idsOf = (svg: string) => [...svg.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id);
    expect(idsOf(a).filter((id) => idsOf(b).includes(id))).toEqual([]);
  });

  it('takes a name from a survey as text, never as markup', () => {
    const svg = svgText(
      {
        width: 9,
        height: 9,
        marks: [{ kind: 'text', x: 0, y: 0, size: 9, text: '</text><script>"&\u0007' }],
      },
      { idPrefix: 'a' },
    );
    expect(svg).toContain('>&lt;/text&gt;&lt;script&gt;&quot;&amp;</text>');
    expect(svg).not.toContain('<script');
  });

  it('uses plain attributes only: no style sheet, no class', () => {
    expect(svgText(hatched(3), { idPrefix: 'a' })).not.toMatch(/<style|style=|class=/);
  });
});

describe('hatches', () => {
  it('differ for the first thirty obstructions, crossed ones by less than a right angle too', () => {
    const look = (place: number) => {
      const { angle, spacing, width, crossed } = hatchFor(place);
      return JSON.stringify([crossed ? angle % 90 : angle % 180, spacing, width, crossed ?? false]);
    };
    expect(new Set(Array.from({ length: 30 }, (_, i) => look(i))).size).toBe(30);
  });
});
