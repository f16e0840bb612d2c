import { describe, expect, test } from 'vitest';
import type { Mark, Picture } from '../../../src/report/marks.ts';
import { hourBars } from '../../../src/report/pictures/hour-bars.ts';
import { obstructionShapes } from '../../../src/report/pictures/horizon-obstructions.ts';
import { monthColumns } from '../../../src/report/pictures/month-columns.ts';
import { monthTicks } from '../../../src/report/pictures/month-ticks.ts';
import type { PictureWords } from '../../../src/report/pictures/picture-words.ts';
import { planView } from '../../../src/report/pictures/plan-view.ts';
import type { RoofBar } from '../../../src/report/pictures/roof-bars.ts';
import { roofBars } from '../../../src/report/pictures/roof-bars.ts';
import { smoothDensity } from '../../../src/report/pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../../src/report/pictures/sun-lines.ts';
import { unrolledHorizon } from '../../../src/report/pictures/unrolled-horizon.ts';
import { sampleShade } from '../sample-shades.ts';

/** A language in which every word is marked, so that an English one would show. */
const MARKED: PictureWords = {
  months: Array.from({ length: 12 }, (_, i) => `m${i + 1}¤`),
  initials: Array.from({ length: 12 }, (_, i) => `${i + 1}¤`),
  compass: Array.from({ length: 8 }, (_, i) => `c${i}¤`),
  unseen: 'unseen¤',
  gone: (name) => `${name} gone¤`,
  lower: (name) => `${name} lower¤`,
  number: (value) => `${value}¤`,
  hour: (hour) => `${hour}h¤`,
};

const textsOf = (marks: readonly Mark[]): string[] =>
  marks.flatMap((mark) =>
    mark.kind === 'text' ? [mark.text] : mark.kind === 'clip' ? textsOf(mark.marks) : [],
  );
/** Degrees need no language. */
const unmarked = ({ marks }: Picture) => textsOf(marks).filter((text) => !/¤|^\d+°$/.test(text));

describe('a picture writes nothing but the words it is given', () => {
  test('the unrolled horizon, the plan, months and hours', async () => {
    const { survey, shade } = await sampleShade('suburban-maple-and-gable.json');
    const names = new Map(survey.obstructions.map(({ id }) => [id, `${id}¤`]));
    const days = dayLines(survey.site, MARKED);
    const horizon = {
      site: survey.site,
      shade,
      density: smoothDensity(shade.density),
      days,
      hours: hourLines(survey.site),
      names,
      width: 640,
      height: 340,
      whole: true,
    };
    const whole = unrolledHorizon(horizon, MARKED);
    const plain = unrolledHorizon({ ...horizon, plain: true }, MARKED);
    const { monthly, hourly } = shade.unshaded;
    const columns = { unshaded: monthly, measured: monthly, imagined: null, width: 640, height: 200 };
    const pictures = [
      whole,
      plain,
      monthColumns(columns, MARKED),
      monthColumns({ ...columns, width: 300 }, MARKED),
      hourBars({ unshaded: hourly, access: shade.measured.solarAccess.hourly, width: 400 }, MARKED),
      monthTicks(shade.measured.solarAccess.monthly, 1, MARKED),
      planView(
        { shapes: obstructionShapes(shade.profile, names, null), days, surfaceAzimuth: 180, size: 200 },
        MARKED,
      ),
    ];
    for (const picture of pictures) {
      expect(textsOf(picture.marks).length).toBeGreaterThan(1);
      expect(unmarked(picture)).toEqual([]);
    }
    const numbers = (picture: Picture) => textsOf(picture.marks).filter((text) => /^\d+¤$/.test(text));
    expect(numbers(whole).length).toBeGreaterThan(0);
    expect(numbers(plain)).toEqual([]);
  });
});

describe('bars of the roofs', () => {
  const bar = (change: Partial<RoofBar> = {}): RoofBar => ({
    name: 'South roof',
    unshaded: 1000,
    access: 0.75,
    interval: { low: 0.7, high: 0.8 },
    value: '75 %',
    ...change,
  });
  const draw = (bars: RoofBar[]) => roofBars({ bars, axis: 'kWh/m² a year', width: 640 });
  const widths = ({ marks }: Picture, isOf: (mark: Mark) => boolean): number[] =>
    marks.flatMap((mark) => {
      if (mark.kind !== 'path' || !isOf(mark)) return [];
      const xs = mark.lines.flatMap((line) => line.filter((_, i) => i % 2 === 0));
      return [Math.max(...xs) - Math.min(...xs)];
    });
  const isInk = (mark: Mark) =>
    mark.kind === 'path' && !!mark.fill && 'tone' in mark.fill && mark.fill.tone === 'ink';
  const isHatched = (mark: Mark) => mark.kind === 'path' && !!mark.fill && 'hatch' in mark.fill;
  const isWhisker = (mark: Mark) => mark.kind === 'path' && mark.pen?.width === 1.6;
  const isBroken = (mark: Mark) => mark.kind === 'path' && !!mark.pen?.dash;

  test('ink, hatch and whisker are as long as what arrives, what is taken, and the range', () => {
    const picture = draw([bar()]);
    const [ink] = widths(picture, isInk);
    const [hatched] = widths(picture, isHatched);
    expect(ink / (ink + hatched)).toBeCloseTo(0.75, 9);
    expect(widths(picture, isWhisker)[0] / (ink + hatched)).toBeCloseTo(0.1, 9);
  });

  test('one scale for all: half the light, half the bar', () => {
    const [longer, shorter] = widths(draw([bar(), bar({ unshaded: 500 })]), isInk);
    expect(shorter / longer).toBeCloseTo(0.5, 9);
  });

  test('a roof that nobody measured is an empty, broken outline without a whisker', () => {
    const picture = draw([bar(), bar({ access: null, interval: null, value: 'not measured' })]);
    expect(widths(picture, isBroken)).toHaveLength(1);
    expect(widths(picture, isInk)).toHaveLength(1);
    expect(widths(picture, isWhisker)).toHaveLength(1);
    expect(textsOf(picture.marks)).toContain('not measured');
  });

  test('six roofs take no more room than a page has beside the figures', () => {
    const picture = draw(Array.from({ length: 6 }, (_, i) => bar({ name: `Roof ${i}` })));
    expect(picture.height / picture.width).toBeLessThan(0.32);
    expect(textsOf(picture.marks)).toEqual(expect.arrayContaining(['Roof 0', 'Roof 5']));
    const [ink] = widths(picture, isInk);
    const [hatched] = widths(picture, isHatched);
    expect(ink / (ink + hatched)).toBeCloseTo(0.75, 9);
  });

  test('stays on its sheet: six roofs, names and values without end, no light at all', () => {
    const long = bar({ name: 'x'.repeat(300), value: 'nicht gemessen '.repeat(3) });
    for (const picture of [
      draw(Array.from({ length: 6 }, () => long)),
      draw([bar({ unshaded: 0, access: 0 })]),
    ]) {
      for (const mark of picture.marks)
        if (mark.kind === 'path')
          for (const line of mark.lines)
            line.forEach((at, i) => {
              expect(at).toBeGreaterThanOrEqual(0);
              expect(at).toBeLessThanOrEqual(i % 2 ? picture.height : picture.width);
            });
      expect(textsOf(picture.marks).every((text) => text.length < 120)).toBe(true);
    }
  });
});
