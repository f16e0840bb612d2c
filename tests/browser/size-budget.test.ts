import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { describe, expect, inject, it } from 'vitest';

const folder = inject('builtApp');
const gzipped = (file: string): number => gzipSync(readFileSync(join(folder, file))).length;
const total = (files: string[]): number => files.reduce((sum, file) => sum + gzipped(file), 0);

/** The scripts that the page asks for by itself: all the JavaScript of the first screen. */
function firstScripts(): string[] {
  const page = readFileSync(join(folder, 'index.html'), 'utf8');
  return [...page.matchAll(/(?:src|href)="\/(assets\/[^"]+\.js)"/g)].map(([, file]) => file);
}

/** Every file the service worker fetches on the first visit. */
function precached(): string[] {
  const worker = readFileSync(join(folder, 'service-worker.js'), 'utf8');
  return [...worker.matchAll(/"url":"([^"]+)"/g)].map(([, file]) => file);
}

describe('the size of the app', () => {
  it('has at most 90 kB of gzipped JavaScript on the first screen', () => {
    expect(firstScripts().length).toBeGreaterThan(0);
    expect(total(firstScripts())).toBeLessThanOrEqual(90_000);
  });

  it('has at most 600 kB gzipped for surveying and 1,200 kB for everything, the report with its four languages and PDF too', () => {
    const isOfReport = (file: string) => /^fonts\/|jspdf|\/report-/.test(file);
    const files = [...precached(), 'service-worker.js'];
    expect(files.filter(isOfReport).length).toBeGreaterThan(4);
    expect(total(files.filter((file) => !isOfReport(file)))).toBeLessThanOrEqual(600_000);
    expect(total(files)).toBeLessThanOrEqual(1_200_000);
  });

  it('fetches all it has, world climate and icons too, and nothing twice', () => {
    const files = precached();
    expect(new Set(files).size).toBe(files.length);
    const needed = readdirSync(join(folder, 'assets')).map((file) => `assets/${file}`);
    const named = [
      'index.html',
      'world-climate.bin',
      'manifest.webmanifest',
      'icon.svg',
      'icon-192.png',
      'icon-512.png',
    ];
    expect(files).toEqual(expect.arrayContaining([...needed, ...named]));
    for (const file of files) expect(existsSync(join(folder, file)), file).toBe(true);
  });
});
