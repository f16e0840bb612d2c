import { solarTimes } from '../solar-position/solar-times.ts';
import type { CheckRow, SelfCheckGroup } from './check-row.ts';
import { checkValue } from './check-row.ts';
import { CLOCK_UNIT } from './shown-row.ts';

interface PublishedDay {
  place: string;
  latitude: number;
  longitude: number;
  /** A zone that keeps this offset on the day. */
  timeZone: string;
  date: [year: number, month: number, day: number];
  /** Clock times h:mm or h:mm:ss. */
  sunrise?: string;
  noon?: string;
  sunset?: string;
}

const golden = {
  place: 'Golden, Colorado',
  latitude: 39.742476,
  longitude: -105.1786,
  timeZone: 'Etc/GMT+7',
};
const tehran = { place: 'Tehran', latitude: 35.6892, longitude: 51.389, timeZone: 'Asia/Tehran' };
const jakarta = { place: 'Jakarta', latitude: -6.2088, longitude: 106.8456, timeZone: 'Asia/Jakarta' };
const istanbul = { place: 'Istanbul', latitude: 41.0082, longitude: 28.9784, timeZone: 'Europe/Istanbul' };
const south = { place: '35° S 0° E', latitude: -35, longitude: 0, timeZone: 'UTC' };

const BY_NOAA: PublishedDay[] = [
  { ...tehran, date: [2025, 1, 1], sunrise: '7:14', noon: '12:08', sunset: '17:02' },
  { ...tehran, date: [2025, 8, 21], sunrise: '5:28', noon: '12:08', sunset: '18:47' },
  { ...jakarta, date: [2025, 3, 21], sunrise: '5:57', noon: '12:00', sunset: '18:03' },
  { ...jakarta, date: [2025, 9, 12], sunrise: '5:47', noon: '11:49', sunset: '17:50' },
  { ...istanbul, date: [2025, 1, 1], sunrise: '8:29', noon: '13:08', sunset: '17:47' },
  { ...istanbul, date: [2025, 9, 12], sunrise: '6:42', noon: '13:00', sunset: '19:18' },
];

const BY_NREL: PublishedDay[] = [
  { ...south, date: [1996, 7, 5], sunrise: '7:08:15', noon: '12:04:36', sunset: '17:01:04' },
  { ...south, date: [2004, 12, 4], sunrise: '4:38:57', noon: '11:50:22', sunset: '19:02:03' },
  { ...golden, date: [2015, 1, 2], sunrise: '7:21:55', noon: '12:04:45', sunset: '16:47:43' },
];

/** Sunrise, solar noon and sunset against two published calculators. */
export function sunriseChecks(): SelfCheckGroup[] {
  return [
    {
      id: 'noaa-sunrise',
      title: 'Sunrise, solar noon and sunset by NOAA',
      source: 'NOAA Solar Calculator, Global Monitoring Laboratory; times printed to the minute',
      allowance: 'Allowed: half a minute of rounding in the printed time and 4 seconds of ours.',
      rows: BY_NOAA.flatMap((day) => dayRows(day, 34 / 60)),
    },
    {
      id: 'nrel-sunrise',
      title: 'Sunrise, solar noon and sunset by NREL',
      source: 'NREL Solar Position Algorithm calculator; times printed to the second',
      allowance: 'Allowed: 4 seconds, in which the sun moves by 0.017°.',
      rows: BY_NREL.flatMap((day) => dayRows(day, 4 / 60)),
    },
  ];
}

function dayRows(day: PublishedDay, allowed: number): CheckRow[] {
  const [year, month, dayOfMonth] = day.date;
  const times = solarTimes({ year, month, day: dayOfMonth }, day.timeZone, day.latitude, day.longitude);
  const minutes = (timeMs: number | null) =>
    times && timeMs !== null ? (timeMs - times.startMs) / 60_000 : NaN;
  const found =
    times?.kind === 'rises-and-sets'
      ? {
          sunrise: minutes(times.sunriseMs),
          noon: minutes(times.solarNoonMs),
          sunset: minutes(times.sunsetMs),
        }
      : { sunrise: NaN, noon: NaN, sunset: NaN };
  const name = `${day.place}, ${year}-${String(month).padStart(2, '0')}-${String(dayOfMonth).padStart(2, '0')}`;
  const row = (quantity: string, clock: string | undefined, computed: number) =>
    clock === undefined
      ? []
      : [
          checkValue({
            name,
            quantity,
            unit: CLOCK_UNIT,
            decimals: 2,
            published: minutesOf(clock),
            computed,
            allowed,
          }),
        ];
  return [
    ...row('sunrise', day.sunrise, found.sunrise),
    ...row('solar noon', day.noon, found.noon),
    ...row('sunset', day.sunset, found.sunset),
  ];
}

function minutesOf(clock: string): number {
  const [hour, minute, second = 0] = clock.split(':').map(Number);
  return hour * 60 + minute + second / 60;
}
