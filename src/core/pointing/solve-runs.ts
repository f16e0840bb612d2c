import type { Problem } from '../survey/problem.ts';
import type { HeadingCheck, Reading, Run, Survey } from '../survey/survey.ts';
import { checkResults } from './check-results.ts';
import type { RunClosure } from './closure.ts';
import { runClosure } from './closure.ts';
import type { CompassLook } from './compass-heading.ts';
import { compassLook } from './compass-heading.ts';
import { elevationIndexes } from './elevation-index.ts';
import { groupedBy } from './grouped-by.ts';
import type { OffsetRate, OffsetSeen } from './heading-fit.ts';
import { fitOffset } from './heading-fit.ts';
import { judgedChecks } from './judged-checks.ts';
import { markPointings } from './mark-pointings.ts';
import { PLANNING } from './planning-values.ts';
import type { CheckResult, PointedRun, RunHeading } from './pointed-survey.ts';
import type { AxisIndex } from './reading-direction.ts';
import type { RunState } from './run-ties.ts';
import { tieRuns } from './run-ties.ts';

/** The runs of a survey with their headings, and what the sightings need to be pointed. */
export interface SolvedRuns {
  runs: Map<string, PointedRun>;
  readings: ReadonlyMap<string, Reading>;
  indexOf: (run: string) => AxisIndex;
  warnings: Problem[];
}

/** Checks of one run further apart than this multiple of their deviations, and these degrees, are worth a word. */
const DISAGREEMENT = 3;
const NO_INDEX: AxisIndex = { camera: 0, 'top-edge': 0 };

/** Heading, inclination index and closure of every run of a survey that the parser has passed. */
export function solveRuns(survey: Survey): SolvedRuns {
  const readings = new Map(survey.readings.map((reading) => [reading.id, reading]));
  const index = elevationIndexes(survey, readings);
  const corrections = new Map([...index.byRun].map(([id, of]) => [id, correctionOf(of)]));
  const indexOf = (run: string) => corrections.get(run) ?? NO_INDEX;
  const marks = markPointings(survey, readings, indexOf);
  const checks = checkResults({ survey, readings, indexOf, marks });
  const marksByRun = groupedBy(marks, ({ pointing }) => pointing.run);
  const checksByRun = groupedBy(checks.results, ({ run }) => run);
  const readingsByRun = groupedBy(survey.readings, ({ run }) => run);
  const recordOf = checkRecords(survey);
  const solved = survey.runs.map((run, i) =>
    solveRun(run, {
      path: `runs[${i}]`,
      survey,
      recordOf,
      closure: runClosure(marksByRun.get(run.id) ?? []),
      compass: compassLook(run, `runs[${i}]`, readingsByRun.get(run.id) ?? [], survey.site),
      checks: checksByRun.get(run.id) ?? [],
    }),
  );
  const usable = solved.filter(({ closure }) => !closure?.refused);
  tieRuns(
    usable.map(({ state }) => state),
    marks,
  );
  const runs = new Map(
    solved.map(({ state, closure, checks }) => [
      state.id,
      {
        id: state.id,
        heading: state.heading,
        index: index.byRun.get(state.id)!,
        closure: closure?.closure ?? null,
        refused: closure?.refused ?? null,
        checks,
      },
    ]),
  );
  const warnings = [...index.warnings, ...checks.warnings, ...solved.flatMap((one) => one.warnings)];
  return { runs, readings, indexOf, warnings };
}

const correctionOf = (index: PointedRun['index']): AxisIndex => ({
  camera: index.camera.value,
  'top-edge': index['top-edge'].value,
});

/** The check of the record that a result came from. */
function checkRecords(survey: Survey): (result: CheckResult) => HeadingCheck {
  const keyed = survey.stations.flatMap((station) =>
    (station.headingChecks ?? []).map((check) => [JSON.stringify([station.id, check.id]), check] as const),
  );
  const records = new Map(keyed);
  return ({ station, check }) => records.get(JSON.stringify([station, check]))!;
}

interface RunEvidence {
  path: string;
  survey: Survey;
  recordOf: (result: CheckResult) => HeadingCheck;
  closure: RunClosure | null;
  compass: CompassLook;
  checks: CheckResult[];
}

interface SolvedRun {
  state: RunState;
  closure: RunClosure | null;
  checks: CheckResult[];
  warnings: Problem[];
}

/** What a run has by itself: its checks, else its compass. */
function solveRun(run: Run, { path, survey, recordOf, closure, compass, checks }: RunEvidence): SolvedRun {
  const rate = closure?.rate ?? plannedRate(run);
  const judged = judgedChecks(checks, {
    site: survey.site,
    recordOf,
    compass: compass.seen,
    driftPerMinute: rate.standardDeviation,
  });
  const warnings = [...compass.warnings, ...judged.warnings];
  if (closure?.refused) warnings.push({ path, message: `The run is refused. ${closure.refused}` });
  const seen = judged.checks.flatMap(({ offset, takenAtMs, standardDeviation }) =>
    offset === null ? [] : [{ offset, atMs: takenAtMs, standardDeviation }],
  );
  const state: RunState = {
    id: run.id,
    device: run.device,
    isMagnetic: run.frame === 'magnetic',
    heading: ownHeading(run, seen, compass.seen, rate),
    rate,
  };
  const apart = disagreementOf(seen, rate);
  if (apart) warnings.push({ path, message: apart });
  return { state, closure, checks: judged.checks, warnings };
}

/** A compass holds its north; without one the azimuths drift. */
const plannedRate = ({ frame }: Run): OffsetRate => ({
  value: 0,
  standardDeviation: frame === 'relative' ? PLANNING.yawDriftPerMinute : 0,
});

function ownHeading(
  { frame }: Run,
  seen: readonly OffsetSeen[],
  compass: OffsetSeen | null,
  rate: OffsetRate,
): RunHeading | null {
  const byCheck = seen.length > 0;
  if (!byCheck && !compass) return null;
  const fit = fitOffset(byCheck ? seen : [compass!], rate);
  return {
    offset: fit.offset,
    standardDeviation: fit.standardDeviation,
    atMs: fit.atMs,
    ratePerMinute: fit.ratePerMinute,
    ratePerMinuteDeviation: fit.ratePerMinuteDeviation,
    source: byCheck ? 'check' : frame === 'true' ? 'device' : 'compass',
    from: null,
    ownDeviation: fit.standardDeviation,
    outliers: byCheck ? null : { share: PLANNING.compassOutlierShare, reach: PLANNING.compassOutlierReach },
  };
}

function disagreementOf(seen: readonly OffsetSeen[], rate: OffsetRate): string | null {
  if (seen.length < 2) return null;
  const { disagreement } = fitOffset(seen, rate);
  if (disagreement <= DISAGREEMENT) return null;
  return `The ${seen.length} heading checks of this run disagree, by ${disagreement.toFixed(1)} times what they should. Look at each; amend or remove the one that is wrong, or take another.`;
}
