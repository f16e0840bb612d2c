import { readFileSync } from 'node:fs';
import { gunzipSync } from 'node:zlib';
import { describe, expect, it, vi } from 'vitest';
import { pointSurvey } from '../../src/core/pointing/point-survey.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import type * as PointSurvey from '../../src/core/pointing/point-survey.ts';
import type { Outcome } from '../../src/core/shading/calculation.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { engineFor, sampleSurvey, underClearSky, worldGridBytes } from '../report/sample-shades.ts';

vi.mock('../../src/core/pointing/point-survey.ts', async (original) => {
  const real = await original<typeof PointSurvey>();
  return { ...real, pointSurvey: vi.fn(real.pointSurvey) };
});

const survey = { ...sampleSurvey('suburban-maple-and-gable.json'), climate: { source: 'world' } as const };
const STEP = { stepMinutes: 15 };
const silent = () => undefined;

function valueOf<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.fault.detail ?? outcome.fault.code);
  return outcome.value;
}

async function byHand(of: Survey, options = {}) {
  const grid = decodeWorldGrid(worldGridBytes());
  if (!grid.ok) throw new Error('grid');
  return assessSurvey(of, worldClimate(grid.value, of.site), { ...STEP, ...options });
}

const question = (changes: { obstruction: string; kind: 'gone' }[] = []) => ({
  plane: survey.planes[0].id,
  station: survey.stations.find(({ serves }) => serves.includes(survey.planes[0].id))!.id,
  changes,
});

