import { describe, expect, test } from 'vitest';
import { RADIANS } from '../../../src/core/angles/angles.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { planeFacing } from '../../../src/core/horizon/sky-view.ts';
import type { ClockSpan } from '../../../src/core/shading/shade-times.ts';
import { dayNumber, dayOfYear, shadeTimes } from '../../../src/core/shading/shade-times.ts';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import { sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { standardOffsetMinutes } from '../../../src/core/solar-position/time-zone.ts';
import { months, obstruction, points, ring, trace } from '../horizon/made-up-traces.ts';

/** A box in the sky: azimuths clockwise from, to (over north where `to` is less) and elevations. */
interface Box {
  id: string;
  from: number;
  to: number;
  low: number;
  high: number;
}

interface Place {
  latitude: number;
  longitude: number;
  altitude: number;
  timeZone: string;
}

const vermont = { latitude: 43.986, longitude: -72.412, altitude: 240, timeZone: 'America/New_York' };
const newSouthWales = { latitude: -35.142, longitude: 149.384, altitude: 655, timeZone: 'Australia/Sydney' };
const tropics = { latitude: 10.352, longitude: -85.118, altitude: 85, timeZone: 'America/Costa_Rica' };
const polar = { latitude: 69.534, longitude: 19.862, altitude: 24, timeZone: 'Europe/Oslo' };
/** Its clocks are a day ahead of its sun. */
const lineIslands = { latitude: 1.87, longitude: -157.4, altitude: 3, timeZone: 'Pacific/Kiritimati' };

const east: Box = { id: 'east', from: 75, to: 130, low: 0, high: 28 };
const crown: Box = { id: 'crown', from: 190, to: 235, low: 12, high: 41 };
const north: Box = { id: 'north', from: 340, to: 25, low: 0, high: 85 };
const south: Box = { id: 'south', from: 150, to: 210, low: 0, high: 84 };

const SCENES: { name: string; at: Place; tilt: number; facing: number; boxes: Box[] }[] = [
  { name: 'north of the tropics', at: vermont, tilt: 33.7, facing: 172, boxes: [east, crown] },
  {
    name: 'south of the tropics',
    at: newSouthWales,
    tilt: 22,
    facing: 8,
    boxes: [east, { ...north, high: 38 }],
  },
  { name: 'sun on both sides of the zenith', at: tropics, tilt: 10, facing: 90, boxes: [north, south, east] },
  {
    name: 'a sun that does not set',
    at: polar,
    tilt: 0,
    facing: 180,
    boxes: [
      { ...north, high: 8 },
      { ...south, high: 15 },
    ],
  },
  { name: 'clocks a day ahead', at: lineIslands, tilt: 15, facing: 270, boxes: [east, crown] },
];

const asTraced = ({ id, from, to, low, high }: Box) => {
  const width = (to - from + 360) % 360;
  const edge = [0, 0.25, 0.5, 0.75, 1].map((share): [number, number] => [(from + share * width) % 360, high]);
  const below = [...edge].reverse().map(([azimuth]): [number, number] => [azimuth, low]);
  return obstruction(
    [low > 0 ? trace('outline', points(...edge, ...below)) : trace('skyline', points(...edge))],
    months(0.3),
    id,
  );
};

const timesOf = (at: Place, tilt: number, facing: number, boxes: Box[], stepMinutes = 5) =>
  shadeTimes(
    sunTrack({ ...at, utcOffset: standardOffsetMinutes(at.timeZone) }, stepMinutes),
    planeFacing(tilt, facing),
    horizonProfile(boxes.map(asTraced)),
    at.timeZone,
  );

/** Minutes of Unix time between two instants at which the box stands between the library's sun and the plane. */
function shadedAt(at: Place, tilt: number, facing: number, box: Box, fromMs: number, toMs: number): number[] {
  const found: number[] = [];
  for (let time = fromMs; time < toMs; time += 60_000) {
    const sun = solarPosition(time + 30_000, at.latitude, at.longitude, at.altitude);
    const [h, turn] = [sun.apparentElevation * RADIANS, (sun.solarAzimuth - facing) * RADIANS];
    const incidence =
      Math.sin(h) * Math.cos(tilt * RADIANS) + Math.cos(h) * Math.sin(tilt * RADIANS) * Math.cos(turn);
    const width = (box.to - box.from + 360) % 360;
    const isBehind =
      (sun.solarAzimuth - box.from + 360) % 360 < width &&
      sun.apparentElevation >= box.low &&
      sun.apparentElevation < box.high;
    if (sun.apparentElevation > 0 && incidence > 0 && isBehind) found.push(time);
  }
  return found;
}

/** From one mean solar midnight to the next, about the noon of a date of 2025. */
function solarDay({ longitude, timeZone }: Place, day: number): [number, number] {
  const standardNoon = Date.UTC(2025, 0, 1 + day, 12) - standardOffsetMinutes(timeZone) * 60_000;
  const nearest = Math.round((standardNoon - (12 * 60 - longitude * 4) * 60_000) / 86_400_000);
  const noon = nearest * 86_400_000 + (12 * 60 - longitude * 4) * 60_000;
  return [Math.round(noon / 60_000) * 60_000 - 43_200_000, Math.round(noon / 60_000) * 60_000 + 43_200_000];
}

const clockMinutes = (timeMs: number, timeZone: string): number => {
  const shown = new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit' }).format(
    timeMs,
  );
  const [hour, minute] = shown.split(':').map(Number);
  return (hour % 24) * 60 + minute;
};

