import { expose } from 'comlink';
import { afterEach, describe, expect, it } from 'vitest';
import { ClimateSource } from '../../src/workers/climate-source.ts';
import { AssessOnWorker } from '../../src/workers/assess-on-worker.ts';
import { ShadeEngine } from '../../src/workers/shade-engine.ts';
import { sampleSurvey, underClearSky } from '../report/sample-shades.ts';

const survey = underClearSky(sampleSurvey('two-trees-one-behind-the-other.json'));
const request = { survey, stepMinutes: 15 };
const question = { plane: survey.planes[0].id, station: survey.stations[0].id, changes: [] };

/** A worker's end and the engine behind it, over a real message channel. */
class ChannelWorker extends EventTarget {
  static readonly all: ChannelWorker[] = [];
  readonly channel = new MessageChannel();
  holds = 0;
  terminated = false;

  constructor(breathe = () => new Promise<void>((resolve) => setTimeout(resolve))) {
    super();
    ChannelWorker.all.push(this);
    const engine = new ShadeEngine(new ClimateSource(() => Promise.reject(new Error('none'))), breathe);
    const hold = engine.hold.bind(engine);
    engine.hold = (held) => {
      this.holds++;
      hold(held);
    };
    expose(engine, this.channel.port2);
    this.channel.port2.start();
    this.channel.port1.addEventListener('message', ({ data, ports }) =>
      this.dispatchEvent(
        new MessageEvent('message', { data: data as unknown, ports: [...ports] as MessagePort[] }),
      ),
    );
    this.channel.port1.start();
  }

  postMessage(message: unknown, transfer: Transferable[]): void {
    this.channel.port1.postMessage(message, transfer as never);
  }

  breakDown(message: string): void {
    this.dispatchEvent(Object.assign(new Event('error'), { message }));
  }

  terminate(): void {
    this.terminated = true;
    this.channel.port1.close();
    this.channel.port2.close();
  }
}

const clientOn = (make: () => ChannelWorker = () => new ChannelWorker()) =>
  new AssessOnWorker(() => make() as unknown as Worker);
const quiet = () => new AbortController().signal;

afterEach(() => ChannelWorker.all.splice(0).forEach((worker) => worker.terminate()));

describe('the page’s side of the worker', () => {
  it('starts one worker, hands a survey over once and brings answers back', async () => {
    const client = clientOn();
    const shares: number[] = [];
    const assessed = await client.assess(request, (share) => shares.push(share), quiet());
    const shade = await client.shade(request, question, quiet());
    expect(assessed.ok && shade.ok).toBe(true);
    if (assessed.ok && shade.ok) {
      const station = assessed.value.planes[0].stations.find(({ id }) => id === question.station)!;
      const { interval, ...solarAccess } = station.solarAccess;
      expect(shade.value.measured).toEqual({ ...station, solarAccess });
      expect(interval).toBeDefined();
    }
    expect(shares.length).toBeGreaterThan(1);
    expect(ChannelWorker.all).toHaveLength(1);
    expect(ChannelWorker.all[0].holds).toBe(1);
  });

  it('takes another survey over when the request is another', async () => {
    const client = clientOn();
    await client.shade(request, question, quiet());
    await client.shade({ ...request }, question, quiet());
    expect(ChannelWorker.all[0].holds).toBe(2);
  });

  it('gives a cancelled call back at once and answers the next one', async () => {
    const client = clientOn();
    const cancel = new AbortController();
    const outcome = await client.assess(request, () => cancel.abort(), cancel.signal);
    expect(outcome).toEqual({ ok: false, fault: { code: 'cancelled' } });
    expect((await client.shade(request, question, quiet())).ok).toBe(true);
    expect(ChannelWorker.all).toHaveLength(1);
    expect(await client.assess(request, () => undefined, AbortSignal.abort())).toMatchObject({
      fault: { code: 'cancelled' },
    });
  });

  it('ends a worker that does not stop when asked, and starts another', async () => {
    const never = () => new Promise<void>(() => undefined);
    let first = true;
    const client = new AssessOnWorker(() => {
      const worker = first ? new ChannelWorker(never) : new ChannelWorker();
      first = false;
      return worker as unknown as Worker;
    }, 0);
    const cancel = new AbortController();
    const outcome = client.assess(request, () => undefined, cancel.signal);
    cancel.abort();
    expect(await outcome).toMatchObject({ fault: { code: 'cancelled' } });
    await expect.poll(() => ChannelWorker.all[0].terminated).toBe(true);
    expect((await client.shade(request, question, quiet())).ok).toBe(true);
    expect(ChannelWorker.all).toHaveLength(2);
  });

  it('tells where no worker can be started', async () => {
    const client = new AssessOnWorker(() => {
      throw new Error('not allowed');
    });
    const fault = { code: 'failed', detail: 'the worker did not start' };
    expect(await client.shade(request, question, quiet())).toEqual({ ok: false, fault });
    expect(await client.readWeatherFile('a', new ArrayBuffer(1))).toEqual({ ok: false, fault });
  });

  it('tells that a worker broke, and starts another for the next call', async () => {
    const never = () => new Promise<void>(() => undefined);
    let first = true;
    const client = clientOn(() => {
      const worker = first ? new ChannelWorker(never) : new ChannelWorker();
      first = false;
      return worker;
    });
    const waiting = client.assess(request, () => undefined, quiet());
    ChannelWorker.all[0].breakDown('out of memory');
    expect(await waiting).toEqual({ ok: false, fault: { code: 'failed', detail: 'out of memory' } });
    expect(ChannelWorker.all[0].terminated).toBe(true);
    expect((await client.shade(request, question, quiet())).ok).toBe(true);
    expect(ChannelWorker.all).toHaveLength(2);
  });
});
