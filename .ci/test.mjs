// npm test: every check. A failing check does not hide the others. Checks that need one core run side by side, and each
// is told as a whole once it has ended.
import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureBrowser } from './browser.mjs';
import { ensurePackages, root } from './packages.mjs';

const tool = (path) => `${root}node_modules/${path}`;
const vitest = (name, projects = name) => ({
  name: `vitest ${name}`,
  counts: true,
  args: [tool('vitest/vitest.mjs'), 'run', '--project', projects],
});

const sideBySide = [
  {
    name: 'eslint',
    args: [tool('eslint/bin/eslint.js'), '-c', 'src/eslint.config.js', '--max-warnings=0', 'src', 'tests'],
  },
  { name: 'prettier', args: [tool('prettier/bin/prettier.cjs'), '--check', 'src', 'tests', '.ci'] },
  { name: 'tsc', args: [tool('typescript/bin/tsc'), '-b', 'src', 'tests'] },
  { name: 'vite build', args: [tool('vite/bin/vite.js'), 'build', '--logLevel', 'warn'], production: true },
];
const oneByOne = [vitest('unit', 'unit*'), { ...vitest('browser'), needsBrowser: true }];

/** Runs a command to its end; gives its exit code, and what it said where that is not shown at once. */
function ended(args, env, shown) {
  return new Promise((resolve) => {
    const stdio = shown ? 'inherit' : ['ignore', 'pipe', 'pipe'];
    const child = spawn(process.execPath, args, { cwd: root, stdio, env });
    let said = '';
    for (const stream of [child.stdout, child.stderr])
      stream?.setEncoding('utf8').on('data', (text) => (said += text));
    child.on('error', (error) => resolve({ status: 1, said: `${said}${error.message}\n` }));
    child.on('close', (status) => resolve({ status, said }));
  });
}

/** Passed and failed of one step: its tests where it counts them, else the step itself. */
async function outcome(step, shown) {
  if (step.needsBrowser && !ensureBrowser()) return { passed: 0, failed: 1, said: '' };
  const folder = mkdtempSync(join(tmpdir(), 'noonmark-test-'));
  const results = join(folder, 'results.json');
  const counting = step.counts
    ? ['--reporter=default', '--reporter=json', `--outputFile.json=${results}`]
    : [];
  const env = step.production ? { ...process.env, NODE_ENV: 'production' } : process.env;
  const { status, said } = await ended([...step.args, ...counting], env, shown);
  const counted = existsSync(results) ? JSON.parse(readFileSync(results, 'utf8')) : null;
  rmSync(folder, { recursive: true, force: true });
  if (!counted) return status === 0 ? { passed: 1, failed: 0, said } : { passed: 0, failed: 1, said };
  const failed = counted.numFailedTests;
  // a file that cannot be loaded or an error between tests fails the run without a failed test
  return { passed: counted.numPassedTests, failed: failed === 0 && status !== 0 ? 1 : failed, said };
}

const total = { passed: 0, failed: 0 };
const failing = [];

/** Runs a step and tells what came of it; `shown`: its words as they come. */
async function run(step, shown) {
  if (shown) process.stdout.write(`\n== ${step.name}\n`);
  const started = Date.now();
  const { passed, failed, said } = await outcome(step, shown);
  total.passed += passed;
  total.failed += failed;
  if (failed > 0) failing.push(step.name);
  const seconds = ((Date.now() - started) / 1000).toFixed(1);
  if (!shown) process.stdout.write(`\n== ${step.name}\n${said}`);
  process.stdout.write(`== ${step.name}: ${failed > 0 ? 'FAILED' : 'ok'} in ${seconds} s\n`);
}

ensurePackages();
await Promise.all(sideBySide.map((step) => run(step, false)));
for (const step of oneByOne) await run(step, true);
if (failing.length > 0) process.stdout.write(`\nFailed: ${failing.join(', ')}\n`);
process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`);
process.exitCode = total.failed > 0 ? 1 : 0;
