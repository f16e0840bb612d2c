import { beforeAll, describe, expect, test } from 'vitest';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import type { Assessment, StationAssessment } from '../../../src/core/shading/assessment.ts';
import type { AssessOptions } from '../../../src/core/assessment/assess-survey.ts';
import { assessSurvey } from '../../../src/core/assessment/assess-survey.ts';
import type { Survey, Trace } from '../../../src/core/survey/survey.ts';

const climate = clearSkyClimate('ineichen');

/** A made-up survey with one south roof and one station; `change` makes it the one a test needs. */
function survey(change: (made: Survey) => void = () => undefined): Survey {
  const made: Survey = {
    format: 'noonmark-survey',
    version: 1,
    id: 'made-up',
    title: 'Made up',
    site: { latitude: 45, longitude: 5, altitude: 200, timeZone: 'Europe/Paris' },
    climate: { source: 'clear-sky', model: 'ineichen' },
    planes: [{ id: 'south', name: 'South roof', surfaceTilt: 35, surfaceAzimuth: 180 }],
    obstructions: [
      { id: 'wall', name: 'Wall', kind: 'building' },
      { id: 'tree', name: 'Tree', kind: 'evergreen-tree', transmittance: 0 },
    ],
    runs: [],
    readings: [],
    stations: [{ id: 'A', name: 'Eave', serves: ['south'], traces: [] }],
  };
  change(made);
  return made;
}

const skyline = (id: string, obstruction: string, ...at: [number, number][]): Trace => ({
  id,
  obstruction,
  shape: 'skyline',
  edge: 'straight',
  sightings: at.map(([azimuth, elevation], i) => ({ id: `${id}-${i}`, azimuth, elevation })),
});

const assess = (made: Survey, options: AssessOptions = {}): Promise<Assessment> =>
  assessSurvey(made, climate, { stepMinutes: 10, ...options });

const station = (assessment: Assessment): StationAssessment => assessment.planes[0].stations[0];

describe('an empty horizon', () => {
  let empty: Assessment;
  beforeAll(async () => (empty = await assess(survey())));

  test('loses nothing, in any month or hour', () => {
    const { solarAccess, irradiation } = station(empty);
    expect(solarAccess.annual).toBe(1);
    expect(solarAccess.monthly).toEqual(Array(12).fill(1));
    expect(solarAccess.hourly.flat().filter((share) => share !== null && share !== 1)).toEqual([]);
    expect(irradiation.annual).toBeCloseTo(empty.planes[0].unshaded.annual, 9);
  });

  test('is dark at night and light at noon', () => {
    for (const hours of station(empty).solarAccess.hourly) {
      expect(hours[0]).toBeNull();
      expect(hours[12]).toBe(1);
    }
  });

  test('was seen by nobody', () => expect(station(empty).coverage).toBe(0));
});

