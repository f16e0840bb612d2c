import { describe, expect, test } from 'vitest';
import { magneticDeclination } from '../../../src/core/pointing/declination.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { SITE, START_MS, VirtualSurvey } from '../pointing/virtual-run.ts';
import { assessed, ofKind, pointsOf, SOUTH } from './found-points.ts';

const { declination } = magneticDeclination({ ...SITE, timeMs: START_MS });

/** A wall in the south seen by a phone; all else is looked at and open. */
class WallSurvey extends VirtualSurvey {
  constructor() {
    super();
    this.survey.planes.push(SOUTH);
    Object.assign(this.station('A'), {
      serves: ['south'],
      position: { east: 0, north: 0, up: 0 },
      observedOpen: [[0, 360]],
    });
  }

  /** Sights the wall's edge, a minute from point to point. */
  wall(run: string, firstMinute = 0, minutes = 0.2): this {
    const sightings = [140, 170, 200, 230].map((azimuth, i) => {
      const reading = this.read(run, { minutes: firstMinute + i * minutes, azimuth, elevation: 30 });
      return { id: `w${reading}`, reading };
    });
    this.station('A').traces.push({ id: `t${run}`, obstruction: 'wall', shape: 'skyline', sightings });
    return this;
  }
}

const kinds = async (survey: Survey) => (await pointsOf(survey)).map(({ kind }) => kind);
const magnetic = (bias = 0) => new WallSurvey().run('r', 'magnetic', { north: bias - declination });

describe('the heading of a run', () => {
  test('that rests on a compass is weak, by what its error may cost; a check cures it', async () => {
    const [point] = ofKind(await pointsOf(magnetic().wall('r').made()), 'no-heading-check');
    expect(point.effect).toBeGreaterThan(0.1);
    expect(point.sentence).toContain('the compass and the declination alone');
    expect(point.cure).toMatchObject({ at: 'run', run: 'r', station: 'A' });
    expect(await kinds(magnetic().wall('r').shadow('r', 5).made())).not.toContain('no-heading-check');
  });

  test('of a run that carries no trace is not asked for', async () => {
    const survey = magnetic();
    survey.sight('r', { minutes: 1, azimuth: 20 }, { mark: 'spire' });
    expect(await kinds(survey.made())).toEqual([]);
  });

  test('shared with another sitting is still told', async () => {
    const survey = magnetic().run('s', 'magnetic', { north: -declination });
    const points = ofKind(await pointsOf(survey.shadow('r', 5).wall('s').made()), 'no-heading-check');
    expect(points.map(({ sentence }) => sentence)).toEqual([
      expect.stringContaining('the check of another sitting'),
    ]);
  });
});

describe('the phone’s own inclination', () => {
  const turned = (survey: WallSurvey, run: string) => {
    const mark = { minutes: 4, azimuth: 20, elevation: 5 };
    const faces = [0, 180].map((roll) => survey.read(run, { ...mark, roll }));
    survey.station('A').indexChecks = [{ id: 'faces', upright: faces[0], turned: faces[1] }];
    return survey;
  };

  test('that was not tested is told, by what it may cost and what turning the phone over would save', async () => {
    const survey = magnetic().wall('r').shadow('r', 5).made();
    const [point] = ofKind(await pointsOf(survey), 'no-two-face-check');
    expect(point.effect).toBeGreaterThan(0.5);
    expect(point.sentence).toContain('up to 1.4° either way');
    const [before, after] = /from ([\d.]+) to ([\d.]+) points \(South roof\)/
      .exec(point.sentence)!
      .slice(1)
      .map(Number);
    const interval = (await assessed(turned(magnetic().wall('r').shadow('r', 5), 'r').made())).planes[0]
      .solarAccess!.interval!;
    expect(before - after).toBeGreaterThan(0.5);
    expect(after).toBeCloseTo(100 * (interval.high - interval.low), 0);
    expect(point.cure).toMatchObject({ at: 'run', run: 'r', station: 'A' });
  });

  test('is told once for all sittings of a phone, at the last of them, and not once it was turned over in any', async () => {
    const sat = () => magnetic().run('s', 'magnetic', { north: -declination }).wall('r').wall('s', 10);
    const points = ofKind(await pointsOf(sat().made()), 'no-two-face-check');
    expect(points.map(({ cure }) => cure)).toEqual([expect.objectContaining({ run: 's' })]);
    expect(await kinds(turned(sat(), 's').made())).not.toContain('no-two-face-check');
  });

  test('is told of each phone for itself', async () => {
    const other = magnetic().run('s', 'magnetic', { north: -declination }, 'another phone');
    const points = ofKind(
      await pointsOf(turned(other.wall('r').wall('s', 10), 's').made()),
      'no-two-face-check',
    );
    expect(points.map(({ cure }) => cure)).toEqual([expect.objectContaining({ run: 'r' })]);
  });
});

