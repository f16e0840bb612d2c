import { useEffect, useMemo, useRef, useState } from 'preact/hooks';
import type { FormDraft } from '../../../app/draft-store.ts';
import type { JsonValue } from '../../../core/survey/json-value.ts';
import { sameJson } from '../../../core/survey/same-json.ts';
import { useApp } from '../../app-context.ts';
import { DraftKeeper } from './draft-keeper.ts';
import { hasShapeOf } from './draft-shape.ts';

/** What a form's frame needs to know of its draft. */
export interface DraftState {
  /** `found`: what was typed earlier is back; `changed`: and what is stored was changed since. */
  found: 'nothing' | 'found' | 'changed';
  /** The form was saved or given up. */
  finish: () => void;
  /** Takes away what was found. */
  startAnew: () => void;
}

export interface Draft<T> {
  typed: T;
  change: (part: Partial<T>) => void;
  /** The same said in another way, such as in another unit: nothing was typed. */
  restate: (part: Partial<T>) => void;
  state: DraftState;
}

/**
 * The texts of a form, kept as they are typed: they are there again when the form is opened next, after a restart too,
 * until it is saved or cancelled. The name of a form must not change while it is open.
 */
export function useDraft<T extends object>(name: Omit<FormDraft, 'typed'>, initial: () => T): Draft<T> {
  const { drafts } = useApp();
  const first = useMemo(initial, []);
  const keeper = useMemo(() => new DraftKeeper(drafts, name), []);
  const latest = useRef(first);
  const touched = useRef(false);
  const [typed, setTyped] = useState(first);
  const [found, setFound] = useState<DraftState['found']>('nothing');
  const put = (texts: T) => {
    latest.current = texts;
    setTyped(texts);
  };
  useEffect(() => {
    let wanted = true;
    void keeper.read().then((draft) => {
      if (!wanted || touched.current || !draft || !hasShapeOf(draft.typed, first)) return;
      touched.current = true;
      put(draft.typed as T);
      setFound(sameJson(draft.over, name.over) ? 'found' : 'changed');
    });
    const hidden = () => document.visibilityState === 'hidden' && keeper.flush();
    document.addEventListener('visibilitychange', hidden);
    return () => {
      wanted = false;
      document.removeEventListener('visibilitychange', hidden);
      keeper.flush();
    };
  }, []);
  return {
    typed,
    change: (part) => {
      touched.current = true;
      put({ ...latest.current, ...part });
      if (sameJson(latest.current as JsonValue, first as JsonValue)) keeper.drop();
      else keeper.type(latest.current as JsonValue);
    },
    restate: (part) => put({ ...latest.current, ...part }),
    state: {
      found,
      finish: () => keeper.finish(),
      startAnew: () => {
        keeper.drop();
        setFound('nothing');
        put(first);
      },
    },
  };
}
