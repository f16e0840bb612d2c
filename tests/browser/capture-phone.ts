import { existsSync } from 'node:fs';
import { chromium, type Browser, type BrowserContext, type CDPSession, type Page } from 'playwright-core';
import { fullCircle, RADIANS } from '../../src/core/angles/angles.ts';
import type { DeviceAngles } from '../../src/core/pointing/attitude.ts';

const ARGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--no-first-run',
  '--disable-background-networking',
  '--use-fake-device-for-media-stream',
];
/** What a person answers when the browser asks for the camera. */
const ANSWERS = { allow: '--use-fake-ui-for-media-stream', refuse: '--deny-permission-prompts' } as const;

export const PHONE_CONTEXT = {
  viewport: { width: 390, height: 844 },
  hasTouch: true,
  isMobile: true,
  deviceScaleFactor: 2,
  locale: 'en-GB',
} as const;

/** A browser of a phone with a camera. */
export function phoneBrowser(camera: keyof typeof ANSWERS = 'allow'): Promise<Browser> {
  return chromium.launch({ executablePath: executable(), args: [...ARGS, ANSWERS[camera]] });
}

/** The same with its data in a folder, so that it is there again after the browser was killed. */
export function phoneWithFolder(folder: string): Promise<BrowserContext> {
  return chromium.launchPersistentContext(folder, {
    ...PHONE_CONTEXT,
    executablePath: executable(),
    args: [...ARGS, ANSWERS.allow],
  });
}

function executable(): string {
  const path = process.env.CHROMIUM ?? '/usr/bin/chromium';
  if (!existsSync(path)) throw new Error(`no browser at ${path}; set CHROMIUM to its path`);
  return path;
}

/** Which events a phone gives. */
export type Sensor = 'absolute' | 'relative' | 'with-compass' | 'none';

interface Turn {
  (at: number): DeviceAngles;
}

/** A phone in a hand: it points, trembles and sweeps, and the page gets the events of its sensor. */
export class HeldPhone {
  private angles: DeviceAngles = { alpha: 0, beta: 0, gamma: 0 };
  private beat = 0;
  private timer: NodeJS.Timeout | null = null;
  private busy = false;
  private turn: { path: Turn; startMs: number; lengthMs: number; done: () => void } | null = null;

  private constructor(
    private readonly page: Page,
    private readonly cdp: CDPSession,
    private readonly sensor: Sensor,
    /** Azimuth from magnetic north less azimuth in the frame of the events, for a phone that has both. */
    private readonly compassTurn: number,
  ) {}

  /** Enables the sensor of a page and loads it anew: a page that is open has no listener to what comes later. */
  static async of(page: Page, sensor: Sensor, compassTurn = 0): Promise<HeldPhone> {
    const cdp = await page.context().newCDPSession(page);
    if (sensor === 'absolute') {
      await enableAbsolute(cdp);
      await page.reload();
      await page.getByRole('main').waitFor();
    }
    const phone = new HeldPhone(page, cdp, sensor, compassTurn);
    if (sensor !== 'none') phone.begin();
    return phone;
  }

  /** Enables the sensor of a page that is still empty, and opens an address with it: one load in place of two. */
  static async at(page: Page, address: string): Promise<HeldPhone> {
    const cdp = await page.context().newCDPSession(page);
    await enableAbsolute(cdp);
    await page.goto(address);
    const phone = new HeldPhone(page, cdp, 'absolute', 0);
    phone.begin();
    await page.getByRole('main').waitFor();
    return phone;
  }

  private begin(): void {
    this.timer = setInterval(() => void this.tick(), 30);
  }

  point(angles: DeviceAngles): void {
    this.angles = angles;
  }

  /** Moves along a path, from 0 to 1, in some time; resolves when it is there. */
  move(path: Turn, lengthMs: number): Promise<void> {
    return new Promise((done) => {
      this.turn = { path, startMs: Date.now(), lengthMs, done };
    });
  }

  put(): void {
    if (this.timer) clearInterval(this.timer);
    this.timer = null;
  }

  private async tick(): Promise<void> {
    if (this.busy) return;
    this.busy = true;
    this.beat++;
    this.follow();
    // a tremor of a tenth or two, the same each time
    const shake = (every: number) => 0.15 * Math.sin(this.beat * every);
    const { alpha, beta, gamma } = this.angles;
    try {
      await this.send({ alpha: fullCircle(alpha + shake(0.9)), beta: beta + shake(0.7), gamma });
    } catch {
      this.put(); // the page is gone
    }
    this.busy = false;
  }

  private follow(): void {
    const { turn } = this;
    if (!turn) return;
    const at = Math.min(1, (Date.now() - turn.startMs) / turn.lengthMs);
    this.angles = turn.path(at);
    if (at < 1) return;
    this.turn = null;
    turn.done();
  }

  private async send({ alpha, beta, gamma }: DeviceAngles): Promise<void> {
    if (this.sensor === 'absolute')
      await this.cdp.send('Emulation.setSensorOverrideReadings', {
        type: 'absolute-orientation',
        reading: { quaternion: quaternion({ alpha, beta, gamma }) },
      });
    else if (this.sensor === 'relative')
      await this.cdp.send('DeviceOrientation.setDeviceOrientationOverride', { alpha, beta, gamma });
    else await this.page.evaluate(dispatchWithCompass, { alpha, beta, gamma, turn: this.compassTurn });
  }
}

const enableAbsolute = (cdp: CDPSession) =>
  cdp.send('Emulation.setSensorOverrideEnabled', { enabled: true, type: 'absolute-orientation' });

/** An event as phones give it that have a compass heading beside the angles. */
function dispatchWithCompass(given: DeviceAngles & { turn: number }): void {
  const event = new DeviceOrientationEvent('deviceorientation', { ...given, absolute: false });
  const heading = (((360 - given.alpha + given.turn) % 360) + 360) % 360;
  Object.defineProperties(event, {
    webkitCompassHeading: { value: heading },
    webkitCompassAccuracy: { value: 10 },
  });
  dispatchEvent(event);
}

/** W3C: the turns about z, x and y one after the other. */
export function quaternion({ alpha, beta, gamma }: DeviceAngles) {
  const half = [beta, gamma, alpha].map((angle) => (angle * RADIANS) / 2);
  const [cx, cy, cz] = half.map(Math.cos);
  const [sx, sy, sz] = half.map(Math.sin);
  return {
    x: sx * cy * cz - cx * sy * sz,
    y: cx * sy * cz + sx * cy * sz,
    z: cx * cy * sz + sx * sy * cz,
    w: cx * cy * cz - sx * sy * sz,
  };
}
