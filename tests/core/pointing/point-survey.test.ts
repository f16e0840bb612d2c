import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { magneticDeclination } from '../../../src/core/pointing/declination.ts';
import { gridConvergence } from '../../../src/core/pointing/grid-convergence.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { PLANNING } from '../../../src/core/pointing/planning-values.ts';
import { sightingDirection } from '../../../src/core/survey/sighting-direction.ts';
import type { Site } from '../../../src/core/survey/survey.ts';
import { sampleSurvey, sampleTexts } from '../survey/sample-surveys.ts';
import { cameraAt } from './held-phone.ts';
import { SITE, START_MS, VirtualSurvey } from './virtual-run.ts';

const SOUTH: Site = { latitude: -35, longitude: 149, timeZone: 'Australia/Sydney' };
const messages = (virtual: VirtualSurvey) =>
  pointSurvey(virtual.made()).warnings.map(({ path, message }) => `${path}: ${message}`);
const pointedOf = (virtual: VirtualSurvey, id: string) => pointSurvey(virtual.made()).sightings.get(id)!;
const declinationAt = (site: Site) => magneticDeclination({ ...site, timeMs: START_MS }).declination;
/** How far from a true azimuth a sighting was pointed, degrees. */
const off = (virtual: VirtualSurvey, id: string, azimuth: number) =>
  Math.abs(turnBetween(pointedOf(virtual, id).direction!.azimuth, azimuth));

describe('what is typed', () => {
  test.each(sampleTexts)('in $file stands as it is', ({ file }) => {
    const survey = sampleSurvey(file);
    const pointed = pointSurvey(survey);
    expect(pointed.warnings).toEqual([]);
    const sightings = survey.stations.flatMap(({ traces }) => traces.flatMap((trace) => trace.sightings));
    for (const sighting of sightings)
      expect(pointed.sightings.get(sighting.id)).toMatchObject({
        direction: sightingDirection(sighting),
        run: null,
        undirected: null,
      });
  });

  test('stands over the reading, and an amendment over both', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    const amendments = [{ azimuth: 50, elevation: 6, reason: 'x', madeAt: '2026-05-14T15:00:00Z' }];
    const typed = virtual.sight('r', { minutes: 1, azimuth: 100 }, { azimuth: 40, elevation: 5 });
    const amended = virtual.sight(
      'r',
      { minutes: 2, azimuth: 100 },
      { azimuth: 40, elevation: 5, amendments },
    );
    expect(pointedOf(virtual, typed)).toMatchObject({
      direction: { azimuth: 40, elevation: 5 },
      source: 'typed',
    });
    expect(pointedOf(virtual, amended)).toMatchObject({
      direction: { azimuth: 50, elevation: 6 },
      source: 'amendment',
    });
  });
});

