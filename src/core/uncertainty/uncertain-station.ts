import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import type { StationHorizon } from '../horizon/station-horizon.ts';
import { pointedDirections, stationHorizon, tracedObstructions } from '../horizon/station-horizon.ts';
import type { SettledTrace } from '../horizon/traced-obstruction.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { AzimuthRange } from '../angles/azimuth-ranges.ts';
import { obstructionKind } from '../survey/obstruction-kinds.ts';
import { ordered } from '../survey/order.ts';
import type { Months, Obstruction, SightingAxis, Station, Survey } from '../survey/survey.ts';
import { TYPED_PASSING } from './planning-values.ts';

/** Whose errors a sighting shares, and what it errs by on its own (standard deviations, degrees). */
export interface SightingError {
  /** Run whose heading and elevation index move it; null for a typed or amended sighting. */
  run: string | null;
  axis: SightingAxis;
  /** Minutes from the instant at which its run's heading is known best. */
  minutes: number;
  across: number;
  upward: number;
}

export interface UncertainTrace extends SettledTrace {
  /** One for each point. */
  errors: readonly SightingError[];
}

/** By how much the share of light that passes may lie below and above its value. */
export type Spread = readonly [below: number, above: number];

export interface UncertainObstruction {
  id: string;
  /** As the survey has it, January to December. */
  transmittance: Months;
  /** In full leaf, and bare. */
  leafOn: Spread;
  leafOff: Spread;
  /** A tree: between its sightings the outline bulges outward. */
  isCrown: boolean;
  traces: readonly UncertainTrace[];
}

/** What one station saw, with what each part of it may be off by. */
export interface UncertainStation {
  id: string;
  obstructions: readonly UncertainObstruction[];
  profile: HorizonProfile;
  observed: readonly AzimuthRange[];
}

/** What a station of a survey saw and how sure that is; `horizon` is what `stationHorizon` gave for it. */
export function uncertainStation(
  survey: Survey,
  station: Station,
  pointed: PointedSurvey,
  horizon: StationHorizon = stationHorizon(survey, station, pointedDirections(pointed)),
): UncertainStation {
  const directionOf = pointedDirections(pointed);
  const byId = new Map(survey.obstructions.map((obstruction) => [obstruction.id, obstruction]));
  const errorOf = sightingErrors(pointed);
  const errors = new Map(
    station.traces.map((trace) => {
      const directed = ordered(trace.sightings).filter((sighting) => directionOf(sighting));
      const key = keyOf(
        trace.obstruction,
        directed.map((sighting) => directionOf(sighting)!),
      );
      return [key, directed.map(({ id }) => errorOf(id))];
    }),
  );
  const obstructions = tracedObstructions(survey, station, directionOf).map(
    ({ id, transmittance, traces }) => ({
      id,
      transmittance,
      ...spreadsOf(byId.get(id)!),
      isCrown: obstructionKind(byId.get(id)!.kind).leaves !== undefined,
      traces: traces.map((trace) => ({ ...trace, errors: errors.get(keyOf(id, trace.points))! })),
    }),
  );
  return { id: station.id, obstructions, ...horizon };
}

function sightingErrors({ runs, sightings }: PointedSurvey): (id: string) => SightingError {
  const bestAt = new Map(runs.map(({ id, heading }) => [id, heading?.atMs ?? null]));
  return (id) => {
    const { run, axis, takenAtMs, random } = sightings.get(id)!;
    const atMs = run === null ? null : (bestAt.get(run) ?? null);
    const minutes = takenAtMs === null || atMs === null ? 0 : (takenAtMs - atMs) / 60_000;
    return { run, axis, minutes, across: random.azimuth, upward: random.elevation };
  };
}

/** Traces are known again by their obstruction and their points. */
const keyOf = (obstruction: string, points: readonly { azimuth: number; elevation: number }[]) =>
  JSON.stringify([obstruction, points.map(({ azimuth, elevation }) => [azimuth, elevation])]);

function spreadsOf({ kind, transmittance }: Obstruction): { leafOn: Spread; leafOff: Spread } {
  const { leaves } = obstructionKind(kind);
  if (transmittance !== undefined) {
    const typed: Spread = transmittance === 0 ? [0, 0] : [TYPED_PASSING, TYPED_PASSING];
    return { leafOn: typed, leafOff: typed };
  }
  if (!leaves) return { leafOn: [0, 0], leafOff: [0, 0] };
  const around = (value: number, [low, high]: readonly [number, number]): Spread => [
    value - low,
    high - value,
  ];
  return { leafOn: around(leaves.on, leaves.onRange), leafOff: around(leaves.off, leaves.offRange) };
}
