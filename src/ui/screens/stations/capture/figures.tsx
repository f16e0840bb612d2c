import { useComputed } from '@preact/signals';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { compassPoint } from './compass-point.ts';

/** Where the phone points now, large enough for a glaring sky. */
export function Figures({ session }: { session: CaptureSession }) {
  const { live } = session;
  const azimuth = useComputed(() => degrees(live.value?.azimuth ?? null, 360));
  const azimuthWithin = useComputed(() => plusMinus(live.value?.azimuthDeviation ?? null));
  const point = useComputed(() => compassPoint(live.value?.azimuth ?? null));
  const elevation = useComputed(() => degrees(live.value?.elevation ?? null));
  const elevationWithin = useComputed(() => plusMinus(live.value?.elevationDeviation ?? null));
  return (
    <dl class="figures">
      <div>
        <dt>
          Azimuth <span>{point}</span>
        </dt>
        <dd class="huge">{azimuth}</dd>
        <dd class="give-or-take">{azimuthWithin}</dd>
      </div>
      <div>
        <dt>Elevation</dt>
        <dd class="huge">{elevation}</dd>
        <dd class="give-or-take">{elevationWithin}</dd>
      </div>
    </dl>
  );
}

function degrees(value: number | null, circle?: number): string {
  if (value === null) return '–';
  const tenths = value.toFixed(1);
  const shown = circle && tenths === circle.toFixed(1) ? '0.0' : tenths;
  return `${shown.replace('-', '−')}°`;
}

/** Twice the deviation: the truth lies within in 95 of 100. */
function plusMinus(deviation: number | null): string {
  if (deviation === null) return 'no north yet';
  const width = 2 * deviation;
  return width > 90 ? '–' : `± ${width.toFixed(1)}°`;
}