describe('obstructions', () => {
  test('one alone gives back what it takes', async () => {
    const { solarAccess, obstructions, groups } = station(
      await assess(
        survey((made) => made.stations[0].traces.push(skyline('t', 'wall', [150, 40], [200, 40]))),
      ),
    );
    expect(obstructions.map(({ id }) => id)).toEqual(['wall']);
    expect(obstructions[0].gainIfRemoved).toBeCloseTo(1 - solarAccess.annual, 12);
    expect(obstructions[0].lossIfAlone).toBeCloseTo(1 - solarAccess.annual, 12);
    obstructions[0].monthly.forEach((gain, m) => expect(gain).toBeCloseTo(1 - solarAccess.monthly[m]!, 12));
    expect(solarAccess.annual).toBeLessThan(1);
    expect(groups).toEqual([]);
  });

  test('two that hide each other give nothing singly, and are named together', async () => {
    const { solarAccess, obstructions, groups } = station(
      await assess(
        survey((made) =>
          made.stations[0].traces.push(
            skyline('t', 'wall', [150, 40], [200, 40]),
            skyline('u', 'tree', [150, 40], [200, 40]),
          ),
        ),
      ),
    );
    for (const { gainIfRemoved, lossIfAlone } of obstructions) {
      expect(gainIfRemoved).toBeCloseTo(0, 12);
      expect(lossIfAlone).toBeCloseTo(1 - solarAccess.annual, 12);
    }
    expect(groups).toHaveLength(1);
    expect(groups[0].obstructions).toEqual(['wall', 'tree']);
    expect(groups[0].gainIfAllRemoved).toBeCloseTo(1 - solarAccess.annual, 12);
  });

  test('two side by side add up and are no group', async () => {
    const { solarAccess, obstructions, groups } = station(
      await assess(
        survey((made) =>
          made.stations[0].traces.push(
            skyline('t', 'wall', [130, 30], [160, 30]),
            skyline('u', 'tree', [190, 30], [220, 30]),
          ),
        ),
      ),
    );
    const singly = obstructions.reduce((sum, { gainIfRemoved }) => sum + gainIfRemoved, 0);
    expect(singly).toBeCloseTo(1 - solarAccess.annual, 12);
    expect(obstructions[0].gainIfRemoved).toBeGreaterThanOrEqual(obstructions[1].gainIfRemoved);
    expect(groups).toEqual([]);
  });

  test('a wall in the east takes the morning and leaves the afternoon', async () => {
    const { solarAccess } = station(
      await assess(
        survey((made) => made.stations[0].traces.push(skyline('t', 'wall', [60, 50], [120, 60], [179, 60]))),
      ),
    );
    for (const hours of [solarAccess.hourly[2], solarAccess.hourly[9]]) {
      expect(hours[9]).toBeLessThan(0.35);
      expect(hours[15]).toBeGreaterThan(0.9);
    }
  });
});

describe('coverage', () => {
  const seen = async (...ranges: [number, number][]) =>
    station(await assess(survey((made) => (made.stations[0].observedOpen = ranges)))).coverage;

  test('is whole for the whole circle', async () => expect(await seen([0, 360])).toBeCloseTo(1, 9));
  test('is half for the eastern half, by symmetry', async () =>
    expect(await seen([0, 180])).toBeCloseTo(0.5, 2));
  test('counts a range twice seen once', async () =>
    expect(await seen([0, 180], [90, 180])).toBeCloseTo(await seen([0, 180]), 12));
  test('runs over north', async () => expect(await seen([270, 90])).toBeLessThan(await seen([90, 270])));
  test('does not miss the sky behind a wall', async () => {
    const facade = survey((made) => {
      made.planes[0].surfaceTilt = 90;
      made.stations[0].observedOpen = [[89, 271]];
    });
    expect(station(await assess(facade)).coverage).toBeCloseTo(1, 9);
  });
});

