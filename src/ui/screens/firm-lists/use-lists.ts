import { useState } from 'preact/hooks';
import type { FactLists } from '../../../core/survey/fact-lists.ts';
import { firmLists, keepFirmLists } from '../../device/firm-lists.ts';

/** So many changes can be taken back. */
const MOST_STEPS = 50;

export interface ListsEditing {
  lists: FactLists;
  /** `done` is told when it is made, such as “320 A” is added. */
  change: (after: FactLists, done: string) => void;
  /** Null where nothing was changed since the screen was opened. */
  takeBack: (() => void) | null;
  /** What was done last. */
  told: string;
  /** Whether the last change could not be stored. */
  isUnkept: boolean;
}

/** The firm's lists being changed; each change is kept at once and can be taken back. */
export function useLists(): ListsEditing {
  const [before, setBefore] = useState<FactLists[]>([]);
  const [told, setTold] = useState('');
  const [isUnkept, setUnkept] = useState(false);
  const put = (lists: FactLists, done: string) => {
    setUnkept(!keepFirmLists(lists));
    setTold(done);
  };
  return {
    lists: firmLists.value,
    told,
    isUnkept,
    change: (after, done) => {
      setBefore([...before, firmLists.value].slice(-MOST_STEPS));
      put(after, done);
    },
    takeBack:
      before.length === 0
        ? null
        : () => {
            setBefore(before.slice(0, -1));
            put(before[before.length - 1], 'The last change is taken back.');
          },
  };
}
