import { useState } from 'preact/hooks';
import { storeFaces } from '../../../../app/capture/heading-takes.ts';
import type { Reading } from '../../../../core/survey/survey.ts';
import { signed, within } from '../heading-words.ts';
import type { Sitting } from './sitting.ts';
import { Thumb } from './thumb.tsx';

/** The same mark twice, the phone turned upside down between: what is wrong with its inclination changes sign. */
export function FacesPanel({ sitting }: { sitting: Sitting }) {
  const { session } = sitting;
  const [upright, setUpright] = useState<Reading | null>(null);
  const index = session.pointed.value && session.runNow?.index[session.axis.value];
  const take = async () => {
    const reading = await session.hold();
    if (!reading) return;
    if (upright) {
      await storeFaces(session, sitting.stationId, upright, reading);
      setUpright(null);
    } else {
      setUpright(reading);
      session.tell({ what: 'face-upright' });
    }
  };
  return (
    <>
      <p>
        {upright
          ? 'Now turn the phone upside down about the line of sight and sight the same mark again.'
          : 'Sight a sharp, far mark with the phone as you always hold it.'}
      </p>
      {index?.source === 'two-face' && (
        <p class="banner" role="status">
          Elevations are corrected by {signed(index.value)}, {within(index.standardDeviation)}.
        </p>
      )}
      <Thumb session={session} label={upright ? 'Second face' : 'First face'} onPress={() => void take()} />
    </>
  );
}
