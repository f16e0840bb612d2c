import type { AccessInterval } from '../../../../core/shading/assessment.ts';
import { percentText } from '../../../value-text.ts';
import type { LiveAccess } from './use-live-access.ts';

/** What the plane gets here so far, how sure that is, and how much of its light was looked at. */
export function AccessLine({ live: { found, fault, stale }, plane }: { live: LiveAccess; plane: string }) {
  if (!found)
    return (
      <p class="small">
        {fault && fault.code !== 'cancelled'
          ? 'The live figure is missing: the Shade section says why.'
          : 'Reading the climate…'}
      </p>
    );
  return (
    <dl class={`live-access ${stale ? 'is-stale' : ''}`} aria-label={plane}>
      <div>
        <dt>{stale ? 'A moment ago' : 'Access'}</dt>
        <dd>{percentText(found.access)}</dd>
      </div>
      <div>
        <dt>95 times in 100</dt>
        <dd>{rangeText(found.interval)}</dd>
      </div>
      <div>
        <dt>Covered</dt>
        <dd>{percentText(found.coverage)}</dd>
      </div>
    </dl>
  );
}

/** Both ends in whole percent, the lower one rounded down and the upper one up; one figure where they are the same. */
export function rangeText({ low, high }: Pick<AccessInterval, 'low' | 'high'>): string {
  const [from, to] = [Math.floor(low * 100 + 1e-9), Math.ceil(high * 100 - 1e-9)];
  return from === to ? percentText(from / 100) : `${from} to ${percentText(to / 100)}`;
}
