import type { Problem } from '../survey/problem.ts';
import type { SightingDirection } from '../survey/sighting-direction.ts';
import type { HeadingMethodId, SightingAxis } from '../survey/survey.ts';

/**
 * Every sighting of a survey turned into a true direction, with what it may err by.
 *
 * How to draw a survey from the error model, all draws independent and normal of mean 0:
 * - per run, a heading error: `ownDeviation`, plus the error drawn for the run named in `from`, and a drift of
 *   `ratePerMinuteDeviation` for each minute between the sighting and the heading's `atMs`;
 * - per run and axis, an index error of `index[axis].standardDeviation`, added to elevations;
 * - per sighting, `random.azimuth` and `random.elevation`;
 * - for typed sightings `typed.heading` and `typed.index` instead of a run's, one draw for the survey.
 */
export interface PointedSurvey {
  /** One for each run, in the order of the record. */
  runs: PointedRun[];
  /** By id, sightings of traces and of marks alike. */
  sightings: ReadonlyMap<string, PointedSighting>;
  /** One for each plane, in the order of the record. */
  planes: PointedPlane[];
  /** Standard deviations of what all typed sightings have in common, degrees; see `PLANNING`. */
  typed: { heading: number; index: number };
  warnings: Problem[];
}

export interface PointedSighting {
  id: string;
  /** Where it stands in the record. */
  path: string;
  station: string;
  /** Null for a sighting of a mark that belongs to no trace. */
  trace: string | null;
  mark: string | null;
  /** Where it points; null where that is not known. */
  direction: SightingDirection | null;
  /** Why it has no direction; null where it has one. */
  undirected: Undirected | null;
  /** Whose word the direction is. */
  source: 'amendment' | 'typed' | 'reading';
  /** Run and axis whose errors move it; null where it was typed or amended. */
  run: string | null;
  axis: SightingAxis;
  /** Unix time it was taken [ms]; null where it was typed. */
  takenAtMs: number | null;
  /**
   * Standard deviations of its own, degrees: of the elevation, and of the azimuth itself, which grows towards the
   * zenith (at most 90).
   */
  random: { azimuth: number; elevation: number };
}

/** Why a sighting points nowhere, with a sentence that says what to do. */
export interface Undirected {
  code: 'no-angles' | 'no-heading' | 'run-refused' | 'cancelled-out';
  message: string;
}

export interface PointedRun {
  id: string;
  /** True azimuth = azimuth in the run's frame + offset. Null where nothing ties the frame to the earth. */
  heading: RunHeading | null;
  /** Correction of the inclination by sighting axis: true elevation = elevation read + value. */
  index: Record<SightingAxis, { value: number; standardDeviation: number; source: 'two-face' | 'planned' }>;
  /** What closing the horizon showed; null where no mark was sighted twice from one station. */
  closure: Closure | null;
  /** Why the run's readings may not be used, as a sentence; null where they may. */
  refused: string | null;
  checks: CheckResult[];
}

export interface RunHeading {
  /** Degrees clockwise, -180 to 180, at the instant `atMs`. */
  offset: number;
  /** Of the offset at `atMs`, degrees. */
  standardDeviation: number;
  /** Instant at which the offset is known best, Unix time [ms]; offset and rate err independently there. */
  atMs: number;
  /** The offset grows by this much a minute: offset(t) = offset + ratePerMinute · minutes since `atMs`. */
  ratePerMinute: number;
  ratePerMinuteDeviation: number;
  /**
   * `check`: heading checks of this run; `tied`: a mark sighted in a run that is known better; `shared`: the check of
   * another run of the same compass; `compass`: the compass and the declination alone; `device`: the device says that
   * its north is true.
   */
  source: 'check' | 'tied' | 'shared' | 'compass' | 'device';
  /** The run it was taken over from, whose error it shares; null for its own. */
  from: string | null;
  /** The part of the standard deviation that is the run's own; with `from` null, all of it. */
  ownDeviation: number;
  /** Compass headings are now and then far off: so many of them (0 to 1), up to so many degrees; null otherwise. */
  outliers: { share: number; reach: number } | null;
}

/** A mark sighted again from the same station, in one run. */
export interface Closure {
  mark: string;
  station: string;
  /** Minutes between the first and the last sighting of it. */
  minutes: number;
  /** Last less first, degrees. The azimuths' is spread over the run by time; the elevations' is only told. */
  azimuth: number;
  elevation: number;
}

/** What one heading check found for its run. */
export interface CheckResult {
  /** Id of the check and of its station. */
  check: string;
  station: string;
  path: string;
  method: HeadingMethodId;
  run: string;
  takenAtMs: number;
  /** True azimuth less azimuth in the frame, degrees, -180 to 180, and its standard deviation; null where refused. */
  offset: number | null;
  standardDeviation: number;
  /** Check less compass, degrees, where the run has a compass. */
  againstCompass: number | null;
  /** Why it does not count, as a sentence; null where it does. */
  refused: string | null;
}

/** What a plane's own readings say; the record's `surfaceTilt` and `surfaceAzimuth` stay what counts. */
export interface PointedPlane {
  id: string;
  tilt: PlaneAngle | null;
  /** Facing, true azimuth. */
  azimuth: PlaneAngle | null;
}

export interface PlaneAngle {
  value: number;
  standardDeviation: number;
  /** Root mean square departure of the placings from their mean, degrees. */
  scatter: number;
  count: number;
  /** Placed both ways round, so that the sensor's own tilt cancels. */
  bothWays: boolean;
}
