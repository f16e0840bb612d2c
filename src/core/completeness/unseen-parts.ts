import { pointedDirections, stationHorizon } from '../horizon/station-horizon.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { AzimuthRange } from '../shading/coverage.ts';
import { observedShares } from '../shading/coverage.ts';
import type { Station, Survey } from '../survey/survey.ts';
import { LIGHT_COLUMN } from './light-by-azimuth.ts';
import type { LightByAzimuth } from './light-by-azimuth.ts';

/** A part of the sun's band before a plane that nobody looked at. */
export interface UnseenPart {
  /** Degrees clockwise from true north; over north where `from` is the greater. */
  from: number;
  to: number;
  /** Share of all light of the plane that nobody looked at, 0 to 1. */
  shareOfUnseen: number;
}

/** Narrower parts are left out, degrees. */
const NARROWEST = 1;

/** The azimuth ranges that somebody observed from a station. */
export const observedFrom = (survey: Survey, station: Station, pointed: PointedSurvey): AzimuthRange[] =>
  stationHorizon(survey, station, pointedDirections(pointed)).observed;

/** The parts of the sun's band that the ranges leave out, clockwise. */
export function unseenParts(observed: readonly AzimuthRange[], light: LightByAzimuth): UnseenPart[] {
  const seen = observedShares(observed);
  const perColumn = seen.length / light.shares.length;
  const width = LIGHT_COLUMN / perColumn;
  const missing = seen.map((share, i) => ((1 - share) * light.shares[Math.floor(i / perColumn)]) / perColumn);
  const all = missing.reduce((sum, share) => sum + share, 0);
  const isOpen = (i: number) =>
    seen[i % seen.length] < 0.5 && light.isInBand[Math.floor((i % seen.length) / perColumn)];
  const parts: UnseenPart[] = [];
  const start = firstSeen(seen.length, isOpen);
  for (let i = start; i < start + seen.length; i++) {
    if (!isOpen(i)) continue;
    let [end, share] = [i, 0];
    while (end < start + seen.length && isOpen(end)) share += missing[end++ % seen.length];
    if ((end - i) * width >= NARROWEST)
      parts.push({ from: (i * width) % 360, to: (end * width) % 360, shareOfUnseen: share / all });
    i = end;
  }
  return parts;
}

/** A column to begin at, so that no part is cut in two; 0 where all are open. */
function firstSeen(count: number, isOpen: (column: number) => boolean): number {
  for (let i = 0; i < count; i++) if (!isOpen(i)) return i;
  return 0;
}
