import type { SunTrack } from '../solar-position/sun-track.ts';
import { cosZenithOf, dayOf, DAYS_IN_MONTH } from '../solar-position/sun-track.ts';
import type { Months } from '../survey/survey.ts';
import { beamExtinction, beamLeft, meanOver } from './beam-extinction.ts';
import type { SkyReader } from './climate.ts';
import { dailyExtraterrestrialNormal, monthlyExtraterrestrial } from './extraterrestrial.ts';
import { INTERVALS, lightByHeight, nodeBelow, NODES } from './light-by-height.ts';

/** Monthly mean clearness index (global over extraterrestrial) and diffuse share of global, each 0 to 1. */
export interface MonthlySky {
  kt: Months;
  kd: Months;
}

/** Sky states: the sun is out, or it is hidden. */
export const STATE_COUNT = 2;
const OUT = 0;
const HIDDEN = 1;

/**
 * Clearness of an overcast and of a sunny month: the share of time that the sun is out runs between them, as in
 * Angstrom's relation of global light and sunshine (constants near the usual 0.25 and 0.75, fitted with the rest).
 */
const OVERCAST_CLEARNESS = 0.21;
const SUNNY_CLEARNESS = 0.78;
const LEAST_OUT = 0.02;
const MOST_OUT = 0.98;
/** Diffuse light with the sun out, over the month's mean (fitted: 0.77 to 0.93 in the hours of seven typical years). */
const DIFFUSE_WITH_SUN = 0.86;
/** The beam is at most this share of the extraterrestrial. */
const LARGEST_BEAM = 0.92;

/**
 * Lays monthly means over a sun track. Sums over each month of the track equal kt·H0 for global and kd of it for
 * diffuse; the beam is never negative, and global is beam plus diffuse at each step.
 *
 * Diffuse light goes with extraterrestrial light through the day (Liu and Jordan, Solar Energy 4 (1960)). Taking it from
 * a published profile of global (Collares-Pereira and Rabl, Solar Energy 22 (1979)) would leave a beam that stays strong
 * down to the horizon, which puts solar access up to four points wrong; so the beam is given the shape that air gives it
 * (`beamExtinction`), and global, their sum, then runs close to that profile.
 */
export function climateFromMonthly(sky: MonthlySky, track: SunTrack): SkyReader {
  for (const [name, values] of Object.entries(sky) as [string, Months][])
    if (values.length !== 12 || !values.every((value) => value >= 0 && value <= 1))
      throw new RangeError(`${name} must be twelve values of 0 to 1, got ${values.join(', ')}`);
  const normal = dailyExtraterrestrialNormal();
  const months = monthSkies(sky, track, lightByHeight(track, normal));
  return reader(track, normal, months);
}

/** What the reader needs of each month; shares of extraterrestrial light. */
interface MonthSkies {
  /** Share of time with the sun out. */
  out: Float64Array;
  diffuseOut: Float64Array;
  diffuseHidden: Float64Array;
  /** Beam with the sun out, by month and node of cos zenith. */
  beam: Float64Array;
}

function reader(track: SunTrack, normal: Float64Array, months: MonthSkies): SkyReader {
  const { out, diffuseOut, diffuseHidden, beam } = months;
  return (step, sky) => {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) return false;
    const day = dayOf(track, step);
    const month = track.monthOfDay[day];
    if (out[month] === 0) return false;
    const node = nodeBelow(cosZenith);
    const at = month * NODES + node;
    const dni = normal[day] * (beam[at] + (cosZenith * INTERVALS - node) * (beam[at + 1] - beam[at]));
    const light = normal[day] * cosZenith;
    sky.weight[OUT] = out[month];
    sky.dni[OUT] = dni;
    sky.dhi[OUT] = diffuseOut[month] * light;
    sky.ghi[OUT] = sky.dhi[OUT] + dni * cosZenith;
    sky.weight[HIDDEN] = 1 - out[month];
    sky.dni[HIDDEN] = 0;
    sky.dhi[HIDDEN] = diffuseHidden[month] * light;
    sky.ghi[HIDDEN] = sky.dhi[HIDDEN];
    return true;
  };
}

function monthSkies({ kt, kd }: MonthlySky, track: SunTrack, light: Float64Array): MonthSkies {
  const h0 = monthlyExtraterrestrial(track.latitude);
  const months: MonthSkies = {
    out: new Float64Array(12),
    diffuseOut: new Float64Array(12),
    diffuseHidden: new Float64Array(12),
    beam: new Float64Array(12 * NODES),
  };
  for (let month = 0; month < 12; month++) {
    const heights = light.subarray(month * NODES, (month + 1) * NODES);
    const sum = heights.reduce((total, part) => total + part, 0);
    const wanted = (kt[month] * h0[month] * DAYS_IN_MONTH[month] * 60_000) / track.stepMinutes;
    if (sum > 0 && wanted > 0)
      fillMonth(months, month, heights, { kt: kt[month], kd: kd[month], global: wanted / sum });
  }
  return months;
}

/** `global` is the month's global light over the extraterrestrial light of the track. */
function fillMonth(
  months: MonthSkies,
  month: number,
  heights: Float64Array,
  { kt, kd, global }: { kt: number; kd: number; global: number },
): void {
  const diffuse = kd * global;
  const beam = global - diffuse;
  const shape = beamLeft(beamExtinction(heights, kt, kt * (1 - kd)));
  const scale = beam / meanOver(heights, shape); // with the sun out all of the time
  const sunny = (kt - OVERCAST_CLEARNESS) / (SUNNY_CLEARNESS - OVERCAST_CLEARNESS);
  const strongest = scale * shape[INTERVALS];
  const out = Math.min(MOST_OUT, Math.max(LEAST_OUT, sunny, strongest / LARGEST_BEAM));
  months.out[month] = out;
  months.diffuseOut[month] = DIFFUSE_WITH_SUN * diffuse;
  months.diffuseHidden[month] = ((1 - out * DIFFUSE_WITH_SUN) / (1 - out)) * diffuse;
  for (let node = 0; node < NODES; node++) months.beam[month * NODES + node] = (scale / out) * shape[node];
}