describe('planes and places', () => {
  test.each([
    [45, 180],
    [-35, 0],
  ])('at latitude %d the best plane faces %d', async (latitude, facing) => {
    const { planes } = await assess(survey((made) => (made.site.latitude = latitude)));
    const { bestPlane, orientationFactor } = planes[0];
    expect(Math.abs(((bestPlane.surfaceAzimuth - facing + 540) % 360) - 180)).toBeLessThan(3);
    expect(bestPlane.surfaceTilt).toBeGreaterThan(20);
    expect(bestPlane.surfaceTilt).toBeLessThan(50);
    expect(orientationFactor).toBeGreaterThan(latitude > 0 ? 0.97 : 0.3);
    expect(orientationFactor).toBeLessThanOrEqual(1);
  });

  test('no plane lies better than the best one', async () => {
    const tilts = [0, 10, 20, 30, 40, 50, 70, 90];
    const many = survey((made) => {
      made.planes = tilts.flatMap((surfaceTilt) =>
        [0, 60, 120, 170, 180, 200, 250, 300].map((surfaceAzimuth) => ({
          id: `${surfaceTilt} ${surfaceAzimuth}`,
          name: 'Tried',
          surfaceTilt,
          surfaceAzimuth,
        })),
      );
      made.stations = [];
    });
    const { planes, warnings } = await assess(many);
    const best = Math.max(...planes.map(({ unshaded }) => unshaded.annual));
    for (const { unshaded, orientationFactor, solarAccess } of planes) {
      expect(orientationFactor).toBeLessThanOrEqual(1);
      expect(
        Math.abs(
          orientationFactor / planes[0].orientationFactor / (unshaded.annual / planes[0].unshaded.annual) - 1,
        ),
      ).toBeLessThan(5e-4);
      expect(solarAccess).toBeNull();
    }
    expect(Math.max(...planes.map((plane) => plane.orientationFactor))).toBeGreaterThan(0.99);
    expect(best).toBeGreaterThan(0);
    expect(warnings[0].path).toBe('planes[0]');
  });

  test('months without sun on the plane are null at a polar site', async () => {
    const { planes } = await assess(
      survey((made) => (made.site = { latitude: 78.2, longitude: 15.6, timeZone: 'Arctic/Longyearbyen' })),
    );
    const { monthly } = planes[0].stations[0].solarAccess;
    expect(monthly[0]).toBeNull();
    expect(monthly[11]).toBeNull();
    expect(monthly[5]).toBe(1);
    expect(planes[0].solarAccess!.monthly[0]).toBeNull();
  });

  test.each([
    [90, 0],
    [-90, 0],
    [0, 180],
    [52, -180],
  ])('latitude %d, longitude %d is computed like any other', async (latitude, longitude) => {
    const { planes } = await assess(
      survey((made) => {
        made.site = { latitude, longitude, timeZone: 'UTC' };
        made.stations[0].traces.push(skyline('t', 'wall', [100, 20], [200, 20]));
      }),
    );
    expect(planes[0].unshaded.annual).toBeGreaterThan(300);
    expect(planes[0].stations[0].solarAccess.annual).toBeGreaterThan(0.3);
    expect(planes[0].stations[0].solarAccess.annual).toBeLessThan(1);
  });

  test('the mean over stations stands for the plane, with its lowest', async () => {
    const { planes } = await assess(
      survey((made) => {
        made.stations[0].traces.push(skyline('t', 'wall', [150, 40], [200, 40]));
        made.stations.push({ id: 'B', name: 'Ridge', serves: ['south'], traces: [] });
      }),
    );
    const [a, b] = planes[0].stations.map(({ solarAccess }) => solarAccess.annual);
    expect(planes[0].solarAccess).toMatchObject({
      annual: (a + b) / 2,
      lowest: a,
      count: 2,
      method: 'stations-mean',
    });
  });
});

describe('what goes with the result', () => {
  test('a sighting in a run that nothing ties to north is named and left out', async () => {
    const { warnings } = await assess(
      survey((made) => {
        made.runs = [{ id: 'r', frame: 'relative', startedAt: '2026-05-14T10:00:00Z' }];
        made.readings = [
          { id: 'x', run: 'r', takenAt: '2026-05-14T10:00:00Z', alpha: 0, beta: 90, gamma: 0 },
        ];
        const trace = skyline('t', 'wall', [150, 40], [170, 40], [200, 40]);
        trace.sightings.push({ id: 'raw', reading: 'x' });
        made.stations[0].traces.push(trace);
      }),
    );
    expect(warnings.map(({ path }) => path)).toEqual(['stations[0].traces[0].sightings[3]']);
  });

  test('progress grows from 0 to 1, and an abort stops the work', async () => {
    const shares: number[] = [];
    await assess(survey(), { onProgress: (share) => void shares.push(share) });
    expect(shares[0]).toBe(0);
    expect(shares.at(-1)).toBe(1);
    expect([...shares].sort((a, b) => a - b)).toEqual(shares);
    const control = new AbortController();
    const work = assess(survey(), {
      signal: control.signal,
      onProgress: () => control.abort(new Error('no longer wanted')),
    });
    await expect(work).rejects.toThrow('no longer wanted');
  });

  test.each(['hay-davies', 'perez', 'isotropic'] as const)(
    '%s gives shares between 0 and 1',
    async (transposition) => {
      const assessment = await assess(
        survey((made) =>
          made.stations[0].traces.push(skyline('t', 'wall', [100, 30], [150, 45], [200, 30], [260, 8])),
        ),
        { transposition },
      );
      expect(assessment.transposition).toBe(transposition);
      const { annual, monthly } = station(assessment).solarAccess;
      for (const share of [annual, ...monthly]) {
        expect(share).toBeGreaterThan(0);
        expect(share).toBeLessThan(1);
      }
    },
  );
});
