import { describe, expect, it } from 'vitest';
import { appState } from '../../src/app/app-state.ts';
import { offerUpdates } from '../../src/app/update-flow.ts';

/** A page and its service worker, played by hand. */
function page(wasControlled: boolean) {
  const state = appState();
  let waiting = () => {};
  let controlling = () => {};
  let later = () => {};
  const done = { reloads: 0, takeOvers: 0 };
  const use = offerUpdates(
    state,
    {
      onWaiting: (listener) => (waiting = listener),
      onControlling: (listener) => (controlling = listener),
      takeOver: () => done.takeOvers++,
    },
    { wasControlled, reload: () => done.reloads++, after: (_, act) => (later = act) },
  );
  return {
    state,
    done,
    use,
    waiting: () => waiting(),
    controlling: () => controlling(),
    timePasses: () => later(),
  };
}

describe('a new version', () => {
  it('is not made of the first visit', () => {
    const first = page(false);
    first.controlling();
    expect(first.state.update.value).toBe('none');
    expect(first.done.reloads).toBe(0);
  });

  it('is offered, and reloads once when somebody agrees', () => {
    const tab = page(true);
    tab.waiting();
    expect(tab.state.update.value).toBe('ready');
    expect(tab.done).toEqual({ reloads: 0, takeOvers: 0 });
    tab.use();
    expect(tab.done).toEqual({ reloads: 0, takeOvers: 1 });
    tab.controlling();
    tab.timePasses();
    expect(tab.done.reloads).toBe(1);
  });

  it('reloads where the browser never tells that the worker took over', () => {
    const tab = page(true);
    tab.waiting();
    tab.use();
    tab.timePasses();
    expect(tab.done.reloads).toBe(1);
  });

  it('let in by another tab does not reload this one, but is told', () => {
    const tab = page(true);
    tab.controlling();
    expect(tab.state.update.value).toBe('elsewhere');
    expect(tab.done.reloads).toBe(0);
    tab.use();
    expect(tab.done.reloads).toBe(1);
  });

  it('in the session of the first visit is told like any other', () => {
    const tab = page(false);
    tab.controlling();
    tab.waiting();
    expect(tab.state.update.value).toBe('ready');
    tab.controlling();
    expect(tab.state.update.value).toBe('elsewhere');
  });
});
