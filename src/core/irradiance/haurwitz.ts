/**
 * Global horizontal irradiance under a clear sky, W/m2, at a cosine of the apparent zenith angle; 0 with the sun down.
 * Ref: Haurwitz, Insolation in relation to cloudiness and cloud density, Journal of Meteorology 2 (1945), in the form
 * 1098 cos z exp(-0.059 / cos z) of Reno, Hansen and Stein, SAND2012-2389 (2012), eq. 9.
 */
export const haurwitz = (cosZenith: number): number =>
  cosZenith > 0 ? 1098 * cosZenith * Math.exp(-0.059 / cosZenith) : 0;
