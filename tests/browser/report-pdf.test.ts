import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { chromium, type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import type { Block, ReportContents, Section } from '../../src/report/contents/report-contents.ts';
import { pdfDocument } from '../../src/report/painters/pdf/pdf-document.ts';
import type { DrawnText } from '../../src/report/painters/pdf/typesetter.ts';
import { fontsOnDisk } from '../report/painters/pdf-fonts-on-disk.ts';
import { fullContents } from '../report/painters/full-contents.ts';
import { inkIn, pdfFacts, pdfFonts, pdfLinks, pdfPages, pdfRaster, pdfWords } from './pdf-tools.ts';

const fonts = fontsOnDisk();
const MADE = { madeOn: '2026-05-20' };
const made = (contents: ReportContents) => pdfDocument(contents, fonts, MADE);
const readable = (pages: readonly string[]) => pages.join(' ').replace(/\s+/g, ' ');

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

const section = (id: string, blocks: Block[], changes: Partial<Section> = {}): Section => ({
  id,
  part: 'letter',
  heading: `Heading ${id}`,
  blocks,
  ...changes,
});

describe('the text of a PDF report', () => {
  /** Every place that takes a text has one of its own. */
  function numbered(): { contents: ReportContents; texts: string[] } {
    const texts: string[] = [];
    const mark = 'TEXT';
    const number = (value: unknown): unknown => {
      if (value === mark) return (texts.push(`Word${texts.length}`), texts.at(-1));
      if (Array.isArray(value)) return value.map(number);
      if (value instanceof Uint8Array || typeof value !== 'object' || value === null) return value;
      // what is told to those who do not see a picture is not on the page
      return Object.fromEntries(
        Object.entries(value).map(([key, inner]) => [key, key === 'alternative' ? inner : number(inner)]),
      );
    };
    return { contents: number(fullContents(mark)) as ReportContents, texts };
  }

  it('can be read from the file, every bit of it, in order of the page', async () => {
    const { contents, texts } = numbered();
    const read = readable(pdfPages(await made(contents)));
    expect(texts.length).toBeGreaterThan(60);
    for (const text of texts) expect(read.split(/[^\w]/), text).toContain(text);
  });

  it('has ink for every letter the typeface has, in each face', async () => {
    const letters = Array.from({ length: 0x2300 - 0x21 }, (_, i) => String.fromCodePoint(0x21 + i));
    const { Typesetter } = await import('../../src/report/painters/pdf/typesetter.ts');
    const setter = new Typesetter(fonts, undefined);
    const has = letters.filter(
      (letter) =>
        /[\p{L}\p{N}\p{P}\p{S}]/u.test(letter) &&
        setter.runs(letter, { face: 'regular', size: 10 }).every(({ kind }) => kind === 'letters'),
    );
    expect(has.length).toBeGreaterThan(550);
    const line = has.join('   ');
    const pdf = await made(
      fullContents('x', {
        sections: [
          section('regular', [{ kind: 'paragraph', text: line }]),
          section('bold', [{ kind: 'subheading', text: line }]),
          section('italic', [
            { kind: 'key-figures', figures: [{ label: '', value: '', range: null, note: line }] },
          ]),
        ],
      }),
    );
    const words = pdfWords(pdf);
    const rasters = new Map<number, ReturnType<typeof pdfRaster>>();
    const scale = 3;
    const empty: string[] = [];
    for (const { text, page: number, left, top, right, bottom } of words) {
      const raster = rasters.get(number) ?? pdfRaster(pdf, number, scale);
      rasters.set(number, raster);
      // accents stand above the box that the reader tells of
      const ink = inkIn(raster, left * scale, (top - 3) * scale, right * scale, (bottom + 3) * scale);
      if (ink < 0.004) empty.push(`${text} on page ${number}`);
    }
    expect(empty).toEqual([]);
    for (const face of [
      /Heading regular(.*)Heading bold/s,
      /Heading bold(.*)Heading italic/s,
      /Heading italic(.*)$/s,
    ]) {
      const read = face.exec(pdfPages(pdf).join('\n'))![1].normalize('NFC');
      // letters that share a shape are read as the commoner one
      const same = (letter: string) =>
        letter
          .replace('\u2206', 'Δ')
          .replace('µ', 'μ')
          .replace(/[\u2010\u2011]/, '-')
          .normalize('NFC');
      const readLetters = new Set([...read].map(same));
      expect(has.filter((letter) => !readLetters.has(same(letter)))).toEqual([]);
    }
  });

  it('is set as wide as a browser sets it', async () => {
    const { Typesetter } = await import('../../src/report/painters/pdf/typesetter.ts');
    const setter = new Typesetter(fonts, undefined);
    const text = 'Irradiation 1 234,5 kWh/m² – Żółta ściana, Ελλάδα, Москва';
    for (const face of ['regular', 'bold', 'italic'] as const) {
      const wide = await page.evaluate(
        async ([base64, words]) => {
          const bytes = Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0));
          const font = await new FontFace('Measured', bytes).load();
          document.fonts.add(font);
          const context = document.createElement('canvas').getContext('2d')!;
          context.font = '100px Measured';
          const { width } = context.measureText(words);
          document.fonts.delete(font);
          return width;
        },
        [Buffer.from(fonts[face]).toString('base64'), text] as const,
      );
      expect(setter.width(text, { face, size: 100 }) / wide).toBeCloseTo(1, 3);
    }
  });
});

