import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { cruise, projectFolder } from './cruise.ts';

const filesUnderSrc = () =>
  readdirSync(`${projectFolder}src`, { recursive: true, encoding: 'utf8' })
    .map((file) => `src/${file.replaceAll('\\', '/')}`)
    .filter((file) => /[.]tsx?$/.test(file) && !file.endsWith('.d.ts'))
    .sort();

describe('the import rules', () => {
  const { sources, violations } = cruise(projectFolder);

  it('are held against every file under src', () => {
    // An unsupported compiler makes the tool read nothing and report success.
    const seen = new Set(sources);
    expect(filesUnderSrc().filter((file) => !seen.has(file))).toEqual([]);
    expect(seen.size).toBeGreaterThan(5);
  });

  it('are kept', () => {
    expect(violations.map(({ rule, from, to }) => `${rule.name}: ${from} -> ${to}`)).toEqual([]);
  });
});
