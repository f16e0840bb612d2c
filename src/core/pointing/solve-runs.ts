import { turnBetween } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import type { Reading, Run, Survey } from '../survey/survey.ts';
import { magneticDeclination } from './declination.ts';
import { PLANNING } from './planning-values.ts';
import type { PointedRun, RunHeading } from './pointed-survey.ts';
import type { AxisIndex } from './reading-direction.ts';

/** The runs of a survey with their headings, and what the sightings need to be pointed. */
export interface SolvedRuns {
  runs: Map<string, PointedRun>;
  readings: ReadonlyMap<string, Reading>;
  indexOf: (run: string) => AxisIndex;
  warnings: Problem[];
}

/** Heading, inclination index and closure of every run. */
export function solveRuns(survey: Survey): SolvedRuns {
  const runs = new Map(survey.runs.map((run) => [run.id, solveRun(run, survey)]));
  return {
    runs,
    readings: new Map(survey.readings.map((reading) => [reading.id, reading])),
    indexOf: () => ({ camera: 0, 'top-edge': 0 }),
    warnings: [],
  };
}

function solveRun(run: Run, survey: Survey): PointedRun {
  const planned = { value: 0, standardDeviation: PLANNING.elevationIndex, source: 'planned' } as const;
  return {
    id: run.id,
    heading: ownHeading(run, survey),
    index: { camera: planned, 'top-edge': planned },
    closure: null,
    refused: null,
    checks: [],
  };
}

function ownHeading(run: Run, { site }: Survey): RunHeading | null {
  if (run.frame === 'relative') return null;
  const atMs = Date.parse(run.startedAt);
  const { declination, standardDeviation } = magneticDeclination({ ...site, timeMs: atMs });
  const deviation = Math.hypot(PLANNING.compass, standardDeviation);
  return {
    offset: run.frame === 'magnetic' ? turnBetween(0, declination) : 0,
    standardDeviation: deviation,
    atMs,
    ratePerMinute: 0,
    ratePerMinuteDeviation: 0,
    source: run.frame === 'magnetic' ? 'compass' : 'device',
    from: null,
    ownDeviation: deviation,
    outliers: { share: PLANNING.compassOutlierShare, reach: PLANNING.compassOutlierReach },
  };
}
