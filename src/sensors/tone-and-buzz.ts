import type { Feedback } from '../app/capture/sensor-interfaces.ts';

interface Tone {
  /** Hz. */
  pitch: number;
  /** Seconds. */
  length: number;
  buzz: number | number[];
}

const TAKEN: Tone = { pitch: 880, length: 0.12, buzz: 60 };
const REFUSED: Tone = { pitch: 220, length: 0.35, buzz: [80, 60, 80] };

/** A short tone and a short buzz, since a glove and a glaring sky hide the screen. */
export class ToneAndBuzz implements Feedback {
  private context: AudioContext | null = null;

  prime(): void {
    if (typeof AudioContext === 'undefined') return;
    this.context ??= new AudioContext();
    void this.context.resume().catch(() => undefined);
  }

  taken(): void {
    this.tell(TAKEN);
  }

  refused(): void {
    this.tell(REFUSED);
  }

  private tell({ pitch, length, buzz }: Tone): void {
    if ('vibrate' in navigator) navigator.vibrate(buzz);
    const { context } = this;
    if (context?.state !== 'running') return;
    const [oscillator, gain] = [context.createOscillator(), context.createGain()];
    oscillator.frequency.value = pitch;
    // A tone that ends at once clicks.
    gain.gain.setValueAtTime(0.4, context.currentTime);
    gain.gain.exponentialRampToValueAtTime(0.001, context.currentTime + length);
    oscillator.connect(gain).connect(context.destination);
    oscillator.start();
    oscillator.stop(context.currentTime + length);
  }
}
