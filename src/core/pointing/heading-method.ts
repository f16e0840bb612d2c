import type { HeadingCheck, HeadingMethodId, Site } from '../survey/survey.ts';

/** What a method is given: the check, and when and how steeply the axis pointed. */
export interface HeadingQuestion {
  check: HeadingCheck;
  site: Site;
  takenAtMs: number;
}

/** The true azimuth in which the axis pointed, degrees, with its standard deviation; or why it is not known. */
export type HeadingReference =
  { ok: true; azimuth: number; standardDeviation: number } | { ok: false; message: string; field?: string };

/** One way of tying a run's azimuths to true north. */
export interface HeadingMethod {
  id: HeadingMethodId;
  name: string;
  /** Whether it needs a bearing, and whether the time of the reading enters. */
  needsBearing: boolean;
  needsSun: boolean;
  /** What the surveyor does, as a sentence. */
  howTo: string;
  caution: string | null;
  reference(question: HeadingQuestion): HeadingReference;
}
