import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Survey } from '../../src/core/survey/survey.ts';
import type { FiguresDocument } from '../../src/report/forms/figures-json.ts';
import { newFolder, project } from './run-noonmark.ts';
import { typed } from './typed-words.ts';

const sample = join(project, 'survey-samples/two-trees-one-behind-the-other.json');
/** Fewer steps, and a day that stays the same. */
const QUICK = ['--step', '15', '--made-on', '2026-06-02'];
const PICTURE = Buffer.from([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3, 0xff, 0xd9]);

let folder: string;
let house: string;
beforeAll(() => {
  folder = newFolder();
  house = written('house.json', () => undefined);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** The sample with something changed, in the folder. */
function written(name: string, change: (survey: Survey) => void): string {
  const survey = JSON.parse(readFileSync(sample, 'utf8')) as Survey;
  survey.climate = { source: 'clear-sky', model: 'ineichen' };
  change(survey);
  writeFileSync(join(folder, name), JSON.stringify(survey));
  return join(folder, name);
}

const inFolder = (name: string) => join(folder, name);
const report = (...words: string[]) => typed('report', ...words, ...QUICK);

describe('report', () => {
  it('writes a page and a table beside the survey, never over a file, and again only when asked', async () => {
    const first = await report(house, '--html', '--csv');
    expect(first.code).toBe(0);
    expect(first.out).toMatch(/^house-report.html: written, \d+ kB\nhouse-figures.csv: written, \d+ kB\n$/);
    const page = readFileSync(inFolder('house-report.html'), 'utf8');
    expect(page.startsWith('<!doctype html>')).toBe(true);
    expect(page).toContain('2 June 2026');
    const again = await report(house, '--html');
    expect([again.code, again.out]).toEqual([1, '']);
    expect(again.err).toContain('house-report.html: There is such a file already. Give --replace');
    expect((await report(house, '--html', '--replace')).code).toBe(0);
    expect(readFileSync(inFolder('house-report.html'), 'utf8') === page).toBe(true); // the same day, the same bytes
  });

  it('replaces no survey and no other file that is not a former report', async () => {
    const before = readFileSync(house, 'utf8');
    const { code, err } = await report(house, '--html', '--replace', '--out', house);
    expect(code).toBe(1);
    expect(err).toContain('a file of another kind');
    expect(readFileSync(house, 'utf8')).toBe(before);
    mkdirSync(inFolder('taken.html'));
    expect((await report(house, '--html', '--replace', '--out', inFolder('taken.html'))).err).toContain(
      'no file',
    );
    expect((await report(house, '--html', '--out', inFolder('none/a.html'))).err).toContain('no such folder');
  });

  it('makes a PDF with its typeface inside', async () => {
    const { code } = await report(house, '--pdf', '--paper', 'letter', '--out', inFolder('a.pdf'));
    expect(code).toBe(0);
    const pdf = readFileSync(inFolder('a.pdf'), 'latin1');
    expect(pdf.startsWith('%PDF-')).toBe(true);
    expect(pdf).toContain('/FontFile2');
    expect(pdf).toMatch(/\/MediaBox \[0 0 612[.\d]* 792[.\d]*\]/);
  });

  it('--json gives on standard output the figures that assess gives, and the fingerprint that check tells', async () => {
    const { code, out } = await report(house, '--json');
    expect(code).toBe(0);
    const { figures, survey } = JSON.parse(out) as FiguresDocument;
    const assessed = await typed('assess', house, '--json', '--step', '15');
    const { surveys } = JSON.parse(assessed.out) as {
      surveys: { planes: { id: string; solarAccess: { annual: number } | null }[] }[];
    };
    for (const { id, solarAccess } of surveys[0].planes) {
      const [row] = figures.filter(
        (one) =>
          one.quantity === 'solar-access' && one.plane_id === id && !one.station && one.period === 'year',
      );
      expect(row.value).toBe(solarAccess!.annual);
    }
    expect((await typed('check', house)).out).toContain(`fingerprint ${survey.fingerprint}\n`);
  });

  it('sets another survey beside it, by the same light', async () => {
    const other = written('felled.json', (survey) => {
      survey.title = 'Without a tree';
      for (const station of survey.stations) station.traces = station.traces.slice(1);
    });
    const { out, code } = await report(house, '--json', '--against', other);
    expect(code).toBe(0);
    const { figures } = JSON.parse(out) as FiguresDocument;
    const access = (compared: boolean) =>
      figures.find((one) => one.quantity === 'solar-access' && (one.compared !== '') === compared)!;
    expect(access(true).compared).toContain('Without a tree');
    expect(access(true).value!).toBeGreaterThan(access(false).value!);
    const far = written('far.json', (survey) => void (survey.site.latitude += 1));
    expect((await report(house, '--json', '--against', far)).err).toContain('lies 111195 m from');
  });

  it('has the pictures of a folder, found by their contents, and tells which are missing', async () => {
    const photo = (id: string, bytes: Buffer) => ({
      id,
      of: { kind: 'site' as const },
      takenAt: '2026-05-14T10:00:00Z',
      width: 40,
      height: 30,
      bytes: bytes.length,
      sha256: createHash('sha256').update(bytes).digest('hex'),
    });
    const file = written('photos.json', (survey) => {
      survey.photos = [photo('p1', PICTURE), photo('p2', Buffer.from('away'))];
    });
    mkdirSync(inFolder('pictures'));
    writeFileSync(inFolder('pictures/whatever.bin'), PICTURE);
    writeFileSync(inFolder('pictures/other.jpg'), 'another');
    const { code, err } = await report(file, '--html', '--photos', inFolder('pictures'));
    expect(code).toBe(0);
    expect(err).toContain('1 of 2 photos have no picture');
    expect(readFileSync(inFolder('photos-report.html'), 'utf8')).toContain(
      `data:image/jpeg;base64,${PICTURE.toString('base64')}`,
    );
  });

  it('names the firm of a file, and what is wrong with one by its path', async () => {
    writeFileSync(inFolder('firm.json'), JSON.stringify({ name: 'Harrow & Vale', lines: ['12 Mill Lane'] }));
    const out = inFolder('firm.html');
    expect((await report(house, '--html', '--out', out, '--firm', inFolder('firm.json'))).code).toBe(0);
    expect(readFileSync(out, 'utf8')).toContain('<strong>Harrow &amp; Vale</strong>');
    writeFileSync(inFolder('bad.json'), JSON.stringify({ name: 1, lines: ['a', 2], colour: 'red', fax: '' }));
    const { code, err } = await report(house, '--csv', '--replace', '--firm', inFolder('bad.json'));
    expect(code).toBe(1);
    for (const path of ['fax', 'name', 'lines[1]', 'colour'])
      expect(err).toContain(`${inFolder('bad.json')}: ${path}: `);
  });

  it('tells what is wrong with the survey by its path, and writes nothing', async () => {
    const file = written('broken.json', (survey) => void (survey.site.latitude = 95));
    const { code, out, err } = await report(file, '--html');
    expect([code, out]).toEqual([1, '']);
    expect(err).toContain(`${file}: site.latitude: `);
    expect(existsSync(inFolder('broken-report.html'))).toBe(false);
    expect((await report(inFolder('none.json'), '--html')).err).toContain('There is no file');
  });

  it.each([
    [[], 'Say which form'],
    [['--html', '--csv', '--out', 'x'], '--out is for one form'],
    [['--html', '--language', 'tlh'], '--language must be one of'],
    [['--html', '--units', 'cubits'], '--units must be one of'],
    [['--html', '--paper', 'a3'], '--paper must be one of'],
    [['--html', '--made-on', '2026-02-30'], '--made-on must be a day'],
    [['--html', '--step', '7'], '--step must be one of'],
  ])('refuses %o as wrong usage', async (words, said) => {
    const { code, err } = await typed('report', house, ...words);
    expect(code).toBe(2);
    expect(err).toContain(said);
  });
});

describe('check tells the fingerprint', () => {
  const fingerprint = async (file: string) => {
    const { out } = await typed('check', file, '--json');
    return (JSON.parse(out) as { files: { fingerprint: string }[] }).files[0].fingerprint;
  };

  it('which the order of fields and spaces does not change, and a changed value does', async () => {
    const reversed = inFolder('reversed.json');
    const fields = Object.entries(JSON.parse(readFileSync(house, 'utf8')) as object).reverse();
    writeFileSync(reversed, JSON.stringify(Object.fromEntries(fields), null, 3));
    const changed = written('changed.json', (survey) => void (survey.planes[0].surfaceTilt += 0.1));
    const own = await fingerprint(house);
    expect(own).toMatch(/^[0-9a-f]{64}$/);
    expect(await fingerprint(reversed)).toBe(own);
    expect(await fingerprint(changed)).not.toBe(own);
  });
});
