import { useEffect, useState } from 'preact/hooks';
import type { ShadeState } from './use-shade.ts';

/** A calculation shorter than this needs no bar, ms. */
const UNNOTICED = 350;

/** How far the calculation is, and the way to stop it. */
export function Working({ working, onCancel }: { working: ShadeState['working']; onCancel: () => void }) {
  const [noticed, setNoticed] = useState(false);
  const busy = working !== null;
  useEffect(() => {
    setNoticed(false);
    if (!busy) return undefined;
    const timer = setTimeout(() => setNoticed(true), UNNOTICED);
    return () => clearTimeout(timer);
  }, [busy]);
  if (!working || !noticed) return null;
  return (
    <div class="working" role="status">
      <label>
        <span>{working.stage}</span>
        <progress max={1} value={working.share} />
      </label>
      <button type="button" onClick={onCancel}>
        Cancel
      </button>
    </div>
  );
}
