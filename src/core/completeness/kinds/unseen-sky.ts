import { fullCircle } from '../../angles/angles.ts';
import { widthOf } from '../../angles/azimuth-ranges.ts';
import type { PlaneAssessment, StationAssessment, UnseenRange } from '../../shading/assessment.ts';
import { ordered } from '../../survey/order.ts';
import type { Station } from '../../survey/survey.ts';
import { sourceEffect } from '../interval-effect.ts';
import type { OpenPoint, OpenPointKind } from '../open-point.ts';
import { isEmpty } from './station-empty.ts';

/** Parts that are narrower [degrees], send a plane less of its light or move its figure by fewer points are not worth a climb. No source. */
const NARROWEST = 1;
const LEAST_SHARE = 0.005;
const LEAST_EFFECT = 0.1;

export const unseenSky: OpenPointKind = {
  id: 'unseen-sky',
  title: 'Nobody looked there',
  isGrave: false,
  find: ({ survey, assessment }) =>
    ordered(survey.stations)
      .filter((station) => !isEmpty(station))
      .flatMap((station) => partsOf(station, assessment?.planes ?? [])),
};

/** A part as one plane has it. */
interface PlanePart extends UnseenRange {
  plane: string;
  effect: number | null;
}

/** The unseen parts of the plane that they matter most to. */
function partsOf(station: Station, planes: readonly PlaneAssessment[]): Omit<OpenPoint, 'kind'>[] {
  const found = planes.flatMap((plane) => {
    const assessed = plane.stations.find(({ id }) => id === station.id);
    return assessed ? planeParts(plane, assessed) : [];
  });
  const worst = found.filter((part) => !found.some((other) => overlaps(part, other) && isWorse(other, part)));
  return worst.map((part) => ({
    subject: station.name,
    sentence: `From ${degrees(part.from)} to ${degrees(part.to)} nobody looked, and about ${percent(part.share)} of the light on ${part.plane} comes from there. It counts as clear.`,
    effect: part.effect,
    cure: {
      at: 'station',
      station: station.id,
      act: 'sight',
      words: 'Trace it, or say that it is open',
    },
  }));
}

/** The parts of the sun's band, each with its part of the interval by the light that comes through. */
function planeParts(plane: PlaneAssessment, { unseen, solarAccess }: StationAssessment): PlanePart[] {
  const parts = unseen.filter((part) => part.inSunBand && widthOf(part.from, part.to) >= NARROWEST);
  const whole = Math.hypot(...parts.map(({ share }) => share));
  const all = solarAccess.interval
    ? sourceEffect(solarAccess.interval, 'unseen') / plane.stations.length
    : null;
  return parts
    .map((part) => ({
      ...part,
      plane: plane.name,
      effect: all === null ? null : (all * part.share) / whole,
    }))
    .filter(({ share, effect }) => share >= LEAST_SHARE && (effect ?? Infinity) >= LEAST_EFFECT);
}

const weight = ({ effect, share }: PlanePart) => effect ?? share;
const isWorse = (a: PlanePart, b: PlanePart) =>
  a.plane !== b.plane && (weight(a) > weight(b) || (weight(a) === weight(b) && a.plane < b.plane));

/** Whether two ranges, each clockwise, have azimuths in common. */
function overlaps(a: UnseenRange, b: UnseenRange): boolean {
  const inside = (azimuth: number, { from, to }: UnseenRange) =>
    fullCircle(azimuth - from) < widthOf(from, to);
  return inside(a.from, b) || inside(b.from, a);
}

const degrees = (azimuth: number) => `${Math.round(azimuth) % 360}°`;
const percent = (share: number) => `${(100 * share).toFixed(share < 0.02 ? 1 : 0)}\u00a0%`;