describe('the pages of a PDF report', () => {
  it('are A4 or Letter, numbered, with the fingerprint on each, and the fonts inside', async () => {
    for (const [paper, size] of [
      ['a4', /A4/],
      ['letter', /letter/],
    ] as const) {
      const pdf = await made(fullContents('A roof', { paper, foot: 'Fingerprint 0123abcd' }));
      const facts = pdfFacts(pdf);
      expect(facts.get('Page size')).toMatch(size);
      expect(facts.get('Title')).toBe('A roof');
      const pages = pdfPages(pdf);
      expect(facts.get('Pages')).toBe(String(pages.length));
      pages.forEach((text, place) => {
        expect(text).toContain(`Page ${place + 1} of ${pages.length}`);
        expect(text).toContain('Fingerprint 0123abcd');
      });
      const inside = pdfFonts(pdf);
      expect(inside.map(({ name }) => name).sort()).toEqual(['bold', 'italic', 'regular']);
      expect(inside.every(({ embedded }) => embedded)).toBe(true);
    }
  });

  it('are listed with links, and bookmarked', async () => {
    const headings = ['How much sun?', 'What blocks it?', 'What could be done?'];
    const sections = headings.map((heading, place) =>
      section(`s${place}`, [{ kind: 'paragraph', text: 'Some words.' }], { heading, startsPage: true }),
    );
    const pdf = await made(fullContents('A roof', { sections }));
    const links = pdfLinks(pdf);
    headings.forEach((heading, place) => {
      const target = place === 0 ? 1 : place + 1;
      expect(links).toMatch(new RegExp(`<a href="[^"]*#${target}">${heading.replace('?', '\\?')}</a>`));
      expect(links).toContain(`<item page="${target}">${heading}</item>`);
      expect(pdfPages(pdf)[target - 1]).toContain(heading);
    });
  });

  it('carry a table on, with its heads on every page and no row lost', async () => {
    const rows = Array.from({ length: 150 }, (_, i) => [`Row ${i}`, String(i * 3), 'steady']);
    const table = {
      caption: 'A long table',
      columns: [{ head: 'Sighting' }, { head: 'Azimuth', number: true }, { head: 'Remark' }],
      rows,
      sums: [['All', '33525', '']],
    };
    const pages = pdfPages(
      await made(fullContents('A roof', { sections: [section('t', [{ kind: 'table', table }])] })),
    );
    expect(pages.length).toBeGreaterThanOrEqual(3);
    for (const text of pages) expect(text).toContain('Azimuth');
    for (const [name] of rows) expect(readable(pages)).toContain(`${name} `);
    expect(pages.at(-1)).toContain('33525');
  });

  it('cut a cell that is higher than a page, and lose none of it', async () => {
    const words = Array.from({ length: 3000 }, (_, i) => `w${i}`);
    const table = { caption: 'Notes', columns: [{ head: 'Note' }], rows: [[words.join(' ')]] };
    const pages = pdfPages(
      await made(fullContents('A roof', { sections: [section('t', [{ kind: 'table', table }])] })),
    );
    const read = new Set(readable(pages).split(' '));
    expect(words.filter((word) => !read.has(word))).toEqual([]);
  });
});

describe('hostile text in a PDF report', () => {
  const HOSTILE = [
    '<script>alert(1)</script> ) Tj ET (\\( endstream endobj %%EOF',
    '\u202egnp.exe\u202c \u0000\u0007 \ud83d lone \udc00 \u2028 line',
    '&lt;b&gt; "quoted" \\ 100 % {{x}} ${y}',
  ];

  it.each(HOSTILE)('is only text: %j', async (text) => {
    const pdf = await made(fullContents(text));
    const read = readable(pdfPages(pdf));
    const shown = text.replace(/[\u0000-\u001f\u202a-\u202e\u2028]/g, ' ').split(/\s+/);
    for (const word of shown.filter((one) => /^[!-~]+$/.test(one))) expect(read).toContain(word);
    expect(pdfFacts(pdf).get('JavaScript')).toBe('no');
  });

  it('of ten thousand letters without a space is broken, and all of it is there', async () => {
    const text = 'abcdefghij'.repeat(1000);
    const block: Block = { kind: 'paragraph', text };
    const pages = pdfPages(await made(fullContents('A roof', { sections: [section('l', [block])] })));
    expect(pages.join('').replace(/A roof\s+Page \d+ of \d+|\s/g, '')).toContain(text);
  });
});

