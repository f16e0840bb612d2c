import { describe, expect, it } from 'vitest';
import { skyStates } from '../../../src/core/irradiance/climate.ts';
import { weatherFileClimate } from '../../../src/core/irradiance/weather-file-climate.ts';
import { sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { EPW } from './bent-weather.ts';
import { weatherFile } from './weather-files.ts';

const file = weatherFile(EPW);
const site = { latitude: file.latitude, longitude: file.longitude, altitude: file.altitude };

/** What the climate answers at each step of a day. */
function dayOfSteps(utcOffset: number, stepMinutes: number, day: number, from = file) {
  const track = sunTrack({ ...site, utcOffset }, stepMinutes);
  const read = weatherFileClimate(from, site).over(track);
  const sky = skyStates(1);
  return Array.from({ length: track.stepsPerDay }, (_, i) =>
    read(day * track.stepsPerDay + i, sky) ? [sky.weight[0], sky.ghi[0], sky.dni[0], sky.dhi[0]] : null,
  );
}

const hourOfFile = (hour: number) =>
  file.ghi[hour] + file.dni[hour] + file.dhi[hour] > 0
    ? [1, file.ghi[hour], file.dni[hour], file.dhi[hour]]
    : null;

describe('weatherFileClimate', () => {
  it('holds an hour of the file through its four quarters, the last of the evening too', () => {
    dayOfSteps(file.utcOffset, 15, 172).forEach((sky, i) =>
      expect(sky).toEqual(hourOfFile(172 * 24 + Math.floor(i / 4))),
    );
  });

  it('stays in the zone of the file where the site keeps another', () => {
    dayOfSteps(file.utcOffset + 90, 15, 172).forEach((sky, i) =>
      expect(sky).toEqual(hourOfFile(172 * 24 + Math.floor((i - 6) / 4))),
    );
  });

  it('takes the ends of the year from each other', () => {
    const [first] = dayOfSteps(file.utcOffset + 720, 15, 0);
    expect(first).toEqual(hourOfFile(8760 - 12));
    expect(first).not.toBeNull();
    const last = dayOfSteps(file.utcOffset - 720, 15, 364).at(-1);
    expect(last).toEqual(hourOfFile(11));
  });

  it('warns of a station over 100 km or 300 m of altitude away, and not of one nearer', () => {
    const warningsAt = (latitude: number, altitude?: number) =>
      weatherFileClimate(file, { latitude, longitude: file.longitude, altitude }).warnings;
    // a degree of latitude is 111.2 km on the mean sphere
    expect(warningsAt(file.latitude + 0.89, 780)).toEqual([]);
    expect(warningsAt(file.latitude + 0.91)).toEqual([expect.stringMatching(/is 101 km from the site/)]);
    expect(warningsAt(file.latitude, file.altitude + 299)).toEqual([]);
    expect(warningsAt(file.latitude, file.altitude + 301)).toEqual([
      expect.stringMatching(/lies 301 m below the site/),
    ]);
    expect(warningsAt(file.latitude, file.altitude - 301)).toEqual([
      expect.stringMatching(/lies 301 m above the site/),
    ]);
  });

  it('measures across the line of 180°', () => {
    const east = { ...file, latitude: 0, longitude: 179.9 };
    expect(weatherFileClimate(east, { latitude: 0, longitude: -179.9 }).warnings).toEqual([]);
  });

  it('says that the seasons are the other way round in the other hemisphere, but not between the tropics', () => {
    const between = (from: number, to: number) =>
      weatherFileClimate(
        { ...file, latitude: from },
        { latitude: to, longitude: file.longitude },
      ).warnings.filter((warning) => warning.includes('its seasons are the other way round'));
    expect(between(32, -32)).toHaveLength(1);
    expect(between(-34, 12)).toHaveLength(1);
    expect(between(23, -23)).toEqual([]);
    expect(between(32, 5)).toEqual([]);
    expect(between(-32, 0)).toEqual([]);
  });
});
