import { RADIANS } from '../angles/angles.ts';
import { equationOfTime } from '../solar-position/hour-angle.ts';
import { solarPosition } from '../solar-position/solar-position.ts';
import type { CheckRow, SelfCheckGroup } from './check-row.ts';
import { checkAzimuth, checkValue } from './check-row.ts';

/** Local standard time, geometric elevation, apparent elevation, azimuth; degrees. Apparent is left out near the horizon, where formulas differ. */
const NOAA_DAY: [hour: number, geometric: number, apparent: number, azimuth: number][] = [
  [6, 14.49251, 14.55384, 71.37213],
  [8, 37.03761, 37.05895, 89.00796],
  [10, 59.49269, 59.5022, 113.65684],
  [12, 73.43368, 73.43848, 178.53323],
  [14, 60.12941, 60.13868, 245.26471],
  [16, 37.73545, 37.75626, 270.41188],
  [18, 15.15458, 15.2132, 288.09927],
];
const NOAA_PLACE = { latitude: 40, longitude: -105, hoursBehind: 7 };

const degrees = { unit: '°', decimals: 3 };

/** Sun positions through one day of NOAA's own calculation. */
export function noaaDayCheck(): SelfCheckGroup {
  const { latitude, longitude, hoursBehind } = NOAA_PLACE;
  const rows = NOAA_DAY.flatMap(([hour, geometric, apparent, azimuth]): CheckRow[] => {
    const name = `40° N 105° W, 21 June 2010, ${hour}:00`;
    const sun = solarPosition(Date.UTC(2010, 5, 21, hour + hoursBehind), latitude, longitude);
    const wide = 0.02 / Math.cos(geometric * RADIANS); // the same angle on the sky
    return [
      { quantity: 'geometric elevation', published: geometric, computed: sun.geometricElevation },
      { quantity: 'apparent elevation', published: apparent, computed: sun.apparentElevation },
    ]
      .map((values) => checkValue({ name, ...values, ...degrees, allowed: 0.02 }))
      .concat(
        checkAzimuth({
          name,
          quantity: 'azimuth',
          published: azimuth,
          computed: sun.solarAzimuth,
          ...degrees,
          allowed: wide,
        }),
      );
  });
  return {
    id: 'noaa-positions',
    title: 'Where the sun stands: a day by NOAA',
    source: 'NOAA Global Monitoring Laboratory, spreadsheet NOAA_Solar_Calculations_day',
    allowance: 'Allowed: 0.02° on the sky, under a twentieth of the width of the sun.',
    rows,
  };
}

/** The worked example of the Solar Position Algorithm. */
export function spaExampleCheck(): SelfCheckGroup {
  const timeMs = Date.UTC(2003, 9, 17, 19, 30, 30);
  const sun = solarPosition(timeMs, 39.742476, -105.1786, 1830.14);
  const name = '39.742476° N 105.1786° W, 17 October 2003, 12:30:30 UTC-7';
  const row = { name, ...degrees, allowed: 0.02 };
  return {
    id: 'spa-example',
    title: 'Where the sun stands: the worked example of the Solar Position Algorithm',
    source:
      'Reda and Andreas, Solar Position Algorithm for Solar Radiation Applications, NREL/TP-560-34302 (2008), Table A4.1',
    allowance:
      'Allowed: 0.02°. The example is for 820 mbar and 11 °C; Noonmark takes the standard pressure of the height.',
    rows: [
      checkValue({
        ...row,
        quantity: 'geometric elevation',
        published: 39.872046,
        computed: sun.geometricElevation,
      }),
      checkValue({
        ...row,
        quantity: 'apparent elevation',
        published: 39.888378,
        computed: sun.apparentElevation,
      }),
      checkAzimuth({
        ...row,
        quantity: 'azimuth',
        published: 194.340241,
        computed: sun.solarAzimuth,
        allowed: 0.026,
      }),
    ],
  };
}

/** The equation of time of a textbook. */
export function equationOfTimeCheck(): SelfCheckGroup {
  return {
    id: 'equation-of-time',
    title: 'How far the sundial is ahead of the clock',
    source: 'Meeus, Astronomical Algorithms, 2nd ed. (1998), example 28.b',
    allowance: 'Allowed: 3 seconds, in which the sun moves by 0.013°.',
    rows: [
      checkValue({
        name: '13 October 1992, 0:00',
        quantity: 'equation of time',
        unit: 'min',
        decimals: 3,
        published: 13.711,
        computed: equationOfTime(Date.UTC(1992, 9, 13)),
        allowed: 0.05,
      }),
    ],
  };
}
