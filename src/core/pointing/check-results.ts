import { RADIANS, turnBetween } from '../angles/angles.ts';
import type { HeadingCheck, Reading, Site, Survey } from '../survey/survey.ts';
import { headingMethod } from './heading-methods.ts';
import { PLANNING } from './planning-values.ts';
import type { CheckResult } from './pointed-survey.ts';
import type { Problem } from '../survey/problem.ts';
import type { AxisIndex, FramePointing } from './reading-direction.ts';
import { pointingOfReading } from './reading-direction.ts';
import type { MarkPointing } from './mark-pointings.ts';

/** An axis steeper than this has no azimuth to compare, degrees. */
const STEEPEST = 70;

/** Whether an axis at this elevation [degrees] is too steep for its azimuth to be compared. */
export const isTooSteep = (elevation: number): boolean => Math.abs(elevation) > STEEPEST;

export interface CheckInput {
  survey: Survey;
  readings: ReadonlyMap<string, Reading>;
  indexOf: (run: string) => AxisIndex;
  marks: readonly MarkPointing[];
}

/** What every heading check found for its run, and problems of checks that found nothing at all. */
export function checkResults(input: CheckInput): { results: CheckResult[]; warnings: Problem[] } {
  const results: CheckResult[] = [];
  const warnings: Problem[] = [];
  input.survey.stations.forEach((station, s) => {
    (station.headingChecks ?? []).forEach((check, c) => {
      const path = `stations[${s}].headingChecks[${c}]`;
      const pointings = pointingsOf(check, station.id, input);
      if (pointings.length === 0) warnings.push({ path, message: nothingSighted(check) });
      for (const pointing of pointings) {
        const result = resultOf(check, pointing, station.id, path, input.survey.site);
        results.push(result);
        if (result.refused) warnings.push({ path: result.path, message: result.refused });
      }
    });
  });
  return { results, warnings };
}

/** The check's own reading, else every sighting of its mark from its station. */
function pointingsOf(check: HeadingCheck, station: string, input: CheckInput): FramePointing[] {
  if (check.reading !== undefined) {
    const reading = input.readings.get(check.reading);
    const pointing = reading && pointingOfReading(reading, input.indexOf(reading.run));
    return pointing ? [pointing] : [];
  }
  if (check.mark === undefined) return [];
  return input.marks
    .filter((one) => one.station === station && one.mark === check.mark)
    .map(({ pointing }) => pointing);
}

function nothingSighted({ reading, mark }: HeadingCheck): string {
  if (reading !== undefined)
    return 'The reading of this check has no angles, so the check ties nothing. Take it again.';
  if (mark !== undefined)
    return `No sighting of "${mark}" from this station was read by the phone, so the check ties nothing. Sight the mark from here.`;
  return 'The check has neither a reading nor a mark, so it ties nothing. Take the reading, or name the mark that was sighted.';
}

function resultOf(
  check: HeadingCheck,
  pointing: FramePointing,
  station: string,
  path: string,
  site: Site,
): CheckResult {
  const { run, takenAtMs, azimuth, elevation } = pointing;
  const known = {
    check: check.id,
    station,
    path,
    method: check.method,
    run,
    takenAtMs,
    againstCompass: null,
  };
  const none = { ...known, offset: null, standardDeviation: 0 };
  if (isTooSteep(elevation))
    return {
      ...none,
      refused: `The axis pointed ${Math.abs(elevation).toFixed(0)}° ${elevation > 0 ? 'up' : 'down'}, too steeply to have a direction. Take the check again with the phone’s top edge, or nearer to level.`,
    };
  const reference = headingMethod(check.method).reference({ check, site, takenAtMs });
  if (!reference.ok) {
    const at =
      reference.field === undefined || reference.field === 'reading' ? path : `${path}.${reference.field}`;
    return { ...none, path: at, refused: reference.message };
  }
  const read = PLANNING.pointing / Math.cos(elevation * RADIANS);
  return {
    ...known,
    offset: turnBetween(azimuth, reference.azimuth),
    standardDeviation: Math.hypot(reference.standardDeviation, read),
    refused: null,
  };
}
