/** Irradiance of one moment, W/m2. */
export interface SkyLight {
  ghi: number;
  dni: number;
  dhi: number;
}

/** Writes the light into `light`. Air mass is absolute: relative times pressure over standard pressure at sea level. */
export type ClearSky = (
  cosZenith: number,
  absoluteAirMass: number,
  dniExtra: number,
  light: SkyLight,
) => void;

/**
 * Clear-sky irradiance at an altitude [m, -1000 to 11000] and a Linke turbidity [1 to 15], without the enhancement factor
 * that a later programme added. Below the horizon there is no light.
 * Ref: Ineichen and Perez, A new airmass independent formulation for the Linke turbidity coefficient, Solar Energy 73
 * (2002), eqs. 8 and 11; the bound on dni keeps diffuse light from falling below its clean-air share (section 4).
 */
export function ineichen(altitude: number, linkeTurbidity: number): ClearSky {
  if (!(altitude >= -1000 && altitude <= 11000))
    throw new RangeError(`altitude must be -1000 to 11000 m, got ${altitude}`);
  if (!(linkeTurbidity >= 1 && linkeTurbidity <= 15))
    throw new RangeError(`linkeTurbidity must be 1 to 15, got ${linkeTurbidity}`);
  const fh1 = Math.exp(-altitude / 8000);
  const fh2 = Math.exp(-altitude / 1250);
  const globalScale = 5.09e-5 * altitude + 0.868;
  const globalRate = -(3.92e-5 * altitude + 0.0387) * (fh1 + fh2 * (linkeTurbidity - 1));
  const beamScale = 0.664 + 0.163 / fh1;
  const beamRate = -0.09 * (linkeTurbidity - 1);
  const largestBeamShare = 1 - (0.1 - 0.2 * Math.exp(-linkeTurbidity)) / (0.1 + 0.882 / fh1);
  return (cosZenith, absoluteAirMass, dniExtra, light) => {
    const up = cosZenith > 0 ? cosZenith : 0;
    const ghi = globalScale * dniExtra * up * Math.exp(globalRate * absoluteAirMass);
    const beam = dniExtra * beamScale * Math.exp(beamRate * absoluteAirMass);
    const largest = up > 0 ? (ghi * largestBeamShare) / up : 0;
    light.ghi = ghi;
    light.dni = beam < largest ? beam : largest;
    light.dhi = ghi - light.dni * up;
  };
}
