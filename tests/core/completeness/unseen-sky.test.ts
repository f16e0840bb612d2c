import { describe, expect, test } from 'vitest';
import { openPoints } from '../../../src/core/completeness/open-points.ts';
import { completeSurvey } from './complete-survey.ts';
import { assessed, ofKind, pointsOf, SOUTH } from './found-points.ts';

/** The complete roof with one station, which looked everywhere but there. */
function seenBut(...observedOpen: [number, number][]) {
  const survey = completeSurvey({ planes: [{ ...SOUTH }] });
  survey.stations = [{ ...survey.stations[0], observedOpen }];
  return survey;
}

describe('sky that nobody looked at', () => {
  test('is told with its azimuths and its share of the light', async () => {
    const survey = seenBut([220, 150]);
    const [point, ...others] = await pointsOf(survey);
    expect(others).toEqual([]);
    expect(point).toMatchObject({ kind: 'unseen-sky', subject: 'Station 0' });
    expect(point.sentence).toMatch(/^From 150° to 220° nobody looked/);
    const [{ stations }] = (await assessed(survey)).planes;
    const share = ((1 - stations[0].coverage) * 100).toFixed(0);
    expect(point.sentence).toContain(`about ${share}\u00a0% of the light on South roof`);
    expect(point.effect).toBeGreaterThan(1);
  });

  test('over north is one range', async () => {
    const survey = seenBut([20, 340]);
    survey.site.latitude = -33;
    survey.planes[0].surfaceAzimuth = 0;
    const [point] = await pointsOf(survey);
    expect(point.sentence).toMatch(/^From 340° to 20° nobody looked/);
  });

  test('all around is cut to where the sun comes before the plane', async () => {
    const survey = seenBut([0, 0.2]);
    const points = await pointsOf(survey);
    expect(points).toHaveLength(1);
    const [, from, to] = /^From (\d+)° to (\d+)°/.exec(points[0].sentence)!.map(Number);
    // at 44.91° N the sun rises at midsummer at about 56° and sets at 304°: cos A = sin 23.44° / cos 44.91°
    expect(from).toBeGreaterThanOrEqual(55);
    expect(from).toBeLessThan(75);
    expect(to).toBeGreaterThan(285);
    expect(to).toBeLessThanOrEqual(305);
  });

  test('where the sun never stands is not missed', async () => {
    expect(await pointsOf(seenBut([50, 310]))).toEqual([]);
  });

  test('counts the more, the more light comes from there', async () => {
    const points = ofKind(await pointsOf(seenBut([0, 95], [125, 165], [195, 360])), 'unseen-sky');
    expect(points.map(({ sentence }) => sentence.slice(0, 17))).toEqual([
      'From 165° to 195°',
      'From 95° to 125° ',
    ]);
  });

  test('before two planes is told once, for the one it matters more to', async () => {
    const survey = seenBut([120, 60]);
    survey.planes.push({ ...SOUTH, id: 'east', name: 'East roof', surfaceAzimuth: 90 });
    survey.stations[0].serves.push('east');
    const points = openPoints(survey, await assessed(survey));
    expect(points).toHaveLength(1);
    expect(points[0].sentence).toContain('East roof');
  });
});
