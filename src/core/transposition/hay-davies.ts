import type { Transposition } from './transposition.ts';

/** Cosine of 89°: nearer the horizon the circumsolar light is counted as if it came from there. */
const LEAST_COSINE = 0.01745240643728351;

/**
 * A share of the sky light comes from the sun's place, as large as the share of the extraterrestrial beam that gets
 * through (A = dni / dniExtra, at most 1); the rest is spread evenly.
 * Ref: Hay and Davies (1980), Proc. First Canadian Solar Radiation Data Workshop, 59-72; Duffie and Beckman,
 * Solar Engineering of Thermal Processes, 4th ed. (2013), eq. 2.16.2 to 2.16.4.
 */
export const hayDavies: Transposition = {
  id: 'hay-davies',
  name: 'Hay and Davies',
  reference: 'Hay and Davies (1980)',
  split(sky, parts) {
    const anisotropy = sky.cosZenith > 0 ? Math.min(1, sky.dni / sky.dniExtra) : 0;
    const cosine = sky.cosZenith > LEAST_COSINE ? sky.cosZenith : LEAST_COSINE;
    parts.circumsolarNormal = (sky.dhi * anisotropy) / cosine;
    parts.dome = sky.dhi * (1 - anisotropy);
    parts.band = 0;
  },
};
