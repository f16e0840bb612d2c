import { beforeAll, describe, expect, it } from 'vitest';
import type { HorizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import type { StationShade } from '../../src/core/shading/station-shade.ts';
import { changedProfile } from '../../src/core/shading/what-if.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import type { Mark, TextMark } from '../../src/report/marks.ts';
import { textWidth } from '../../src/report/marks.ts';
import { svgText } from '../../src/report/painters/svg.ts';
import { overlap } from '../../src/report/pictures/label-places.ts';
import { obstructionShapes } from '../../src/report/pictures/horizon-obstructions.ts';
import { monthColumns } from '../../src/report/pictures/month-columns.ts';
import { hourBars } from '../../src/report/pictures/hour-bars.ts';
import { planView } from '../../src/report/pictures/plan-view.ts';
import { xOf } from '../../src/report/pictures/sky-frame.ts';
import { smoothDensity } from '../../src/report/pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../src/report/pictures/sun-lines.ts';
import { unrolledHorizon } from '../../src/report/pictures/unrolled-horizon.ts';
import { SAMPLE_FILES, sampleShade } from './sample-shades.ts';

const SHEETS = [
  { width: 328, height: 300, whole: false },
  { width: 358, height: 300, whole: true },
  { width: 860, height: 480, whole: false },
];

const textsOf = (marks: readonly Mark[]): TextMark[] =>
  marks.flatMap((mark) => (mark.kind === 'text' ? [mark] : mark.kind === 'clip' ? textsOf(mark.marks) : []));

function boxOf({ x, y, text, size, anchor = 'start', bold, turn }: TextMark) {
  const width = textWidth(text, size, bold);
  if (turn) return { left: x - size * 0.8, right: x + size * 0.2, top: y - width / 2, bottom: y + width / 2 };
  const left = anchor === 'middle' ? x - width / 2 : anchor === 'end' ? x - width : x;
  return { left, right: left + width, top: y - size * 0.8, bottom: y + size * 0.2 };
}

describe.each(SAMPLE_FILES)('the unrolled horizon of %s', (file) => {
  let survey: Survey;
  let shade: StationShade;
  beforeAll(async () => void ({ survey, shade } = await sampleShade(file)));

  const picture = (sheet: (typeof SHEETS)[number], imaginedProfile: HorizonProfile | null = null) =>
    unrolledHorizon({
      site: survey.site,
      shade: { ...shade, imaginedProfile },
      density: smoothDensity(shade.density),
      days: dayLines(survey.site),
      hours: hourLines(survey.site),
      names: new Map(survey.obstructions.map(({ id, name }) => [id, name])),
      ...sheet,
    });

  it.each(SHEETS)('sets no label over another or off the sheet, $width wide', (sheet) => {
    const texts = textsOf(picture(sheet).marks);
    const boxes = texts.map(boxOf);
    expect(texts.length).toBeGreaterThan(12);
    boxes.forEach((box, i) => {
      expect(box.left, texts[i].text).toBeGreaterThanOrEqual(-1);
      expect(box.right, texts[i].text).toBeLessThanOrEqual(sheet.width + 1);
      for (let k = 0; k < i; k++)
        expect(overlap(box, boxes[k]), `${texts[i].text} over ${texts[k].text}`).toBe(false);
    });
  });

  it('is painted without a number that is none, and alike each time', () => {
    const pictures = [
      picture(SHEETS[0]),
      monthColumns({
        unshaded: shade.unshaded.monthly,
        measured: shade.measured.irradiation.monthly,
        imagined: shade.unshaded.monthly,
        width: 358,
        height: 200,
      }),
      hourBars({ unshaded: shade.unshaded.hourly, access: shade.measured.solarAccess.hourly, width: 358 }),
      planView({
        shapes: obstructionShapes(shade.profile, new Map(), null),
        days: dayLines(survey.site).slice(0, 2),
        surfaceAzimuth: shade.surfaceAzimuth,
        size: 220,
      }),
    ];
    for (const made of pictures) {
      const svg = svgText(made, { idPrefix: 'p' });
      expect(svg).not.toMatch(/NaN|undefined|Infinity/);
      expect(svg).toBe(svgText(made, { idPrefix: 'p' }));
    }
  });

  it('names what stands outside a cut view, and has it all in the whole circle', () => {
    expect(picture(SHEETS[1]).outside).toEqual([]);
    const { outside, frame } = picture(SHEETS[0]);
    const all = obstructionShapes(
      shade.profile,
      new Map(survey.obstructions.map(({ id, name }) => [id, name])),
      null,
    );
    for (const { name, parts } of all) {
      const seen = parts.some(({ azimuth }) =>
        azimuth.some((a) => xOf(frame, a) > frame.left && xOf(frame, a) < frame.right),
      );
      expect(outside.includes(name), name).toBe(!seen);
    }
  });

  it('draws what is imagined gone as a broken line without a hatch', () => {
    const [id] = shade.profile.obstructionIds;
    const hatches = (marks: readonly Mark[]): number =>
      marks.reduce((count, mark) => {
        if (mark.kind === 'clip') return count + hatches(mark.marks);
        return (
          count +
          (mark.kind === 'path' && mark.fill && 'hatch' in mark.fill && !mark.fill.hatch.ringed ? 1 : 0)
        );
      }, 0);
    expect(hatches(picture(SHEETS[1]).marks)).toBe(shade.profile.obstructionIds.length);
    const without = changedProfile(shade.profile, [{ obstruction: id, kind: 'gone' }]);
    expect(hatches(picture(SHEETS[1], without).marks)).toBe(shade.profile.obstructionIds.length - 1);
  });
});
