import { useMemo } from 'preact/hooks';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { usableShadowHours } from '../../../../core/pointing/usable-shadow-hours.ts';
import { clockTime } from '../../../../core/solar-position/time-zone.ts';

/** When a shadow is good to go by today, in the site's clock time. */
export function ShadowHours({ session }: { session: CaptureSession }) {
  const { site } = session.record.survey;
  const nowMs = session.live.peek()?.timeMs ?? Date.now();
  const day = new Date(nowMs).toDateString();
  const hours = useMemo(() => {
    const { year, month, day: date } = clockTime(nowMs, site.timeZone);
    return usableShadowHours({ year, month, day: date }, site);
  }, [day, site]);
  const clock = (timeMs: number) => {
    const { hour, minute } = clockTime(timeMs, site.timeZone);
    return `${hour}:${String(minute).padStart(2, '0')}`;
  };
  if (hours.length === 0) return <p>The sun throws no shadow to go by here today. Use a mark.</p>;
  const isNow = hours.some(({ fromMs, toMs }) => nowMs >= fromMs && nowMs <= toMs);
  const spans = hours.map(({ fromMs, toMs }) => `${clock(fromMs)} to ${clock(toMs)}`).join(' and ');
  return (
    <p class="small">
      Good today from {spans}, by the site’s clock.{' '}
      {!isNow && <strong>Not now: the check would be refused.</strong>}
    </p>
  );
}
