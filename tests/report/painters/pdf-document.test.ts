import { describe, expect, it } from 'vitest';
import type { ReportContents } from '../../../src/report/contents/report-contents.ts';
import { isReadable } from '../../../src/report/painters/pdf/image-bytes.ts';
import { pdfDocument } from '../../../src/report/painters/pdf/pdf-document.ts';
import { fullContents } from './full-contents.ts';
import { fontsOnDisk } from './pdf-fonts-on-disk.ts';

const fonts = fontsOnDisk();
const MADE = { madeOn: '2026-05-20' };

async function file(contents: ReportContents): Promise<string> {
  return Buffer.from(await pdfDocument(contents, fonts, MADE)).toString('latin1');
}

const pages = (pdf: string) => pdf.match(/\/Type \/Page\b(?!s)/g)!.length;
const hex = (text: string) => `<FEFF${Buffer.from(text, 'utf16le').swap16().toString('hex').toUpperCase()}>`;

describe('the PDF of a report', () => {
  it('is the same file for the same contents', async () => {
    const contents = fullContents('A roof');
    expect(await file(contents)).toBe(await file(contents));
    expect((await file(contents)).startsWith('%PDF-')).toBe(true);
  });

  it('has title, author, language and day of the report', async () => {
    const title = 'Dach (Süd) \\ čtyři 光 🙂';
    const pdf = await file(fullContents(title, { language: 'de' }));
    expect(pdf).toContain(`/Title ${hex(title)}`);
    expect(pdf).toContain(`/Author ${hex(title)}`);
    expect(pdf).toContain('/Lang (de)');
    expect(pdf).toContain("/CreationDate (D:20260520120000+00'00')");
  });

  it('has the paper asked for', async () => {
    // ISO 216: 210 by 297 mm; North American letter: 8.5 by 11 inches of 72 points
    expect(await file(fullContents('A roof', { paper: 'a4' }))).toMatch(
      /\/MediaBox \[0\.? 0\.? 595\.27\d 841\.89/,
    );
    expect(await file(fullContents('A roof', { paper: 'letter' }))).toMatch(
      /\/MediaBox \[0\.? 0\.? 612\.? 792\.?\]/,
    );
  });

  it('is a page with a head where there is no section', async () => {
    expect(pages(await file(fullContents('A roof', { sections: [] })))).toBe(1);
  });

  it('has a bookmark for each section, and begins pages where sections ask for it', async () => {
    const heading = (place: number) => `Question ${place}`;
    const sections = [0, 1, 2, 3].map((place) => ({
      id: `s-${place}`,
      part: 'letter' as const,
      heading: heading(place),
      startsPage: true,
      blocks: [],
    }));
    const pdf = await file(fullContents('A roof', { sections }));
    expect(pages(pdf)).toBe(4);
    for (const { heading: words } of sections) expect(pdf).toContain(`/Title ${hex(words)}`);
  });

  it('embeds only the letters used', async () => {
    const sections = [{ id: 's', part: 'letter' as const, heading: 'Sun', blocks: [] }];
    const pdf = await pdfDocument(fullContents('Sun', { sections }), fonts, MADE);
    expect(pdf.length).toBeLessThan(40_000);
  });

  it('stores photos as they are, each once, and stands where one cannot be read', async () => {
    const jpeg = Buffer.alloc(200_000, 0x5a);
    jpeg.set([0xff, 0xd8, 0xff, 0xc0, 0, 17, 8, 0x03, 0, 0x04, 0, 3, 1, 0x22, 0, 2, 0x11, 1, 3, 0x11, 1]);
    jpeg.set([0xff, 0xd9], jpeg.length - 2);
    const photo = (bytes: Uint8Array) => ({
      image: { type: 'image/jpeg' as const, bytes, width: 1024, height: 768 },
      caption: 'The roof',
      alternative: 'The roof',
    });
    const six = [1, 2, 3, 4, 5, 6].map((number) => photo(jpeg.with(500, number)));
    const withPhotos = (photos: typeof six) =>
      file(
        fullContents('A roof', {
          sections: [{ id: 'p', part: 'evidence', heading: 'Photos', blocks: [{ kind: 'photos', photos }] }],
        }),
      );
    const empty = (await withPhotos([])).length;
    expect((await withPhotos(six)).length - empty).toBeLessThan(6 * 200_000 + 10_000);
    expect((await withPhotos([...six, ...six])).length - empty).toBeLessThan(6 * 200_000 + 20_000);
    const broken = await withPhotos([
      photo(new Uint8Array([0xff, 0xd8, 0xff, 0xd9])),
      photo(new Uint8Array()),
    ]);
    expect(broken).not.toContain('/DCTDecode');
  });
});

describe('bytes of a picture', () => {
  it('are told from others by their head', () => {
    const png = new Uint8Array(60);
    png.set([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
    expect(isReadable(png, 'PNG')).toBe(true);
    expect(isReadable(png, 'JPEG')).toBe(false);
    expect(isReadable(png.slice(0, 20), 'PNG')).toBe(false);
    // start of image, an application segment of four bytes, then a baseline frame of 3 by 2
    const jpeg = [0xff, 0xd8, 0xff, 0xe0, 0, 4, 1, 2, 0xff, 0xc0, 0, 11, 8, 0, 2, 0, 3, 1, 1, 0x11, 0, 0xff];
    expect(isReadable(new Uint8Array(jpeg), 'JPEG')).toBe(true);
    expect(isReadable(new Uint8Array(jpeg.slice(0, 12)), 'JPEG')).toBe(false);
    expect(isReadable(new Uint8Array(jpeg.with(14, 0)), 'JPEG')).toBe(false);
  });
});