describe('sightings that point nowhere', () => {
  test('come first, once for a sitting, with the way to give them their north', async () => {
    const points = await pointsOf(new WallSurvey().run('r', 'relative').wall('r').made());
    expect(points[0]).toMatchObject({
      kind: 'undirected-sightings',
      effect: null,
      cure: { at: 'run', run: 'r', station: 'A' },
    });
    expect(points[0].sentence).toContain('4 sightings');
    expect(ofKind(points, 'undirected-sightings')).toHaveLength(1);
  });
});

describe('signs against a compass or a check', () => {
  test('a disagreement no compass could make is clock, zone or steel', async () => {
    const points = await pointsOf(magnetic(40).wall('r').shadow('r', 60).made());
    const [point] = ofKind(points, 'doubtful-check');
    expect(point.sentence).toContain('clock, zone or steel');
    expect(point.cure).toMatchObject({ at: 'station', station: 'A', act: 'sight' });
  });

  test('a compass that owns to 60° is in doubt', async () => {
    const survey = new WallSurvey().run('r', 'relative').wall('r');
    survey.read('r', {
      minutes: 0,
      azimuth: 10,
      axis: 'top-edge',
      extra: { compassHeading: 10, compassAccuracy: 60 },
    });
    const [point] = ofKind(await pointsOf(survey.made()), 'disturbed-compass');
    expect(point.sentence).toContain('could be 60° off');
  });

  test('checks that disagree are told, once', async () => {
    const survey = magnetic().wall('r');
    survey.check({ method: 'known-mark', mark: 'spire', bearing: 20 });
    survey.check({ method: 'known-mark', mark: 'mast', bearing: 88 });
    survey.sight('r', { minutes: 1, azimuth: 20 }, { mark: 'spire' });
    survey.sight('r', { minutes: 1, azimuth: 80 }, { mark: 'mast' });
    const points = ofKind(await pointsOf(survey.made()), 'disturbed-compass');
    expect(points.map(({ sentence }) => sentence)).toEqual([
      expect.stringContaining('checks of this run disagree'),
    ]);
  });
});

describe('closing the horizon', () => {
  const closed = (drift: number) => {
    const survey = new WallSurvey().run('r', 'relative', { drift });
    survey.sight('r', { minutes: 0, azimuth: 20 }, { mark: 'spire' });
    survey.wall('r', 0.5, 1).shadow('r', 4);
    survey.sight('r', { minutes: 6, azimuth: 20 }, { mark: 'spire' });
    return survey.made();
  };

  test('is missed after a sitting of some minutes', async () => {
    const [point] = ofKind(await pointsOf(magnetic().wall('r', 0, 2).made()), 'no-closure');
    expect(point.sentence).toContain('A sitting of 6 minutes');
    expect(await kinds(magnetic().wall('r', 0, 0.1).made())).not.toContain('no-closure');
  });

  test('says nothing where it closes well', async () => {
    const found = await kinds(closed(0.1));
    expect(found).not.toContain('large-closure');
    expect(found).not.toContain('no-closure');
  });

  test('tells a large error', async () => {
    const [point] = ofKind(await pointsOf(closed(0.6)), 'large-closure');
    expect(point.sentence).toContain('"spire" had moved 3.6° in azimuth');
  });

  test('over the limit takes the sitting out, and is told first and once', async () => {
    const points = await pointsOf(closed(4));
    expect(points[0]).toMatchObject({ kind: 'run-refused', cure: { at: 'run', run: 'r' } });
    expect(ofKind(points, 'undirected-sightings')).toEqual([]);
    expect(ofKind(points, 'large-closure')).toEqual([]);
  });
});
