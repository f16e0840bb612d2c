import type { ClearSkyModel, Months } from '../survey/survey.ts';
import { standardPressure } from '../solar-position/refraction.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { cosZenithOf, dayOf } from '../solar-position/sun-track.ts';
import { airMassAt } from './air-mass.ts';
import type { Climate, SkyReader } from './climate.ts';
import { erbsDiffuse } from './erbs.ts';
import { dailyExtraterrestrialNormal } from './extraterrestrial.ts';
import { haurwitz } from './haurwitz.ts';
import { ineichen } from './ineichen.ts';

/** Linke turbidity where nothing is known of the place (common practice: a clean to moderate air). */
const USUAL_TURBIDITY: Months = [3, 3, 3, 3, 3, 3, 3, 3, 3, 3, 3, 3];

const rows: Record<ClearSkyModel, { name: string; reference: string }> = {
  ineichen: {
    name: 'Clear sky (Ineichen and Perez)',
    reference: 'Ineichen and Perez, Solar Energy 73 (2002)',
  },
  'haurwitz-erbs': {
    name: 'Clear sky (Haurwitz with Erbs)',
    reference: 'Haurwitz, J. Meteorology 2 (1945); Erbs et al., Solar Energy 28 (1982)',
  },
};

/**
 * A year without clouds: an upper bound for what the sun can give, not a forecast.
 * `linkeTurbidity`, 1 to 15, is used by `ineichen` alone and held through each month.
 */
export function clearSkyClimate(model: ClearSkyModel, linkeTurbidity: Months = USUAL_TURBIDITY): Climate {
  if (linkeTurbidity.length !== 12 || !linkeTurbidity.every((value) => value >= 1 && value <= 15))
    throw new RangeError(`linkeTurbidity must be twelve values of 1 to 15, got ${linkeTurbidity.join(', ')}`);
  return {
    source: 'clear-sky',
    ...rows[model],
    warnings: [
      'A clear sky has no clouds: yields are an upper bound, and shade counts for more than in a real year.',
    ],
    stateCount: 1,
    over: (track) => (model === 'ineichen' ? ineichenOver(track, linkeTurbidity) : haurwitzErbsOver(track)),
  };
}

function ineichenOver(track: SunTrack, linkeTurbidity: Months): SkyReader {
  const months = linkeTurbidity.map((turbidity) => ineichen(track.altitude, turbidity));
  const normal = dailyExtraterrestrialNormal();
  const pressureRatio = standardPressure(track.altitude) / 1013.25;
  const light = { ghi: 0, dni: 0, dhi: 0 };
  return (step, sky) => {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) return false;
    const day = dayOf(track, step);
    months[track.monthOfDay[day]](cosZenith, airMassAt(cosZenith) * pressureRatio, normal[day], light);
    sky.weight[0] = 1;
    sky.ghi[0] = light.ghi;
    sky.dni[0] = light.dni;
    sky.dhi[0] = light.dhi;
    return true;
  };
}

function haurwitzErbsOver(track: SunTrack): SkyReader {
  const normal = dailyExtraterrestrialNormal();
  return (step, sky) => {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) return false;
    const ghi = haurwitz(cosZenith);
    const dhi = erbsDiffuse(ghi, cosZenith, normal[dayOf(track, step)]);
    sky.weight[0] = 1;
    sky.ghi[0] = ghi;
    sky.dhi[0] = dhi;
    sky.dni[0] = (ghi - dhi) / cosZenith;
    return true;
  };
}
