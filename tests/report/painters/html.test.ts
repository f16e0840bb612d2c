import { describe, expect, it } from 'vitest';
import { reportContents } from '../../../src/report/report-contents.ts';
import { base64 } from '../../../src/report/painters/html/base64.ts';
import { plainMarkup, styleString, wordsMarkup } from '../../../src/report/painters/markup-text.ts';
import { htmlPage } from '../../../src/report/painters/html.ts';
import { reportOf } from '../report-of.ts';
import { sampleSurvey } from '../sample-shades.ts';
import { fullContents, somePicture } from './full-contents.ts';

const HOSTILE =
  '</style></title><script>alert(1)</script><img src=x onerror="alert(1)">&amp;\' \u202e\u0000\ud800';
const tags = (page: string, name: string) => [...page.matchAll(new RegExp(`<${name}[ >]`, 'g'))].length;
const attribute = (page: string, name: string) =>
  [...page.matchAll(new RegExp(` ${name}="([^"]*)"`, 'g'))].map(([, value]) => value);

describe('a report as an HTML page', () => {
  const page = htmlPage(fullContents('Maple & gable'));

  it('has one title, one first heading, a heading for every section, and a caption for every table and picture', () => {
    expect([tags(page, 'title'), tags(page, 'h1'), tags(page, 'main'), tags(page, 'nav')]).toEqual([
      1, 1, 1, 1,
    ]);
    expect(tags(page, 'section')).toBe(3);
    expect(tags(page, 'h2')).toBe(3 + 1); // and that of the list of contents
    expect(tags(page, 'caption')).toBe(tags(page, 'table'));
    expect(tags(page, 'figcaption')).toBe(tags(page, 'figure'));
    expect(page).toContain('<html lang="en-GB">');
  });

  it('names rows and columns, and leaves an empty head no heading', () => {
    expect(page).toContain('<thead><tr><th scope="col">Maple &amp; gable</th>');
    expect(page).toContain('<td></td></tr></thead>');
    expect(page).toContain('<tbody class="sums"><tr><th scope="row">');
  });

  it('gives every id once, and every link and label a target', () => {
    const ids = attribute(page, 'id');
    expect(new Set(ids).size).toBe(ids.length);
    const aims = [
      ...attribute(page, 'href').map((href) => href.slice(1)),
      ...attribute(page, 'aria-labelledby'),
      ...[...page.matchAll(/url\(#([^)]+)\)/g)].map(([, id]) => id),
    ];
    expect(aims.length).toBeGreaterThan(10);
    for (const aim of aims) expect(ids).toContain(aim);
  });

  it('fetches nothing and runs nothing', () => {
    for (const wish of [
      /<(script|link|iframe|object|embed|form|base|audio|video)[\s>]/i,
      /\s(src|href)="(?!data:image\/|#)/,
      /@import|url\((?!#)/,
      /(?<! xmlns=")https?:/,
    ])
      expect(wish.exec(page)?.[0]).toBeUndefined();
    expect(page).toContain(`http-equiv="Content-Security-Policy" content="default-src 'none'; style-src`);
  });

  it('shows markup, quotes and controls in every place as words or not at all', () => {
    const hostile = htmlPage(fullContents(HOSTILE));
    const plain = htmlPage(fullContents('x'));
    for (const name of ['script', 'img', 'title', 'style', 'section', 'svg', 'td'])
      expect(tags(hostile, name), name).toBe(tags(plain, name));
    expect(/[\u0000\u202e]/.test(hostile)).toBe(false);
    expect(Buffer.from(hostile, 'utf8').toString('utf8') === hostile).toBe(true); // no half letters
    expect(hostile.match(/onerror=&quot;/g)!.length).toBeGreaterThan(40);
  });

  it('colours with six hexadecimal digits or not at all', () => {
    expect(page).toContain('--firm:#7a1f2b}');
    const colour = '#7a1f2b}body{display:none';
    const firm = { name: '', lines: [], colour };
    expect(htmlPage(fullContents('x', { firm }))).not.toContain('display:none}</style>');
    expect(htmlPage(fullContents('x', { firm }))).not.toContain(colour);
  });

  it('prints on the paper chosen, pages counted in the words of the report', () => {
    expect(page).toContain('@page{size:A4;');
    expect(page).toContain('content:"Page " counter(page) " of " counter(pages)');
    const frame = {
      ...fullContents('x').frame,
      page: (at: number, of: number) => `${of} Seiten, Seite ${at}`,
    };
    const other = htmlPage(fullContents('x', { paper: 'letter', frame }));
    expect(other).toContain('@page{size:letter;');
    expect(other).toContain('content:counter(pages) " Seiten, Seite " counter(page)');
  });

  it('leaves out what is not there: firm, photo, evidence, range', () => {
    const firm = { name: '', lines: [''], colour: null };
    const bare = htmlPage(
      fullContents('x', { firm, about: [], sections: fullContents('x').sections.slice(0, 1) }),
    );
    expect(bare).not.toMatch(/class="(firm|about|part)"/);
    expect(bare).toContain('<p class="missing">x</p>');
    const figures = [{ label: 'a', value: '9', range: null, note: 'b' }];
    const one = fullContents('x', {
      sections: [{ id: 'a', part: 'letter', heading: 'x', blocks: [{ kind: 'key-figures', figures }] }],
    });
    expect(htmlPage(one)).not.toContain('class="range"');
  });

  it('sets the unit of a key figure small, and percent as large as its number', () => {
    const figures = ['2,249 kWh/m²', '95 %', '12 ft 3 in', 'unknown'].map((value) => ({
      label: 'a',
      value,
      range: null,
      note: 'b',
    }));
    const shown = htmlPage(
      fullContents('x', {
        sections: [{ id: 'a', part: 'letter', heading: 'x', blocks: [{ kind: 'key-figures', figures }] }],
      }),
    );
    expect([...shown.matchAll(/class="value">(.*?)<\/dd>/g)].map(([, value]) => value)).toEqual([
      '2,249<small> kWh/m²</small>',
      '95 %',
      '12 ft 3<small> in</small>',
      'unknown',
    ]);
  });

  it('keeps the patterns of many pictures apart', () => {
    const blocks = [1, 2, 3].map(() => ({
      kind: 'picture' as const,
      picture: somePicture('x'),
      caption: 'c',
      alternative: 'a "quoted" one',
    }));
    const many = htmlPage(
      fullContents('x', { sections: [{ id: 'a', part: 'letter', heading: 'x', blocks }] }),
    );
    const ids = attribute(many, 'id');
    expect(new Set(ids).size).toBe(ids.length);
    expect(attribute(many, 'aria-label')).toEqual(Array(3).fill('a &quot;quoted&quot; one'));
  });

  it('shows every text of a report, in order', async () => {
    const contents = reportContents(await reportOf(sampleSurvey('two-trees-one-behind-the-other.json')));
    const text = htmlPage(contents)
      .replace(/<style>[\s\S]*?<\/style>|<svg[\s\S]*?<\/svg>|<[^>]+>/g, '')
      .replace(/&amp;/g, '&')
      .replace(/&#39;/g, "'")
      .replace(/&quot;/g, '"');
    let from = 0;
    for (const { heading, blocks } of contents.sections.slice(1))
      for (const words of [heading, ...blocks.flatMap((block) => ('text' in block ? [block.text] : []))]) {
        const at = text.indexOf(words, from);
        expect(at, words).toBeGreaterThanOrEqual(from);
        from = at;
      }
  });
});

describe('words of the page', () => {
  it('set a name that runs from right to left apart from the number after it', () => {
    expect(wordsMarkup('South of בית הספר, 94 %')).toBe('South of <bdi>בית הספר</bdi>, 94 %');
    expect(wordsMarkup('سقف & 3')).toBe('<bdi>سقف</bdi> &amp; 3');
    expect(plainMarkup('סקר')).toBe('סקר');
  });

  it('leave emoji and letters of every script whole', () => {
    const text = 'Ådalen 屋根 крыша 🌳👩‍🌾 é';
    expect(wordsMarkup(text)).toBe(text);
  });

  it('cannot end a string of the style sheet', () => {
    expect(styleString('a"b\\c</style>\n')).toBe('"a\\22 b\\5c c\\3c /style\\3e \\a "');
  });
});

describe('base64', () => {
  it.each([0, 1, 2, 3, 4, 12_287, 12_288, 12_289, 30_001])(
    'of %i bytes is that of another program',
    (length) => {
      const bytes = Uint8Array.from({ length }, (_, i) => (i * 167 + 13) % 256);
      expect(base64(bytes)).toBe(Buffer.from(bytes).toString('base64'));
    },
  );
});
