import { safeAcos } from '../angles/angles.ts';
import { airMassAt } from '../irradiance/air-mass.ts';
import type { Transposition } from './transposition.ts';

/** Upper ends of the sky clearness bins 1 to 7; bin 8 is open. Ref: Perez et al. (1990), table 1. */
const CLEARNESS_ENDS = [1.065, 1.23, 1.5, 1.95, 2.8, 4.5, 6.2];

/** F11, F12, F13, F21, F22, F23 for each clearness bin. Ref: Perez et al. (1990), table 6, all sites. */
const COEFFICIENTS = [
  [-0.008, 0.588, -0.062, -0.06, 0.072, -0.022],
  [0.13, 0.683, -0.151, -0.019, 0.066, -0.029],
  [0.33, 0.487, -0.221, 0.055, -0.064, -0.026],
  [0.568, 0.187, -0.295, 0.109, -0.152, -0.014],
  [0.873, -0.392, -0.362, 0.226, -0.462, 0.001],
  [1.132, -1.237, -0.412, 0.288, -0.823, 0.056],
  [1.06, -1.6, -0.359, 0.264, -1.127, 0.131],
  [0.678, -0.327, -0.25, 0.156, -1.377, 0.251],
] as const;

/** Ref: Perez et al. (1990), eq. 1, zenith angle in radians. */
const KAPPA = 1.041;
/** Least cosine of the zenith angle the circumsolar term is divided by: cos 85°. Ref: the same, eq. 9. */
const LEAST_COSINE = 0.08715574274765817;

/**
 * Circumsolar light, dome and horizon band after the brightness and the clearness of the sky.
 * Ref: Perez, Ineichen, Seals, Michalsky and Stewart (1990), Solar Energy 44, 271-289, eq. 1, 2, 9;
 * doi 10.1016/0038-092X(90)90055-H.
 */
export const perez: Transposition = {
  id: 'perez',
  name: 'Perez, all sites',
  reference: 'Perez et al. (1990)',
  split(sky, parts) {
    if (sky.cosZenith <= 0 || sky.dhi <= 0) {
      parts.circumsolarNormal = 0;
      parts.dome = sky.dhi > 0 ? sky.dhi : 0;
      parts.band = 0;
      return;
    }
    const zenith = safeAcos(sky.cosZenith);
    const cubed = KAPPA * zenith * zenith * zenith;
    const clearness = ((sky.dhi + sky.dni) / sky.dhi + cubed) / (1 + cubed);
    let bin = 0;
    while (bin < 7 && clearness >= CLEARNESS_ENDS[bin]) bin++;
    const f = COEFFICIENTS[bin];
    const brightness = (sky.dhi * airMassAt(sky.cosZenith)) / sky.dniExtra;
    const circumsolar = Math.max(0, f[0] + f[1] * brightness + f[2] * zenith);
    const band = f[3] + f[4] * brightness + f[5] * zenith;
    parts.circumsolarNormal = (sky.dhi * circumsolar) / Math.max(LEAST_COSINE, sky.cosZenith);
    parts.dome = sky.dhi * (1 - circumsolar);
    parts.band = sky.dhi * band;
  },
};
