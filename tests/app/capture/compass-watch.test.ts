import { describe, expect, it } from 'vitest';
import { CompassWatch, frameTurn, MOST_WANDER } from '../../../src/app/capture/compass-watch.ts';
import { livePointing } from '../../../src/app/capture/live-pointing.ts';
import type { SensorSample } from '../../../src/app/capture/sensor-interfaces.ts';
import { cameraAt, topEdgeAt } from '../../sensors/posed-phone.ts';

/** A sample whose compass says one azimuth and whose gyroscope another. */
function sample(compass: number, gyroscope: number, elevation = 10, timeMs = 0): SensorSample {
  return {
    ...cameraAt(compass, elevation),
    timeMs,
    eventMs: timeMs,
    absolute: true,
    compassHeading: null,
    compassAccuracy: null,
    byGyroscope: cameraAt(gyroscope, elevation),
    screenAngle: 0,
  };
}

describe('compass and gyroscope', () => {
  it('differ by one turn about the vertical, in every pose', () => {
    for (const elevation of [-60, 0, 0.01, 45, 88])
      for (const azimuth of [0, 90, 200, 359])
        expect(frameTurn(sample(azimuth, azimuth + 30, elevation))).toBeCloseTo(30, 6);
    expect(frameTurn({ ...sample(10, 20), byGyroscope: null })).toBeNull();
  });

  it('that part by more than a compass may wander are a sign of steel', () => {
    const watch = new CompassWatch();
    expect(watch.apart(sample(100, 40))).toBeCloseTo(0, 6);
    expect(watch.apart(sample(160, 100, 30, 1000))).toBeCloseTo(0, 6);
    expect(watch.apart(sample(172, 100, 30, 2000))!).toBeGreaterThan(MOST_WANDER);
  });

  it('are compared anew after a minute, so that slow drift is let be', () => {
    const watch = new CompassWatch();
    watch.apart(sample(100, 40));
    expect(watch.apart(sample(112, 40, 10, 61_000))).toBeCloseTo(0, 6);
  });
});

describe('the live pointing', () => {
  it('has no azimuth without a heading, and keeps its elevation', () => {
    const live = livePointing(sample(100, 40, 33), 'camera', null);
    expect(live).toMatchObject({ azimuth: null, azimuthDeviation: null });
    expect(live.elevation).toBeCloseTo(33, 6);
    expect(live.elevationDeviation).toBeGreaterThan(0.5);
  });

  it('tells how far from flat the phone is', () => {
    const flat = { ...sample(0, 0), ...topEdgeAt(30, 5) };
    expect(livePointing(flat, 'top-edge', null).fromFlat).toBeCloseTo(5, 6);
  });
});