describe('the worker’s engine', () => {
  it('assesses a survey as the core does, and tells how far it is', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const shares: number[] = [];
    const assessment = valueOf(await engine.assess(0, (share) => shares.push(share)));
    expect(assessment).toEqual(await byHand(survey));
    expect(shares.length).toBeGreaterThan(survey.stations.length);
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    expect(shares[shares.length - 1]).toBe(1);
  });

  it('gives a station the same figures as the whole assessment does', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const shade = valueOf(await engine.shade(0, question()));
    const whole = await byHand(survey, { intervals: false });
    const plane = whole.planes.find(({ id }) => id === question().plane)!;
    expect(shade.measured).toEqual(plane.stations.find(({ id }) => id === question().station));
    expect(shade.unshaded.annual).toBeCloseTo(plane.unshaded.annual, 9);
    expect(shade.imagined).toBeNull();
  });

  it('sums the hours of a month to the month, and the sky’s density to the direct light', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const { unshaded, density } = valueOf(await engine.shade(0, question()));
    unshaded.hourly.forEach((hours, month) =>
      expect(hours.reduce((sum, light) => sum + light, 0)).toBeCloseTo(unshaded.monthly[month], 3),
    );
    const direct = density.irradiation.reduce((sum, light) => sum + light, 0);
    expect(direct).toBeGreaterThan(0.3 * unshaded.annual);
    expect(direct).toBeLessThan(unshaded.annual);
  });

  it('imagines an obstruction gone as if it had never been traced', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const before = valueOf(await engine.shade(0, question()));
    const [{ id, gainIfRemoved }] = before.measured.obstructions;
    const shade = valueOf(await engine.shade(1, question([{ obstruction: id, kind: 'gone' }])));
    const never = {
      ...survey,
      stations: survey.stations.map((station) => ({
        ...station,
        traces: station.traces.filter(({ obstruction }) => obstruction !== id),
      })),
    };
    const plane = (await byHand(never)).planes.find((one) => one.id === question().plane)!;
    const station = plane.stations.find((one) => one.id === question().station)!;
    expect(gainIfRemoved).toBeGreaterThan(0.001);
    expect(shade.measured).toEqual(before.measured);
    expect(shade.imagined!.solarAccess.annual).toBeCloseTo(station.solarAccess.annual, 9);
    expect(shade.imagined!.solarAccess.annual - shade.measured.solarAccess.annual).toBeCloseTo(
      gainIfRemoved,
      9,
    );
  });

  it('gives the year of a station so far, and how sure it is, as the whole assessment does', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const soFar = valueOf(await engine.soFar(0, question()));
    const whole = await byHand(survey);
    const station = whole.planes
      .find(({ id }) => id === question().plane)!
      .stations.find(({ id }) => id === question().station)!;
    const { annual, interval } = station.solarAccess;
    expect(soFar.access).toBeCloseTo(annual, 12);
    expect(soFar.coverage).toBe(station.coverage);
    expect(soFar.interval).toEqual({ ...interval, sources: [] });
    expect(interval!.sources.length).toBeGreaterThan(0);
  });

  it('takes a survey as pointed where it is given so, and its raw readings are not needed then', async () => {
    const engine = engineFor();
    const pointed = pointSurvey(survey);
    engine.hold({ survey, ...STEP });
    const whole = valueOf(await engine.soFar(0, question()));
    vi.mocked(pointSurvey).mockClear();
    engine.hold({ survey: { ...survey, runs: [], readings: [] }, pointed, ...STEP });
    expect(valueOf(await engine.soFar(1, question()))).toEqual(whole);
    expect(pointSurvey).not.toHaveBeenCalled();
  });

  it('leaves alone what this station did not trace', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    const shade = valueOf(await engine.shade(0, question([{ obstruction: 'elsewhere', kind: 'gone' }])));
    expect(shade.imagined).toBeNull();
  });

  it('asks for the world’s grid once, and again only after it failed', async () => {
    let asked = 0;
    const engine = engineFor(() => {
      asked++;
      return asked === 1 ? Promise.reject(new Error('no connection')) : Promise.resolve(worldGridBytes());
    });
    engine.hold({ survey, ...STEP });
    const failed = await engine.assess(0, silent);
    expect(failed).toMatchObject({ ok: false, fault: { code: 'climate-missing' } });
    expect((await engine.assess(1, silent)).ok).toBe(true);
    engine.hold({ survey: { ...survey, site: { ...survey.site, latitude: 40 } }, ...STEP });
    expect((await engine.assess(2, silent)).ok).toBe(true);
    expect(asked).toBe(2);
  });

  it('stops a cancelled call at its next look up', async () => {
    const engine = engineFor();
    engine.hold({ survey: underClearSky(survey), ...STEP });
    const outcome = await engine.assess(7, (share) => share > 0.3 && engine.cancel(7));
    expect(outcome).toEqual({ ok: false, fault: { code: 'cancelled' } });
    expect((await engine.assess(8, silent)).ok).toBe(true);
  });

  it('answers with a fault, not a crash, where something is wrong', async () => {
    const engine = engineFor(() => Promise.resolve(new ArrayBuffer(12)));
    engine.hold({ survey, ...STEP });
    expect(await engine.assess(0, silent)).toMatchObject({ fault: { code: 'climate-missing' } });
    expect(await engine.shade(1, { plane: 'none', station: 'none', changes: [] })).toMatchObject({
      fault: { code: 'failed', detail: expect.stringContaining('none') as string },
    });
    const named: Survey = { ...survey, climate: { source: 'weather-file', name: 'town.epw' } };
    engine.hold({ survey: named, ...STEP });
    expect(await engine.assess(2, silent)).toMatchObject({ fault: { code: 'weather-file-missing' } });
    const contents = new TextEncoder().encode('not weather').buffer;
    engine.hold({ survey: named, weatherFile: { name: 'town.epw', contents }, ...STEP });
    expect(await engine.assess(3, silent)).toMatchObject({
      fault: { code: 'weather-file-refused', problems: [{ path: 'line 1' }] },
    });
    expect(await engine.readWeatherFile('town.epw', contents)).toMatchObject({
      fault: { code: 'weather-file-refused' },
    });
  });

  it('reads a weather file and assesses with it', async () => {
    const name = 'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw';
    const file = gunzipSync(readFileSync(new URL(`../reference-values/weather/${name}.gz`, import.meta.url)));
    const contents = new Uint8Array(file).buffer;
    const engine = engineFor();
    expect(valueOf(await engine.readWeatherFile(name, contents)).place).toContain('Chicago');
    engine.hold({
      survey: { ...survey, climate: { source: 'weather-file', name } },
      weatherFile: { name, contents },
      ...STEP,
    });
    const assessment = valueOf(await engine.assess(0, silent));
    expect(assessment.climate.source).toBe('weather-file');
    expect(assessment.climate.name).toContain('Chicago');
  });

  it('points a held survey once for all questions about it, and anew once another is held', async () => {
    const engine = engineFor();
    engine.hold({ survey, ...STEP });
    vi.mocked(pointSurvey).mockClear();
    const first = valueOf(await engine.shade(0, question()));
    const again = valueOf(await engine.shade(1, question()));
    expect(again.measured).toEqual(first.measured);
    expect(pointSurvey).toHaveBeenCalledTimes(1);
    engine.hold({ survey: { ...survey, obstructions: [...survey.obstructions] }, ...STEP });
    valueOf(await engine.shade(2, question()));
    expect(pointSurvey).toHaveBeenCalledTimes(2);
  });

  it('does not take a weather file for another of the same name and length', async () => {
    const name = 'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw';
    const text = gunzipSync(
      readFileSync(new URL(`../reference-values/weather/${name}.gz`, import.meta.url)),
    ).toString('latin1');
    const renamed = text.replace('Chicago', 'Chiccgo');
    expect(renamed).not.toBe(text);
    expect(renamed).toHaveLength(text.length);
    const engine = engineFor();
    const named: Survey = { ...survey, climate: { source: 'weather-file', name } };
    const light = async (contents: string) => {
      const bytes = new Uint8Array(Buffer.from(contents, 'latin1')).buffer;
      engine.hold({ survey: named, weatherFile: { name, contents: bytes }, ...STEP });
      return valueOf(await engine.assess(0, silent)).climate.name;
    };
    expect([await light(text), await light(renamed)]).toEqual([
      expect.stringContaining('Chicago'),
      expect.stringContaining('Chiccgo'),
    ]);
  });

  it('reads a weather file of old letters as the command line does', async () => {
    const name = 'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw';
    const text = gunzipSync(
      readFileSync(new URL(`../reference-values/weather/${name}.gz`, import.meta.url)),
    ).toString('latin1');
    const contents = new Uint8Array(Buffer.from(text.replace('Chicago', 'Ca\xf1ada'), 'latin1')).buffer;
    expect(valueOf(await engineFor().readWeatherFile(name, contents)).place).toContain('Cañada');
  });
});
