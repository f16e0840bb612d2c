import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { SensorSample } from '../../src/app/capture/sensor-interfaces.ts';
import { DeviceOrientation } from '../../src/sensors/device-orientation.ts';

type Angle = number | null;
interface Given {
  alpha?: Angle;
  beta?: Angle;
  gamma?: Angle;
  absolute?: boolean;
  webkitCompassHeading?: number;
}

let page: EventTarget;
let asked: { requestPermission?: () => Promise<string> };
let sensor: DeviceOrientation | null = null;

/** A page in sight on a device of which nothing is known yet. */
beforeEach(() => {
  vi.useFakeTimers();
  page = new EventTarget();
  asked = {};
  vi.stubGlobal('addEventListener', page.addEventListener.bind(page));
  vi.stubGlobal('removeEventListener', page.removeEventListener.bind(page));
  vi.stubGlobal('document', Object.assign(new EventTarget(), { visibilityState: 'visible' }));
  vi.stubGlobal('navigator', { userAgent: 'Invented (A phone; of no make) 1.0' });
  vi.stubGlobal('screen', { orientation: { angle: 90 } });
  vi.stubGlobal('DeviceOrientationEvent', asked);
});
afterEach(() => {
  sensor?.stop();
  sensor = null;
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

function event(type: 'deviceorientation' | 'deviceorientationabsolute', given: Given = {}): void {
  const angles = { alpha: 10, beta: 80, gamma: 1, absolute: type === 'deviceorientationabsolute' };
  page.dispatchEvent(Object.assign(new Event(type), angles, given));
}

/** Starts, and gives the device its events while it waits. */
async function started(events: () => void) {
  sensor = new DeviceOrientation();
  const starting = sensor.start();
  await vi.advanceTimersByTimeAsync(1);
  events();
  await vi.advanceTimersByTimeAsync(3000);
  return { sensor, outcome: await starting };
}

describe('what a device gives', () => {
  it.each<[string, () => void, object]>([
    ['tied to magnetic north', () => event('deviceorientationabsolute'), { ok: true, kind: 'magnetic' }],
    [
      'tied to north though it does not say so by the event’s name',
      () => event('deviceorientation', { absolute: true }),
      { ok: true, kind: 'magnetic' },
    ],
    ['from anywhere', () => event('deviceorientation'), { ok: true, kind: 'relative' }],
    [
      'from anywhere, where the others are empty',
      () => {
        event('deviceorientationabsolute', { alpha: null, beta: null, gamma: null });
        event('deviceorientation');
      },
      { ok: true, kind: 'relative' },
    ],
    [
      'from anywhere with a compass beside them',
      () => event('deviceorientation', { webkitCompassHeading: 120 }),
      { ok: true, kind: 'carried' },
    ],
    [
      'with a compass that is not calibrated',
      () => event('deviceorientation', { webkitCompassHeading: -1 }),
      { ok: true, kind: 'relative' },
    ],
    [
      'empty',
      () => event('deviceorientation', { alpha: null, beta: null, gamma: null }),
      { ok: false, why: 'no-angles' },
    ],
    ['no numbers', () => event('deviceorientation', { beta: NaN }), { ok: false, why: 'no-angles' }],
    ['not there', () => undefined, { ok: false, why: 'no-sensor' }],
  ])('is told apart: angles %s', async (_, events, outcome) => {
    expect((await started(events)).outcome).toEqual(outcome);
  });

  it.each(['denied', 'no answer'])('is not listened to where leave is %s', async (answer) => {
    asked.requestPermission = () =>
      answer === 'denied' ? Promise.resolve('denied') : Promise.reject(new Error('no gesture'));
    const { outcome } = await started(() => event('deviceorientation'));
    expect(outcome).toEqual({ ok: false, why: 'refused' });
  });
});

describe('a device at work', () => {
  async function atWork() {
    const { sensor: working } = await started(() => event('deviceorientationabsolute'));
    const samples: SensorSample[] = [];
    const broke = vi.fn();
    working.onBreak(broke);
    const end = working.listen((sample) => samples.push(sample));
    return { samples, broke, end };
  }

  it('gives its angles as they are, with how the screen is turned', async () => {
    const { samples, end } = await atWork();
    await vi.advanceTimersByTimeAsync(100);
    end();
    expect(samples.length).toBeGreaterThan(2);
    expect(samples[0]).toMatchObject({ alpha: 10, beta: 80, gamma: 1, absolute: true, screenAngle: 90 });
  });

  it.each<[string, Given]>([
    ['null', { alpha: null, beta: null, gamma: null }],
    ['NaN', { alpha: NaN }],
    ['endless', { gamma: Infinity }],
  ])('whose angles become %s breaks off, and gives nothing until they are back', async (_, given) => {
    const { samples, broke, end } = await atWork();
    await vi.advanceTimersByTimeAsync(100);
    event('deviceorientationabsolute', given);
    expect(broke).toHaveBeenCalledTimes(1);
    const before = samples.length;
    await vi.advanceTimersByTimeAsync(200);
    expect(samples).toHaveLength(before);
    event('deviceorientationabsolute', { alpha: 50 });
    await vi.advanceTimersByTimeAsync(100);
    end();
    expect(samples.at(-1)).toMatchObject({ alpha: 50 });
    expect(samples.every(({ alpha, beta, gamma }) => [alpha, beta, gamma].every(Number.isFinite))).toBe(true);
  });

  it('out of sight breaks off', async () => {
    const { broke, end } = await atWork();
    Object.assign(document, { visibilityState: 'hidden' });
    document.dispatchEvent(new Event('visibilitychange'));
    end();
    expect(broke).toHaveBeenCalledTimes(1);
  });
});
