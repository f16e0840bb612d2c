import { describe, expect, it } from 'vitest';
import { liveSurvey, sweptDirections } from '../../../src/app/capture/live-survey.ts';
import { SweepTake } from '../../../src/app/capture/sweep-take.ts';
import type { TraceChoice } from '../../../src/app/capture/trace-choice.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { stationSoFar } from '../../../src/core/assessment/station-so-far.ts';
import type { PointedSurvey } from '../../../src/core/pointing/pointed-survey.ts';
import { siteLight } from '../../../src/core/shading/site-light.ts';
import { skyMap } from '../../../src/core/shading/sky-map.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { cameraAt } from '../../sensors/posed-phone.ts';
import { inventedSitting } from './invented-sitting.ts';

const choice: TraceChoice = { obstruction: 'maple', shape: 'skyline', way: 'sweep', angularWidth: 1 };
const edge = (at: number) => cameraAt(110 + 80 * at, 32 + 12 * Math.sin(5 * at));

function figures(survey: Survey, pointed: PointedSurvey) {
  const climate = clearSkyClimate('ineichen');
  const light = siteLight(survey.site, climate, { transposition: 'hay-davies', stepMinutes: 15 });
  const [plane] = survey.planes;
  const map = skyMap(light.year, light.grid, plane.surfaceTilt, plane.surfaceAzimuth);
  return stationSoFar(map, climate.source, survey, survey.stations[0], pointed);
}

describe('the live figures', () => {
  it('of a sweep at work are those of the trace it becomes, its range too', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sensor.give(edge, 20);
    sweep.begin();
    sensor.give(edge, 8000);
    const run = session.runNow!;
    const swept = sweptDirections(sweep.samples, 'camera', run);
    const at = { swept, axis: 'camera', run, choice } as const;
    const during = liveSurvey(await stored(), 'A', session.pointed.value!, at);
    const live = figures(during.survey, during.pointed);
    expect(during.survey.readings).toEqual([]);
    await sweep.end();
    await sweep.finish(choice, 'Maple');
    const after = figures(await stored(), session.pointed.value!);
    expect(after.access).toBeLessThan(0.95);
    // the line drawn live is up to half a degree coarser
    expect(live.access).toBeCloseTo(after.access, 2);
    expect(live.interval.low).toBeCloseTo(after.interval.low, 1);
    expect(live.interval.high).toBeCloseTo(after.interval.high, 1);
    expect(live.interval.standardDeviation).toBeGreaterThan(0.005);
  });

  it('at rest are those of the survey itself, draw by draw', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sensor.give(edge, 20);
    sweep.begin();
    sensor.give(edge, 4000);
    await sweep.end();
    await sweep.finish(choice, 'Maple');
    const survey = await stored();
    const light = liveSurvey(survey, 'A', session.pointed.value!, null);
    expect(figures(light.survey, light.pointed)).toEqual(figures(survey, session.pointed.value!));
  });
});
