import type { Climate } from '../irradiance/climate.ts';
import { skyStates } from '../irradiance/climate.ts';
import { extraterrestrialNormal } from '../irradiance/extraterrestrial.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { TRACK_DAYS, cosZenithOf, dayOf } from '../solar-position/sun-track.ts';
import type { SkyMoment, SkyParts, Transposition } from '../transposition/transposition.ts';
import type { SunPaths } from './sun-paths.ts';

/** Sums over each hour of local standard time in each month, [month · 24 + hour], kWh/m2. */
export type MonthHours = Float64Array;

/**
 * The light of one typical year over a site, for any plane: beam and circumsolar light step by step, since they come from
 * the sun's place; the even parts as sums by month and hour, since they do not move.
 */
export interface SkyYear {
  readonly paths: SunPaths;
  readonly transposition: Transposition;
  /** Beam and circumsolar irradiation normal to the sun in each step, kWh/m2. */
  readonly direct: Float32Array;
  /** On the horizontal. */
  readonly dome: MonthHours;
  /** Band coefficient where it brightens the horizon, and where it darkens it (0 or less). */
  readonly brightBand: MonthHours;
  readonly darkBand: MonthHours;
  readonly ghi: MonthHours;
  readonly albedo: number;
}

/** Share of each step with the sun above the apparent horizon, following it straight between the step's ends. */
function shareUp(track: SunTrack, step: number): number {
  const [start, end] = [track.elevation[step], track.elevation[step + 1]];
  if (start >= 0 && end >= 0) return 1;
  if (start < 0 && end < 0) return 0;
  return start < 0 ? end / (end - start) : start / (start - end);
}

/**
 * Runs a climate through a year of steps and splits its sky light. Where the dark band of the model would take more from
 * a wall than the dome gives it, it is cut to that (sky light is never below 0).
 */
export function skyYear(
  paths: SunPaths,
  climate: Climate,
  transposition: Transposition,
  albedo: number,
): SkyYear {
  const { track } = paths;
  const hours = () => new Float64Array(12 * 24);
  const year = {
    direct: new Float32Array(track.steps),
    dome: hours(),
    brightBand: hours(),
    darkBand: hours(),
    ghi: hours(),
  };
  const read = climate.over(track);
  const sky = skyStates(climate.stateCount);
  const moment: SkyMoment = { dni: 0, dhi: 0, dniExtra: 0, cosZenith: 0 };
  const parts: SkyParts = { circumsolarNormal: 0, dome: 0, band: 0 };
  const toEnergy = track.stepMinutes / 60 / 1000;
  const stepsPerHour = 60 / track.stepMinutes;
  for (let day = 0, step = 0; day < TRACK_DAYS; day++) {
    moment.dniExtra = extraterrestrialNormal(day + 1);
    const row = track.monthOfDay[day] * 24;
    for (let k = 0; k < track.stepsPerDay; k++, step++) {
      if (!read(step, sky)) continue;
      const cell = row + ((k / stepsPerHour) | 0);
      const up = shareUp(track, step);
      moment.cosZenith = cosZenithOf(track, step);
      let direct = 0;
      for (let state = 0; state < climate.stateCount; state++) {
        const energy = sky.weight[state] * toEnergy;
        moment.dni = sky.dni[state]!;
        moment.dhi = sky.dhi[state]!;
        transposition.split(moment, parts);
        direct += energy * (moment.dni + parts.circumsolarNormal);
        year.dome[cell] += energy * parts.dome;
        if (parts.band > 0) year.brightBand[cell] += energy * parts.band;
        else if (parts.band < 0) year.darkBand[cell] += energy * Math.max(parts.band, -parts.dome / 2);
        year.ghi[cell] += energy * sky.ghi[state];
      }
      year.direct[step] = direct * up;
    }
  }
  return { paths, transposition, ...year, albedo };
}

/** Cell of a month × hour table that a step falls in. */
export const monthHourOf = (track: SunTrack, step: number): number =>
  track.monthOfDay[dayOf(track, step)] * 24 + ((((step % track.stepsPerDay) * track.stepMinutes) / 60) | 0);

/** Sums a month × hour table to twelve months. */
export function monthsOf(table: MonthHours): number[] {
  return Array.from({ length: 12 }, (_, month) => {
    let sum = 0;
    for (let hour = 0; hour < 24; hour++) sum += table[month * 24 + hour];
    return sum;
  });
}
