import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { commands } from '../../src/cli/command-table.ts';
import { newFolder, noonmark, project } from './run-noonmark.ts';
import { typed } from './typed-words.ts';

describe('help', () => {
  it('lists every command and exits with 0', async () => {
    const { code, out, err } = await noonmark(['--help']);
    expect([code, err]).toEqual([0, '']);
    for (const { name } of commands) expect(out).toContain(`  ${name} `);
  });

  it.each(commands.map(({ name }) => name))('of %s tells its usage and each of its options', async (name) => {
    const { code, out, err } = await typed(name, '--help');
    expect([code, err]).toEqual([0, '']);
    expect(out).toContain(`Usage: noonmark ${name}`);
    for (const option of Object.keys(commands.find((command) => command.name === name)!.options))
      expect(out).toContain(`--${option}`);
  });
});

describe('wrong usage exits with 2 and leaves standard output empty', () => {
  it('as a process too', async () => {
    const { code, out, err } = await noonmark(['assess', '--sunshine', 'yes']);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain('--sunshine');
  });

  it.each([
    [[]],
    [['measure']],
    [['assess']],
    [['assess', 'a.json', '--step', '7']],
    [['assess', 'a.json', '--step', 'fast']],
    [['assess', 'a.json', '--transposition', 'flat']],
    [['check']],
    [['weather']],
    [['weather', 'a.epw', 'b.epw']],
    [['climate', '--latitude', '40']],
    [['climate', '--latitude', '40', '--longitude', '190']],
    [['sun', 'file.csv']],
    [['sun']],
    [['sun', '--latitude', '40']],
    [['sun', '--latitude', 'north', '--longitude', '1']],
    [['sun', '--latitude', '1', '--longitude', '1', '--at', 'noon']],
    [['declination', '--date', '2026-01-01']],
    [['self-check', 'all']],
  ])('%o', async (words) => {
    const { code, out, err } = await typed(...words);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain('Usage: noonmark');
  });
});

describe('the other commands', () => {
  it('check: tells good and bad files apart, by exit code too', async () => {
    const good = join(project, 'survey-samples/valley-full-horizon.json');
    const bad = join(project, 'package.json');
    expect((await typed('check', good)).code).toBe(0);
    const both = await typed('check', good, bad, '--json');
    expect(both.code).toBe(1);
    const { files } = JSON.parse(both.out) as { files: { ok: boolean; problems: { path: string }[] }[] };
    expect(files.map(({ ok }) => ok)).toEqual([true, false]);
    expect(files[1].problems[0].path).toBe('format');
  });

  it('check: tells a warning as the other commands do', async () => {
    const folder = newFolder();
    const file = join(folder, 'odd.json');
    const survey = JSON.parse(
      readFileSync(join(project, 'survey-samples/valley-full-horizon.json'), 'utf8'),
    ) as object;
    writeFileSync(file, JSON.stringify({ ...survey, unheardOf: 1 }));
    const { code, err } = await typed('check', file);
    rmSync(folder, { recursive: true, force: true });
    expect(code).toBe(0);
    expect(err).toContain('unheardOf: Warning: ');
  });

  it('climate: gives twelve months whose diffuse share is that of the grid', async () => {
    const { code, out } = await typed('climate', '--latitude', '-33.9', '--longitude', '151.2', '--json');
    expect(code).toBe(0);
    const months = JSON.parse(out) as {
      ghi: { monthly: number[] };
      dhi: { monthly: number[] };
      diffuseFraction: number[];
    };
    expect(months.ghi.monthly).toHaveLength(12);
    months.diffuseFraction.forEach((share, month) =>
      expect(months.dhi.monthly[month] / months.ghi.monthly[month]).toBeCloseTo(share, 2),
    );
  });

  it('weather: refuses what is no weather file, with the line', async () => {
    const { code, out, err } = await typed('weather', join(project, 'package.json'));
    expect([code, out]).toEqual([1, '']);
    expect(err).toContain('line 1');
  });

  it('weather: refuses a folder', async () => {
    const { code, err } = await typed('weather', project);
    expect(code).toBe(1);
    expect(err).toContain('is not a file');
  });

  it('self-check: meets every published value', async () => {
    const { code, out } = await typed('self-check', '--json');
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ ok: true });
    expect((await typed('self-check')).out).not.toContain('NOT MET');
  });
});
