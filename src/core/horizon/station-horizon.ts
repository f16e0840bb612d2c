import { turnBetween } from '../angles/angles.ts';
import { openRange } from '../pointing/open-looks.ts';
import { overZenith } from '../pointing/over-zenith.ts';
import { pointSurvey } from '../pointing/point-survey.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import { monthlyTransmittance, traceEdge } from '../survey/obstruction-kinds.ts';
import { ordered } from '../survey/order.ts';
import type { SightingDirection } from '../survey/sighting-direction.ts';
import type { OpenLook, Sighting, Station, Survey, Trace } from '../survey/survey.ts';
import type { HorizonProfile } from './horizon-profile.ts';
import { horizonProfile } from './horizon-profile.ts';
import type { SettledTrace, TracedObstruction } from './traced-obstruction.ts';

/** What one station saw: the profile around it, and the azimuth ranges that somebody looked at. */
export interface StationHorizon {
  profile: HorizonProfile;
  observed: [number, number][];
}

/** Where things of a survey point. */
export interface DirectionOf {
  /** Where a sighting points; null where that is not known. */
  (sighting: Sighting): SightingDirection | null;
  /** The true azimuths of an open look; null where they are not known. */
  openRange(look: OpenLook): [number, number] | null;
}

/** The true directions of a survey's sightings and open looks. */
export function pointedDirections({
  sightings,
  runs,
}: Pick<PointedSurvey, 'sightings' | 'runs'>): DirectionOf {
  const directionOf = ({ id }: Sighting) => sightings.get(id)?.direction ?? null;
  return Object.assign(directionOf, { openRange: (look: OpenLook) => openRange(look, runs) });
}

/**
 * The horizon of a station of a survey that the parser has passed. Sightings without a direction (their warnings are
 * in the pointed survey) are left out, and with them a trace that does not hold together without them. `directionOf`
 * saves pointing the survey anew, or stands for other directions.
 */
export function stationHorizon(
  survey: Survey,
  station: Station,
  directionOf: DirectionOf = pointedDirections(pointSurvey(survey)),
): StationHorizon {
  const obstructions = tracedObstructions(survey, station, directionOf);
  const spans = obstructions.flatMap(({ traces }) => traces.map(traceSpan));
  const looks = (station.openLooks ?? []).flatMap((look) => {
    const range = directionOf.openRange(look);
    return range ? [range] : [];
  });
  const observed = [...spans, ...(station.observedOpen ?? []), ...looks];
  return { profile: horizonProfile(obstructions), observed };
}

/** What a station traced, by obstruction, in the order of the survey's obstructions. */
export function tracedObstructions(
  survey: Survey,
  station: Station,
  directionOf: DirectionOf = pointedDirections(pointSurvey(survey)),
): TracedObstruction[] {
  return ordered(survey.obstructions).flatMap((obstruction) => {
    const traces = ordered(station.traces)
      .filter((trace) => trace.obstruction === obstruction.id)
      .map((trace) => settledTrace(trace, traceEdge(trace, obstruction) === 'straight', directionOf))
      .filter(joinsUp);
    const transmittance = monthlyTransmittance(obstruction, survey.site.latitude);
    return traces.length > 0 ? [{ id: obstruction.id, transmittance, traces }] : [];
  });
}

/** A turn this close to half a circle could go either way, degrees. */
const HALF_CIRCLE = 180 - 1e-9;

/** Whether a trace still has enough sightings, and none of its neighbours 180° apart, once those without direction are out. */
function joinsUp({ shape, fullCircle, points }: SettledTrace): boolean {
  const closed = shape === 'outline' || fullCircle;
  const neighbours = closed ? points.map((_, i) => i) : points.map((_, i) => i).slice(1);
  const turn = (i: number) =>
    Math.abs(turnBetween(points[(i + points.length - 1) % points.length].azimuth, points[i].azimuth));
  return points.length >= (shape === 'outline' ? 3 : 2) && neighbours.every((i) => turn(i) < HALF_CIRCLE);
}

function settledTrace(trace: Trace, straight: boolean, directionOf: DirectionOf): SettledTrace {
  const points = overZenith(ordered(trace.sightings).flatMap((sighting) => directionOf(sighting) ?? []));
  const { shape, fullCircle = false, angularWidth = 0 } = trace;
  return { shape, straight, fullCircle, angularWidth, points };
}

/** The azimuths a trace goes over, clockwise. */
function traceSpan({ points, fullCircle }: SettledTrace): [number, number] {
  if (fullCircle) return [0, 360];
  let [turned, left, right] = [0, 0, 0];
  for (let i = 1; i < points.length; i++) {
    turned += turnBetween(points[i - 1].azimuth, points[i].azimuth);
    left = Math.min(left, turned);
    right = Math.max(right, turned);
  }
  if (right - left >= 360) return [0, 360];
  const wrap = (azimuth: number) => ((azimuth % 360) + 360) % 360;
  const start = points[0].azimuth;
  return [wrap(start + left), wrap(start + right)];
}