describe.each([
  ['north of the equator', SITE],
  ['south of it', SOUTH],
])('the frame of a run, %s', (_, site) => {
  const declination = declinationAt(site);

  test('magnetic, with no check: declination is added, and the compass’s own error stays', () => {
    const virtual = new VirtualSurvey(site).run('r', 'magnetic', { north: -declination });
    const id = virtual.sight('r', { minutes: 1, azimuth: 350, elevation: 12 });
    expect(off(virtual, id, 350)).toBeLessThan(1e-4);
    const { runs, warnings } = pointSurvey(virtual.made());
    expect(runs[0].heading).toMatchObject({
      source: 'compass',
      outliers: { share: PLANNING.compassOutlierShare },
    });
    expect(runs[0].heading!.standardDeviation).toBeGreaterThanOrEqual(PLANNING.compass);
    expect(warnings.map(({ path }) => path)).toEqual(['runs[0]']);
  });

  test('true, with no check: declination is not added', () => {
    const virtual = new VirtualSurvey(site).run('r', 'true');
    const id = virtual.sight('r', { minutes: 1, azimuth: 350 });
    expect(off(virtual, id, 350)).toBeLessThan(1e-4);
  });

  test('relative, with no check: no direction, and what to do', () => {
    const virtual = new VirtualSurvey(site).run('r', 'relative', { north: 77 });
    const id = virtual.sight('r', { minutes: 1, azimuth: 350 });
    expect(pointedOf(virtual, id)).toMatchObject({ direction: null, undirected: { code: 'no-heading' } });
    expect(messages(virtual).join()).toMatch(/Take one heading check in the same run/);
  });

  test.each(['magnetic', 'relative', 'true'] as const)(
    '%s, with a check by shadow: whatever the frame’s north is, sightings before and after it are true',
    (frame) => {
      // 13:30 UTC is morning in New England and night in Australia; half past midnight is morning there
      const later = site === SOUTH ? 660 : 20;
      const north = frame === 'relative' ? 123 : 6 - (frame === 'magnetic' ? declination : 0);
      const virtual = new VirtualSurvey(site).run('r', frame, { north });
      const before = virtual.sight('r', { minutes: later - 5, azimuth: 10, elevation: 20 });
      virtual.shadow('r', later);
      const after = virtual.sight('r', { minutes: later + 5, azimuth: 200, elevation: 3 });
      expect(off(virtual, before, 10)).toBeLessThan(0.02);
      expect(off(virtual, after, 200)).toBeLessThan(0.02);
      const { heading, checks } = pointSurvey(virtual.made()).runs[0];
      expect(heading).toMatchObject({ source: 'check', from: null, outliers: null });
      expect(heading!.standardDeviation).toBeLessThan(1.2);
      expect(checks[0].againstCompass).toEqual(
        frame === 'relative' ? null : (expect.closeTo(-6, 1) as number),
      );
    },
  );

  test('a bearing is taken from whichever north it was measured', () => {
    const bearing = 230;
    const zone = site === SOUTH ? '55S' : '18N';
    const convergence = gridConvergence(site.latitude, site.longitude, site === SOUTH ? 147 : -75);
    const frames = [
      { bearing, frame: 'true' as const },
      { bearing },
      { bearing: bearing - declination, frame: 'magnetic' as const },
      { bearing: bearing - convergence, frame: 'grid' as const, gridZone: zone },
      { bearing: bearing - 1.5, frame: 'grid' as const, convergence: 1.5 },
    ];
    for (const given of frames)
      for (const method of ['known-mark', 'plan-bearing'] as const) {
        const virtual = new VirtualSurvey(site).run('r', 'relative', { north: -99 });
        virtual.check({ method, reading: virtual.read('r', { minutes: 1, azimuth: bearing }), ...given });
        const id = virtual.sight('r', { minutes: 1, azimuth: 10 });
        expect(off(virtual, id, 10)).toBeLessThan(0.01);
      }
  });
});

