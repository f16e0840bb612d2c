import type { Remote } from 'comlink';
import { proxy, wrap } from 'comlink';
import type { Assessment } from '../core/shading/assessment.ts';
import type {
  AssessRequest,
  CalculationFault,
  Outcome,
  PlaceQuestion,
  ShadeQuestion,
  WeatherFileFacts,
} from '../core/shading/calculation.ts';
import type { StationSoFar } from '../core/assessment/station-so-far.ts';
import type { SurveyEvidence } from '../core/assessment/survey-evidence.ts';
import type { StationShade } from '../core/shading/station-shade.ts';
import type { Progress, ShadeEngine } from './shade-engine.ts';

/** What of an AbortSignal is used here. */
interface CancelSignal {
  readonly aborted: boolean;
  addEventListener(type: 'abort', listener: () => void): void;
  removeEventListener(type: 'abort', listener: () => void): void;
}

/** A cancelled call that has not ended after this long is ended with its worker. */
const PATIENCE_MS = 3000;

interface Running {
  worker: Worker;
  engine: Remote<ShadeEngine>;
  /** The request the worker holds. */
  held: AssessRequest | null;
  /** Resolves with the fault when the worker breaks or is ended. */
  broken: Promise<CalculationFault>;
  breakOff(fault: CalculationFault): void;
}

/** The page's side of the worker: started when first needed, started again after it broke or did not stop. */
export class AssessOnWorker {
  private running: Running | null = null;
  private tickets = 0;

  constructor(
    private readonly start: () => Worker,
    private readonly patienceMs = PATIENCE_MS,
  ) {}

  assess(request: AssessRequest, onProgress: Progress, signal: CancelSignal): Promise<Outcome<Assessment>> {
    return this.ask(request, signal, (engine, ticket) => engine.assess(ticket, proxy(onProgress)));
  }

  evidence(
    request: AssessRequest,
    onProgress: Progress,
    signal: CancelSignal,
  ): Promise<Outcome<SurveyEvidence>> {
    return this.ask(request, signal, (engine, ticket) => engine.evidence(ticket, proxy(onProgress)));
  }

  shade(
    request: AssessRequest,
    question: ShadeQuestion,
    signal: CancelSignal,
  ): Promise<Outcome<StationShade>> {
    return this.ask(request, signal, (engine, ticket) => engine.shade(ticket, question));
  }

  soFar(
    request: AssessRequest,
    question: PlaceQuestion,
    signal: CancelSignal,
  ): Promise<Outcome<StationSoFar>> {
    return this.ask(request, signal, (engine, ticket) => engine.soFar(ticket, question));
  }

  readWeatherFile(name: string, contents: ArrayBuffer): Promise<Outcome<WeatherFileFacts>> {
    const running = this.ready();
    if (!running) return Promise.resolve(notStarted);
    return settled(running.engine.readWeatherFile(name, contents), running.broken);
  }

  private async ask<T>(
    request: AssessRequest,
    signal: CancelSignal,
    call: (engine: Remote<ShadeEngine>, ticket: number) => Promise<Outcome<T>>,
  ): Promise<Outcome<T>> {
    if (signal.aborted) return { ok: false, fault: { code: 'cancelled' } };
    const running = this.ready();
    if (!running) return notStarted;
    const ticket = this.tickets++;
    // messages keep their order, so the survey is there before the question
    const held = running.held === request ? null : running.engine.hold(request);
    running.held = request;
    const answer = settled(
      Promise.all([call(running.engine, ticket), held]).then(([got]) => got),
      running.broken,
    );
    return new Promise((resolve) => {
      const stop = () => {
        this.stop(running, ticket, answer);
        resolve({ ok: false, fault: { code: 'cancelled' } });
      };
      signal.addEventListener('abort', stop);
      void answer.then((outcome) => {
        signal.removeEventListener('abort', stop);
        resolve(outcome);
      });
    });
  }

  private stop(running: Running, ticket: number, answer: Promise<unknown>): void {
    void running.engine.cancel(ticket);
    const timer = setTimeout(() => this.end(running, { code: 'cancelled' }), this.patienceMs);
    void answer.then(() => clearTimeout(timer));
  }

  private ready(): Running | null {
    try {
      this.running ??= this.started();
    } catch {
      return null; // the browser allows no worker here
    }
    return this.running;
  }

  private started(): Running {
    const worker = this.start();
    let breakOff: Running['breakOff'] = () => undefined;
    const broken = new Promise<CalculationFault>((resolve) => (breakOff = resolve));
    const running: Running = { worker, engine: wrap<ShadeEngine>(worker), held: null, broken, breakOff };
    const fail = (detail: string) => this.end(running, { code: 'failed', detail });
    worker.addEventListener('error', ({ message }) => fail(message || 'the worker did not start'));
    worker.addEventListener('messageerror', () => fail('a message could not be read'));
    return running;
  }

  private end(running: Running, fault: CalculationFault): void {
    running.breakOff(fault);
    running.worker.terminate();
    if (this.running === running) this.running = null;
  }
}

const notStarted: { ok: false; fault: CalculationFault } = {
  ok: false,
  fault: { code: 'failed', detail: 'the worker did not start' },
};

/** An answer, or the fault of the worker that breaks before it. */
function settled<T>(answer: Promise<Outcome<T>>, broken: Promise<CalculationFault>): Promise<Outcome<T>> {
  return Promise.race([
    answer.catch((error: unknown): Outcome<T> => ({
      ok: false,
      fault: { code: 'failed', detail: String(error) },
    })),
    broken.then((fault): Outcome<T> => ({ ok: false, fault })),
  ]);
}
