import type { SkyPoint } from '../../../src/core/horizon/horizon-edge.ts';
import type { SettledTrace, TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import type { Months } from '../../../src/core/survey/survey.ts';

/** Points from [azimuth, elevation] pairs. */
export const points = (...pairs: [number, number][]): SkyPoint[] =>
  pairs.map(([azimuth, elevation]) => ({ azimuth, elevation }));

export const trace = (
  shape: SettledTrace['shape'],
  at: SkyPoint[],
  more: Partial<SettledTrace> = {},
): SettledTrace => ({ shape, straight: false, fullCircle: false, angularWidth: 0, points: at, ...more });

export const months = (value: number): Months => Array<number>(12).fill(value) as Months;

export const obstruction = (
  traces: SettledTrace[],
  transmittance: Months = months(0),
  id = 'thing',
): TracedObstruction => ({ id, transmittance, traces });

/** A skyline of one elevation around the whole horizon. */
export const ring = (elevation: number): SettledTrace =>
  trace('skyline', points([0, elevation], [120, elevation], [240, elevation]), { fullCircle: true });