describe('a heading check', () => {
  test('of a mark takes every sighting of it from its station', () => {
    const virtual = new VirtualSurvey().run('r', 'relative', { north: 40 });
    virtual.sight('r', { minutes: 1, azimuth: 77 }, { mark: 'spire' });
    const id = virtual.sight('r', { minutes: 2, azimuth: 10 });
    virtual.check({ method: 'plan-bearing', mark: 'spire', bearing: 77 });
    expect(off(virtual, id, 10)).toBeLessThan(1e-6);
    virtual.check({ method: 'plan-bearing', mark: 'mast', bearing: 77 });
    expect(messages(virtual).join()).toMatch(/No sighting of "mast" from this station/);
  });

  test('of an eave may have the bearing of either way along it, where a compass tells which', () => {
    for (const bearing of [95, 275]) {
      const virtual = new VirtualSurvey().run('r', 'magnetic', { north: 7 - declinationAt(SITE) });
      virtual.check({
        method: 'plan-bearing',
        bearing,
        reading: virtual.read('r', { minutes: 1, azimuth: 95 }),
      });
      const id = virtual.sight('r', { minutes: 1, azimuth: 10 });
      expect(off(virtual, id, 10)).toBeLessThan(1e-6);
    }
  });

  test.each([
    [{ method: 'known-mark' as const }, /has no bearing yet/, 'stations[0].headingChecks[0].bearing'],
    [
      { method: 'plan-bearing' as const, bearing: 10, frame: 'grid' as const },
      /neither the convergence nor the UTM zone/,
      'stations[0].headingChecks[0].gridZone',
    ],
    [
      { method: 'plan-bearing' as const, bearing: 10, frame: 'grid' as const, gridZone: '33N' },
      /UTM zone 33N has its meridian at 15°/,
      'stations[0].headingChecks[0].gridZone',
    ],
  ])('that lacks something ties nothing, and says what: %o', (check, message, path) => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    virtual.check({ ...check, reading: virtual.read('r', { minutes: 1, azimuth: 10 }) });
    const { runs, warnings } = pointSurvey(virtual.made());
    expect(runs[0].heading).toBe(null);
    expect(warnings[0]).toMatchObject({ path, message: expect.stringMatching(message) as string });
  });

  test('at night is refused, and the compass stands in', () => {
    const virtual = new VirtualSurvey().run('r', 'magnetic');
    virtual.shadow('r', 15 * 60);
    virtual.sight('r', { minutes: 15 * 60, azimuth: 10 });
    const { runs, warnings } = pointSurvey(virtual.made());
    expect(runs[0].heading!.source).toBe('compass');
    expect(warnings[0].message).toMatch(/the sun was down/);
  });

  test('with the axis straight up or without angles is refused', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    virtual.check({
      method: 'sun-shadow',
      reading: virtual.read('r', { minutes: 1, azimuth: 0, elevation: -90 }),
    });
    const empty = virtual.read('r', { minutes: 1, azimuth: 0, extra: { alpha: undefined } });
    virtual.check({ method: 'known-mark', bearing: 4, reading: empty });
    virtual.check({ method: 'known-mark', bearing: 4 });
    const said = messages(virtual).join('\n');
    expect(said).toMatch(/too steeply/);
    expect(said).toMatch(/has no angles, so the check ties nothing/);
    expect(said).toMatch(/neither a reading nor a mark/);
  });

  test('that disagrees with another by far is told, and the heading is as unsure as they differ', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    for (const bearing of [10, 30])
      virtual.check({
        method: 'known-mark',
        bearing,
        reading: virtual.read('r', { minutes: 1, azimuth: 10 }),
      });
    const { runs, warnings } = pointSurvey(virtual.made());
    expect(runs[0].heading!.standardDeviation).toBeGreaterThan(9);
    expect(warnings[0]).toMatchObject({
      path: 'runs[0]',
      message: expect.stringMatching(/2 heading checks of this run disagree/) as string,
    });
  });
});

describe('closing the horizon', () => {
  property.prop([
    fc.double({ min: -0.6, max: 0.6, noNaN: true }),
    fc.double({ min: 3, max: 12, noNaN: true }),
  ])('spreads the drift by time over all sightings', (drift, minutes) => {
    const virtual = new VirtualSurvey().run('r', 'relative', { north: 200, drift });
    virtual.sight('r', { minutes: 0, azimuth: 5 }, { mark: 'gable' });
    virtual.check({
      method: 'known-mark',
      bearing: 60,
      reading: virtual.read('r', { minutes: 1, azimuth: 60 }),
    });
    const middle = virtual.sight('r', { minutes: minutes / 2, azimuth: 150 });
    const last = virtual.sight('r', { minutes, azimuth: 5 }, { mark: 'gable' });
    expect(off(virtual, middle, 150)).toBeLessThan(1e-4);
    expect(off(virtual, last, 5)).toBeLessThan(1e-4);
    const { closure, heading } = pointSurvey(virtual.made()).runs[0];
    expect(closure).toMatchObject({ mark: 'gable', azimuth: expect.closeTo(drift * minutes, 4) as number });
    expect(heading!.ratePerMinuteDeviation).toBeLessThan(PLANNING.yawDriftPerMinute / 2);
  });

  test('by too much in azimuth or elevation refuses the run, with its sightings', () => {
    for (const [again, message] of [
      [{ azimuth: 25 }, /moved 20\.0° in azimuth, over the limit of 6\.0°/],
      [{ azimuth: 5, elevation: 5 }, /moved 5\.0° in elevation, over the limit of 3°/],
    ] as const) {
      const virtual = new VirtualSurvey().run('r', 'magnetic');
      const id = virtual.sight('r', { minutes: 0, azimuth: 5 }, { mark: 'gable' });
      virtual.sight('r', { minutes: 4, ...again }, { mark: 'gable' });
      expect(pointedOf(virtual, id)).toMatchObject({ direction: null, undirected: { code: 'run-refused' } });
      expect(pointSurvey(virtual.made()).runs[0].refused).toMatch(message);
    }
  });

  test('needs the same mark from the same station, and a while between', () => {
    const virtual = new VirtualSurvey().run('r', 'magnetic');
    virtual.sight('r', { minutes: 0, azimuth: 5 }, { mark: 'gable' });
    virtual.sight('r', { minutes: 0.2, azimuth: 6 }, { mark: 'gable' });
    virtual.sight('r', { minutes: 9, azimuth: 40 }, { mark: 'gable', at: 'B' });
    virtual.sight('r', { minutes: 9, azimuth: 70 }, { mark: 'spire' });
    expect(pointSurvey(virtual.made()).runs[0]).toMatchObject({ closure: null, refused: null });
  });
});

