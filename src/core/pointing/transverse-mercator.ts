import type { Coordinates } from '../angles/place.ts';
import { DEGREES, RADIANS, turnBetween } from '../angles/angles.ts';

/** WGS 84: equatorial radius, metres, and flattening (NIMA TR8350.2, 2000, table 3.1). */
const RADIUS = 6_378_137;
const FLATTENING = 1 / 298.257223563;
const E2 = FLATTENING * (2 - FLATTENING);
const E = Math.sqrt(E2);
/** Third flattening, in which the series run. */
const N = FLATTENING / (2 - FLATTENING);
/** Radius of the circle as long as a meridian. Eq. (14). */
const MERIDIAN_RADIUS = (RADIUS / (1 + N)) * (1 + N ** 2 / 4 + N ** 4 / 64 + N ** 6 / 256);

/** A polynomial in the third flattening from its lowest power on. */
const series = (lowest: number, ...by: number[]) =>
  by.reduce((sum, coefficient, i) => sum + coefficient * N ** (lowest + i), 0);

/** Eq. (35). */
const ALPHA = [
  series(1, 1 / 2, -2 / 3, 5 / 16, 41 / 180, -127 / 288, 7891 / 37_800),
  series(2, 13 / 48, -3 / 5, 557 / 1440, 281 / 630, -1_983_433 / 1_935_360),
  series(3, 61 / 240, -103 / 140, 15_061 / 26_880, 167_603 / 181_440),
  series(4, 49_561 / 161_280, -179 / 168, 6_601_661 / 7_257_600),
  series(5, 34_729 / 80_640, -3_418_889 / 1_995_840),
  series(6, 212_378_941 / 319_334_400),
];
/** Eq. (36). */
const BETA = [
  series(1, 1 / 2, -2 / 3, 37 / 96, -1 / 360, -81 / 512, 96_199 / 604_800),
  series(2, 1 / 48, 1 / 15, -437 / 1440, 46 / 105, -1_118_711 / 3_870_720),
  series(3, 17 / 480, -37 / 840, -209 / 4480, 5569 / 90_720),
  series(4, 4397 / 161_280, -11 / 504, -830_251 / 7_257_600),
  series(5, 4583 / 161_280, -108_847 / 3_991_680),
  series(6, 20_648_693 / 638_668_800),
];

/** A place of the projection, metres from where its central meridian meets the equator, at scale 1. */
export interface MapPlace {
  east: number;
  north: number;
}

/**
 * Transverse Mercator projection of the WGS 84 ellipsoid with scale 1 on its central meridian: a place to metres.
 * `latitude` -90 to 90, `longitude` within 60° of `meridian`, degrees; exact to well under a millimetre within 30°.
 * Throws RangeError outside. Ref: Karney, Transverse Mercator with an accuracy of a few nanometers, Journal of Geodesy
 * 85 (2011) 475, eqs. (7)-(11) and (35), doi:10.1007/s00190-011-0445-3; the series is Krüger's (1912).
 */
export function projected(latitude: number, longitude: number, meridian: number): MapPlace {
  const east = turnBetween(meridian, longitude);
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  if (!(Math.abs(east) <= 60))
    throw new RangeError(`longitude must be within 60° of the meridian ${meridian}, got ${longitude}`);
  const tan = conformalTan(Math.tan(latitude * RADIANS));
  const cosine = Math.cos(east * RADIANS);
  const xi = Math.atan2(tan, cosine); // 10
  const eta = Math.asinh(Math.sin(east * RADIANS) / Math.hypot(tan, cosine)); // 10
  const bent = turned(xi, eta, ALPHA, 1); // 11
  return { east: MERIDIAN_RADIUS * bent.eta, north: MERIDIAN_RADIUS * bent.xi };
}

/**
 * The place, degrees, of a point of the projection that `projected` gives, metres at scale 1; the longitude between
 * -180 and 180. The point lies within 5000 km of the meridian and 10100 km of the equator, else RangeError; past the pole lies the meridian opposite.
 * Ref: Karney (2011), as there, eqs. (12), (15), (18)-(21) and (36).
 */
export function unprojected({ east, north }: MapPlace, meridian: number): Coordinates {
  if (!(Math.abs(east) <= 5e6)) throw new RangeError(`east must be within 5000 km, got ${east} m`);
  if (!(Math.abs(north) <= 10_100_000)) throw new RangeError(`north must be within 10100 km, got ${north} m`);
  const { xi, eta } = turned(north / MERIDIAN_RADIUS, east / MERIDIAN_RADIUS, BETA, -1); // 15
  const conformal = Math.sin(xi) / Math.hypot(Math.sinh(eta), Math.cos(xi)); // 18
  const turn = Math.atan2(Math.sinh(eta), Math.cos(xi)) * DEGREES; // 18
  return {
    latitude: Math.atan(geographicTan(conformal)) * DEGREES,
    longitude: turnBetween(0, meridian + turn),
  };
}

/** Between the sphere's transverse Mercator and the ellipsoid's. Eq. (11) with `sign` 1, eq. (15) with -1. */
function turned(xi: number, eta: number, by: readonly number[], sign: 1 | -1) {
  const bent = { xi, eta };
  by.forEach((coefficient, i) => {
    const k = 2 * (i + 1);
    bent.xi += sign * coefficient * Math.sin(k * xi) * Math.cosh(k * eta);
    bent.eta += sign * coefficient * Math.cos(k * xi) * Math.sinh(k * eta);
  });
  return bent;
}

/** Tangent of the conformal latitude from that of the geographic one. Eqs. (7)-(9). */
function conformalTan(tan: number): number {
  const secant = Math.hypot(1, tan);
  const sigma = Math.sinh(E * Math.atanh((E * tan) / secant));
  return tan * Math.hypot(1, sigma) - sigma * secant;
}

/** The way back, by Newton's method; two or three steps reach full precision. Eqs. (19)-(21). */
function geographicTan(conformal: number): number {
  let tan = conformal / (1 - E2);
  for (let step = 0; step < 6; step++) {
    const now = conformalTan(tan);
    const slope = (1 + (1 - E2) * tan * tan) / ((1 - E2) * Math.hypot(1, tan) * Math.hypot(1, now));
    const change = (conformal - now) * slope;
    tan += change;
    if (Math.abs(change) <= 1e-14 * Math.max(1, Math.abs(tan))) break;
  }
  return tan;
}
