import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Mark, Picture } from '../../src/report/marks.ts';
import { openSheet } from '../../src/report/painters/pdf/open-sheet.ts';
import { paintPicture } from '../../src/report/painters/pdf/picture-painter.ts';
import { Typesetter } from '../../src/report/painters/pdf/typesetter.ts';
import { svgText } from '../../src/report/painters/svg.ts';
import { smoothDensity } from '../../src/report/pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../src/report/pictures/sun-lines.ts';
import { unrolledHorizon } from '../../src/report/pictures/unrolled-horizon.ts';
import { fontsOnDisk } from '../report/painters/pdf-fonts-on-disk.ts';
import { sampleShade } from '../report/sample-shades.ts';
import { inkIn, pdfRaster, type Raster } from './pdf-tools.ts';

const fonts = fontsOnDisk();
/** Dots to a point. */
const SCALE = 4;
/** Side of the squares whose ink is compared, in points: about a letter. */
const CELL = 8;
/**
 * The two forms are drawn by different programs, which smooth edges in their own ways: a square may differ by a twentieth
 * of its area, and all squares by 0.6 % of theirs on average. A tenth of an area is what one missing letter takes.
 */
const TOLERANCE = { square: 0.05, mean: 0.006 };

let browser: Browser;
let page: Page;
beforeAll(async () => {
  browser = await chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  });
  page = await browser.newPage();
});
afterAll(() => browser.close());

async function asPdf(picture: Picture): Promise<Raster> {
  const sheet = await openSheet(fonts, new Typesetter(fonts, undefined), picture);
  paintPicture(sheet, picture, 0, 0, 1);
  return pdfRaster(new Uint8Array(sheet.doc.output('arraybuffer')), 1, SCALE);
}