const isIn = (minute: number, spans: readonly ClockSpan[], slack: number) =>
  spans.some(({ from, to }) =>
    [minute, minute + 1440].some((at) => at >= from - slack && at + 1 <= to + slack),
  );

describe('against the solar position library, minute by minute', () => {
  test.each(SCENES)('$name: minutes of every ninth day', ({ at, tilt, facing, boxes }) => {
    const times = timesOf(at, tilt, facing, boxes);
    let most = 0;
    boxes.forEach((box, i) => {
      for (let day = 4; day < 365; day += 9) {
        const counted = shadedAt(at, tilt, facing, box, ...solarDay(at, day)).length;
        most = Math.max(most, counted);
        // two ends to within a minute each, and those of a sun that grazes the box
        expect(Math.abs(times[i].minutes[day] - counted), `${box.id}, day ${day}`).toBeLessThanOrEqual(4);
      }
    });
    expect(most).toBeGreaterThan(60);
  });

  test.each(SCENES)('$name: hours of the 21st by the clock', ({ at, tilt, facing, boxes }) => {
    timesOf(at, tilt, facing, boxes).forEach(({ months: spans }, i) =>
      spans.forEach((hours, month) => {
        const shaded = shadedAt(at, tilt, facing, boxes[i], ...solarDay(at, dayNumber(month, 21)));
        const clock = shaded.map((time) => clockMinutes(time, at.timeZone));
        const missed = clock.filter((minute) => !isIn(minute, hours, 2));
        expect(missed.length, `${boxes[i].id}, month ${month}`).toBeLessThan(5);
        const told = hours.reduce((sum, { from, to }) => sum + to - from, 0);
        expect(Math.abs(told - clock.length), `${boxes[i].id}, month ${month}`).toBeLessThanOrEqual(8);
      }),
    );
  });

  test.each(SCENES)('$name: a stretch holds the days with shade, and its longest day', (scene) => {
    for (const { minutes, stretches } of timesOf(scene.at, scene.tilt, scene.facing, scene.boxes)) {
      const inside = new Set<number>();
      for (const { from, to, longest } of stretches) {
        const first = dayNumber(from.month, from.day);
        const days = ((dayNumber(to.month, to.day) - first + 365) % 365) + 1;
        const of = Array.from({ length: days }, (_, k) => (first + k) % 365);
        of.forEach((day) => inside.add(day));
        expect(longest.minutes).toBe(Math.max(...of.map((day) => minutes[day])));
        expect(minutes[first]).toBeGreaterThanOrEqual(10);
        expect(minutes[of[days - 1]]).toBeGreaterThanOrEqual(10);
      }
      minutes.forEach((shade, day) => shade >= 10 && expect(inside.has(day), `day ${day}`).toBe(true));
    }
  });
});

