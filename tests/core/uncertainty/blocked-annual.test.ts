import { describe, expect, test } from 'vitest';
import { annualLight } from '../../../src/core/uncertainty/annual-light.ts';
import type { Deviations } from '../../../src/core/uncertainty/blocked-annual.ts';
import { BlockedAnnual } from '../../../src/core/uncertainty/blocked-annual.ts';
import { drawnRegions } from '../../../src/core/uncertainty/drawn-regions.ts';
import { randomSource } from '../../../src/core/uncertainty/random-source.ts';
import { skyMap } from '../../../src/core/shading/sky-map.ts';
import type { Months } from '../../../src/core/survey/survey.ts';
import { sampleSurvey } from '../survey/sample-surveys.ts';
import type { Scene } from './drawn-scenes.ts';
import { lightOf, rebuiltAccess, sampleScenes, scenesOf } from './drawn-scenes.ts';

/** How far a draw's change of access may be from the whole rebuild's, percentage points: each, and root mean square. */
const EACH = 0.03;
const ROOT_MEAN_SQUARE = 0.012;

function countingOf({ map, station }: Scene) {
  const { obstructions } = station;
  const keys = Array.from({ length: 12 }, (_, m) => obstructions.map((o) => o.transmittance[m]).join());
  const light = annualLight(map, keys);
  const regions = drawnRegions(obstructions);
  const counting = new BlockedAnnual(light, regions, obstructions.length);
  const lost = new Float64Array(obstructions.length * light.classes);
  obstructions.forEach(({ transmittance }, o) =>
    transmittance.forEach((passes, m) => (lost[o * light.classes + light.classOfMonth[m]] = 1 - passes)),
  );
  const still: Deviations = {
    azimuth: new Float64Array(regions.sightings.length),
    elevation: new Float64Array(regions.sightings.length),
    stray: new Float64Array(regions.edgeStray.length),
    lost,
  };
  const access = (deviations: Deviations) => {
    const { direct, even } = counting.take(deviations);
    return 1 - (direct + even) / (light.direct + light.even + light.ground);
  };
  return { light, regions, still, access };
}

/** The traces with every point moved. */
function moved({ station }: Scene, { azimuth, elevation }: Deviations) {
  let at = 0;
  return station.obstructions.map((obstruction) => ({
    ...obstruction,
    traces: obstruction.traces.map((trace) => ({
      ...trace,
      points: trace.points.map((point) => {
        const i = at++;
        return {
          azimuth: (point.azimuth + azimuth[i] + 720) % 360,
          elevation: point.elevation + elevation[i],
        };
      }),
    })),
  }));
}

describe('a draw is a whole rebuild, nearly', () => {
  test.each(sampleScenes().map((scene) => [scene.name, scene] as const))('%s', (_, scene) => {
    const { still, access } = countingOf(scene);
    const [start, exactStart] = [access(still), rebuiltAccess(scene.map, scene.station.obstructions)];
    expect(100 * Math.abs(start - exactStart)).toBeLessThan(EACH);
    const random = randomSource('rebuild', scene.name);
    let squares = 0;
    for (let draw = 0; draw < 20; draw++) {
      const [heading, index] = [4 * random.normal(), 0.7 * random.normal()];
      const drawn: Deviations = {
        ...still,
        azimuth: still.azimuth.map(() => heading + 0.4 * random.normal()),
        elevation: still.elevation.map(() => index + 0.4 * random.normal()),
      };
      const exact = rebuiltAccess(scene.map, moved(scene, drawn)) - exactStart;
      const difference = 100 * (access(drawn) - start - exact);
      expect(Math.abs(difference)).toBeLessThan(EACH);
      squares += difference ** 2 / 20;
    }
    expect(Math.sqrt(squares)).toBeLessThan(ROOT_MEAN_SQUARE);
  });

  test('with transmittances drawn too', () => {
    const survey = sampleSurvey('two-trees-one-behind-the-other.json');
    for (const scene of scenesOf(survey)) {
      const { light, still, access } = countingOf(scene);
      const lost = still.lost.map((share) => Math.max(0, share - 0.13));
      const changed = scene.station.obstructions.map((obstruction, o) => ({
        ...obstruction,
        transmittance: obstruction.transmittance.map(
          (_, m) => 1 - lost[o * light.classes + light.classOfMonth[m]],
        ) as Months,
      }));
      const exact = rebuiltAccess(scene.map, changed) - rebuiltAccess(scene.map, scene.station.obstructions);
      expect(100 * exact).toBeGreaterThan(0.3);
      expect(100 * Math.abs(access({ ...still, lost }) - access(still) - exact)).toBeLessThan(EACH);
    }
  });

  test('with edges astray: a drawn edge cut into many along its parabola', () => {
    const [scene] = scenesOf(sampleSurvey('valley-full-horizon.json'));
    const { regions, still, access } = countingOf(scene);
    const random = randomSource('astray');
    const stray = still.stray.map((_, edge) => (regions.edgeStraight[edge] ? 0 : 2 * random.normal()));
    const { sightings, edgeStart, edgeTurn } = regions;
    let first = 0;
    const bent = scene.station.obstructions.map((obstruction) => ({
      ...obstruction,
      traces: obstruction.traces.map((trace) => {
        const from = first;
        first += trace.points.length;
        if (trace.straight || trace.shape !== 'skyline') return trace;
        const points = trace.points.flatMap((point, i) => {
          const edge = edgeStart.findIndex(
            (corner) => regions.before[corner] === from + i && corner === from + i,
          );
          const nextIndex = i + 1 < trace.points.length ? i + 1 : 0;
          if (edge < 0 || (nextIndex === 0 && !trace.fullCircle)) return [point];
          const next = sightings[from + nextIndex];
          return Array.from({ length: 24 }, (_, k) => {
            const u = k / 24;
            return {
              azimuth: (point.azimuth + u * edgeTurn[edge] + 360) % 360,
              elevation:
                point.elevation + u * (next.elevation - point.elevation) + 4 * u * (1 - u) * stray[edge],
            };
          });
        });
        return { ...trace, points };
      }),
    }));
    // Corners and sightings go side by side only where no line comes before the trace.
    expect(scene.station.obstructions[0].traces[0].shape).toBe('skyline');
    const onlyFirst = stray.map((value, edge) => (edge < regions.regions[0].lastEdge ? value : 0));
    const exactBent = [bent[0], ...scene.station.obstructions.slice(1)];
    const exact = rebuiltAccess(scene.map, exactBent) - rebuiltAccess(scene.map, scene.station.obstructions);
    expect(Math.abs(100 * exact)).toBeGreaterThan(0.05);
    expect(100 * Math.abs(access({ ...still, stray: onlyFirst }) - access(still) - exact)).toBeLessThan(EACH);
  });

  test('behind Perez’s band and on a wall', () => {
    const survey = sampleSurvey('polar-wall-and-steep-roof.json');
    const light = lightOf({ ...survey, transposition: 'perez' });
    for (const scene of scenesOf(survey, light)) {
      const map = skyMap(light.year, light.grid, 90, scene.map.surfaceAzimuth);
      const { still, access } = countingOf({ ...scene, map });
      expect(100 * Math.abs(access(still) - rebuiltAccess(map, scene.station.obstructions))).toBeLessThan(
        EACH,
      );
    }
  });
});
