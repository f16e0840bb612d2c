import { turnBetween } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import type { HeadingCheck, Site } from '../survey/survey.ts';
import type { ClockVerdict } from './clock-test.ts';
import { COMPASS_REACH, clockByLength, clockByPair } from './clock-test.ts';
import type { OffsetSeen } from './heading-fit.ts';
import type { CheckResult } from './pointed-survey.ts';

/** A compass that was this far off is worth a word, degrees. No source. */
const COMPASS_OFF = 10;

/** One run's checks held against its compass and its clock. */
export interface JudgedChecks {
  checks: CheckResult[];
  warnings: Problem[];
}

export interface Judgement {
  site: Site;
  /** The checks of the record by result. */
  recordOf: (result: CheckResult) => HeadingCheck;
  compass: OffsetSeen | null;
  /** What the run's frame may turn in a minute, degrees, standard deviation. */
  driftPerMinute: number;
}

/**
 * A check that evidence speaks against is refused; one that disagrees with the compass more than a compass can be off,
 * and that nothing decides, stays with its deviation widened to half the disagreement.
 */
export function judgedChecks(results: readonly CheckResult[], judgement: Judgement): JudgedChecks {
  const warnings: Problem[] = [];
  const pair = pairVerdict(results, judgement);
  const checks = results.map((read) => {
    const result = alongEdge(read, judgement);
    if (result.offset === null) return result;
    const judged = judgedCheck(result, verdictOn(result, pair, judgement), judgement);
    if (judged.warning) warnings.push({ path: result.path, message: judged.warning });
    return judged.check;
  });
  return { checks, warnings };
}

/** The bearing of an edge on a plan may be that of either way along it; a compass tells which was sighted. */
function alongEdge(result: CheckResult, { compass, recordOf }: Judgement): CheckResult {
  const isEdge = result.method === 'plan-bearing' && recordOf(result).mark === undefined;
  if (!isEdge || !compass || result.offset === null) return result;
  const isOtherWay = Math.abs(turnBetween(compass.offset, result.offset)) > 90;
  return isOtherWay ? { ...result, offset: turnBetween(0, result.offset + 180) } : result;
}

/** The verdict of the first and the last check by shadow. */
function pairVerdict(results: readonly CheckResult[], { site, driftPerMinute }: Judgement): ClockVerdict {
  const bySun = results
    .filter(({ method, offset }) => method === 'sun-shadow' && offset !== null)
    .sort((a, b) => a.takenAtMs - b.takenAtMs);
  const [first, last] = [bySun[0], bySun.at(-1)];
  if (!first || !last || first === last) return { is: 'unknown' };
  const minutes = (last.takenAtMs - first.takenAtMs) / 60_000;
  return clockByPair(first, last, site, driftPerMinute * minutes);
}

function verdictOn(result: CheckResult, pair: ClockVerdict, { site, recordOf }: Judgement): ClockVerdict {
  if (result.method !== 'sun-shadow') return { is: 'unknown' };
  const byLength = clockByLength(recordOf(result), result.takenAtMs, site);
  return byLength.is === 'unknown' ? pair : byLength;
}

function judgedCheck(
  result: CheckResult,
  verdict: ClockVerdict,
  { compass }: Judgement,
): { check: CheckResult; warning: string | null } {
  const against = compass ? turnBetween(compass.offset, result.offset!) : null;
  const check = { ...result, againstCompass: against };
  if (verdict.is === 'wrong') {
    const refused = wrongClock(verdict);
    return { check: { ...check, offset: null, refused }, warning: refused };
  }
  const off = Math.abs(against ?? 0);
  if (off <= COMPASS_OFF) return { check, warning: null };
  if (verdict.is === 'right')
    return { check, warning: steel(off, 'The sun’s time is confirmed, so the check counts.') };
  if (off <= COMPASS_REACH) return { check, warning: steel(off, 'The check counts.') };
  const widened = { ...check, standardDeviation: Math.hypot(result.standardDeviation, off / 2) };
  return { check: widened, warning: undecided(result, against!) };
}

const steel = (off: number, consequence: string) =>
  `Check and compass differ by ${off.toFixed(0)}°: the compass is disturbed here, by steel, rails or an inverter. ${consequence} Do not trust the compass in runs without a check.`;

function wrongClock({ minutes, because }: { minutes: number | null; because: string }): string {
  const by =
    minutes === null
      ? 'clock, zone or place is wrong'
      : `the clock or its zone is off by about ${Math.abs(minutes)} minutes (${minutes > 0 ? 'slow' : 'fast'})`;
  return `The check does not count: ${because}, so ${by}. Set the clock and zone right and take the check again.`;
}

function undecided({ method }: CheckResult, against: number): string {
  const off = Math.abs(against).toFixed(0);
  const counted = 'Until then it counts with half the difference as its deviation.';
  if (method !== 'sun-shadow')
    return `Check and compass differ by ${off}°, more than a compass can be off: another mark was sighted, its bearing is wrong, or there is steel. A check by shadow decides. ${counted}`;
  const round =
    Math.abs(against) > 180 - COMPASS_REACH
      ? ' The phone may also have pointed towards the sun instead of along the shadow, away from it.'
      : '';
  return `Check and compass differ by ${off}°, more than a compass can be off: clock, zone or steel.${round} A second check an hour later, or the length of an upright’s shadow, decides. ${counted}`;
}
