import { beforeAll, describe, expect, test } from 'vitest';
import type { SurveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { surveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { planeProspects } from '../../../src/core/shading/prospects.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { sampleSurvey } from '../../report/sample-shades.ts';

const climate = clearSkyClimate('ineichen');
const evidenceOf = (survey: Survey): Promise<SurveyEvidence> =>
  surveyEvidence(survey, climate, { stepMinutes: 15, intervals: false });

/** As if some obstructions had never been traced. */
const without = (survey: Survey, ids: readonly string[]): Survey => ({
  ...survey,
  stations: survey.stations.map((station) => ({
    ...station,
    traces: station.traces.filter(({ obstruction }) => !ids.includes(obstruction)),
  })),
});

const accessOf = ({ assessment }: SurveyEvidence) =>
  assessment.planes.map((plane) => plane.solarAccess!.annual);

describe('what could be changed', () => {
  const survey = sampleSurvey('suburban-maple-and-gable.json');
  let evidence: SurveyEvidence;
  beforeAll(async () => {
    evidence = await evidenceOf(survey);
  });

  test('a gain is what the plane has more when the obstruction was never traced', async () => {
    for (const id of ['maple', 'gable']) {
      const gone = accessOf(await evidenceOf(without(survey, [id])));
      evidence.planes.forEach(({ prospects }, p) => {
        const row = prospects.obstructions.find((one) => one.id === id);
        expect(row?.gainIfRemoved ?? 0).toBeCloseTo(gone[p] - accessOf(evidence)[p], 9);
      });
    }
  });

  test('metres off the top give more and more, never more than all of it, and growth takes', () => {
    const rows = evidence.planes.flatMap(({ prospects }) => prospects.obstructions);
    const maple = rows.find(({ id }) => id === 'maple')!;
    expect(maple.lower.map(({ by }) => by)).toEqual([1, 2, 3]);
    expect(maple.lower[0].gain).toBeGreaterThan(0);
    expect(maple.grown.map(({ by }) => by)).toEqual([1, 3]);
    for (const { lower, gainIfRemoved, grown } of rows) {
      const gains = [0, ...lower.map(({ gain }) => gain), gainIfRemoved];
      gains.slice(1).forEach((gain, i) => expect(gain).toBeGreaterThanOrEqual(gains[i] - 1e-12));
      grown.slice(1).forEach(({ loss }, i) => expect(loss).toBeGreaterThanOrEqual(grown[i].loss));
    }
    expect(rows.find(({ id }) => id === 'gable')!.grown).toEqual([]);
  });

  test('the cut that clears gives all but a thousandth of the year', () => {
    const maple = evidence.planes[0].prospects.obstructions.find(({ id }) => id === 'maple')!;
    expect(maple.clear!.by % 0.5).toBe(0);
    expect(maple.clear!.gain).toBeGreaterThanOrEqual(maple.gainIfRemoved - 0.001);
    const short = maple.lower.filter(({ by }) => by < maple.clear!.by);
    for (const { gain } of short) expect(gain).toBeLessThan(maple.gainIfRemoved - 0.001);
  });

  test('a crown over a station 13 m away, cut by 2 m, is traced lower by the tangents of its points', async () => {
    const lower = await evidenceOf(traced2mLower(survey));
    const maple = evidence.planes[0].prospects.obstructions.find(({ id }) => id === 'maple')!;
    const two = maple.lower.find(({ by }) => by === 2)!;
    const gain = accessOf(lower)[0] - accessOf(evidence)[0];
    // only what stands over the cut goes: less than when every point comes down
    expect(two.gain).toBeGreaterThan(0);
    expect(two.gain).toBeLessThan(gain);
  });

  test('groups give together what the plane has more when none of them was traced', async () => {
    const trees = sampleSurvey('two-trees-one-behind-the-other.json');
    const before = await evidenceOf(trees);
    const [{ prospects }] = before.planes;
    expect(prospects.groups).toHaveLength(1);
    const [group] = prospects.groups;
    expect([...group.obstructions].sort()).toEqual(['linden', 'spruce']);
    const after = await evidenceOf(without(trees, group.obstructions));
    expect(group.gainIfAllRemoved).toBeCloseTo(accessOf(after)[0] - accessOf(before)[0], 9);
    expect(group.gainIfAllRemoved).toBeGreaterThan(group.sumOfSingleGains);
  });

  test('without distance no metres; without stations nothing', async () => {
    const unknown = {
      ...survey,
      obstructions: survey.obstructions.map(({ id, name, kind }) => ({ id, name, kind })),
    };
    const { planes } = await evidenceOf(unknown);
    for (const { lower, clear, grown } of planes.flatMap(({ prospects }) => prospects.obstructions))
      expect([lower, clear, grown]).toEqual([[], null, []]);
    expect(planeProspects([], new Map())).toEqual({ obstructions: [], groups: [] });
  });

  test('the lowest station is that with the least access', () => {
    evidence.planes.forEach(({ lowest }, p) => {
      const { stations, solarAccess } = evidence.assessment.planes[p];
      const found = stations.find(({ id }) => id === lowest!.id)!;
      expect(found.solarAccess.annual).toBe(solarAccess!.lowest);
    });
  });
});

/** Every sighting of the maple as if it stood 2 m lower, 13 m away. */
const traced2mLower = (survey: Survey): Survey => ({
  ...survey,
  stations: survey.stations.map((station) => ({
    ...station,
    traces: station.traces.map((trace) =>
      trace.obstruction !== 'maple'
        ? trace
        : {
            ...trace,
            sightings: trace.sightings.map((sighting) => ({
              ...sighting,
              elevation:
                (Math.atan(Math.max(0, Math.tan((sighting.elevation! * Math.PI) / 180) - 2 / 13)) * 180) /
                Math.PI,
            })),
          },
    ),
  })),
});
