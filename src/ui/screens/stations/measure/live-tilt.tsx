import { useComputed } from '@preact/signals';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';

/** How steeply the phone lies now, and how quiet it is. */
export function LiveTilt({ session, held }: { session: CaptureSession; held: 'flat' | 'edge' }) {
  const { live } = session;
  const tilt = useComputed(() => {
    if (!live.value) return '–';
    const { fromFlat, topEdge } = live.value;
    const flat = fromFlat > 90 ? 180 - fromFlat : fromFlat;
    return `${(held === 'flat' ? flat : Math.abs(topEdge)).toFixed(1)}°`;
  });
  return (
    <dl class="figures">
      <div>
        <dt>Tilt now</dt>
        <dd class="huge">{tilt}</dd>
      </div>
    </dl>
  );
}
