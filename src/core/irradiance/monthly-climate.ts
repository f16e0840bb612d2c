import type { SunTrack } from '../solar-position/sun-track.ts';
import { dayOf } from '../solar-position/sun-track.ts';
import type { Months } from '../survey/survey.ts';
import type { Climate } from './climate.ts';
import { skyStates } from './climate.ts';

/** Irradiation of each month, kWh/m2: global and diffuse horizontal, and direct normal. */
export interface MonthlyIrradiation {
  ghi: Months;
  dni: Months;
  dhi: Months;
}

const twelveZeros = () => Array<number>(12).fill(0) as Months;

/** What a climate gives in each month over a sun track. */
export function monthlyOf(climate: Climate, track: SunTrack): MonthlyIrradiation {
  const months = { ghi: twelveZeros(), dni: twelveZeros(), dhi: twelveZeros() };
  const read = climate.over(track);
  const sky = skyStates(climate.stateCount);
  const perStep = track.stepMinutes / 60_000; // W/m2 to kWh/m2
  for (let step = 0; step < track.steps; step++) {
    if (!read(step, sky)) continue;
    const month = track.monthOfDay[dayOf(track, step)];
    for (let k = 0; k < climate.stateCount; k++) {
      const weight = sky.weight[k] * perStep;
      months.ghi[month] += sky.ghi[k] * weight;
      months.dni[month] += sky.dni[k] * weight;
      months.dhi[month] += sky.dhi[k] * weight;
    }
  }
  return months;
}
