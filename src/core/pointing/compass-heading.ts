import { DEGREES, RADIANS, fullCircle, turnBetween } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import type { Reading, Run, Site } from '../survey/survey.ts';
import { directionOf } from '../angles/vectors.ts';
import { attitude } from './attitude.ts';
import { magneticDeclination } from './declination.ts';
import type { OffsetSeen } from './heading-fit.ts';
import { PLANNING } from './planning-values.ts';
import { rowsOfReading } from './reading-direction.ts';

/** A compass that gives a heading of its own is trusted while the phone is this near to level, degrees (second-hand report). */
export const FLATTEST = 50;
/** Its headings may differ by this much from where the gyroscope carries them, degrees; more is a sign of steel. No source. */
const COMPASS_WANDER = 10;
/** Accuracy by the device's own account that is a sign of steel or of a compass not calibrated, degrees. No source. */
const POOR_ACCURACY = 20;
/** Horizontal field below which a compass is unsure, and of no use [nT]; as used with the World Magnetic Model. */
const WEAK_FIELD = 6000;
const NO_FIELD = 2000;

/** What the compass says of a run's offset to true north, and signs that it is disturbed. */
export interface CompassLook {
  seen: OffsetSeen | null;
  warnings: Problem[];
}

/** The compass of a run: its frame where that is magnetic, else the flat headings among its readings. */
export function compassLook(run: Run, path: string, readings: readonly Reading[], site: Site): CompassLook {
  const headings = readings.flatMap(flatHeading);
  const warnings = signsOf(headings, path);
  const startMs = Date.parse(run.startedAt);
  if (run.frame === 'true')
    return { seen: { atMs: startMs, offset: 0, standardDeviation: PLANNING.compass }, warnings };
  if (run.frame === 'relative' && headings.length === 0) return { seen: null, warnings };
  const flat = run.frame === 'magnetic' ? null : meanHeading(headings);
  const atMs = flat?.atMs ?? startMs;
  const { latitude, longitude, altitude } = site;
  const field = magneticDeclination({ latitude, longitude, altitude, timeMs: atMs });
  if (field.horizontalIntensity < WEAK_FIELD)
    warnings.push({ path, message: weakField(field.horizontalIntensity) });
  if (field.horizontalIntensity < NO_FIELD) return { seen: null, warnings };
  if (!field.withinValidity)
    warnings.push({
      path: `${path}.startedAt`,
      message: `The magnetic model holds until ${field.validUntil}, and this run is outside; its declination is an extrapolation. Take a heading check, or correct the date.`,
    });
  const deviation = Math.hypot(PLANNING.compass, (flat?.accuracy ?? 0) / 2, field.standardDeviation);
  return {
    seen: {
      atMs,
      offset: turnBetween(0, (flat?.offset ?? 0) + field.declination),
      standardDeviation: deviation,
    },
    warnings,
  };
}

const weakField = (nT: number) =>
  `Here, near a magnetic pole, the earth’s field along the ground is ${nT < NO_FIELD ? 'too weak for a compass' : 'weak, and a compass unsure'}. Take a heading check.`;

interface FlatHeading {
  atMs: number;
  /** Magnetic heading less azimuth in the frame, degrees. */
  offset: number;
  accuracy: number;
}

/** The compass heading of a reading against its top edge, where the phone lay flat enough. */
function flatHeading(reading: Reading): FlatHeading[] {
  const { compassHeading, compassAccuracy = 0, takenAt } = reading;
  const row = rowsOfReading(reading)[0];
  if (compassHeading === undefined || !row || compassAccuracy < 0) return [];
  const [, alpha, beta, gamma] = row;
  const { y, z } = attitude({ alpha, beta, gamma });
  if (z[2] < Math.cos(FLATTEST * RADIANS)) return [];
  const offset = turnBetween(directionOf(y).azimuth, compassHeading);
  return [{ atMs: Date.parse(takenAt) + row[0], offset, accuracy: compassAccuracy }];
}

/** Their mean, not surer than one: what disturbs a compass disturbs all of them alike. */
function meanHeading(headings: readonly FlatHeading[]): FlatHeading {
  const [sin, cos] = [Math.sin, Math.cos].map((of) =>
    headings.reduce((sum, { offset }) => sum + of(offset * RADIANS), 0),
  );
  const mean = (of: (heading: FlatHeading) => number) =>
    headings.reduce((sum, heading) => sum + of(heading), 0) / headings.length;
  return {
    atMs: mean(({ atMs }) => atMs),
    offset: fullCircle(Math.atan2(sin, cos) * DEGREES),
    accuracy: mean(({ accuracy }) => accuracy),
  };
}

function signsOf(headings: readonly FlatHeading[], path: string): Problem[] {
  if (headings.length === 0) return [];
  const warnings: Problem[] = [];
  const turns = headings.map(({ offset }) => turnBetween(headings[0].offset, offset));
  const range = Math.max(...turns) - Math.min(...turns);
  const worst = Math.max(...headings.map(({ accuracy }) => accuracy));
  const cure =
    'Move away from steel, rails and inverters, turn the phone about all its axes, and take a heading check by shadow or by a mark.';
  if (range > COMPASS_WANDER)
    warnings.push({
      path,
      message: `Compass and gyroscope of this run drift apart by ${range.toFixed(0)}°: something magnetic disturbs the compass. ${cure}`,
    });
  if (worst > POOR_ACCURACY)
    warnings.push({
      path,
      message: `By the phone’s own account its compass could be ${worst.toFixed(0)}° off here. ${cure}`,
    });
  return warnings;
}