describe('letters that the typeface lacks', () => {
  const TEXTS = ['Dach von 光伏屋顶 Nord', 'משפחת כהן 12 דירה', 'مدرسة النور', 'Roof 🙂🏠 east'];
  const asked = (text: string) =>
    fullContents('A roof', {
      sections: [
        section('n', [
          { kind: 'paragraph', text },
          { kind: 'subheading', text },
        ]),
      ],
    });

  it('are boxes without a drawing device, told in a sentence, and found as text', async () => {
    for (const text of TEXTS) {
      const pdf = await made(asked(text));
      const read = readable(pdfPages(pdf));
      expect(read, text).toContain('A box stands for a letter.');
      for (const letter of text.replace(/\s/g, '')) expect(read, text).toContain(letter);
    }
    expect(readable(pdfPages(await made(asked('plain'))))).not.toContain('A box stands');
  });

  it('are drawn by the device where it can, and no box is told of', async () => {
    for (const text of TEXTS) {
      const wanted = new Map<string, [string, number, boolean]>();
      const key = (...of: [string, number, boolean]) => JSON.stringify(of);
      const note = (...of: [string, number, boolean]) => (wanted.set(key(...of), of), null);
      await pdfDocument(asked(text), fonts, { ...MADE, drawText: note });
      const drawn = new Map<string, DrawnText>();
      for (const [name, [words, size, bold]] of wanted) drawn.set(name, await drawnInPage(words, size, bold));
      const pdf = await pdfDocument(asked(text), fonts, {
        ...MADE,
        drawText: (...of) => drawn.get(key(...of))!,
      });
      const read = readable(pdfPages(pdf));
      expect(read).not.toContain('A box stands');
      for (const letter of text.replace(/\s/g, '')) expect(read, text).toContain(letter);
      const { png } = await drawnInPage(' ', 10, false);
      const blank = await pdfDocument(asked(text), fonts, {
        ...MADE,
        drawText: (...of) => ({ ...drawn.get(key(...of))!, png }),
      });
      const [with_, without] = [pdf, blank].map((file) => wholeInk(pdfRaster(file, 1, 2)));
      expect(with_ - without, text).toBeGreaterThan(100);
    }
  });

  /** Sum of the ink of a page, in dots of full black. */
  const wholeInk = (raster: ReturnType<typeof pdfRaster>) =>
    inkIn(raster, 0, 0, raster.width, raster.height) * raster.width * raster.height;

  async function drawnInPage(text: string, size: number, bold: boolean): Promise<DrawnText> {
    const { bytes, width, height } = await page.evaluate(
      ([words, points, weight]) => {
        const canvas = document.createElement('canvas');
        const context = canvas.getContext('2d')!;
        const font = `${weight} ${points * 4}px sans-serif`;
        context.font = font;
        canvas.width = Math.ceil(context.measureText(words).width);
        canvas.height = Math.ceil(points * 4 * 1.6);
        context.font = font;
        context.fillText(words, 0, points * 4 * 1.2);
        const base64 = canvas.toDataURL('image/png').split(',')[1];
        return { bytes: base64, width: canvas.width / 4, height: canvas.height / 4 };
      },
      [text, size, bold ? 600 : 400] as const,
    );
    return { png: new Uint8Array(Buffer.from(bytes, 'base64')), width, height, baseline: size * 1.2 };
  }
});

describe('the PDF painter in the built app', () => {
  const folder = inject('builtApp');
  const names = readdirSync(join(folder, 'assets'));

  it('is a file of its own, without what draws web pages and SVG', () => {
    const page_ = readFileSync(join(folder, 'index.html'), 'utf8');
    const library = names.filter((name) => /^jspdf.*\.js$/.test(name));
    expect(library).toHaveLength(1);
    expect(page_).not.toContain(library[0]);
    expect(names.filter((name) => /html2canvas|canvg|purify|core-js/i.test(name))).toEqual([]);
    // words that each of the three packages has in it, and the library has not
    const scripts = names.filter((name) => name.endsWith('.js'));
    for (const name of scripts)
      expect(readFileSync(join(folder, 'assets', name), 'utf8')).not.toMatch(
        /data-html2canvas-ignore|ALLOWED_URI_REGEXP|feColorMatrix/,
      );
  });

  it('has its typeface at hand offline, with the licence beside it', () => {
    const worker = readFileSync(join(folder, 'service-worker.js'), 'utf8');
    for (const face of ['regular', 'semibold', 'italic'])
      expect(worker).toContain(`fonts/source-serif-4-${face}.ttf`);
    expect(existsSync(join(folder, 'fonts/LICENSE.txt'))).toBe(true);
  });
});
