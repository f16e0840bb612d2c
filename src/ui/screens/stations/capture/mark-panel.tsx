import { useState } from 'preact/hooks';
import { takeMark } from '../../../../app/capture/heading-takes.ts';
import { marksOf } from '../../../../app/capture/marks.ts';
import { undoLast } from '../../../../app/capture/undo-last.ts';
import { useApp } from '../../../app-context.ts';
import { closureWords } from '../heading-words.ts';
import type { Sitting } from './sitting.ts';
import { Thumb } from './thumb.tsx';

/** Sighting a recognisable point by name; sighted again, it closes the horizon. */
export function MarkPanel({ sitting }: { sitting: Sitting }) {
  const services = useApp();
  const { session } = sitting;
  const [name, setName] = useState('');
  const marks = marksOf(session.record.survey);
  const closure = session.pointed.value ? session.runNow?.closure : null;
  return (
    <>
      {closure && <p class="banner">{closureWords(closure)}</p>}
      <label class="sheet-name">
        Name of the mark
        <input
          type="text"
          value={name}
          maxLength={200}
          autocomplete="off"
          placeholder="such as gable tip"
          onInput={({ currentTarget }) => setName(currentTarget.value)}
        />
      </label>
      <div class="mark-names" role="group" aria-label="Marks sighted before">
        {marks.map((mark) => (
          <button key={mark} type="button" aria-pressed={mark === name} onClick={() => setName(mark)}>
            {mark}
          </button>
        ))}
        <button type="button" onClick={() => void undoLast(services, session)} aria-label="Undo the last">
          Undo
        </button>
      </div>
      <Thumb
        session={session}
        label={marks.includes(name.trim()) ? 'Sight it again' : 'Sight the mark'}
        onPress={() =>
          name.trim() === ''
            ? session.refuse('mark-unnamed')
            : void takeMark(session, sitting.stationId, name.trim())
        }
      />
    </>
  );
}
