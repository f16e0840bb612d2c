import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/** The project's folder. */
export const projectFolder = fileURLToPath(new URL('../..', import.meta.url));

export interface Violation {
  rule: { name: string };
  from: string;
  to: string;
}

export interface Cruise {
  /** Files under src that the rules were held against, in relation to the folder. */
  sources: string[];
  violations: Violation[];
}

interface Output {
  modules: { source: string }[];
  summary: { violations: Violation[] };
}

/** Runs a tool of the project in a folder and gives its output and exit code. */
export function runTool(tool: string, args: string[], folder: string) {
  const script = `${projectFolder}node_modules/${tool}`;
  const { stdout, stderr, status } = spawnSync(process.execPath, [script, ...args], {
    cwd: folder,
    encoding: 'utf8',
    maxBuffer: 200_000_000,
  });
  return { stdout, stderr, status };
}

/** Holds the import rules against everything under `src` of a folder. */
export function cruise(folder: string): Cruise {
  const args = ['src', '--config', '.dependency-cruiser.cjs', '--output-type', 'json'];
  const { stdout, stderr } = runTool('dependency-cruiser/bin/dependency-cruise.mjs', args, folder);
  if (stdout === '') throw new Error(`the import rules did not run: ${stderr}`);
  const { modules, summary } = JSON.parse(stdout) as Output;
  const sources = modules.map(({ source }) => source).filter((source) => source.startsWith('src/'));
  return { sources, violations: summary.violations };
}
