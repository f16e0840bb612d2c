import { useState } from 'preact/hooks';
import { undoLast } from '../../../../app/capture/undo-last.ts';
import { useApp } from '../../../app-context.ts';
import { freeMarkName } from '../../../../app/capture/marks.ts';
import { markable, MarkRow } from './mark-row.tsx';
import { ObstructionSheet } from './obstruction-sheet.tsx';
import type { Sitting } from './sitting.ts';
import { Switches, Thumb } from './thumb.tsx';

const WAYS = [
  { value: 'sweep', label: 'Sweep' },
  { value: 'ridge', label: 'Straight edge' },
  { value: 'points', label: 'Points' },
] as const;

/** Tracing an obstruction: along its edge, by both ends of a ridge, or corner by corner. */
export function TracePanel({ sitting }: { sitting: Sitting }) {
  const services = useApp();
  const [sheet, setSheet] = useState<'before' | 'after' | null>(null);
  const [naming, setNaming] = useState(false);
  const { session, sweep, points } = sitting;
  const choice = sitting.choice.value;
  const survey = session.record.survey;
  const sweeping = session.phase.value === 'sweeping';
  const unfinished = sweeping ? null : sweep.unfinished(survey);
  const waiting = points.waiting(survey);
  const atWork = points.trace.value !== null || waiting.length > 0;
  const name = sitting.nameOf(choice.obstruction);

  const point = markable(sitting);
  const mark = () => {
    if (sweeping) void sweep.noteMark(freeMarkName(survey));
    setNaming(sweeping || !naming);
  };
  const endSweep = async () => {
    if (!(await sweep.end())) return;
    if (choice.obstruction === null) setSheet('after');
    else if (await sweep.finish(choice, name)) sitting.traced();
  };
  const sight = async () => {
    setNaming(false);
    sweep.lastMark.value = null;
    await points.sight(choice);
    if (choice.way !== 'ridge') return;
    if (choice.obstruction === null && points.enough(choice)) setSheet('after');
    if (choice.obstruction !== null && points.trace.value === null && points.waiting().length === 0)
      sitting.traced();
  };
  const endPoints = async () => {
    if (points.trace.value !== null) {
      points.end();
      sitting.traced();
    } else if (!points.enough(choice)) await points.drop();
    else if (choice.obstruction === null) setSheet('after');
    else {
      await points.finish(choice, name);
      sitting.traced();
    }
  };
  const chosen = async (obstruction: string) => {
    const wasAfter = sheet === 'after';
    setSheet(null);
    sitting.choose({ obstruction });
    if (!wasAfter) return;
    const now = { ...sitting.choice.value, obstruction };
    const known = sitting.nameOf(obstruction);
    if (sweep.unfinished()) await sweep.finish(now, known);
    else await points.finish(now, known);
    sitting.traced();
  };

  return (
    <>
      <div class="panel-row">
        <button
          type="button"
          class="what"
          disabled={sweeping}
          onClick={() => setSheet(unfinished ? 'after' : 'before')}
        >
          <span class="faint small">What</span> {name || 'Say after'}
        </button>
        <button
          type="button"
          disabled={!sweeping && point === null}
          aria-expanded={naming && point !== null}
          onClick={mark}
        >
          {sweeping ? 'Mark here' : 'A mark?'}
        </button>
        <button
          type="button"
          disabled={sweeping}
          onClick={() => void undoLast(services, session)}
          aria-label="Undo the last"
        >
          Undo
        </button>
      </div>
      {naming && point !== null ? (
        <MarkRow sitting={sitting} id={point} onDone={() => setNaming(false)} />
      ) : (
        <Switches
          label="How it is traced"
          value={choice.way}
          options={WAYS}
          disabled={sweeping || atWork}
          onChoose={(way) => sitting.choose({ way })}
        />
      )}
      {unfinished ? (
        <div class="thumbs">
          <button type="button" class="thumb" onClick={() => void sweep.drop()}>
            Leave the sweep out
          </button>
          <button type="button" class="thumb main" onClick={() => setSheet('after')}>
            What was it?
          </button>
        </div>
      ) : choice.way === 'sweep' && !atWork ? (
        <Thumb
          session={session}
          label={sweeping ? 'End sweep' : 'Start sweep'}
          onPress={() => {
            setNaming(false);
            if (sweeping) void endSweep();
            else sweep.begin();
          }}
        />
      ) : (
        <div class="thumbs">
          {atWork && (
            <button type="button" class="thumb" onClick={() => void endPoints()}>
              End trace
            </button>
          )}
          <Thumb session={session} label={pointLabel(sitting)} onPress={() => void sight()} />
        </div>
      )}
      {sheet && (
        <ObstructionSheet
          sitting={sitting}
          onChosen={(id) => void chosen(id)}
          onCancel={() => setSheet(null)}
          onLater={
            sheet === 'before'
              ? () => {
                  sitting.choose({ obstruction: null });
                  setSheet(null);
                }
              : undefined
          }
        />
      )}
    </>
  );
}

function pointLabel({ choice, points }: Sitting): string {
  const waiting = points.waiting().length;
  if (choice.value.way === 'ridge') return waiting === 0 ? 'One end' : 'Other end';
  return points.trace.value === null && waiting === 0 ? 'First point' : 'Next point';
}
