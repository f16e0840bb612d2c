import Model from 'geomagnetism/lib/model.js';
import wmm from 'geomagnetism/data/wmm-2025.json' with { type: 'json' };

export interface MagneticDeclination {
  /** Degrees from true north to magnetic north, east positive: true azimuth = magnetic azimuth + declination. */
  declination: number;
  /**
   * Standard deviation of the declination as a compass would find it away from iron, degrees; what the model leaves
   * out is mostly rock. It grows towards the magnetic poles.
   */
  standardDeviation: number;
  /** Horizontal part of the field, nT. A compass is unsure below 6000 and of no use below 2000. */
  horizontalIntensity: number;
  model: 'WMM2025';
  /** Year the coefficients stand for. */
  epoch: number;
  /** Day from which the model is out of date. */
  validUntil: string;
  /** Whether the instant lies in the model's years; outside, the declination is an extrapolation. */
  withinValidity: boolean;
}

export interface DeclinationQuery {
  /** -90 to 90, degrees. */
  latitude: number;
  /** Degrees, any turn. */
  longitude: number;
  /** Metres above sea level, -1000 to 850000; absent means 0. */
  altitude?: number;
  /** Unix time [ms]. */
  timeMs: number;
}

/** Release of the model; it is in force from then on. */
const VALID_FROM = '2024-11-13';
const VALID_UNTIL = '2030-01-01';

/**
 * Magnetic declination of a place and instant by the World Magnetic Model 2025, to the model's own digits. Heights
 * above sea level are taken as heights over the ellipsoid (at most 0.001° of difference).
 * Throws RangeError for a place or time out of range.
 * Ref: The US/UK World Magnetic Model for 2025-2030, NOAA/NCEI Technical Report (2024); coefficients of 13 November
 * 2024. Standard deviation: the report's error model, sqrt(0.26² + (5417 / H)²), constants from memory.
 */
export function magneticDeclination({
  latitude,
  longitude,
  altitude = 0,
  timeMs,
}: DeclinationQuery): MagneticDeclination {
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  if (!Number.isFinite(longitude)) throw new RangeError(`longitude must be finite, got ${longitude}`);
  if (!(altitude >= -1000 && altitude <= 850_000))
    throw new RangeError(`altitude must be -1000 to 850000 m, got ${altitude}`);
  if (!Number.isFinite(timeMs)) throw new RangeError(`timeMs must be finite, got ${timeMs}`);
  const field = fieldOfYear(decimalYear(timeMs)).point([latitude, longitude, altitude / 1000]);
  return {
    declination: field.decl,
    standardDeviation: Math.hypot(0.26, 5417 / field.h),
    horizontalIntensity: field.h,
    model: 'WMM2025',
    epoch: wmm.epoch,
    validUntil: VALID_UNTIL,
    withinValidity: timeMs >= Date.parse(VALID_FROM) && timeMs < Date.parse(VALID_UNTIL),
  };
}

/** The field's coefficients moved on to a year. The package's own way of doing so slips a day in leap years. */
function fieldOfYear(year: number): Model {
  const since = year - wmm.epoch;
  const moved = (main: number[], perYear: number[]) => main.map((value, i) => value + since * perYear[i]);
  return new Model({
    epoch: wmm.epoch,
    n_max: wmm.n_max,
    main_field_coeff_g: moved(wmm.main_field_coeff_g, wmm.secular_var_coeff_g),
    main_field_coeff_h: moved(wmm.main_field_coeff_h, wmm.secular_var_coeff_h),
  });
}

/** Year with its share gone by, as the model counts time. */
function decimalYear(timeMs: number): number {
  const year = new Date(timeMs).getUTCFullYear();
  const start = Date.UTC(year, 0, 1);
  return year + (timeMs - start) / (Date.UTC(year + 1, 0, 1) - start);
}
