import { magneticDeclination } from '../pointing/declination.ts';
import type { SelfCheckGroup } from './check-row.ts';
import { checkAzimuth } from './check-row.ts';

/** Table 6 of the report: instant, height over the ellipsoid in km, place, declination. */
const TABLE_6: [
  year: 2025 | 2027.5,
  heightKm: number,
  latitude: number,
  longitude: number,
  declination: number,
][] = [
  [2025, 0, 80, 0, 1.28],
  [2025, 0, 0, 120, -0.16],
  [2025, 0, -80, 240, 68.78],
  [2025, 100, 80, 0, 0.85],
  [2025, 100, 0, 120, -0.15],
  [2025, 100, -80, 240, 68.21],
  [2027.5, 0, 80, 0, 2.59],
  [2027.5, 0, 0, 120, -0.24],
  [2027.5, 0, -80, 240, 68.49],
  [2027.5, 100, 80, 0, 2.16],
  [2027.5, 100, 0, 120, -0.23],
  [2027.5, 100, -80, 240, 67.93],
];

const INSTANT = { 2025: Date.UTC(2025, 0, 1), 2027.5: Date.UTC(2027, 6, 2, 12) };

/** Magnetic declination against the model's own test values. */
export function declinationCheck(): SelfCheckGroup {
  return {
    id: 'wmm2025',
    title: 'Magnetic declination',
    source:
      'The US/UK World Magnetic Model for 2025-2030, NOAA/NCEI Technical Report (2024), Table 6, test values',
    allowance:
      'Allowed: half of the last printed digit. The field itself strays from the model by some tenths of a degree.',
    rows: TABLE_6.map(([year, heightKm, latitude, longitude, published]) =>
      checkAzimuth({
        name: `${Math.abs(latitude)}°${latitude < 0 ? ' S' : latitude > 0 ? ' N' : ''} ${longitude}° E, ${heightKm} km, ${year.toFixed(1)}`,
        quantity: 'declination',
        unit: '°',
        decimals: 3,
        published,
        computed: magneticDeclination({
          latitude,
          longitude,
          altitude: heightKm * 1000,
          timeMs: INSTANT[year],
        }).declination,
        allowed: 0.00501,
      }),
    ),
  };
}
