import { describe, expect, test } from 'vitest';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { PointedSurvey } from '../../../src/core/pointing/pointed-survey.ts';
import { assessSurvey } from '../../../src/core/assessment/assess-survey.ts';
import { worldClimate } from '../../../src/core/irradiance/world-climate.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../../../src/core/uncertainty/access-interval.ts';
import { uncertainStation } from '../../../src/core/uncertainty/uncertain-station.ts';
import { worldGrid } from '../irradiance/world-bytes.ts';
import { sampleSurvey } from '../survey/sample-surveys.ts';
import type { Scene } from './drawn-scenes.ts';
import { lightOf, rebuiltAccess, scenesOf } from './drawn-scenes.ts';

/** A building alone before the maple's south roof, all the rest of the horizon seen, typed by hand. */
function wallSurvey(change: (survey: Survey) => void = () => undefined): Survey {
  const survey = sampleSurvey();
  const [station] = survey.stations;
  survey.planes = survey.planes.slice(0, 1);
  survey.obstructions = [{ id: 'wall', name: 'Wall', kind: 'building' }];
  const corners = [
    [176, 2],
    [176, 34],
    [268, 31],
    [268, 2],
  ];
  const sightings = corners.map(([azimuth, elevation], i) => ({ id: `c${i}`, azimuth, elevation }));
  station.traces = [{ id: 'wall', obstruction: 'wall', shape: 'skyline', sightings }];
  station.observedOpen = [[0, 360]];
  survey.stations = [station];
  survey.runs = [];
  survey.readings = [];
  change(survey);
  return survey;
}

const light = lightOf(wallSurvey());

function drawn(survey: Survey, options: { seed?: string; pointed?: PointedSurvey; draws?: number } = {}) {
  const { seed = 'seed', pointed = pointSurvey(survey), draws } = options;
  const [scene] = scenesOf(survey, light);
  const set = drawnSurvey(pointed, survey.site.latitude, 'world', { seed, draws });
  const annual = rebuiltAccess(scene.map, scene.station.obstructions);
  const station = uncertainStation(survey, survey.stations[0], pointed);
  const access = drawAccess(scene.map, station, annual, set);
  return { scene, annual, interval: accessInterval([access], set), set, access };
}

const sourcesOf = ({ interval }: ReturnType<typeof drawn>) =>
  Object.fromEntries(interval.sources.map((source) => [source.source, source]));

/** The pointing's answer with some deviations put in place of its own. */
function pointedWith(survey: Survey, heading: number, index: number, random: number): PointedSurvey {
  const pointed = pointSurvey(survey);
  const sightings = [...pointed.sightings].map(
    ([id, one]) => [id, { ...one, random: { azimuth: random, elevation: random } }] as const,
  );
  return { ...pointed, sightings: new Map(sightings), typed: { heading, index } };
}

/** Change of access when every point of a scene moves by so much, by whole rebuilds. */
function change({ map, station }: Scene, azimuth: number, elevation: number): number {
  const moved = (sign: number) =>
    rebuiltAccess(
      map,
      station.obstructions.map((obstruction) => ({
        ...obstruction,
        traces: obstruction.traces.map((trace) => ({
          ...trace,
          points: trace.points.map((point) => ({
            azimuth: point.azimuth + sign * azimuth,
            elevation: point.elevation + sign * elevation,
          })),
        })),
      })),
    );
  return (moved(1) - moved(-1)) / 2;
}

describe('an interval', () => {
  test('is the same for the same seed, nearly the same for another', () => {
    const [a, again, other] = ['a', 'a', 'b'].map((seed) => drawn(wallSurvey(), { seed }).interval);
    expect(again).toEqual(a);
    expect(other.low).not.toBe(a.low);
    // Ends of 1,000 draws: a standard error of 0.09 deviations each; five of the difference of two.
    expect(Math.abs(other.low - a.low)).toBeLessThan(5 * 0.13 * a.standardDeviation);
    expect(Math.abs(other.high - a.high)).toBeLessThan(5 * 0.13 * a.standardDeviation);
  });

  test('holds the access, and 95 % of a normal spread', () => {
    const { interval, annual } = drawn(wallSurvey());
    expect(interval.low).toBeLessThan(annual);
    expect(interval.high).toBeGreaterThan(annual);
    const width = (interval.high - interval.low) / interval.standardDeviation;
    expect(width).toBeGreaterThan(3.5);
    expect(width).toBeLessThan(4.4);
    expect(interval.draws).toBe(1000);
  });

  test.each([
    ['heading', 2, 0],
    ['elevation-index', 0, 0.5],
  ] as const)(
    'from %s alone has the deviation that the slope of whole rebuilds gives',
    (source, heading, index) => {
      const survey = wallSurvey();
      const one = drawn(survey, { pointed: pointedWith(survey, heading, index, 0) });
      const slope = Math.abs(change(one.scene, heading, index));
      const rest = drawn(survey, { pointed: pointedWith(survey, 0, 0, 0) }).interval.standardDeviation;
      const own = Math.sqrt(one.interval.standardDeviation ** 2 - rest ** 2);
      expect(slope).toBeGreaterThan(0.002);
      expect(own / slope).toBeGreaterThan(0.88);
      expect(own / slope).toBeLessThan(1.12);
      expect(one.interval.sources[0].source).toBe(source);
    },
  );

  test('of the mean of two stations shares the heading and not the hand', () => {
    const survey = wallSurvey();
    const twins = (pointed: PointedSurvey) => {
      const { access, set, scene, annual, interval } = drawn(survey, { pointed });
      const twin = { ...access.station, id: 'twin' };
      const both = accessInterval([access, drawAccess(scene.map, twin, annual, set)], set);
      return both.standardDeviation / interval.standardDeviation;
    };
    expect(twins(pointedWith(survey, 3, 0, 0))).toBeGreaterThan(0.95);
    expect(twins(pointedWith(survey, 0, 0, 4))).toBeLessThan(0.8);
  });

  test('is as wide again with twice the hand', () => {
    const survey = wallSurvey();
    const deviation = (random: number) =>
      drawn(survey, { pointed: pointedWith(survey, 0, 0, random) }).interval.standardDeviation;
    expect(deviation(2) / deviation(1)).toBeGreaterThan(1.7);
  });
});

