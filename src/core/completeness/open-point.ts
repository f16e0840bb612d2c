import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { Assessment } from '../shading/assessment.ts';
import type { Survey } from '../survey/survey.ts';
import type { CureId } from '../uncertainty/interval-source.ts';

/** What kinds of things may be missing or weak. */
export type OpenPointKindId =
  | 'no-plane'
  | 'plane-without-station'
  | 'undirected-sightings'
  | 'run-refused'
  | 'station-empty'
  | 'broken-trace'
  | 'unseen-sky'
  | 'no-heading-check'
  | 'no-two-face-check'
  | 'doubtful-check'
  | 'disturbed-compass'
  | 'wide-interval'
  | 'station-serves-nothing'
  | 'large-closure'
  | 'no-closure'
  | 'array-places'
  | 'station-without-place';

/** Where a point is put right. */
export type Cure = { words: string } & (
  | { at: 'site' | 'roof' | 'light' }
  /** `plane`: the one that it shall stand on. */
  | { at: 'new-station'; plane: string }
  | { at: 'plane'; plane: string }
  /** `sight`: with the phone; `edit`: its place and planes; `book`: its field book. */
  | { at: 'station'; station: string; act: 'sight' | 'edit' | 'book' }
  /** A run is put right from a station at which it sighted. */
  | { at: 'run'; run: string; station: string }
);

/** One thing that is missing or weak in a survey. */
export interface OpenPoint {
  kind: OpenPointKindId;
  /** What it is about: the name of a plane or a station. */
  subject: string;
  /** What is missing or weak and what it does, in plain words. */
  sentence: string;
  /**
   * Percentage points that a plane's annual solar access may be off by for this alone, 95 times in 100 (1.96 standard
   * deviations); null where that cannot be computed.
   */
  effect: number | null;
  cure: Cure;
  /** What would shrink it, where the point is about one source of an interval. */
  shrunkBy?: CureId;
}

/** A survey as its points are looked for. */
export interface SurveyLook {
  survey: Survey;
  pointed: PointedSurvey;
  /** Null where the figures could not be computed: then no point has an effect. */
  assessment: Assessment | null;
}

/** One kind of point: a row of the table, a file of its own. */
export interface OpenPointKind {
  id: OpenPointKindId;
  /** What is the matter, in a few words. */
  title: string;
  /** Whether a result is missing or false as long as it stands: such points come before all others. */
  isGrave: boolean;
  find: (look: SurveyLook) => Omit<OpenPoint, 'kind'>[];
}
