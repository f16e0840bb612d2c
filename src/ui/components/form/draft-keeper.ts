import { signal } from '@preact/signals';
import type { DraftStore, FormDraft } from '../../../app/draft-store.ts';

/** Counts what was kept and dropped, so that offers of unfinished forms are looked up anew. */
export const draftTurns = signal(0);

/** So long after the last key the typed is stored, milliseconds. */
const PAUSE_MS = 300;

/** Keeps one form's draft: a little after each key, and at once where the app goes out of sight. */
export class DraftKeeper {
  #waiting: FormDraft | null = null;
  #timer: ReturnType<typeof setTimeout> | undefined;
  #finished = false;
  /** Whether there may be something stored. */
  #stored = false;

  constructor(
    private readonly store: DraftStore,
    private readonly name: Omit<FormDraft, 'typed'>,
  ) {}

  async read(): Promise<FormDraft | null> {
    const draft = await this.store.read(this.name.survey, this.name.form).catch(() => null);
    this.#stored ||= draft !== null;
    return draft;
  }

  type(typed: FormDraft['typed']): void {
    this.#waiting = { ...this.name, typed };
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => this.flush(), PAUSE_MS);
  }

  flush(): void {
    clearTimeout(this.#timer);
    const draft = this.#waiting;
    this.#waiting = null;
    if (draft === null || this.#finished) return;
    this.#stored = true;
    this.#tell(this.store.keep(draft));
  }

  /** Nothing typed is left: it was saved, given up, or is as it was. */
  drop(): void {
    clearTimeout(this.#timer);
    this.#waiting = null;
    if (!this.#stored) return;
    this.#stored = false;
    this.#tell(this.store.drop(this.name.survey, this.name.form));
  }

  finish(): void {
    this.drop();
    this.#finished = true;
  }

  /** A draft that finds no room is a convenience lost; saving the form itself tells what is wrong. */
  #tell(done: Promise<void>): void {
    void done.catch(() => undefined).then(() => draftTurns.value++);
  }
}
