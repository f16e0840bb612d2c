import type { Problem } from '../survey/problem.ts';
import type { TranspositionId } from '../survey/survey.ts';
import type { CureId, IntervalSourceId } from '../uncertainty/interval-source.ts';

/** Twelve monthly values; null in a month without sun on the plane. */
export type MonthlyShares = (number | null)[];

/** What the survey's obstructions cost. Irradiation in kWh/m2 (a year or a month), shares 0 to 1. */
export interface Assessment {
  climate: { source: string; name: string; reference: string; warnings: readonly string[] };
  transposition: TranspositionId;
  stepMinutes: number;
  /** What a person should know of the survey (a station that serves no plane). */
  warnings: Problem[];
  planes: PlaneAssessment[];
}

export interface PlaneAssessment {
  id: string;
  name: string;
  surfaceTilt: number;
  surfaceAzimuth: number;
  /** Unshaded irradiation on the plane, over that on the best-lying plane at this site. */
  orientationFactor: number;
  /**
   * Where the factor is expected 95 times in 100, by how well tilt and azimuth are known; left out where no intervals were
   * asked for, and at a site without light.
   */
  orientationInterval?: { low: number; high: number };
  /** How the best-lying plane lies. */
  bestPlane: { surfaceTilt: number; surfaceAzimuth: number };
  unshaded: Irradiation;
  /** Mean over the plane's stations; null where no station serves it. */
  solarAccess: PlaneAccess | null;
  stations: StationAssessment[];
}

export interface Irradiation {
  annual: number;
  /** Twelve. */
  monthly: number[];
}

export interface PlaneAccess {
  annual: number;
  monthly: MonthlyShares;
  method: 'stations-mean';
  /** Lowest annual access among the stations. */
  lowest: number;
  count: number;
  /** How sure the annual mean is; left out where no intervals were asked for. */
  interval?: AccessInterval;
}

/**
 * How sure an annual solar access is: between `low` and `high` the truth is expected 95 times in 100. The access itself may
 * lie near one end or even outside, since what nobody looked at counts as clear in it and is drawn in the interval.
 */
export interface AccessInterval {
  /** The 2.5 % and 97.5 % quantiles, 0 to 1. */
  low: number;
  high: number;
  standardDeviation: number;
  /** Monte Carlo draws it was made from. */
  draws: number;
  /** What it comes from, the largest first. */
  sources: IntervalSource[];
}

export interface IntervalSource {
  source: IntervalSourceId;
  /** Share of the variance, 0 to 1; they sum to 1. */
  share: number;
  /** What would shrink it; null where nothing that can be named would. */
  cure: CureId | null;
  /** Standard deviation of the access after that, all else as it is. */
  standardDeviationAfter: number | null;
}

export interface StationAssessment {
  id: string;
  name: string;
  solarAccess: {
    annual: number;
    monthly: MonthlyShares;
    /** [month][hour], hours of local standard time; null where the month has no light in that hour. */
    hourly: (number | null)[][];
    /** How sure `annual` is; left out where no intervals were asked for. */
    interval?: AccessInterval;
  };
  /** Share of the plane's unshaded energy that comes through azimuths somebody observed. */
  coverage: number;
  /** What nobody observed, clockwise: the shares and `coverage` sum to 1. */
  unseen: UnseenRange[];
  irradiation: Irradiation;
  /** Most gain first. */
  obstructions: ObstructionShading[];
  /** Obstructions that hide each other: removing all gives more than the sum of removing each. */
  groups: ObstructionGroup[];
}

/** Azimuths that nobody observed; cut where the sun's band begins and ends. */
export interface UnseenRange {
  /** Degrees clockwise from true north; over north where `to` is below `from`, 0 to 360 for the whole circle. */
  from: number;
  to: number;
  /** Share of the plane's unshaded energy that comes from there, counted as `coverage` is, 0 to 1. */
  share: number;
  /** Whether the sun stands there at some time of the year, in front of the plane. */
  inSunBand: boolean;
}

export interface ObstructionShading {
  id: string;
  name: string;
  /** Solar access gained, over the year, if this one goes and the others stay. */
  gainIfRemoved: number;
  /** Solar access lost, over the year, if only this one stood. */
  lossIfAlone: number;
  /** `gainIfRemoved` by month, as a share of that month. */
  monthly: MonthlyShares;
}

export interface ObstructionGroup {
  /** Ids, in the order of the station's list. */
  obstructions: string[];
  /** Solar access gained over the year if all of them go. */
  gainIfAllRemoved: number;
  /** Sum of what each would give back by itself. */
  sumOfSingleGains: number;
}
