import type { SelfCheckGroup } from './check-row.ts';
import { declinationCheck } from './declination-check.ts';
import { skyViewCheck } from './sky-view-check.ts';
import { equationOfTimeCheck, noaaDayCheck, spaExampleCheck } from './sun-place-check.ts';
import { sunriseChecks } from './sunrise-check.ts';

/** Recomputes every published value built in, here and now. Pure: the same on every device that computes right. */
export const runSelfCheck = (): SelfCheckGroup[] => [
  noaaDayCheck(),
  spaExampleCheck(),
  equationOfTimeCheck(),
  ...sunriseChecks(),
  declinationCheck(),
  skyViewCheck(),
];
