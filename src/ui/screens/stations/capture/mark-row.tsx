import { useState } from 'preact/hooks';
import { freeMarkName, hasSighting, markOf, marksOf, nameSighting } from '../../../../app/capture/marks.ts';
import { stationOf } from '../../../../app/capture/station-edits.ts';
import { Dialog } from '../../../components/dialog.tsx';
import type { Sitting } from './sitting.ts';

/** The sighting that a tap may make a mark of: noted in the sweep at work, else the point sighted last. */
export function markable({ session, stationId, sweep, points }: Sitting): string | null {
  const station = stationOf(session.record.survey, stationId);
  const sighted = session.phase.value === 'sweeping' ? null : points.last.value;
  const id = sweep.lastMark.value ?? sighted;
  return id !== null && hasSighting(station, id) ? id : null;
}

/** Which mark the point is: a new one, or one that is known. One tap. */
export function MarkRow({ sitting, id, onDone }: { sitting: Sitting; id: string; onDone: () => void }) {
  const { session, stationId } = sitting;
  const [typing, setTyping] = useState(false);
  const { survey } = session.record;
  const now = markOf(stationOf(survey, stationId), id);
  const known = marksOf(survey);
  const fresh = freeMarkName(survey);
  const give = (mark: string) => {
    setTyping(false);
    void nameSighting(session, stationId, id, mark).then(onDone);
  };
  return (
    <div class="mark-row" role="group" aria-label="Which mark is the point?">
      {(now === null ? [fresh, ...known] : known).map((mark) => (
        <button key={mark} type="button" aria-pressed={mark === now} onClick={() => give(mark)}>
          {mark === fresh ? `New: ${fresh}` : mark}
        </button>
      ))}
      <button type="button" onClick={() => setTyping(true)}>
        Other name
      </button>
      {typing && <MarkName onName={give} onCancel={() => setTyping(false)} />}
    </div>
  );
}

function MarkName({ onName, onCancel }: { onName: (mark: string) => void; onCancel: () => void }) {
  const [name, setName] = useState('');
  return (
    <Dialog title="Name of the mark" onCancel={onCancel}>
      <form
        class="sheet-name"
        onSubmit={(event) => {
          event.preventDefault();
          if (name.trim() !== '') onName(name.trim());
        }}
      >
        <label>
          A point that can be found again from other stations
          <input
            type="text"
            value={name}
            maxLength={200}
            autocomplete="off"
            placeholder="such as gable tip"
            onInput={({ currentTarget }) => setName(currentTarget.value)}
          />
        </label>
        <div class="row">
          <button type="submit" class="tall" disabled={name.trim() === ''}>
            Give the name
          </button>
          <button type="button" class="tall" onClick={onCancel}>
            Back
          </button>
        </div>
      </form>
    </Dialog>
  );
}
