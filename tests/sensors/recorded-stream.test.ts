import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { PRACTICE_SITE, isPracticeSurvey } from '../../src/app/capture/practice-place.ts';
import { magneticDeclination } from '../../src/core/pointing/declination.ts';
import { directionOf } from '../../src/core/angles/vectors.ts';
import { sightVector } from '../../src/core/pointing/attitude.ts';
import { steadiness } from '../../src/core/pointing/steadiness.ts';
import { usableShadowHours } from '../../src/core/pointing/usable-shadow-hours.ts';
import {
  rests,
  rowAt,
  type RecordedPart,
  type RecordedStream,
  type Recordings,
} from '../../src/sensors/recorded-stream.ts';
import { ReplayedOrientation } from '../../src/sensors/replayed-orientation.ts';

const recordings = JSON.parse(
  readFileSync(new URL('../../public/practice-recording.json', import.meta.url), 'utf8'),
) as Recordings;

const part: RecordedPart = {
  cue: '',
  rows: [
    [0, 0, 10, 0],
    [50, 1, 11, 0],
    [100, 2, 12, 0],
    [150, 3, 13, 0],
    [200, 4, 14, 0],
  ],
  restFrom: 2,
};

describe('a recorded part', () => {
  it('plays its way once, then its rest to and fro', () => {
    const alphas = [0, 60, 100, 160, 200, 260, 299, 301, 360].map((ms) => rowAt(part, ms)[1]);
    expect(alphas).toEqual([0, 1, 2, 3, 4, 2, 2, 2, 3]);
    expect(rests(part, 99)).toBe(false);
    expect(rests(part, 100)).toBe(true);
  });

  it('stands still where it has one row to rest in', () => {
    expect(rowAt({ ...part, restFrom: 4 }, 10_000)).toEqual([200, 4, 14, 0]);
  });
});

describe.each(Object.entries(recordings) as [string, RecordedStream][])(
  'the recording of %s',
  (_name, stream) => {
    it('has finite angles in order of time, and a rest that is steady enough to be taken', () => {
      for (const { rows, restFrom, cue } of stream.parts) {
        expect(cue).toMatch(/\.$/);
        rows.forEach((row, i) => {
          expect(row.every(Number.isFinite)).toBe(true);
          if (i > 0) expect(row[0]).toBeGreaterThan(rows[i - 1][0]);
        });
        const rest = rows.slice(restFrom, restFrom + 12);
        const axis = cue.includes('shadow') ? 'top-edge' : 'camera';
        expect(steadiness(rest, { axis, handHeld: false }).steady, cue).toBe(true);
      }
    });

    it('is made while the sun throws a shadow to go by', () => {
      const atMs = Date.parse(stream.startedAt);
      const [year, month, day] = stream.startedAt.slice(0, 10).split('-').map(Number);
      const hours = usableShadowHours({ year, month, day }, PRACTICE_SITE);
      expect(hours.some(({ fromMs, toMs }) => atMs > fromMs && atMs + 600_000 < toMs)).toBe(true);
    });
  },
);

describe('a replayed sensor', () => {
  it('moves on only when told, and its clock never runs back', async () => {
    let pageMs = 0;
    const sensor = new ReplayedOrientation(recordings.sighting, () => pageMs);
    expect(await sensor.start()).toEqual({ ok: true, kind: 'magnetic' });
    const heard: number[] = [];
    const samples: number[] = [];
    sensor.recording.onCue(() => heard.push(sensor.recording.cue().place));
    const stop = sensor.listen(({ timeMs }) => samples.push(timeMs));
    pageMs = 60_000;
    await expect.poll(() => samples.length).toBeGreaterThan(0);
    expect(sensor.recording.cue()).toMatchObject({ place: 0, resting: true, count: 12 });
    sensor.recording.goOn();
    expect(sensor.recording.cue()).toMatchObject({ place: 1, resting: false });
    pageMs = 61_000;
    const first = samples.length;
    await expect.poll(() => samples.length).toBeGreaterThan(first);
    stop();
    expect([...samples].sort((a, b) => a - b)).toEqual(samples);
    expect(samples.at(-1)! - Date.parse(recordings.sighting.startedAt)).toBe(61_000);
    expect(heard).toContain(1);
  });

  it('has a compass that is off as it says, which a check finds', () => {
    const { parts } = recordings.sighting;
    const tip = parts[4].rows.at(-1)!;
    const [, alpha, beta, gamma] = tip;
    const { declination } = magneticDeclination({
      ...PRACTICE_SITE,
      timeMs: Date.parse(recordings.sighting.startedAt),
    });
    const { azimuth, elevation } = directionOf(sightVector({ alpha, beta, gamma }));
    expect(azimuth + declination - 152).toBeCloseTo(4, 0);
    expect(elevation).toBeCloseTo(17, 0);
  });
});

describe('a practice survey', () => {
  it('is told by its place', () => {
    expect(isPracticeSurvey({ site: { ...PRACTICE_SITE } })).toBe(true);
    expect(isPracticeSurvey({ site: { ...PRACTICE_SITE, latitude: 47.26 } })).toBe(false);
  });
});
