import { DEGREES, fullCircle, safeAsin } from '../angles/angles.ts';
import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import { COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import type { PlaneFacing } from '../horizon/sky-view.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { TRACK_DAYS } from '../solar-position/sun-track.ts';

export const DAY_MINUTES = 1440;
const YEAR_MINUTES = TRACK_DAYS * DAY_MINUTES;

/** Minutes of one day, counted from its solar midnight: from, to, from, to, … */
export type DaySpans = number[];

/**
 * Minutes of local standard time after midnight at which the mean sun stands lowest: days are counted from there, so that
 * each holds one whole way of the sun, also where it never sets. Within half a day of midnight.
 */
export function solarMidnight({ utcOffset, longitude }: SunTrack): number {
  const minutes = Math.round(utcOffset - longitude * 4);
  return minutes - DAY_MINUTES * Math.round(minutes / DAY_MINUTES);
}

/**
 * When each obstruction of a profile stands between the sun and a plane: for each, 365 lists of spans, minute by minute. A
 * minute counts by the centre of the sun's disc in its middle, with the sun above the horizontal and in front of the plane;
 * what passes through a crown is not asked. Between the boundaries of a step the sun's vector is taken as linear (within
 * 0.003° for steps of five minutes).
 */
export function shadedMinutes(track: SunTrack, facing: PlaneFacing, profile: HorizonProfile): DaySpans[][] {
  const spans = profile.obstructionIds.map(() => Array.from({ length: TRACK_DAYS }, (): DaySpans => []));
  const blockedBy = blockers(profile);
  const shift = solarMidnight(track);
  const { stepMinutes, east, north, up, elevation } = track;
  const top = profile.high.reduce((most, high) => Math.max(most, high), 0) + SAG;
  for (let day = 0; day < TRACK_DAYS; day++)
    for (let minute = 0; minute < DAY_MINUTES; minute++) {
      const ofYear = (day * DAY_MINUTES + shift + minute + YEAR_MINUTES) % YEAR_MINUTES;
      const step = Math.floor(ofYear / stepMinutes);
      const [start, end] = [elevation[step], elevation[step + 1]];
      if ((start <= 0 && end <= 0) || (start > top && end > top)) {
        minute += stepMinutes - 1 - (ofYear % stepMinutes);
        continue;
      }
      const share = ((ofYear % stepMinutes) + 0.5) / stepMinutes;
      const between = (values: Float32Array) => values[step] + share * (values[step + 1] - values[step]);
      const [x, y, z] = [between(east), between(north), between(up)];
      if (z <= 0 || facing.east * x + facing.north * y + facing.upward * z <= 0) continue;
      for (const obstruction of blockedBy(x, y, z)) extend(spans[obstruction][day], minute);
    }
  return spans;
}

function extend(spans: DaySpans, minute: number): void {
  const last = spans.length - 1;
  if (last > 0 && spans[last] >= minute) spans[last] = minute + 1;
  else spans.push(minute, minute + 1);
}

/** The sun between two boundaries is not lower than both by more than this, degrees. */
const SAG = 0.1;

const NOTHING: readonly number[] = [];

/** Finds what stands in a direction, given by east, north and up. */
function blockers(profile: HorizonProfile) {
  const { columnFirst, sliceFrom, sliceTo, intervalFirst, intervalObstruction, low, high } = profile;
  return (east: number, north: number, up: number): readonly number[] => {
    const azimuth = fullCircle(Math.atan2(east, north) * DEGREES);
    const column = Math.floor(azimuth / COLUMN_WIDTH);
    if (columnFirst[column] === columnFirst[column + 1]) return NOTHING;
    const elevation = safeAsin(up / Math.hypot(east, north, up)) * DEGREES;
    const found: number[] = [];
    for (let slice = columnFirst[column]; slice < columnFirst[column + 1]; slice++) {
      if (azimuth < sliceFrom[slice] || azimuth >= sliceTo[slice]) continue;
      for (let k = intervalFirst[slice]; k < intervalFirst[slice + 1]; k++)
        if (elevation >= low[k] && elevation < high[k] && !found.includes(intervalObstruction[k]))
          found.push(intervalObstruction[k]);
    }
    return found;
  };
}
