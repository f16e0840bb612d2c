import { RADIANS, safeAsin } from '../angles/angles.ts';
import { planeFacing, planeHorizon, viewBetween } from '../horizon/sky-view.ts';
import { airMassAt } from '../irradiance/air-mass.ts';
import type { RoofPlane } from '../survey/survey.ts';

/** Width of a column of azimuth, degrees. */
export const LIGHT_COLUMN = 2;
const COLUMNS = 360 / LIGHT_COLUMN;
const STEP = 0.5 * RADIANS;
/** The sun's declination goes this far from the equator. */
const TROPIC = 23.44 * RADIANS;
/** Share of the light that comes from the sun's place, for the split alone: 0.5 to 0.85 in the world's climates, on planes. */
const DIRECT = 0.6;

/** A plane's light by azimuth, for telling which of several directions sends more of it. */
export interface LightByAzimuth {
  /** Share of the year's light from each column, 0 to 1; they sum to 1. */
  shares: Float64Array;
  /** Whether the sun ever stands in the column in front of the plane. */
  isInBand: boolean[];
}

/**
 * About how a plane's year of light is spread over azimuth under a clear sky, without a climate and without a sky map. The time the sun spends at a declination δ goes by 1/sqrt(TROPIC² − δ²), as for a uniform circular
 * orbit; beam by Meinel and Meinel (1976), Applied Solar Energy, 0.7^(air mass^0.678); the rest from an even sky.
 */
export function lightByAzimuth(
  latitude: number,
  { surfaceTilt, surfaceAzimuth }: Pick<RoofPlane, 'surfaceTilt' | 'surfaceAzimuth'>,
): LightByAzimuth {
  const { east, north, upward } = planeFacing(surfaceTilt, surfaceAzimuth);
  const direct = new Float64Array(COLUMNS);
  const even = new Float64Array(COLUMNS);
  for (let column = 0; column < COLUMNS; column++) {
    const azimuth = (column + 0.5) * LIGHT_COLUMN * RADIANS;
    const toward = north * Math.cos(azimuth) + east * Math.sin(azimuth);
    direct[column] = columnDirect(latitude * RADIANS, azimuth, toward, upward);
    even[column] = viewBetween(toward, upward, 0, Math.PI / 2);
  }
  const [allDirect, allEven] = [sum(direct), sum(even)];
  const share = allDirect > 0 ? DIRECT : 0;
  return {
    shares: direct.map(
      (light, column) =>
        (allDirect > 0 ? (share * light) / allDirect : 0) + ((1 - share) * even[column]) / allEven,
    ),
    isInBand: [...direct].map((light) => light > 0),
  };
}

/** Beam on the plane from one column, in no unit. */
function columnDirect(latitudeRad: number, azimuthRad: number, toward: number, upward: number): number {
  let light = 0;
  const [sinLatitude, cosLatitude] = [Math.sin(latitudeRad), Math.cos(latitudeRad)];
  const behind = Math.max(0, planeHorizon(toward, upward));
  for (let elevation = STEP / 2; elevation < Math.PI / 2; elevation += STEP) {
    const [sine, cosine] = [Math.sin(elevation), Math.cos(elevation)];
    const sinDeclination = sinLatitude * sine + cosLatitude * cosine * Math.cos(azimuthRad);
    const declination = safeAsin(sinDeclination);
    if (elevation <= behind || Math.abs(declination) >= TROPIC) continue;
    const seldom = Math.sqrt(Math.max(1e-3, TROPIC ** 2 - declination ** 2)) * Math.cos(declination);
    const beam = 0.7 ** (airMassAt(sine) ** 0.678);
    light += (beam * (toward * cosine + upward * sine) * cosine) / seldom;
  }
  return light;
}

const sum = (values: Float64Array) => values.reduce((all, value) => all + value, 0);
