import { describe, expect, it } from 'vitest';
import { dayAt, proposedTitle, startSurvey } from '../../src/app/actions/start-survey.ts';
import { plausiblePosition } from '../../src/app/location-source.ts';
import { zoneAt } from '../../src/app/zone-at.ts';
import { parseSurvey } from '../../src/core/survey/parse-survey.ts';
import { plainServices } from './plain-services.ts';

const SITE = { latitude: -36.85, longitude: 174.76, timeZone: 'Pacific/Auckland' };

describe('a new survey', () => {
  it('is one that can be read, with the day at its place and storage asked for', async () => {
    const services = { ...plainServices(), now: () => Date.UTC(2026, 4, 14, 13, 0) };
    const id = await startSurvey(services, { title: ' ', site: SITE });
    const stored = await services.store.load(id);
    const survey = stored?.state === 'readable' ? stored.survey : null;
    expect(survey).toMatchObject({ title: 'Survey of 2026-05-15', surveyedOn: '2026-05-15', site: SITE });
    expect(parseSurvey(JSON.stringify(survey)).ok).toBe(true);
    expect(services.timesKept()).toBe(1);
    const second = await startSurvey(services, { title: '', site: SITE });
    expect((await services.store.load(second))?.state === 'readable').toBe(true);
    expect((await services.store.list()).map(({ title }) => title)).toContain('Survey of 2026-05-15, 2');
  });

  it('has the day of its place, not of the device', () => {
    const timeMs = Date.UTC(2026, 0, 1, 2, 0);
    expect(dayAt(timeMs, 'America/New_York')).toBe('2025-12-31');
    expect(dayAt(timeMs, 'Europe/Berlin')).toBe('2026-01-01');
  });

  it('is named after its address, numbered where that is taken', () => {
    expect(proposedTitle(' Mill lane 4 ', '2026-05-14', [])).toBe('Mill lane 4');
    expect(proposedTitle('', '2026-05-14', ['Survey of 2026-05-14'])).toBe('Survey of 2026-05-14, 2');
  });
});

describe('a position of the device', () => {
  const here = { latitude: 38.7, longitude: -9.1, altitude: 20, accuracy: 8 };
  it('is taken where it can be, its height only where that can be', () => {
    expect(plausiblePosition(here)).toEqual(here);
    expect(plausiblePosition({ ...here, altitude: 99_999 })).toEqual({ ...here, altitude: null });
  });

  it.each([
    { latitude: NaN },
    { longitude: 200 },
    { accuracy: -1 },
    { accuracy: Infinity },
    { latitude: 0, longitude: 0 },
  ])('with %o is refused', (bad) => expect(plausiblePosition({ ...here, ...bad })).toBeNull());
});

// Zones by common knowledge of the places.
it.each([
  [38.72, -9.14, 'Europe/Lisbon'],
  [27.7, 85.3, 'Asia/Kathmandu'],
  [-36.85, 174.76, 'Pacific/Auckland'],
  [33.45, -112.07, 'America/Phoenix'],
])('the time zone at %d, %d is %s', async (latitude, longitude, zone) => {
  expect(await zoneAt(latitude, longitude)).toBe(zone);
});
