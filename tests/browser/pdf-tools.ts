import { spawnSync } from 'node:child_process';

/** Grey values of a page, 0 black to 255 white. */
export interface Raster {
  width: number;
  height: number;
  grey: Uint8Array;
}

/** A word where a reader finds it, in points from the page's upper left corner. */
export interface Word {
  text: string;
  page: number;
  left: number;
  top: number;
  right: number;
  bottom: number;
}

/** Runs one of poppler's tools on a file; whatever it complains of is an error, since a reader may fail on it. */
function poppler(tool: string, args: string[], pdf: Uint8Array): Buffer {
  const { status, stdout, stderr, error } = spawnSync(tool, args, { input: pdf, maxBuffer: 400_000_000 });
  if (error) throw error;
  if (status !== 0 || stderr.length > 0) throw new Error(`${tool} ${args.join(' ')}: ${stderr.toString()}`);
  return stdout;
}

/** The text as it reads, page by page. */
export function pdfPages(pdf: Uint8Array): string[] {
  const text = poppler('pdftotext', ['-enc', 'UTF-8', '-', '-'], pdf).toString('utf8');
  return text.split('\f').slice(0, -1);
}

export function pdfWords(pdf: Uint8Array): Word[] {
  const page = poppler('pdftotext', ['-bbox', '-enc', 'UTF-8', '-', '-'], pdf).toString('utf8');
  const words: Word[] = [];
  let number = 0;
  for (const line of page.split('\n')) {
    if (line.includes('<page ')) number++;
    const found = /<word xMin="(.*?)" yMin="(.*?)" xMax="(.*?)" yMax="(.*?)">(.*)<\/word>/.exec(line);
    if (!found) continue;
    const [left, top, right, bottom] = found.slice(1, 5).map(Number);
    words.push({ text: unescaped(found[5]), page: number, left, top, right, bottom });
  }
  return words;
}

const unescaped = (text: string) =>
  text.replaceAll('&lt;', '<').replaceAll('&gt;', '>').replaceAll('&quot;', '"').replaceAll('&amp;', '&');

/** The facts of a file that pdfinfo prints, by name. */
export function pdfFacts(pdf: Uint8Array): Map<string, string> {
  const lines = poppler('pdfinfo', ['-'], pdf).toString('utf8').split('\n');
  return new Map(
    lines.flatMap((line) => {
      const [, name, value] = /^([^:]+):\s*(.*)$/.exec(line) ?? [];
      return name ? [[name, value]] : [];
    }),
  );
}

/** Names of the fonts, with whether each is inside the file. */
export function pdfFonts(pdf: Uint8Array): { name: string; embedded: boolean }[] {
  const lines = poppler('pdffonts', ['-'], pdf).toString('utf8').trim().split('\n').slice(2);
  return lines.map((line) => {
    const [name] = line.split(/\s+/);
    const [embedded] = line.slice(55).trim().split(/\s+/).slice(-5);
    return { name, embedded: embedded === 'yes' };
  });
}

/** Bookmarks and links, as pdftohtml's XML tells them. */
export const pdfLinks = (pdf: Uint8Array): string =>
  poppler('pdftohtml', ['-xml', '-i', '-stdout', '-enc', 'UTF-8', '-', '-'], pdf).toString('utf8');

/** One page in grey, `perPoint` dots to a point. */
export function pdfRaster(pdf: Uint8Array, page: number, perPoint: number): Raster {
  const number = String(page);
  const args = ['-gray', '-r', String(72 * perPoint), '-f', number, '-l', number, '-'];
  const file = poppler('pdftoppm', args, pdf);
  // binary PGM: P5, width, height, highest value, each followed by one white space
  const [head, width, height] = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(file.toString('latin1', 0, 60))!;
  return { width: Number(width), height: Number(height), grey: new Uint8Array(file.subarray(head.length)) };
}

/** Share of ink in a rectangle of dots, 0 to 1. */
export function inkIn(raster: Raster, left: number, top: number, right: number, bottom: number): number {
  let [ink, dots] = [0, 0];
  for (let y = Math.max(0, Math.floor(top)); y < Math.min(raster.height, Math.ceil(bottom)); y++)
    for (let x = Math.max(0, Math.floor(left)); x < Math.min(raster.width, Math.ceil(right)); x++) {
      ink += 255 - raster.grey[y * raster.width + x];
      dots++;
    }
  return dots === 0 ? 0 : ink / 255 / dots;
}