describe('one run to another', () => {
  const twoRuns = (at: string) => {
    const virtual = new VirtualSurvey()
      .run('one', 'relative', { north: 30 })
      .run('two', 'relative', { north: -80 });
    virtual.check({
      method: 'known-mark',
      bearing: 60,
      reading: virtual.read('one', { minutes: 1, azimuth: 60 }),
    });
    virtual.sight('one', { minutes: 1, azimuth: 200, elevation: 8 }, { mark: 'spire' });
    virtual.sight('two', { minutes: 30, azimuth: 200, elevation: 8 }, { mark: 'spire', at });
    const id = virtual.sight('two', { minutes: 30, azimuth: 111 }, { at });
    return { virtual, id };
  };

  test('a mark sighted in both from one station ties them', () => {
    const { virtual, id } = twoRuns('A');
    expect(off(virtual, id, 111)).toBeLessThan(1e-4);
    const [one, two] = pointSurvey(virtual.made()).runs;
    expect(two.heading).toMatchObject({ source: 'tied', from: 'one' });
    expect(two.heading!.standardDeviation).toBeCloseTo(
      Math.hypot(one.heading!.standardDeviation, two.heading!.ownDeviation),
      9,
    );
  });

  test('from another station it does not', () => {
    const { virtual, id } = twoRuns('B');
    expect(pointedOf(virtual, id).direction).toBe(null);
  });

  test('ties go on from run to run, each less sure', () => {
    const virtual = new VirtualSurvey();
    const names = ['one', 'two', 'three', 'four'];
    names.forEach((name, i) => virtual.run(name, 'relative', { north: 77 * i }));
    virtual.check({
      method: 'known-mark',
      bearing: 60,
      reading: virtual.read('one', { minutes: 0, azimuth: 60 }),
    });
    [1, 2, 3].forEach((i) => {
      for (const name of [names[i - 1], names[i]])
        virtual.sight(name, { minutes: i, azimuth: 40 * i }, { mark: `m${i}` });
    });
    const deviations = pointSurvey(virtual.made()).runs.map(({ heading }) => heading!.standardDeviation);
    expect(deviations).toEqual([...deviations].sort((a, b) => a - b));
    const id = virtual.sight('four', { minutes: 3, azimuth: 300 });
    expect(off(virtual, id, 300)).toBeLessThan(1e-4);
  });

  test('runs of one compass share a check, with a wider deviation; those of another phone do not', () => {
    const north = 4 - declinationAt(SITE);
    const virtual = new VirtualSurvey();
    for (const [id, device] of [
      ['one', 'mine'],
      ['two', 'mine'],
      ['other', 'yours'],
    ])
      virtual.run(id, 'magnetic', { north }, device);
    virtual.shadow('one', 1);
    const [one, two, other] = pointSurvey(virtual.made()).runs.map(({ heading }) => heading!);
    expect(two).toMatchObject({ source: 'shared', from: 'one', offset: one.offset });
    expect(two.standardDeviation).toBeGreaterThan(one.standardDeviation + 1);
    expect(two.standardDeviation).toBeLessThan(other.standardDeviation);
    expect(other.source).toBe('compass');
  });

  test('many runs are all tied', () => {
    const virtual = new VirtualSurvey();
    const names = Array.from({ length: 400 }, (_, i) => `r${i}`);
    names.forEach((name, i) => {
      virtual.run(name, 'relative', { north: i });
      virtual.sight(name, { minutes: i, azimuth: 30 }, { mark: 'spire' });
    });
    virtual.check({
      method: 'known-mark',
      bearing: 60,
      reading: virtual.read('r0', { minutes: 0, azimuth: 60 }),
    });
    const { runs } = pointSurvey(virtual.made());
    expect(Math.abs(turnBetween(runs[399].heading!.offset, -399))).toBeLessThan(1e-4);
  });

  test('a refused run ties nothing', () => {
    const { virtual, id } = twoRuns('A');
    virtual.sight('one', { minutes: 9, azimuth: 250, elevation: 8 }, { mark: 'spire' });
    expect(pointedOf(virtual, id).direction).toBe(null);
  });
});

