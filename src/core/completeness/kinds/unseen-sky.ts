import type { PlaneAssessment, StationAssessment } from '../../shading/assessment.ts';
import { ordered } from '../../survey/order.ts';
import type { Station } from '../../survey/survey.ts';
import { sourceEffect } from '../interval-effect.ts';
import type { LightByAzimuth } from '../light-by-azimuth.ts';
import { lightByAzimuth } from '../light-by-azimuth.ts';
import type { OpenPoint, OpenPointKind, SurveyLook } from '../open-point.ts';
import type { UnseenPart } from '../unseen-parts.ts';
import { observedFrom, unseenParts } from '../unseen-parts.ts';
import { isEmpty } from './station-empty.ts';

/** Parts that send a plane less of its light, or move its figure by fewer points, are not worth a climb. No source. */
const LEAST_SHARE = 0.005;
const LEAST_EFFECT = 0.1;

export const unseenSky: OpenPointKind = {
  id: 'unseen-sky',
  title: 'Nobody looked there',
  isGrave: false,
  find: (look) => {
    const planes = litPlanes(look);
    return ordered(look.survey.stations)
      .filter((station) => !isEmpty(station))
      .flatMap((station) => partsOf(station, planes, look));
  },
};

interface LitPlane {
  plane: PlaneAssessment;
  light: LightByAzimuth;
}

const litPlanes = ({ survey, assessment }: SurveyLook): LitPlane[] =>
  (assessment?.planes ?? []).map((plane) => ({ plane, light: lightByAzimuth(survey.site.latitude, plane) }));

/** A part as one plane has it. */
interface PlanePart extends UnseenPart {
  plane: string;
  /** Share of the plane's light, 0 to 1. */
  share: number;
  effect: number | null;
}

/** The unseen parts of the plane that they matter most to. */
function partsOf(
  station: Station,
  planes: readonly LitPlane[],
  { survey, pointed }: SurveyLook,
): Omit<OpenPoint, 'kind'>[] {
  const observed = observedFrom(survey, station, pointed);
  const found = planes.flatMap(({ plane, light }) => {
    const assessed = plane.stations.find(({ id }) => id === station.id);
    return assessed ? planeParts(unseenParts(observed, light), plane, assessed) : [];
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

/** What each part is worth: the light nobody looked at, and its part of the interval, by the light that comes through. */
function planeParts(
  parts: readonly UnseenPart[],
  plane: PlaneAssessment,
  { coverage, solarAccess }: StationAssessment,
): PlanePart[] {
  const whole = Math.hypot(...parts.map(({ shareOfUnseen }) => shareOfUnseen));
  const all = solarAccess.interval
    ? sourceEffect(solarAccess.interval, 'unseen') / plane.stations.length
    : null;
  return parts
    .map((part) => ({
      ...part,
      plane: plane.name,
      share: (1 - coverage) * part.shareOfUnseen,
      effect: all === null ? null : (all * part.shareOfUnseen) / whole,
    }))
    .filter(({ share, effect }) => share >= LEAST_SHARE && (effect ?? Infinity) >= LEAST_EFFECT);
}

const weight = ({ effect, share }: PlanePart) => effect ?? share;
const isWorse = (a: PlanePart, b: PlanePart) =>
  a.plane !== b.plane && (weight(a) > weight(b) || (weight(a) === weight(b) && a.plane < b.plane));

/** Whether two ranges, each clockwise, have azimuths in common. */
function overlaps(a: UnseenPart, b: UnseenPart): boolean {
  const inside = (azimuth: number, { from, to }: UnseenPart) =>
    (azimuth - from + 360) % 360 < ((to - from + 360) % 360 || 360);
  return inside(a.from, b) || inside(b.from, a);
}

const degrees = (azimuth: number) => `${Math.round(azimuth) % 360}°`;
const percent = (share: number) => `${(100 * share).toFixed(share < 0.02 ? 1 : 0)}\u00a0%`;
