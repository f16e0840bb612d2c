import { describe, expect, test } from 'vitest';
import { openPoints } from '../../../src/core/completeness/open-points.ts';
import { isGrave, OPEN_POINT_KINDS } from '../../../src/core/completeness/point-kinds.ts';
import type { Station } from '../../../src/core/survey/survey.ts';
import { sampleSurvey, sampleTexts } from '../survey/sample-surveys.ts';
import { completeSurvey } from './complete-survey.ts';
import { ofKind, pointsOf, SOUTH } from './found-points.ts';

const changed = (change: Partial<Station>) => {
  const survey = completeSurvey();
  Object.assign(survey.stations[0], change);
  return survey;
};

describe('a survey with everything in it', () => {
  test('has nothing open', async () => {
    expect(await pointsOf(completeSurvey())).toEqual([]);
  });
});

describe('a part of the record taken away is told, with its cure', () => {
  test('no plane', async () => {
    const points = await pointsOf(completeSurvey({ planes: [] }));
    expect(points[0]).toMatchObject({ kind: 'no-plane', effect: null, cure: { at: 'roof' } });
  });

  test('a plane without a station', async () => {
    const survey = completeSurvey();
    survey.planes.push({ ...SOUTH, id: 'shed', name: 'Shed' });
    const points = await pointsOf(survey);
    expect(points).toHaveLength(1);
    expect(points[0]).toMatchObject({
      kind: 'plane-without-station',
      subject: 'Shed',
      cure: { at: 'new-station' },
    });
  });

  test('a station without a place', async () => {
    const points = await pointsOf(changed({ position: undefined }));
    expect(points.map(({ kind }) => kind)).toEqual(['station-without-place']);
    expect(points[0].cure).toMatchObject({ at: 'station', station: 'S0', act: 'edit' });
  });

  test('a station that serves nothing, and the corner that it no longer stands for', async () => {
    const points = await pointsOf(changed({ serves: [] }));
    expect(points.map(({ kind }) => kind)).toEqual(['station-serves-nothing', 'array-places']);
    expect(points[1].sentence).toContain('Not sighted: lower left corner.');
  });

  test('a station from which nothing was seen, by what that may cost', async () => {
    const points = await pointsOf(changed({ observedOpen: undefined }));
    expect(points.map(({ kind }) => kind)).toEqual(['station-empty']);
    expect(points[0].effect).toBeGreaterThan(0.5);
    expect(points[0].cure).toMatchObject({ at: 'station', station: 'S0', act: 'sight' });
  });
});

describe('corners and centre', () => {
  test('are not asked for where the plane has no size', async () => {
    const survey = completeSurvey({ planes: [SOUTH] });
    survey.stations = survey.stations.slice(0, 1);
    expect(await pointsOf(survey)).toEqual([]);
  });

  test('are named where only the centre has a station', async () => {
    const survey = completeSurvey();
    survey.stations = survey.stations.slice(4);
    const [point] = await pointsOf(survey);
    expect(point.sentence).toContain(
      'lower left corner, lower right corner, upper left corner and upper right corner.',
    );
  });
});

describe('the order', () => {
  test('is: results that are missing or false, then effects from the greatest, then the rest', async () => {
    const survey = sampleSurvey('terrace-chimneys-mast-balcony.json');
    survey.planes.push({ ...SOUTH, id: 'shed', name: 'Shed' });
    delete survey.stations[0].position;
    const points = await pointsOf(survey);
    const graves = points.map(({ kind }) => isGrave(kind));
    expect(graves[0]).toBe(true);
    expect(graves.lastIndexOf(true)).toBeLessThan(graves.indexOf(false));
    const effects = points.filter(({ kind }) => !isGrave(kind)).map(({ effect }) => effect ?? -1);
    expect(effects.filter((effect) => effect > 0).length).toBeGreaterThan(3);
    expect(effects).toEqual([...effects].sort((a, b) => b - a));
    expect(points.at(-1)!.kind).toBe('station-without-place');
  });

  test('has every kind once in the table, with a title', () => {
    const ids = OPEN_POINT_KINDS.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { title } of OPEN_POINT_KINDS) expect(title.length).toBeGreaterThan(5);
  });
});

describe('without figures', () => {
  test.each(sampleTexts.map(({ file }) => file))(
    'points of %s have no effect, and are still told',
    (file) => {
      const points = openPoints(sampleSurvey(file), null);
      expect(points.length).toBeGreaterThan(0);
      expect(points.every(({ effect }) => effect === null)).toBe(true);
      expect(ofKind(points, 'unseen-sky')).toEqual([]);
    },
  );
});
