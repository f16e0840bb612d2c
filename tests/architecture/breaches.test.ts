import { cpSync, mkdirSync, mkdtempSync, readdirSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cruise, projectFolder, runTool } from './cruise.ts';
import type { Cruise } from './cruise.ts';

/**
 * A small house under the project's own rules, with one file for each way of breaking them. Each breach must be
 * caught; the honest files must not be.
 */
const HONEST = {
  'src/core/angles/turn.ts': 'export const turn = 360;\n',
  'src/core/angles/half-turn.ts': `import { turn } from './turn.ts';\nexport const halfTurn = turn / 2;\n`,
  'src/app/state.ts': `import { turn } from '../core/angles/turn.ts';\nexport const state = { turn };\n`,
  'src/ui/screen.ts': `import { state } from '../app/state.ts';\nexport interface Screen { turn: number }\nexport const screen: Screen = state;\n`,
  'src/storage/keep.ts': `import { turn } from '../core/angles/turn.ts';\nexport const kept = turn;\n`,
  'src/main.tsx': `import { screen } from './ui/screen.ts';\nimport { kept } from './storage/keep.ts';\nexport const all = [screen, kept];\n`,
};

/** Caught by the import rules: file, text, name of the rule. */
const IMPORTS: [string, string, string][] = [
  [
    'src/core/breach/ui.ts',
    `import { screen } from '../../ui/screen.ts';\nexport const a = screen;\n`,
    'core-imports',
  ],
  [
    'src/core/breach/ui-type.ts',
    `import type { Screen } from '../../ui/screen.ts';\nexport type A = Screen;\n`,
    'core-imports',
  ],
  ['src/core/breach/ui-later.ts', `export const a = () => import('../../ui/screen.ts');\n`, 'core-imports'],
  [
    'src/app/storage.ts',
    `import { kept } from '../storage/keep.ts';\nexport const a = kept;\n`,
    'app-imports',
  ],
  ['src/ui/storage.ts', `import { kept } from '../storage/keep.ts';\nexport const a = kept;\n`, 'ui-imports'],
  [
    'src/core/breach/node.ts',
    `import { readFileSync } from 'node:fs';\nexport const a = readFileSync;\n`,
    'core-packages',
  ],
  [
    'src/core/breach/package.ts',
    `import { openDB } from 'idb';\nexport const a = openDB;\n`,
    'core-packages',
  ],
  ['src/ui/package.ts', `import { openDB } from 'idb';\nexport const a = openDB;\n`, 'ui-packages'],
  [
    'src/core/breach/sun.ts',
    `import { getPosition } from 'suncalc';\nexport const a = getPosition;\n`,
    'suncalc-behind-one-folder',
  ],
  [
    'src/gadgets/new-folder.ts',
    `import { turn } from '../core/angles/turn.ts';\nexport const a = turn;\n`,
    'new-top-folder-needs-a-row',
  ],
  ['src/core/breach/vague.ts', `import { b } from './utils.ts';\nexport const a = b;\n`, 'no-vague-names'],
  ['src/core/breach/round.ts', `import { b } from './about.ts';\nexport const a = b;\n`, 'no-circular'],
  ['src/core/breach/orphan.ts', `export const a = 1;\n`, 'no-orphans'],
  [
    'src/core/breach/misspelt.ts',
    `import { b } from './nowhere.ts';\nexport const a = b;\n`,
    'no-unresolvable',
  ],
  [
    'src/core/breach/tests.ts',
    `import { b } from '../../../tests/values.ts';\nexport const a = b;\n`,
    'src-not-to-tests',
  ],
];

/** Caught by the compiler in core, which knows the language and nothing of a browser or of Node. */
const OUTSIDE: [string, string][] = [
  ['src/core/outside/document.ts', 'export const a = () => document.title;\n'],
  ['src/core/outside/fetch.ts', `export const a = () => fetch('/x');\n`],
  ['src/core/outside/console.ts', `export const a = () => console.log('x');\n`],
  ['src/core/outside/timer.ts', 'export const a = () => setTimeout(() => 1, 5);\n'],
  ['src/core/outside/process.ts', 'export const a = () => process.argv;\n'],
  ['src/core/outside/local-storage.ts', `export const a = () => localStorage.getItem('x');\n`],
];