describe('the ranked sources', () => {
  test('come largest first and sum to 1', () => {
    for (const { interval } of [drawn(wallSurvey()), drawn(sampleSurvey())]) {
      const shares = interval.sources.map(({ share }) => share);
      expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 9);
      expect(shares).toEqual([...shares].sort((a, b) => b - a));
    }
  });

  test('a wall has no transmittance, and a horizon that was all looked at nothing unseen', () => {
    const sources = sourcesOf(drawn(wallSurvey()));
    expect(sources.transmittance).toBeUndefined();
    expect(sources.unseen).toBeUndefined();
    expect(sources.heading.cure).toBe('known-bearing');
  });

  test('what a cure promises is what the cured survey has', () => {
    const survey = wallSurvey();
    const before = drawn(survey, { pointed: pointedWith(survey, 2, 0.7, 0.3) });
    const promised = sourcesOf(before)['elevation-index'];
    expect(promised.cure).toBe('two-face-check');
    const after = drawn(survey, { pointed: pointedWith(survey, 2, 0.2, 0.3) }).interval;
    expect(promised.standardDeviationAfter! / after.standardDeviation).toBeGreaterThan(0.9);
    expect(promised.standardDeviationAfter! / after.standardDeviation).toBeLessThan(1.1);
  });

  test('an index that was turned over has no cure', () => {
    const survey = wallSurvey();
    const index = sourcesOf(drawn(survey, { pointed: pointedWith(survey, 2, 0.2, 0.3) }))['elevation-index'];
    expect(index).toMatchObject({ cure: null, standardDeviationAfter: null });
    expect(index.share).toBeGreaterThan(0);
  });
});

describe('what nobody looked at', () => {
  const open = drawn(wallSurvey());
  const unseen = (range: [number, number][]) =>
    drawn(wallSurvey((s) => (s.stations[0].observedOpen = range)));

  test('in front of the plane lowers the lower end and leads the sources', () => {
    const one = unseen([[176, 90]]);
    expect(one.annual).toBe(open.annual);
    expect(one.interval.low).toBeLessThan(open.interval.low - 0.01);
    expect(one.interval.sources[0]).toMatchObject({ source: 'unseen', cure: 'look' });
    expect(one.interval.sources[0].standardDeviationAfter!).toBeLessThan(one.interval.standardDeviation / 2);
  });

  test('behind a wall facing south does not matter', () => {
    const facing = (range: [number, number][]) =>
      wallSurvey((survey) => {
        survey.planes[0] = { ...survey.planes[0], surfaceTilt: 90, surfaceAzimuth: 180 };
        survey.stations[0].observedOpen = range;
      });
    expect(drawn(facing([[80, 280]])).interval).toEqual(drawn(facing([[0, 360]])).interval);
    expect(sourcesOf(drawn(facing([[100, 280]]))).unseen).toBeDefined();
  });
});

describe('the trees', () => {
  test('of a kind are unsure, a typed share less so, a typed 0 not at all', () => {
    const share = (transmittance?: number) => {
      const survey = sampleSurvey();
      for (const obstruction of survey.obstructions)
        if (obstruction.id === 'maple') obstruction.transmittance = transmittance;
      return sourcesOf(drawn(survey)).transmittance?.share ?? 0;
    };
    expect(share()).toBeGreaterThan(share(0.4));
    expect(share(0.4)).toBeGreaterThan(0);
    expect(share(0)).toBe(0);
  });
});

describe('the assessment', () => {
  test('carries intervals of stations and planes, the same each time, and none where none are asked for', async () => {
    const survey = sampleSurvey();
    const climate = worldClimate(worldGrid, survey.site);
    const assess = (intervals?: boolean) =>
      assessSurvey(survey, climate, { stepMinutes: 15, light, intervals });
    const [first, again, without] = [await assess(), await assess(true), await assess(false)];
    expect(again).toEqual(first);
    for (const plane of first.planes)
      for (const { annual, interval } of [plane.solarAccess!, ...plane.stations.map((s) => s.solarAccess)]) {
        expect(interval!.low).toBeLessThan(annual);
        expect(interval!.high).toBeGreaterThan(interval!.low);
        expect(interval!.high).toBeLessThanOrEqual(1);
        expect(interval!.sources.length).toBeGreaterThan(4);
      }
    for (const { solarAccess, stations } of without.planes) {
      expect(solarAccess).not.toHaveProperty('interval');
      for (const station of stations) expect(station.solarAccess).not.toHaveProperty('interval');
    }
  });

  test('a station that traced nothing and looked everywhere is sure but for nothing', async () => {
    const survey = wallSurvey((one) => (one.stations[0].traces = []));
    const climate = worldClimate(worldGrid, survey.site);
    const { planes } = await assessSurvey(survey, climate, { light });
    const { annual, interval } = planes[0].solarAccess!;
    expect(annual).toBe(1);
    expect(interval).toMatchObject({ low: 1, high: 1, standardDeviation: 0 });
  });
});
