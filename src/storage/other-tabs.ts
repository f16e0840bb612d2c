import type { SurveyStore } from '../app/survey-store.ts';

const CHANNEL = 'noonmark-changes';
/** A sweep stores twice a second: what comes within this time is told together [ms]. */
const GATHER_MS = 700;

/** The other tabs of this device: each is told which surveys were stored, and tells what it hears. */
export class OtherTabs {
  // a few browsers have no channel between tabs: a survey is then read again when it is opened
  readonly #channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(CHANNEL);

  tell(id: string): void {
    this.#channel?.postMessage(id);
  }

  /** Hears the id of each survey that another tab changed, some time after the change is durable. */
  listen(heard: (id: string) => void): void {
    const gathered = new Set<string>();
    this.#channel?.addEventListener('message', ({ data }: MessageEvent<unknown>) => {
      if (typeof data !== 'string') return;
      if (gathered.size === 0)
        setTimeout(() => {
          const ids = [...gathered];
          gathered.clear();
          ids.forEach((id) => heard(id));
        }, GATHER_MS);
      gathered.add(data);
    });
  }

  close(): void {
    this.#channel?.close();
  }
}

/** A store whose changes are told once they are durable. */
export function toldStore(store: SurveyStore, tell: (id: string) => void): SurveyStore {
  const told = async <T>(id: string, done: Promise<T>): Promise<T> => {
    const result = await done;
    tell(id);
    return result;
  };
  return {
    ...store,
    create: (survey) => told(survey.id, store.create(survey)),
    applyChanges: (id, ...change) => told(id, store.applyChanges(id, ...change)),
    undo: (id, number) => told(id, store.undo(id, number)),
    redo: (id) => told(id, store.redo(id)),
    remove: (id) => told(id, store.remove(id)),
    restore: (id) => told(id, store.restore(id)),
    erase: (id) => told(id, store.erase(id)),
  };
}
