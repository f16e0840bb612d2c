import { fullCircle, RADIANS } from '../../core/angles/angles.ts';
import { directionOf } from '../../core/angles/vectors.ts';
import { attitude, axisVector } from '../../core/pointing/attitude.ts';
import { PLANNING } from '../../core/pointing/planning-values.ts';
import { offsetAt } from '../../core/pointing/run-ties.ts';
import type { PointedRun } from '../../core/pointing/pointed-survey.ts';
import type { SightingAxis } from '../../core/survey/survey.ts';
import type { SensorSample } from './sensor-interfaces.ts';

/** Where the phone points now, degrees. */
export interface LivePointing {
  timeMs: number;
  /** From true north; null where nothing ties the run to north. */
  azimuth: number | null;
  /** From the zero of its run. */
  azimuthInRun: number;
  elevation: number;
  /** Standard deviations; null where there is no azimuth. */
  azimuthDeviation: number | null;
  elevationDeviation: number;
  /** Angle of the screen from level, 0 where the phone lies flat with its screen up. */
  fromFlat: number;
  /** Elevation of the phone's top edge. */
  topEdge: number;
  /** Seconds since the platform last told of a movement. */
  stillFor: number;
}

/** A sample as a direction, in the light of what is known of its run. */
export function livePointing(sample: SensorSample, axis: SightingAxis, run: PointedRun | null): LivePointing {
  const held = attitude(sample);
  const index = run?.index[axis];
  const { azimuth, elevation } = directionOf(axisVector(held, axis, index?.value ?? 0));
  const heading = run?.heading ?? null;
  const minutes = heading ? Math.abs(sample.timeMs - heading.atMs) / 60_000 : 0;
  const across = PLANNING.pointing / Math.max(Math.cos(elevation * RADIANS), 1e-3);
  return {
    timeMs: sample.timeMs,
    azimuthInRun: azimuth,
    azimuth: heading && fullCircle(azimuth + offsetAt(heading, sample.timeMs)),
    elevation,
    azimuthDeviation: heading
      ? Math.hypot(heading.standardDeviation, minutes * heading.ratePerMinuteDeviation, across)
      : null,
    elevationDeviation: Math.hypot(index?.standardDeviation ?? PLANNING.elevationIndex, PLANNING.pointing),
    fromFlat: Math.acos(Math.min(1, Math.max(-1, held.z[2]))) / RADIANS,
    topEdge: directionOf(held.y).elevation,
    stillFor: Math.max(0, sample.timeMs - sample.eventMs) / 1000,
  };
}
