import { arrayPlaces } from './kinds/array-places.ts';
import { brokenTrace } from './kinds/broken-trace.ts';
import { disturbedCompass } from './kinds/disturbed-compass.ts';
import { doubtfulCheck } from './kinds/doubtful-check.ts';
import { largeClosure } from './kinds/large-closure.ts';
import { noClosure } from './kinds/no-closure.ts';
import { noHeadingCheck } from './kinds/no-heading-check.ts';
import { noPlane } from './kinds/no-plane.ts';
import { noTwoFaceCheck } from './kinds/no-two-face-check.ts';
import { planeWithoutStation } from './kinds/plane-without-station.ts';
import { runRefused } from './kinds/run-refused.ts';
import { stationEmpty } from './kinds/station-empty.ts';
import { stationServesNothing } from './kinds/station-serves-nothing.ts';
import { stationWithoutPlace } from './kinds/station-without-place.ts';
import { undirectedSightings } from './kinds/undirected-sightings.ts';
import { unseenSky } from './kinds/unseen-sky.ts';
import { wideInterval } from './kinds/wide-interval.ts';
import type { OpenPointKind, OpenPointKindId } from './open-point.ts';

/** Every kind of point; where effects do not decide, points stand in this order. A new kind is a file and a row. */
export const OPEN_POINT_KINDS: readonly OpenPointKind[] = [
  noPlane,
  planeWithoutStation,
  runRefused,
  undirectedSightings,
  brokenTrace,
  stationEmpty,
  unseenSky,
  noHeadingCheck,
  noTwoFaceCheck,
  doubtfulCheck,
  disturbedCompass,
  stationServesNothing,
  wideInterval,
  largeClosure,
  arrayPlaces,
  noClosure,
  stationWithoutPlace,
];

const BY_ID = new Map(OPEN_POINT_KINDS.map((kind) => [kind.id, kind]));

/** What is the matter with points of a kind, in a few words. */
export const titleOf = (kind: OpenPointKindId): string => BY_ID.get(kind)!.title;

/** Whether a result is missing or false as long as a point of this kind stands. */
export const isGrave = (kind: OpenPointKindId): boolean => BY_ID.get(kind)!.isGrave;