describe('a compass read flat and carried by the gyroscope', () => {
  const declination = declinationAt(SITE);
  /** A flat reading whose top edge truly points somewhere. */
  const flat = (virtual: VirtualSurvey, azimuth: number, error = 0, extra = {}) =>
    virtual.read('r', {
      minutes: 0,
      azimuth,
      axis: 'top-edge',
      extra: { compassHeading: (azimuth - declination + error + 360) % 360, compassAccuracy: 8, ...extra },
    });

  test('gives upright sightings their true azimuth', () => {
    const virtual = new VirtualSurvey().run('r', 'relative', { north: 250 });
    flat(virtual, 300);
    const id = virtual.sight('r', { minutes: 0, azimuth: 20, elevation: 30 });
    expect(off(virtual, id, 20)).toBeLessThan(1e-4);
    expect(pointSurvey(virtual.made()).runs[0].heading).toMatchObject({ source: 'compass' });
  });

  test('is not trusted upright, nor where the phone says that its compass is not to be', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    flat(virtual, 300, 0, { compassAccuracy: -1 });
    flat(virtual, 300, 0, cameraAt(300, 0));
    expect(pointSurvey(virtual.made()).runs[0].heading).toBe(null);
  });

  test('with steel nearby drifts from the gyroscope, and that is told', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    flat(virtual, 300);
    flat(virtual, 60, 25, { compassAccuracy: 30 });
    const said = messages(virtual).join('\n');
    expect(said).toMatch(/drift apart by 25°: something magnetic/);
    expect(said).toMatch(/could be 30° off here/);
  });
});

test('near the magnetic pole a compass gives no heading, and that is told', () => {
  const virtual = new VirtualSurvey({ latitude: 86, longitude: 140, timeZone: 'UTC' }).run('r', 'magnetic');
  expect(pointSurvey(virtual.made()).runs[0].heading).toBe(null);
  expect(messages(virtual).join()).toMatch(/too weak for a compass/);
});

describe('points of a sweep', () => {
  test('are the row at their time; a sighting of several readings is their mean', () => {
    const virtual = new VirtualSurvey().run('r', 'true');
    const rows = [10, 20, 30].map((azimuth, i) => {
      const { alpha, beta, gamma } = cameraAt(azimuth, 5);
      return [i * 200, alpha, beta, gamma] as [number, number, number, number];
    });
    const point = virtual.sight('r', { minutes: 1, azimuth: 0, extra: { samples: rows } }, { sampleAt: 210 });
    expect(pointedOf(virtual, point).direction!.azimuth).toBeCloseTo(20, 6);
    expect(pointedOf(virtual, point).takenAtMs).toBe(START_MS + 60_200);
    const [one, two] = [40, 50].map((azimuth) => virtual.read('r', { minutes: 2, azimuth }));
    virtual.station('A').markSightings!.push({ id: 'both', reading: one, readings: [one, two] });
    expect(pointedOf(virtual, 'both').direction!.azimuth).toBeCloseTo(45, 6);
  });

  test('near the zenith spread widely in azimuth, not on the sky', () => {
    const virtual = new VirtualSurvey().run('r', 'true');
    const low = virtual.sight('r', { minutes: 1, azimuth: 10, elevation: 0 });
    const high = virtual.sight('r', { minutes: 1, azimuth: 10, elevation: 80 });
    const [a, b] = [low, high].map((id) => pointedOf(virtual, id).random);
    expect(b.azimuth / a.azimuth).toBeCloseTo(1 / Math.cos((80 * Math.PI) / 180), 3);
    expect(b.elevation).toBe(a.elevation);
  });
});