/** As the HTML form shows it, set in the typeface of the PDF so that letters can be compared dot by dot. */
async function asSvg(picture: Picture): Promise<Raster> {
  const face = (bytes: Uint8Array, look: string) =>
    `@font-face{font-family:Report;${look};src:url(data:font/ttf;base64,${Buffer.from(bytes).toString('base64')})}`;
  const style =
    face(fonts.regular, 'font-weight:400') +
    face(fonts.bold, 'font-weight:600') +
    face(fonts.italic, 'font-weight:400;font-style:italic');
  const svg = svgText(picture, { idPrefix: 'p', font: 'Report' }).replace(
    '<defs>',
    `<style>${style}</style><defs>`,
  );
  const size = { width: Math.round(picture.width * SCALE), height: Math.round(picture.height * SCALE) };
  const base64 = await page.evaluate(
    async ([source, width, height]) => {
      const image = new Image();
      image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(source)}`;
      await image.decode();
      const canvas = document.createElement('canvas');
      [canvas.width, canvas.height] = [width, height];
      const context = canvas.getContext('2d')!;
      context.fillStyle = '#fff';
      context.fillRect(0, 0, width, height);
      context.drawImage(image, 0, 0, width, height);
      const { data } = context.getImageData(0, 0, width, height);
      let grey = '';
      for (let i = 0; i < data.length; i += 4)
        grey += String.fromCharCode(Math.round(0.3 * data[i] + 0.59 * data[i + 1] + 0.11 * data[i + 2]));
      return btoa(grey);
    },
    [svg, size.width, size.height] as const,
  );
  return { ...size, grey: new Uint8Array(Buffer.from(base64, 'base64')) };
}

/** Ink of each square in both, and how far they are apart. */
function differences(a: Raster, b: Raster): { worst: number; mean: number; where: string; ink: number } {
  const side = CELL * SCALE;
  let [worst, where, sum, count, ink] = [0, '', 0, 0, 0];
  for (let y = 0; y + side <= Math.min(a.height, b.height); y += side)
    for (let x = 0; x + side <= Math.min(a.width, b.width); x += side) {
      const [inA, inB] = [a, b].map((one) => inkIn(one, x, y, x + side, y + side));
      const apart = Math.abs(inA - inB);
      if (apart > worst) [worst, where] = [apart, `${x / SCALE}, ${y / SCALE}: ${inA} and ${inB}`];
      sum += apart;
      ink += inA;
      count++;
    }
  return { worst, mean: sum / count, where, ink: ink / count };
}

const square = (x: number, y: number, side: number) => [x, y, x + side, y, x + side, y + side, x, y + side];
const hatch = { angle: 45, spacing: 6, width: 1.1, tone: 'ink' } as const;

/** Every kind of mark with every way it can be drawn. */
const EVERY_MARK: Mark[] = [
  {
    kind: 'path',
    lines: [square(16, 16, 64)],
    closed: true,
    fill: { hatch },
    pen: { tone: 'ink', width: 1.5 },
  },
  {
    kind: 'path',
    lines: [square(96, 16, 64)],
    closed: true,
    fill: { hatch: { ...hatch, angle: 15, crossed: true } },
  },
  {
    kind: 'path',
    lines: [square(176, 16, 64)],
    closed: true,
    fill: { hatch: { ...hatch, angle: 30, spacing: 9, width: 3, ringed: true } },
  },
  // a square with a hole
  {
    kind: 'path',
    lines: [square(256, 16, 64), square(272, 32, 32)],
    closed: true,
    fill: { tone: 'ink', opacity: 0.4 },
  },
  {
    kind: 'path',
    lines: [
      [336, 16, 400, 80],
      [336, 80, 400, 16],
    ],
    pen: { tone: 'ink', width: 3, dash: [8, 5] },
  },
  { kind: 'path', lines: [[336, 48, 400, 48]], pen: { tone: 'faint', width: 6, opacity: 0.5 } },
  { kind: 'dots', at: [24, 104, 48, 104, 72, 104, 24, 128, 48, 128, 72, 128], radius: 5, tone: 'ink' },
  {
    kind: 'clip',
    x: 96,
    y: 96,
    width: 64,
    height: 32,
    marks: [{ kind: 'path', lines: [square(80, 80, 200)], closed: true, fill: { tone: 'rule' } }],
  },
  { kind: 'text', x: 180, y: 112, text: 'From the left 1234', size: 13 },
  { kind: 'text', x: 400, y: 132, text: 'To the right, bold', size: 13, anchor: 'end', bold: true },
  {
    kind: 'text',
    x: 208,
    y: 160,
    text: 'In the middle, slanted',
    size: 14,
    anchor: 'middle',
    italic: true,
    tone: 'faint',
  },
  { kind: 'text', x: 40, y: 200, text: 'Turned', size: 14, anchor: 'middle', turn: -90 },
  { kind: 'path', lines: [square(96, 168, 80)], closed: true, fill: { tone: 'ink' } },
  { kind: 'text', x: 100, y: 210, text: 'With a rim of paper', size: 15, rim: true, bold: true },
];
const chart = (marks: Mark[]): Picture => ({ width: 416, height: 256, marks });

describe('a picture in the PDF', () => {
  it('has the same ink in the same places as in the web page, mark for mark', async () => {
    const picture = chart(EVERY_MARK);
    const { worst, mean, where, ink } = differences(await asPdf(picture), await asSvg(picture));
    expect(ink).toBeGreaterThan(0.05);
    expect(worst, where).toBeLessThan(TOLERANCE.square);
    expect(mean).toBeLessThan(TOLERANCE.mean);
  });

  it('would be found out if any one mark were missing', async () => {
    const whole = await asSvg(chart(EVERY_MARK));
    for (const missing of EVERY_MARK) {
      const { worst, mean } = differences(
        await asPdf(chart(EVERY_MARK.filter((mark) => mark !== missing))),
        whole,
      );
      const found = worst > TOLERANCE.square || mean > TOLERANCE.mean;
      expect(found, JSON.stringify(missing).slice(0, 90)).toBe(true);
    }
  });

  it.each(['suburban-maple-and-gable.json', 'terrace-chimneys-mast-balcony.json'])(
    'of the sky over %s agrees, with its hatches, dots, contours and names',
    async (file) => {
      const { survey, shade } = await sampleShade(file);
      const picture = unrolledHorizon({
        site: survey.site,
        shade,
        density: smoothDensity(shade.density),
        days: dayLines(survey.site),
        hours: hourLines(survey.site),
        names: new Map(survey.obstructions.map(({ id, name }) => [id, name])),
        width: 720,
        height: 400,
        whole: false,
      });
      const { worst, mean, where, ink } = differences(await asPdf(picture), await asSvg(picture));
      expect(ink).toBeGreaterThan(0.05);
      expect(worst, where).toBeLessThan(TOLERANCE.square);
      expect(mean).toBeLessThan(TOLERANCE.mean);
    },
  );
});