describe('what can be foretold', () => {
  test('in the shade all round, a level roof lies in it from rise to set on all days', () => {
    const track = sunTrack({ ...vermont, utcOffset: -300 }, 5);
    const walls = horizonProfile([obstruction([ring(80)])]);
    const [{ minutes, stretches }] = shadeTimes(track, planeFacing(0, 180), walls, vermont.timeZone);
    expect(stretches).toHaveLength(1);
    expect(stretches[0]).toMatchObject({
      wholeYear: true,
      from: { month: 0, day: 1 },
      to: { month: 11, day: 31 },
    });
    // the longest day at 44° north is 15 h 27 min between the upper limb's rise and set (from memory); the disc's centre
    // is up for about 4 minutes less
    expect(minutes[dayNumber(5, 21)]).toBeGreaterThan(15 * 60 + 17);
    expect(minutes[dayNumber(5, 21)]).toBeLessThan(15 * 60 + 28);
  });

  test('the sun of both half years: a wall in the south shades a low winter sun over new year in one stretch', () => {
    const [{ stretches }] = timesOf(vermont, 30, 180, [{ ...south, high: 30 }]);
    expect(stretches).toHaveLength(1);
    const [{ from, to, wholeYear, longest }] = stretches;
    expect(wholeYear).toBe(false);
    expect(from.month).toBeGreaterThan(8);
    expect(to.month).toBeLessThan(3);
    // the same declination about as long before the solstice as after it
    const turn = (355 - dayNumber(from.month, from.day) + 365) % 365;
    expect(Math.abs(turn - (dayNumber(to.month, to.day) + 365 - 355))).toBeLessThanOrEqual(3);
    expect([10, 11, 0]).toContain(longest.month);
  });

  test('in the tropics a wall in the north shades the months of the northern sun only', () => {
    const [northern, southern] = timesOf(tropics, 0, 180, [north, south]);
    // the noon sun stands at the latitude, 10.4° N, in the middle of April and at the end of August
    expect(northern.minutes[dayNumber(11, 21)]).toBe(0);
    expect(northern.minutes[dayNumber(5, 21)]).toBeGreaterThan(30);
    expect(southern.minutes[dayNumber(5, 21)]).toBe(0);
    expect(southern.minutes[dayNumber(11, 21)]).toBeGreaterThan(120);
  });

  test('the midnight sun behind a wall in the north: one span over midnight', () => {
    const [{ months: spans }] = timesOf(polar, 0, 180, [{ ...north, high: 8 }]);
    expect(spans[5]).toHaveLength(1);
    expect(spans[5][0].from).toBeGreaterThan(22 * 60);
    expect(spans[5][0].to).toBeGreaterThan(1440);
    expect(spans[11]).toEqual([]);
  });

  test('summer time moves the hours by one, standard time does not', () => {
    const inZone = (timeZone: string) =>
      timesOf({ ...vermont, timeZone }, 30, 172, [{ ...east, high: 60 }])[0];
    // Etc/GMT+5 keeps the same standard time all year
    const [summer, standard] = [inZone('America/New_York'), inZone('Etc/GMT+5')];
    expect(summer.months[0]).toEqual(standard.months[0]);
    expect(summer.months[6]).toEqual(
      standard.months[6].map(({ from, to }) => ({ from: from + 60, to: to + 60 })),
    );
    expect(summer.minutes).toEqual(standard.minutes);
  });

  test('a finer track tells the same to a minute or two', () => {
    const [coarse, fine] = [15, 1].map((step) => timesOf(vermont, 33.7, 172, [crown], step)[0]);
    const off = coarse.minutes.map((minutes, day) => Math.abs(minutes - fine.minutes[day]));
    expect(Math.max(...off)).toBeLessThanOrEqual(3);
  });

  test('nothing traced gives nothing; behind the plane nothing shades', () => {
    expect(timesOf(vermont, 30, 172, [])).toEqual([]);
    const [behind] = timesOf(vermont, 90, 0, [crown]);
    expect(behind.stretches).toEqual([]);
    expect(behind.minutes.every((minutes) => minutes === 0)).toBe(true);
  });

  test('an unknown zone is refused', () => {
    expect(() => timesOf({ ...vermont, timeZone: 'Etc/GMT+5' }, 30, 172, [crown])).not.toThrow();
    const track = sunTrack({ ...vermont, utcOffset: -300 }, 15);
    const profile = horizonProfile([asTraced(crown)]);
    expect(() => shadeTimes(track, planeFacing(30, 172), profile, 'Nowhere/Town')).toThrow(RangeError);
  });

  test('days by number', () => {
    expect(dayOfYear(0)).toEqual({ month: 0, day: 1 });
    expect(dayOfYear(59)).toEqual({ month: 2, day: 1 });
    expect(dayOfYear(364)).toEqual({ month: 11, day: 31 });
    expect(dayOfYear(365 + 31)).toEqual({ month: 1, day: 1 });
    for (let day = 0; day < 365; day++) expect(dayNumber(dayOfYear(day).month, dayOfYear(day).day)).toBe(day);
  });
});
