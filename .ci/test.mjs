// npm test: every check, one after the other. A failing check does not hide the later ones.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureBrowser } from './browser.mjs';
import { ensurePackages, root } from './packages.mjs';

const tool = (path) => `${root}node_modules/${path}`;
const vitest = (project) => ({ name: `vitest ${project}`, counts: true, args: vitestArgs(project) });
const vitestArgs = (project) => [tool('vitest/vitest.mjs'), 'run', '--project', project];

const steps = [
  { name: 'prettier', args: [tool('prettier/bin/prettier.cjs'), '--check', 'src', 'tests', '.ci'] },
  {
    name: 'eslint',
    args: [tool('eslint/bin/eslint.js'), '-c', 'src/eslint.config.js', '--max-warnings=0', 'src', 'tests'],
  },
  { name: 'tsc', args: [tool('typescript/bin/tsc'), '-b', 'src', 'tests'] },
  vitest('unit'),
  { name: 'vite build', args: [tool('vite/bin/vite.js'), 'build', '--logLevel', 'warn'], production: true },
  { ...vitest('browser'), needsBrowser: true },
];

/** Passed and failed of one step: its tests where it counts them, else the step itself. */
function run(step) {
  if (step.needsBrowser && !ensureBrowser()) return { passed: 0, failed: 1 };
  const folder = mkdtempSync(join(tmpdir(), 'noonmark-test-'));
  const results = join(folder, 'results.json');
  const counting = step.counts
    ? ['--reporter=default', '--reporter=json', `--outputFile.json=${results}`]
    : [];
  const { status } = spawnSync(process.execPath, [...step.args, ...counting], {
    cwd: root,
    stdio: 'inherit',
    env: step.production ? { ...process.env, NODE_ENV: 'production' } : process.env,
  });
  const counted = existsSync(results) ? JSON.parse(readFileSync(results, 'utf8')) : null;
  rmSync(folder, { recursive: true, force: true });
  const failed = counted?.numFailedTests ?? 0;
  // a file that cannot be loaded or an error between tests fails the run without a failed test
  if (counted) return { passed: counted.numPassedTests, failed: failed === 0 && status !== 0 ? 1 : failed };
  return status === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

ensurePackages();
const total = { passed: 0, failed: 0 };
const failing = [];
for (const step of steps) {
  process.stdout.write(`\n== ${step.name}\n`);
  const started = Date.now();
  const { passed, failed } = run(step);
  total.passed += passed;
  total.failed += failed;
  if (failed > 0) failing.push(step.name);
  const seconds = ((Date.now() - started) / 1000).toFixed(1);
  process.stdout.write(`== ${step.name}: ${failed > 0 ? 'FAILED' : 'ok'} in ${seconds} s\n`);
}
if (failing.length > 0) process.stdout.write(`\nFailed: ${failing.join(', ')}\n`);
process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`);
process.exitCode = total.failed > 0 ? 1 : 0;
