import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { magneticDeclination } from '../../../src/core/pointing/declination.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import type { Site } from '../../../src/core/survey/survey.ts';
import { SITE, START_MS, VirtualSurvey } from './virtual-run.ts';

const declination = magneticDeclination({ ...SITE, timeMs: START_MS }).declination;
/** A magnetic run whose compass is off by so much. */
const run = (bias: number, site: Site = SITE) =>
  new VirtualSurvey(site).run('r', 'magnetic', { north: bias - declination });
/** Height and shadow of an upright under the true sun, `late` minutes before what the clock says. */
function shadowOf(minutes: number, late: number) {
  const { apparentElevation } = solarPosition(
    START_MS + (minutes - late) * 60_000,
    SITE.latitude,
    SITE.longitude,
  );
  return { shadowHeight: 2, shadowLength: 2 / Math.tan((apparentElevation * Math.PI) / 180) };
}
const solved = (virtual: VirtualSurvey) => {
  const { runs, warnings } = pointSurvey(virtual.made());
  return { run: runs[0], said: warnings.map(({ message }) => message).join('\n') };
};
/** Degrees by which the run's heading differs from the truth. */
const wrong = (virtual: VirtualSurvey, bias: number) =>
  Math.abs(turnBetween(solved(virtual).run.heading!.offset, declination - bias));

// The clock an hour fast, as with summer time counted twice: in mid-morning in May the sun's azimuth is off by some 15°.
describe('a check and a compass that agree as well as a compass can', () => {
  test.each([0, 8, -8])('say nothing at a compass error of %d', (bias) => {
    const virtual = run(bias).shadow('r', 60);
    expect(solved(virtual).said).toBe('');
    expect(wrong(virtual, bias)).toBeLessThan(0.01);
  });

  test('but for steel where it is far off; the check counts', () => {
    const virtual = run(18).shadow('r', 60);
    expect(solved(virtual).said).toMatch(/differ by 18°: the compass is disturbed/);
    expect(solved(virtual).run.checks[0].againstCompass).toBeCloseTo(-18, 1);
    expect(wrong(virtual, 18)).toBeLessThan(0.01);
  });
});

describe('a disagreement that no compass could make', () => {
  test('is clock, zone or steel until something decides, with half of it as the deviation', () => {
    const virtual = run(40).shadow('r', 60);
    const { said, run: made } = solved(virtual);
    expect(said).toMatch(/clock, zone or steel/);
    expect(said).toMatch(/second check an hour later, or the length of an upright’s shadow, decides/);
    expect(made.heading!.standardDeviation).toBeGreaterThan(19);
  });

  test('is steel where the shadow’s length confirms the time', () => {
    const virtual = run(40).shadow('r', 60, 0, shadowOf(60, 0));
    const { said, run: made } = solved(virtual);
    expect(said).toMatch(/compass is disturbed here, by steel.*time is confirmed/);
    expect(made.heading!.standardDeviation).toBeLessThan(1.5);
    expect(wrong(virtual, 40)).toBeLessThan(0.01);
  });

  test('is the clock where the shadow’s length contradicts the time; the compass stands in', () => {
    const virtual = run(3).shadow('r', 60, 60, shadowOf(60, 60));
    const { said, run: made } = solved(virtual);
    expect(said).toMatch(/clock or its zone is off by about 60 minutes \(fast\)/);
    expect(made.checks[0]).toMatchObject({ offset: null });
    expect(made.heading!.source).toBe('compass');
  });

  test('is steel where a second check hours later gives the same', () => {
    const virtual = run(40).shadow('r', 0).shadow('r', 240);
    expect(solved(virtual).said).toMatch(/time is confirmed/);
    expect(wrong(virtual, 40)).toBeLessThan(0.01);
  });

  test('is the clock where a second check hours later gives another, both checks being wrong', () => {
    const virtual = run(3).shadow('r', 0, 60).shadow('r', 180, 60);
    const { said, run: made } = solved(virtual);
    expect(said).toMatch(/two checks by shadow, 180 minutes apart, differ by/);
    expect(made.checks.every(({ offset }) => offset === null)).toBe(true);
    expect(made.heading!.source).toBe('compass');
  });

  test('is perhaps the phone turned round, where it is half a circle', () => {
    const virtual = run(0);
    const sun = solarPosition(START_MS, SITE.latitude, SITE.longitude);
    const reading = virtual.read('r', { minutes: 0, azimuth: sun.solarAzimuth, axis: 'top-edge' });
    expect(solved(virtual.check({ method: 'sun-shadow', reading })).said).toMatch(/pointed towards the sun/);
  });

  test('with a mark is the mark, its bearing or steel', () => {
    const virtual = run(0);
    virtual.check({
      method: 'known-mark',
      bearing: 10,
      reading: virtual.read('r', { minutes: 0, azimuth: 100 }),
    });
    expect(solved(virtual).said).toMatch(/another mark was sighted, its bearing is wrong, or there is steel/);
    expect(solved(virtual).said).not.toMatch(/clock/);
  });
});

test('the shadow’s length says nothing near noon, when an hour hardly changes it', () => {
  // solar noon at 72.4° W in mid-May is 16:46 UTC
  const noon = 196;
  const virtual = run(40).shadow('r', noon, 0, shadowOf(noon, 0));
  expect(solved(virtual).said).toMatch(/clock, zone or steel/);
});
