import { RADIANS } from '../angles/angles.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { cosZenithOf, dayOf, DAYS_IN_MONTH } from '../solar-position/sun-track.ts';
import type { Months } from '../survey/survey.ts';
import type { SkyReader } from './climate.ts';
import { dailyExtraterrestrialNormal, monthlyExtraterrestrial } from './extraterrestrial.ts';

/** Monthly mean clearness index and diffuse share, each 0 to 1. */
export interface MonthlySky {
  kt: Months;
  kd: Months;
}

export const STATE_COUNT = 1;

/** Lays monthly means over a sun track: each month's sums on the track equal kt·H0 and kd of it, beam never negative. */
export function climateFromMonthly({ kt, kd }: MonthlySky, track: SunTrack): SkyReader {
  const normal = dailyExtraterrestrialNormal();
  const shapes = dailyShapes(track);
  const { globalScale, diffuseScale } = monthScales({ kt, kd }, track, normal, shapes);
  return (step, sky) => {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) return false;
    const day = dayOf(track, step);
    const month = track.monthOfDay[day]!;
    const clearness =
      globalScale[month]! * (shapes.a[day]! + shapes.b[day]! * Math.cos(track.hourAngle[step]!));
    const diffuse = diffuseScale[month]! < clearness ? diffuseScale[month]! : clearness;
    sky.weight[0] = 1;
    sky.ghi[0] = clearness * normal[day]! * cosZenith;
    sky.dhi[0] = diffuse * normal[day]! * cosZenith;
    sky.dni[0] = (clearness - diffuse) * normal[day]!;
    return true;
  };
}

/** Ref: Collares-Pereira and Rabl, Solar Energy 22 (1979), as in Duffie and Beckman (2013), eqs. 2.13.2. */
function dailyShapes(track: SunTrack): { a: Float64Array; b: Float64Array } {
  const a = new Float64Array(365);
  const b = new Float64Array(365);
  const tangent = Math.tan(track.latitude * RADIANS);
  for (let day = 0; day < 365; day++) {
    const cosine = Math.min(1, Math.max(-1, -tangent * Math.tan(track.declination[day]!)));
    const shift = Math.sin(Math.acos(cosine) - Math.PI / 3);
    a[day] = 0.409 + 0.5016 * shift;
    b[day] = 0.6609 - 0.4767 * shift;
  }
  return { a, b };
}

function monthScales(
  { kt, kd }: MonthlySky,
  track: SunTrack,
  normal: Float64Array,
  shapes: ReturnType<typeof dailyShapes>,
) {
  const h0 = monthlyExtraterrestrial(track.latitude);
  const global = new Float64Array(12);
  const diffuse = new Float64Array(12);
  for (let step = 0; step < track.steps; step++) {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) continue;
    const day = dayOf(track, step);
    const month = track.monthOfDay[day]!;
    const light = normal[day]! * cosZenith;
    diffuse[month]! += light;
    global[month]! += light * (shapes.a[day]! + shapes.b[day]! * Math.cos(track.hourAngle[step]!));
  }
  const perStep = track.stepMinutes / 60_000;
  const target = (month: number) => (kt[month]! * h0[month]! * DAYS_IN_MONTH[month]!) / perStep;
  const scale = (value: number, sum: number) => (sum > 0 ? value / sum : 0);
  return {
    globalScale: global.map((sum, month) => scale(target(month), sum)),
    diffuseScale: diffuse.map((sum, month) => scale(kd[month]! * target(month), sum)),
  };
}
