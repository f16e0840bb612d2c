import type { TranspositionId } from '../survey/survey.ts';

/**
 * Sky light split into parts that an obstruction blocks differently. None depends on the plane, so one year of parts
 * serves every plane of a site.
 */
export interface SkyParts {
  /** Light that comes from the sun's place, as irradiance normal to it, W/m2 (the beam is not in it). */
  circumsolarNormal: number;
  /** Light spread evenly over the dome, as irradiance on the horizontal, W/m2. */
  dome: number;
  /** Coefficient of the horizon band, W/m2: the plane gets band·sin(tilt); may be negative. */
  band: number;
}

/** What the sky is like at an instant. Irradiance in W/m2. */
export interface SkyMoment {
  dni: number;
  dhi: number;
  /** Extraterrestrial irradiance normal to the sun. */
  dniExtra: number;
  /** Cosine of the apparent zenith angle; below 0 with the sun down. */
  cosZenith: number;
}

/** One way of laying sky light on a tilted plane. */
export interface Transposition {
  readonly id: TranspositionId;
  readonly name: string;
  readonly reference: string;
  /** Writes the parts into `parts`. With the sun down there is no circumsolar light and no band. */
  split(sky: SkyMoment, parts: SkyParts): void;
}
