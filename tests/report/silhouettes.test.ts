import { describe, expect, it } from 'vitest';
import { stationHorizon } from '../../src/core/horizon/station-horizon.ts';
import type { SilhouettePart } from '../../src/report/pictures/silhouettes.ts';
import { obstructionsAt, silhouette } from '../../src/report/pictures/silhouettes.ts';
import { SAMPLE_FILES, sampleSurvey } from './sample-shades.ts';

/** The intervals a shape covers at an azimuth, by its drawn edges. */
function coveredAt(parts: readonly SilhouettePart[], azimuth: number): [number, number][] {
  return parts.flatMap((part) =>
    [azimuth, azimuth + 360].flatMap((a): [number, number][] => {
      const i = part.azimuth.findIndex((next, k) => k > 0 && part.azimuth[k - 1] < a && a <= next);
      if (i < 0) return [];
      const share = (a - part.azimuth[i - 1]) / (part.azimuth[i] - part.azimuth[i - 1]);
      const at = (edge: number[]) => edge[i - 1] + share * (edge[i] - edge[i - 1]);
      return [[at(part.low), at(part.high)]];
    }),
  );
}

describe.each(SAMPLE_FILES)('the silhouettes of %s', (file) => {
  const survey = sampleSurvey(file);
  const horizons = survey.stations.map((station) => stationHorizon(survey, station).profile);

  it('pass through every blocked interval that is computed with', () => {
    let compared = 0;
    for (const profile of horizons)
      profile.obstructionIds.forEach((_, obstruction) => {
        const parts = silhouette(profile, obstruction);
        for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
          const middle = (profile.sliceFrom[slice] + profile.sliceTo[slice]) / 2;
          const drawn = coveredAt(parts, middle).sort((a, b) => a[0] - b[0]);
          const blocked: [number, number][] = [];
          for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
            if (profile.intervalObstruction[k] === obstruction)
              blocked.push([profile.low[k], profile.high[k]]);
          blocked.sort((a, b) => a[0] - b[0]);
          expect(drawn.length).toBe(blocked.length);
          blocked.forEach(([low, high], i) => {
            expect(drawn[i][0]).toBeCloseTo(low, 6);
            expect(drawn[i][1]).toBeCloseTo(high, 6);
            compared++;
          });
        }
      });
    expect(compared).toBeGreaterThan(20);
  });

  it('have an upright end only where nothing of the same obstruction stands beside it', () => {
    for (const profile of horizons)
      profile.obstructionIds.forEach((_, obstruction) => {
        for (const { walls, azimuth } of silhouette(profile, obstruction))
          for (const wall of walls) {
            const outward = wall.azimuth === azimuth[0] ? -1 : 1;
            const middle = (wall.low + wall.high) / 2;
            const beside = (((wall.azimuth + outward * 1e-9) % 360) + 360) % 360;
            expect(obstructionsAt(profile, beside, middle)).not.toContain(obstruction);
          }
      });
  });
});

describe('what is in the way of a direction', () => {
  const survey = sampleSurvey('suburban-maple-and-gable.json');
  const { profile } = stationHorizon(survey, survey.stations[0]);

  it('is each obstruction whose interval holds it, and nothing overhead', () => {
    const slice = Math.floor(profile.sliceColumn.length / 2);
    const k = profile.intervalFirst[slice];
    const azimuth = (profile.sliceFrom[slice] + profile.sliceTo[slice]) / 2;
    const found = obstructionsAt(profile, azimuth, (profile.low[k] + profile.high[k]) / 2);
    expect(found).toContain(profile.intervalObstruction[k]);
    expect(obstructionsAt(profile, azimuth, 89.9)).toEqual([]);
  });
});
