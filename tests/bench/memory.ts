import { spawnSync } from 'node:child_process';

/** Peak memory of `noonmark assess` on one survey file, MB, as the process itself reports it at its end. */
export function assessMemory(file: string): number {
  const report = `process.on('exit', () => process.stderr.write('PEAK ' + process.resourceUsage().maxRSS + '\\n'))`;
  const run = spawnSync(
    process.execPath,
    [
      '--import',
      `data:text/javascript,${encodeURIComponent(report)}`,
      '--import',
      'tsx',
      'src/cli/main.ts',
      'assess',
      file,
      '--json',
    ],
    { encoding: 'utf8', maxBuffer: 1e8 },
  );
  const peak = /PEAK (\d+)/.exec(run.stderr)?.[1];
  if (run.status !== 0 || !peak) throw new Error(`assess ${file} failed: ${run.stderr}`);
  return Number(peak) / 1024;
}
