import { useComputed } from '@preact/signals';
import { undoLast } from '../../../../app/capture/undo-last.ts';
import { fullCircle } from '../../../../core/angles/angles.ts';
import { useApp } from '../../../app-context.ts';
import type { Sitting } from './sitting.ts';
import { Thumb } from './thumb.tsx';

/** A range without north on either side of it. */
export type Gap = [from: number, to: number];

/** A wider gap is turned along, not called open at one glance; degrees. */
const WIDEST = 90;

const inGap = (azimuth: number, [from, to]: Gap): boolean => fullCircle(azimuth - from) <= to - from;
const whole = (azimuth: number) => Math.round(fullCircle(azimuth)) % 360;

/** Azimuths looked at and found open: from here to there, or a whole gap between what is traced. */
export function OpenPanel({ sitting, gaps }: { sitting: Sitting; gaps: readonly Gap[] }) {
  const services = useApp();
  const { session, open } = sitting;
  const looking = open.looking.value;
  const gap = useComputed(() => {
    const azimuth = session.live.value?.azimuth ?? null;
    return azimuth === null ? null : (gaps.find((one) => inGap(azimuth, one)) ?? null);
  }).value;
  const isWide = gap !== null && gap[1] - gap[0] > WIDEST;
  return (
    <>
      <div class="panel-row">
        <button
          type="button"
          class="what"
          disabled={gap === null || isWide || session.phase.value !== 'idle'}
          onClick={() => gap && void open.gap(gap[0], gap[1])}
        >
          {gap && !isWide
            ? `All open from ${whole(gap[0])}° to ${whole(gap[1])}°`
            : isWide
              ? 'A wide gap: turn along it'
              : 'Point into a gap to call it open'}
        </button>
        <button
          type="button"
          disabled={looking}
          onClick={() => void undoLast(services, session)}
          aria-label="Undo the last"
        >
          Undo
        </button>
      </div>
      <Thumb
        session={session}
        label={looking ? 'Open up to here' : 'Open from here on'}
        onPress={() => (looking ? void open.end() : open.begin())}
      />
    </>
  );
}
