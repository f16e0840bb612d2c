import { describe, expect, it } from 'vitest';
import { RADIANS } from '../../../src/core/angles/angles.ts';
import { skyStates } from '../../../src/core/irradiance/climate.ts';
import { climateFromMonthly, STATE_COUNT } from '../../../src/core/irradiance/climate-from-monthly.ts';
import {
  extraterrestrialNormal,
  monthlyExtraterrestrial,
} from '../../../src/core/irradiance/extraterrestrial.ts';
import { worldClimate } from '../../../src/core/irradiance/world-climate.ts';
import { gridAt } from '../../../src/core/irradiance/world-grid.ts';
import type { SunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { cosZenithOf, dayOf, DAYS_IN_MONTH, sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import type { Months } from '../../../src/core/survey/survey.ts';
import { worldGrid } from './world-bytes.ts';

const places: [string, number, number, number][] = [
  ['mid-latitude north', 43.07, -89.4, -360],
  ['the equator', -1.3, 36.8, 180],
  ['the south', -33.87, 151.2, 600],
  ['beyond the polar circle', 69.65, 18.96, 60],
  ['the pole', 90, 0, 0],
  ['a far southern winter', -77.8, 166.7, 720],
];

const sums = () => ({
  ghi: Array<number>(12).fill(0),
  dhi: Array<number>(12).fill(0),
  beam: Array<number>(12).fill(0),
});

/** Monthly sums over a track, kWh/m2; also checks each step's sky for what must always hold. */
function summed(track: SunTrack, read: ReturnType<typeof climateFromMonthly>) {
  const months = sums();
  const sky = skyStates(STATE_COUNT);
  for (let step = 0; step < track.steps; step++) {
    if (!read(step, sky)) continue;
    const cosZenith = cosZenithOf(track, step);
    const month = track.monthOfDay[dayOf(track, step)];
    let weights = 0;
    for (let k = 0; k < STATE_COUNT; k++) {
      const weight = (sky.weight[k] * track.stepMinutes) / 60_000;
      weights += sky.weight[k];
      if (!(
        sky.dni[k] >= 0 &&
        sky.dhi[k] >= 0 &&
        sky.dni[k] < extraterrestrialNormal(dayOf(track, step) + 1)
      ))
        throw new Error(`impossible sky at step ${step}: ${sky.dni[k]}, ${sky.dhi[k]}`);
      months.ghi[month] += weight * sky.ghi[k];
      months.dhi[month] += weight * sky.dhi[k];
      months.beam[month] += weight * sky.dni[k] * cosZenith;
    }
    if (Math.abs(weights - 1) > 1e-12) throw new Error(`weights of step ${step} sum to ${weights}`);
  }
  return months;
}

describe('worldClimate', () => {
  it.each(places)(
    'keeps the sums of each month at %s: ghi kt·H0, dhi kd of it, beam the rest',
    (_, lat, lon, utcOffset) => {
      const track = sunTrack({ latitude: lat, longitude: lon, utcOffset }, 5);
      const { kt, kd } = gridAt(worldGrid, lat, lon);
      const months = summed(track, worldClimate(worldGrid, { latitude: lat, longitude: lon }).over(track));
      monthlyExtraterrestrial(lat).forEach((h0, month) => {
        const ghi = kt[month] * h0 * DAYS_IN_MONTH[month];
        expect(Math.abs(months.ghi[month] - ghi)).toBeLessThan(1e-6 * ghi + 1e-9);
        expect(Math.abs(months.dhi[month] - kd[month] * ghi)).toBeLessThan(1e-6 * ghi + 1e-9);
        expect(Math.abs(months.beam[month] - (1 - kd[month]) * ghi)).toBeLessThan(1e-6 * ghi + 1e-9);
      });
    },
  );

  it('acknowledges its source and warns where it is coarse', () => {
    const climate = worldClimate(worldGrid, { latitude: 70, longitude: 20 });
    expect(climate.reference).toMatch(
      /^Data obtained from the NASA Langley Research Center POWER Project, climatology 2001-2020; beyond/,
    );
    expect(climate.reference).not.toMatch(/terms/);
    expect(climate.warnings).toHaveLength(1);
    expect(worldClimate(worldGrid, { latitude: 50, longitude: 20 }).warnings).toEqual([]);
  });
});

describe('climateFromMonthly', () => {
  const months = (value: number) => Array<number>(12).fill(value) as Months;
  const track = sunTrack({ latitude: 40, longitude: 0, utcOffset: 0 }, 10);

  it.each([
    [0.02, 1],
    [0.05, 0.98],
    [0.3, 0],
    [0.3, 0.9],
    [0.5, 0.5],
    [0.78, 0.1],
    [0.85, 0.05],
    [1, 1],
  ])('keeps the sums and gives a possible sky for kt %f, kd %f', (kt, kd) => {
    const summedMonths = summed(track, climateFromMonthly({ kt: months(kt), kd: months(kd) }, track));
    monthlyExtraterrestrial(40).forEach((h0, month) => {
      expect(summedMonths.ghi[month]).toBeCloseTo(kt * h0 * DAYS_IN_MONTH[month], 6);
      expect(summedMonths.dhi[month]).toBeCloseTo(kd * kt * h0 * DAYS_IN_MONTH[month], 6);
    });
  });

  it('runs through the day close to the profile of Collares-Pereira and Rabl (Duffie and Beckman 2013, eq. 2.13.2)', () => {
    const kt: Months = [0.47, 0.53, 0.52, 0.5, 0.51, 0.53, 0.56, 0.54, 0.53, 0.47, 0.45, 0.41];
    const read = climateFromMonthly({ kt, kd: months(0.44) }, track);
    const sky = skyStates(STATE_COUNT);
    for (const day of [16, 74, 104, 161, 227, 318]) {
      const hours = Array<number>(24).fill(0); // from solar noon outward
      for (let i = 0; i < track.stepsPerDay; i++) {
        const step = day * track.stepsPerDay + i;
        if (!read(step, sky)) continue;
        const fromNoon = Math.floor((Math.abs(track.hourAngle[step]) * 12) / Math.PI + 0.5);
        hours[fromNoon] += sky.weight[0] * sky.ghi[0] + sky.weight[1] * sky.ghi[1];
      }
      const total = hours.reduce((sum, value) => sum + value, 0);
      for (let hour = 0; hour < 9; hour++) {
        const share = hours[hour] / total / (hour === 0 ? 1 : 2);
        expect(Math.abs(share - collaresPereiraRabl(hour * 15, 40, track.declination[day]))).toBeLessThan(
          0.013,
        );
      }
    }
  });

  it('refuses values that are no shares', () => {
    expect(() => climateFromMonthly({ kt: months(1.2), kd: months(0.5) }, track)).toThrow(
      /kt must be twelve/,
    );
    expect(() => climateFromMonthly({ kt: months(0.5), kd: months(Number.NaN) }, track)).toThrow(
      /kd must be twelve/,
    );
  });
});

/** Share of a day's global light in the hour around an hour angle [degrees]. */
function collaresPereiraRabl(hourAngle: number, latitude: number, declinationRad: number): number {
  const ws = Math.acos(-Math.tan(latitude * RADIANS) * Math.tan(declinationRad));
  const w = hourAngle * RADIANS;
  if (w > ws) return 0;
  const a = 0.409 + 0.5016 * Math.sin(ws - Math.PI / 3);
  const b = 0.6609 - 0.4767 * Math.sin(ws - Math.PI / 3);
  const shape = (Math.cos(w) - Math.cos(ws)) / (Math.sin(ws) - ws * Math.cos(ws));
  return (Math.PI / 24) * (a + b * Math.cos(w)) * shape;
}
