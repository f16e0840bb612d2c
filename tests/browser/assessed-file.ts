import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Survey } from '../../src/core/survey/survey.ts';
import { newFolder, noonmark } from '../cli/run-noonmark.ts';

interface StationFigures {
  solarAccess: { annual: number; interval?: { low: number; high: number } };
  coverage: number;
}

/** What the command line makes of an exported survey: its first station over its first plane. */
export async function assessed(survey: Survey): Promise<StationFigures> {
  const file = join(newFolder(), 'exported.json');
  writeFileSync(file, JSON.stringify(survey));
  const { code, out, err } = await noonmark(['assess', '--json', file]);
  if (code !== 0) throw new Error(`assess ended with ${code}: ${err}${out}`);
  const { surveys } = JSON.parse(out) as { surveys: { planes: { stations: StationFigures[] }[] }[] };
  return surveys[0].planes[0].stations[0];
}
