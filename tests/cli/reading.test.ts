import { closeSync, ftruncateSync, openSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fc, test } from '@fast-check/vitest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { plainNumber } from '../../src/cli/command.ts';
import { readCsv } from '../../src/cli/csv-rows.ts';
import { dateOf, instantOf } from '../../src/cli/instants.ts';
import { progressTeller } from '../../src/cli/progress.ts';
import { readSurveyText, readWeatherText } from '../../src/cli/read-file.ts';
import { newFolder } from './run-noonmark.ts';

let folder: string;
beforeAll(() => {
  folder = newFolder();
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('files', () => {
  it('refuses 100 MB at once, with the limit named', () => {
    const file = join(folder, 'large.json');
    const handle = openSync(file, 'w');
    ftruncateSync(handle, 100_000_000);
    closeSync(handle);
    const read = readSurveyText(file);
    expect(read.ok).toBe(false);
    if (!read.ok) expect(read.problems[0].message).toContain('100 MB; the limit is 80 MB');
  });

  it('takes a survey only as UTF-8, a weather file as old ones are written too', () => {
    const file = join(folder, 'old.epw');
    writeFileSync(file, Buffer.from('LOCATION,Ca\xf1ada', 'latin1'));
    expect(readSurveyText(file).ok).toBe(false);
    const weather = readWeatherText(file);
    expect(weather.ok && weather.value.text).toBe('LOCATION,Cañada');
  });
});

describe('numbers and instants', () => {
  it.each(['', ' ', '0x10', '1e', 'NaN', 'Infinity', '1,5', '--1', '1 2'])('%o is no number', (text) => {
    expect(plainNumber(text)).toBeNull();
  });

  test.prop([fc.double({ noNaN: true, noDefaultInfinity: true })])(
    'reads any finite number back',
    (value) => {
      expect(plainNumber(String(value))).toBe(Object.is(value, -0) ? 0 : value);
    },
  );

  test.prop([
    fc.date({ min: new Date('1900-01-01T00:00Z'), max: new Date('2100-12-31T23:59Z'), noInvalidDate: true }),
  ])('reads back what a clock writes', (date) => {
    expect(instantOf(date.toISOString())).toBe(date.getTime());
  });

  it.each([
    ['2026-06-21', Date.UTC(2026, 5, 21)],
    ['2026-06-21 12:30', Date.UTC(2026, 5, 21, 12, 30)],
    ['2026-06-21T12:30+05:30', Date.UTC(2026, 5, 21, 7)],
    ['2026-06-21T12:30:00.5-0330', Date.UTC(2026, 5, 21, 16, 0, 0, 500)],
  ])('reads %s', (text, timeMs) => expect(instantOf(text)).toBe(timeMs));

  it.each(['2026-02-29', '2026-13-01', '1899-12-31', '2101-01-01', '21.06.2026', '2026-06-21T24:00Z', ''])(
    '%o is no instant',
    (text) => expect(instantOf(text)).toBeNull(),
  );

  it('reads a decimal year', () => {
    expect(dateOf('2027.5')).toBe(Date.UTC(2027, 6, 2, 12)); // 182.5 of 365 days
    expect(dateOf('2025')).toBe(Date.UTC(2025, 0, 1));
    expect(dateOf('1700.5')).toBeNull();
  });
});

describe('a CSV table', () => {
  test.prop([fc.string({ maxLength: 200, unit: 'binary' })])(
    'is read or refused with lines, whatever it holds',
    (text) => {
      const read = readCsv(`a,b\n${text}`, ['a', 'b'], (row) => {
        const [a, b] = [row.number('a', -1, 1), row.number('b', 0, 5)];
        return Number.isNaN(a + b) ? null : a + b;
      });
      if (read.ok) for (const sum of read.value) expect(Number.isFinite(sum)).toBe(true);
      else for (const { path } of read.problems) expect(path).toMatch(/^line \d+/);
    },
  );
});

describe('progress', () => {
  it('is silent in the first second and then speaks once a second', () => {
    let now = 0;
    let said = '';
    const terminal = {
      out: () => undefined,
      err: (text: string) => void (said += text),
      input: () => Promise.resolve(null),
      rowsWait: () => false,
    };
    const tell = progressTeller(terminal, 'house.json', () => now);
    for (const [time, share] of [
      [500, 0.1],
      [1500, 0.2],
      [1900, 0.3],
      [2600, 0.4],
    ]) {
      now = time;
      tell(share, 'South roof');
    }
    expect(said).toBe('house.json: 20 %, South roof\nhouse.json: 40 %, South roof\n');
  });
});
