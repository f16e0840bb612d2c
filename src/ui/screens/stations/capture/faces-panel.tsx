import { untracked, useSignalEffect } from '@preact/signals';
import { stationOf } from '../../../../app/capture/station-edits.ts';
import { signed, within } from '../heading-words.ts';
import type { Sitting } from './sitting.ts';
import { Thumb } from './thumb.tsx';

/** The same mark twice, the phone turned upside down between: what is wrong with its inclination changes sign. */
export function FacesPanel({ sitting }: { sitting: Sitting }) {
  const { session, faces } = sitting;
  const upright = faces.upright.value;
  const led = faces.ledFrom.value !== null;
  const found = foundWords(sitting);
  useSignalEffect(() => {
    const live = session.live.value;
    if (live) untracked(() => void faces.follow(live));
  });
  const leave = () => {
    faces.skip();
    sitting.task.value = 'trace';
  };
  return (
    <>
      {found ? (
        <p class="banner" role="status">
          {found}
        </p>
      ) : (
        <FacesWords sitting={sitting} />
      )}
      {found && !upright ? (
        <div class="thumbs">
          <Thumb session={session} label="Once more" minor onPress={() => void faces.take()} />
          <button type="button" class="thumb main" onClick={leave}>
            Go on tracing
          </button>
        </div>
      ) : (
        <div class="thumbs">
          {(led || found) && (
            <button type="button" class="thumb" onClick={leave}>
              {found ? 'Go on tracing' : 'Skip'}
            </button>
          )}
          <Thumb
            session={session}
            label={upright ? 'Second face' : 'First face'}
            onPress={() => void faces.take()}
          />
        </div>
      )}
    </>
  );
}

/** What to do now, and why. */
function FacesWords({ sitting: { session, faces } }: { sitting: Sitting }) {
  const mark = faces.ledFrom.value;
  if (faces.upright.value)
    return (
      <>
        <p>
          <strong>Turn the phone over.</strong>{' '}
          {session.axis.value === 'camera'
            ? 'Upside down, the camera still on'
            : 'Face down, its top edge still on'}{' '}
          {mark || 'the same mark'}. Held still, it is taken by itself.
        </p>
        {mark !== null && <Why />}
      </>
    );
  return (
    <>
      <p>Sight a sharp, far mark with the phone as you always hold it, never near the sun.</p>
      {mark !== null && <Why />}
    </>
  );
}

const Why = () => (
  <p class="small">
    Once in a survey: it shows how far off this phone’s inclination is, which nothing else does.
  </p>
);

/** What the check just stored found, or why it counts for nothing; null before. */
function foundWords({ session, stationId, faces }: Sitting): string | null {
  const pointed = session.pointed.value;
  const id = faces.done.value;
  if (!pointed || id === null) return null;
  const { survey } = session.record;
  const station = survey.stations.findIndex((one) => one.id === stationId);
  const place = (stationOf(survey, stationId).indexChecks ?? []).findIndex((check) => check.id === id);
  if (place < 0) return null;
  const path = `stations[${station}].indexChecks[${place}]`;
  const warning = pointed.warnings.find((one) => one.path === path);
  if (warning) return warning.message;
  const index = session.runNow?.index[session.axis.value];
  return index?.source === 'two-face'
    ? `Elevations are corrected by ${signed(index.value)}, ${within(index.standardDeviation)}.`
    : null;
}
