import { closeSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { commands } from '../../src/cli/command-table.ts';
import { runCommandLine } from '../../src/cli/run-command-line.ts';
import { newFolder, noonmark, project } from './run-noonmark.ts';
import { typed, typedWith } from './typed-words.ts';

const SUN_ROWS = 'utc,latitude,longitude\n2026-06-21T12:00:00Z,40,-105\n';
const FIELD_ROWS = 'date,latitude,longitude,elevation\n2026-05-01,52,13,50\n';
const PLACE = ['--latitude', '40', '--longitude', '-105'];

/** With rows on standard input, `wait` where they are known to be there. */
const withRows = (rows: string, wait: boolean, ...words: string[]) =>
  typedWith((terminal) => runCommandLine(words, terminal), { rows, wait });

describe('no option is ignored silently', () => {
  it.each([
    [SUN_ROWS, 'sun', ['--altitude', '3000'], '--altitude'],
    [SUN_ROWS, 'sun', ['--at', '2026-06-21'], '--at'],
    [FIELD_ROWS, 'declination', ['--altitude', '5'], '--altitude'],
    [FIELD_ROWS, 'declination', ['--date', '2026'], '--date'],
  ])('rows beside options of one place: %# %s', async (rows, command, words, said) => {
    const { code, out, err } = await withRows(rows, false, command, ...words);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain(said);
    expect((await withRows(rows, true, command)).code).toBe(0);
  });

  it('--day with --altitude', async () => {
    const { code, out, err } = await typed('sun', '--day', '2026-06-21', ...PLACE, '--altitude', '9');
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain('--altitude does not go with --day');
  });

  it.each([
    ['sun', PLACE, SUN_ROWS],
    ['sun', ['--day', '2026-06-21', ...PLACE], SUN_ROWS],
    ['declination', PLACE, FIELD_ROWS],
  ])('%s %o with rows known to wait', async (command, words, rows) => {
    const { code, out, err } = await withRows(rows, true, command, ...words);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain('not both');
    expect((await withRows(rows, false, command, ...words)).code).toBe(0);
  });
});

describe('a file on standard input', () => {
  let folder: string;
  beforeAll(() => {
    folder = newFolder();
    writeFileSync(join(folder, 'rows.csv'), SUN_ROWS);
  });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  const redirected = (words: string[]) => {
    const input = openSync(join(folder, 'rows.csv'), 'r');
    const { status, stdout } = spawnSync(process.execPath, [`${project}.ci/noonmark.mjs`, ...words], {
      stdio: [input, 'pipe', 'pipe'],
      encoding: 'utf8',
    });
    closeSync(input);
    return { status, stdout };
  };

  it.runIf(process.platform === 'linux')('is seen to wait beside a place by options', () => {
    expect(redirected(['sun', '--at', '2026-06-21', ...PLACE])).toEqual({ status: 2, stdout: '' });
  });

  it('is read where there is no place', () => {
    expect(redirected(['sun', '--json']).status).toBe(0);
  });

  it('of a shell’s loop is left to the loop', () => {
    const loop = 'read -r first; exec "$0" "$1" sun --at 2026-06-21 --latitude 40 --longitude 5';
    const input = openSync(join(folder, 'rows.csv'), 'r');
    const result = spawnSync('bash', ['-c', loop, process.execPath, `${project}.ci/noonmark.mjs`], {
      stdio: [input, 'pipe', 'pipe'],
    });
    closeSync(input);
    expect(result.status).toBe(0);
  });
});

describe('heights above sea are altitudes', () => {
  it('declination takes --altitude, and no --elevation', async () => {
    const at = async (metres: string) => {
      const words = ['declination', '--date', '2026', ...PLACE, '--altitude', metres, '--json'];
      return JSON.parse((await typed(...words)).out) as { elevation: number; declination: number }[];
    };
    const [[low], [high]] = [await at('0'), await at('600000')];
    expect([low.elevation, high.elevation]).toEqual([0, 600_000]);
    expect(low.declination).not.toBe(high.declination);
    expect((await typed('declination', ...PLACE, '--elevation', '5')).code).toBe(2);
  });
});

describe('wrong options are told in plain words', () => {
  it.each([
    [['check', '--sunshine', 'a.json'], '"check" has no option --sunshine. It has --json, --help.'],
    [['check', '-x', 'a.json'], '"check" has no option -x.'],
    [['check', '--json=yes', 'a.json'], '--json takes no value, got "yes".'],
    [['assess', 'a.json', '--climate'], '--climate needs a value.'],
    [['assess', 'a.json', '--climate', '--json'], '--climate needs a value.'],
    [['assess', 'a.json', '--climate='], '--climate needs a value.'],
    [['check', '--toString', 'a.json'], '"check" has no option --toString.'],
  ])('%o', async (words, said) => {
    const { code, out, err } = await typed(...words);
    expect([code, out]).toEqual([2, '']);
    expect(err.startsWith(said)).toBe(true);
  });
});

describe('help and version', () => {
  it.each(commands.map(({ name, help }) => [name, help]))(
    'the help of %s keeps the indent of its first line',
    async (name, help) => {
      const first = help.split('\n').find((line) => line !== '')!;
      expect((await typed(name, '--help')).out).toContain(`\n\n${first}\n`);
    },
  );

  it('--version gives that of the package', async () => {
    const { version } = JSON.parse(readFileSync(`${project}package.json`, 'utf8')) as { version: string };
    expect(await noonmark(['--version'])).toEqual({ code: 0, out: `${version}\n`, err: '' });
  });
});

describe('bad input with --json leaves standard output empty and tells the path', () => {
  it.each([
    ['sun', SUN_ROWS.replace('40', '95'), [], 'standard input: line 2, latitude: '],
    ['declination', FIELD_ROWS.replace('52', '95'), [], 'standard input: line 2, latitude: '],
    ['climate', '', [...PLACE, '--climate', 'nowhere.epw'], '--climate nowhere.epw: file: '],
  ])('%s', async (command, rows, words, said) => {
    const { code, out, err } = await withRows(rows, false, command, ...words, '--json');
    expect([code, out]).toEqual([1, '']);
    expect(err.startsWith(said)).toBe(true);
  });
});
