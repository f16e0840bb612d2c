import type { Reading, SightingAxis } from '../../core/survey/survey.ts';
import type { SensorSample } from './sensor-interfaces.ts';
import { sampleRow } from './sensor-interfaces.ts';

/** A raw reading of one or more samples, as the device gave them. Throws RangeError for none. */
export function rawReading(
  id: string,
  run: string,
  axis: SightingAxis,
  samples: readonly SensorSample[],
): Reading {
  if (samples.length === 0) throw new RangeError('samples must not be empty');
  const startMs = Math.round(samples[0].timeMs);
  const rows = samples.map((sample) => sampleRow(sample, startMs));
  const [, alpha, beta, gamma] = rows[0];
  const { compassHeading, compassAccuracy, absolute, screenAngle } = samples[0];
  return {
    id,
    run,
    takenAt: new Date(startMs).toISOString(),
    alpha,
    beta,
    gamma,
    axis,
    samples: rows,
    ...(compassHeading !== null && { compassHeading }),
    ...(compassHeading !== null &&
      compassAccuracy !== null && { compassAccuracy: Math.max(-1, compassAccuracy) }),
    absolute,
    screenAngle,
  };
}
