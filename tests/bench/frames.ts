import { existsSync } from 'node:fs';
import type { Page } from 'playwright-core';
import type { DeviceAngles } from '../../src/core/pointing/attitude.ts';
import { PHONE_CONTEXT, phoneBrowser, quaternion } from '../browser/capture-phone.ts';
import { bareSurvey, magneticLook, newStation } from '../browser/capture-steps.ts';
import { FileServer } from '../browser/file-server.ts';
import { imported } from '../browser/survey-files.ts';

/** Frames of the page over some time. */
interface Frames {
  count: number;
  medianMs: number;
  p95Ms: number;
  /** Share that took over 33 ms, 0 to 1. */
  over33: number;
}

/** Frame times of the strip while a sweep goes on, or why they could not be measured. */
export type FrameTimes =
  | {
      throttling: number;
      /** Orientation events a second that the page was given. */
      events: number;
      sweeping: Frames;
      /** The same screen before, the phone still: what the machine itself gives at the time. */
      resting: Frames;
      /** Live figures that came while sweeping. */
      refreshed: number;
    }
  | { skipped: string };

/** The processor is made this many times slower, as of a cheap phone against a desk. */
const THROTTLING = 4;
const SWEEP_MS = 10_000;
const REST_MS = 3_000;
const EVENTS_PER_SECOND = 60;

/** Sweeps for ten seconds in a built app, with sixty orientation events a second under a slowed processor. */
export async function frameTimes(folder: string): Promise<FrameTimes> {
  const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium';
  if (!existsSync(chromium)) return { skipped: `no Chromium at ${chromium}; set CHROMIUM to its path` };
  const server = new FileServer(folder);
  await server.start();
  const browser = await phoneBrowser();
  try {
    const page = await (await browser.newContext(PHONE_CONTEXT)).newPage();
    // the TypeScript runner wraps inner functions in a call of this name, which a page does not have
    await page.addInitScript('globalThis.__name = (named) => named');
    return await sweepOn(page, server.address);
  } finally {
    await browser.close();
    await server.kill();
  }
}

async function sweepOn(page: Page, address: string): Promise<FrameTimes> {
  await page.goto(address);
  await page.getByRole('main').waitFor();
  const cdp = await page.context().newCDPSession(page);
  await cdp.send('Emulation.setSensorOverrideEnabled', { enabled: true, type: 'absolute-orientation' });
  await page.reload();
  await page.getByRole('main').waitFor();
  await cdp.send('Emulation.setSensorOverrideReadings', {
    type: 'absolute-orientation',
    reading: { quaternion: quaternion(lookAt(0)) },
  });
  await imported(page, bareSurvey());
  await page.getByRole('link', { name: 'Bare house' }).first().tap();
  await newStation(page);
  await page.getByRole('button', { name: 'With the camera' }).tap();
  await page.locator('.live-access').waitFor();
  await cdp.send('Emulation.setCPUThrottlingRate', { rate: THROTTLING });
  const resting = await page.evaluate(watched, { angles: [], lengthMs: REST_MS });
  await page.getByRole('button', { name: 'Start sweep' }).tap();
  await page.getByRole('button', { name: 'End sweep' }).waitFor();
  const steps = (EVENTS_PER_SECOND * SWEEP_MS) / 1000;
  const angles = Array.from({ length: steps }, (_, step) => lookAt(step / steps));
  const sweeping = await page.evaluate(watched, { angles, lengthMs: SWEEP_MS });
  return {
    throttling: THROTTLING,
    events: (1000 * sweeping.events) / SWEEP_MS,
    sweeping: framesOf(sweeping.frames),
    resting: framesOf(resting.frames),
    refreshed: sweeping.refreshed,
  };
}

/** Along an edge that rises and falls, with a tremor. */
const lookAt = (at: number): DeviceAngles =>
  magneticLook(100 + 160 * at + 0.2 * Math.sin(90 * at), 15 + 12 * Math.sin(9 * at));

/** In the page: plays orientation events and notes when each frame comes and each new live figure. */
function watched({ angles, lengthMs }: { angles: DeviceAngles[]; lengthMs: number }) {
  return new Promise<{ frames: number[]; events: number; refreshed: number }>((done) => {
    const found = { frames: [] as number[], events: 0, refreshed: 0 };
    const observer = new MutationObserver(() => found.refreshed++);
    const strip = document.querySelector('.strip');
    if (strip) observer.observe(strip, { subtree: true, childList: true, characterData: true });
    const timer = setInterval(
      () => {
        const angle = angles[found.events];
        if (!angle) return;
        found.events++;
        dispatchEvent(new DeviceOrientationEvent('deviceorientationabsolute', { ...angle, absolute: true }));
      },
      lengthMs / Math.max(1, angles.length),
    );
    const start = performance.now();
    let last = start;
    const frame = (now: number) => {
      found.frames.push(now - last);
      last = now;
      if (now - start < lengthMs) return requestAnimationFrame(frame);
      clearInterval(timer);
      observer.disconnect();
      done(found);
    };
    requestAnimationFrame(frame);
  });
}

function framesOf(frames: readonly number[]): Frames {
  const sorted = [...frames].sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
  const over33 = frames.filter((ms) => ms > 33).length / frames.length;
  return { count: frames.length, medianMs: at(0.5), p95Ms: at(0.95), over33 };
}

/** What was measured, as lines to print. */
export function frameWords(times: FrameTimes): string {
  if ('skipped' in times) return `Frames while sweeping: not measured, ${times.skipped}`;
  const { throttling, events, sweeping, resting, refreshed } = times;
  const words = ({ count, medianMs, p95Ms, over33 }: Frames) =>
    `${count} frames, median ${medianMs.toFixed(1)} ms, 95th percentile ${p95Ms.toFixed(1)} ms, ${(100 * over33).toFixed(1)} % over 33 ms`;
  return [
    `Sighting screen, processor slowed ${throttling} times, ${events.toFixed(0)} orientation events a second`,
    `sweeping: ${words(sweeping)}; strip drawn anew ${refreshed} times`,
    `phone still: ${words(resting)}`,
  ].join('\n');
}