/** Caught by the linter in core: the clock and chance. */
const CLOCK: [string, string, string][] = [
  ['src/core/clock/now.ts', 'export const a = () => Date.now();\n', 'no-restricted-properties'],
  ['src/core/clock/new-date.ts', 'export const a = () => new Date();\n', 'no-restricted-syntax'],
  ['src/core/clock/chance.ts', 'export const a = () => Math.random();\n', 'no-restricted-properties'],
];

const SUPPORT = {
  'src/core/breach/utils.ts': 'export const b = 1;\n',
  'src/core/breach/about.ts': `import { a } from './round.ts';\nexport const b = (): unknown => a;\n`,
  'tests/values.ts': 'export const b = 1;\n',
};

const SETTINGS = ['.dependency-cruiser.cjs', 'package.json', 'src/eslint.config.js', 'src/tsconfig.json'];

let folder: string;

function write(path: string, text: string): void {
  mkdirSync(dirname(join(folder, path)), { recursive: true });
  writeFileSync(join(folder, path), text);
}

/** The project's own settings: what is tested is the rules that hold here, not a copy of them. */
function copySettings(): void {
  mkdirSync(join(folder, 'src'), { recursive: true });
  const folders = readdirSync(`${projectFolder}src`, { withFileTypes: true }).filter((entry) =>
    entry.isDirectory(),
  );
  const perFolder = folders.map(({ name }) => `src/${name}/tsconfig.json`);
  for (const path of [...SETTINGS, 'src/tsconfig.base.json', ...perFolder])
    cpSync(join(projectFolder, path), join(folder, path));
  symlinkSync(join(projectFolder, 'node_modules'), join(folder, 'node_modules'));
}

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'noonmark-breaches-'));
  copySettings();
  for (const [path, text] of [
    ...Object.entries(HONEST),
    ...Object.entries(SUPPORT),
    ...IMPORTS,
    ...OUTSIDE,
    ...CLOCK,
  ])
    write(path, text);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the import rules catch', () => {
  let result: Cruise;
  beforeAll(() => {
    result = cruise(folder);
  });

  it.each(IMPORTS)('%s', (path, _text, rule) => {
    // a cycle is reported once, from either end
    const broken = result.violations
      .filter(({ from, to }) => from === path || to === path)
      .map(({ rule }) => rule.name);
    expect(broken).toContain(rule);
  });

  it('nothing in the honest files', () => {
    const honest = new Set(Object.keys(HONEST));
    expect(result.sources).toEqual(expect.arrayContaining([...honest]));
    expect(result.violations.filter(({ from }) => honest.has(from))).toEqual([]);
  });
});

describe('the compiler catches', () => {
  let output: string;
  beforeAll(() => {
    const args = [
      '-p',
      'src/core/tsconfig.json',
      '--noEmit',
      '--tsBuildInfoFile',
      join(folder, 'types.json'),
    ];
    output = runTool('typescript/bin/tsc', args, folder).stdout;
  });

  it.each(OUTSIDE)('%s', (path) => {
    expect(output).toMatch(new RegExp(`^${path}.* error TS(2304|2584|2591|2580|2552)`, 'm'));
  });

  it('nothing in the honest files', () => {
    expect(output).not.toContain('src/core/angles/');
  });
});

describe('the linter catches', () => {
  let output: { filePath: string; messages: { ruleId: string }[] }[];
  beforeAll(() => {
    const args = ['-c', 'src/eslint.config.js', '--format', 'json', 'src/core/clock', 'src/core/angles'];
    output = JSON.parse(runTool('eslint/bin/eslint.js', args, folder).stdout) as typeof output;
  });
  const rulesBroken = (path: string) =>
    output.find(({ filePath }) => filePath.endsWith(path))?.messages.map(({ ruleId }) => ruleId);

  it.each(CLOCK)('%s', (path, _text, rule) => {
    expect(rulesBroken(path)).toContain(rule);
  });

  it('nothing in the honest files', () => {
    expect(rulesBroken('src/core/angles/turn.ts')).toEqual([]);
  });
});
