import { useState } from 'preact/hooks';
import { addObstruction } from '../../../../app/capture/obstruction-edits.ts';
import { obstructionKinds, type ObstructionKindRow } from '../../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../../core/survey/order.ts';
import type { Obstruction, ObstructionKind, TraceShape } from '../../../../core/survey/survey.ts';
import { Dialog } from '../../../components/dialog.tsx';
import { percentText } from '../../../value-text.ts';
import type { Sitting } from './sitting.ts';
import { Switches } from './thumb.tsx';

const SHAPES: { value: TraceShape; label: string }[] = [
  { value: 'skyline', label: 'Skyline' },
  { value: 'outline', label: 'Outline' },
  { value: 'line', label: 'Line' },
];

const SHAPE_WORDS: Record<TraceShape, string> = {
  skyline: 'All below the edge is blocked, down to the horizon.',
  outline: 'Closed: sky above it and below it, as of a balcony or a crown on a bare trunk.',
  line: 'A mast or a wire: its middle and its width.',
};

const WIDTHS = ['0.2', '0.5', '1', '2', '5'].map((value) => ({ value, label: `${value}°` }));

function leafWords({ leaves }: ObstructionKindRow): string {
  if (!leaves) return '';
  if (leaves.on === leaves.off) return `lets ${percentText(leaves.on)} through`;
  return `lets ${percentText(leaves.on)} through in leaf, ${percentText(leaves.off)} bare`;
}

interface Props {
  sitting: Sitting;
  onChosen: (id: string) => void;
  onCancel: () => void;
  /** Given where it may be said after. */
  onLater?: () => void;
}

/** What it is, in one tap: the same as last, one that is known, or a new one by its kind. */
export function ObstructionSheet({ sitting, onChosen, onCancel, onLater }: Props) {
  const [name, setName] = useState('');
  const { session } = sitting;
  const { obstructions } = session.record.survey;
  const last = obstructions.find(({ id }) => id === sitting.last.value);
  const add = async (kind: ObstructionKind) => {
    const added = await addObstruction(session, kind, name);
    if (added) onChosen(added.id);
  };
  return (
    <Dialog title="What is it?" onCancel={onCancel}>
      <ShapeChoice sitting={sitting} />
      {obstructions.length > 0 && <KnownOnes known={obstructions} last={last} onChosen={onChosen} />}
      <h3 id="new-ones">New</h3>
      <label class="sheet-name">
        Name of a new one, if it needs one
        <input
          type="text"
          value={name}
          maxLength={200}
          autocomplete="off"
          onInput={({ currentTarget }) => setName(currentTarget.value)}
        />
      </label>
      <div class="sheet-list" role="group" aria-labelledby="new-ones">
        {obstructionKinds.map((row) => (
          <button key={row.kind} type="button" onClick={() => void add(row.kind)}>
            <span>{row.name}</span>
            {row.leaves && <span class="small under">{leafWords(row)}</span>}
          </button>
        ))}
      </div>
      <div class="row">
        {onLater && (
          <button type="button" class="tall" onClick={onLater}>
            Say after the trace
          </button>
        )}
        <button type="button" class="tall" onClick={onCancel}>
          Back
        </button>
      </div>
    </Dialog>
  );
}

/** Those that are known, the one traced last as the main one. */
function KnownOnes(props: {
  known: readonly Obstruction[];
  last: Obstruction | undefined;
  onChosen: Props['onChosen'];
}) {
  const { known, last, onChosen } = props;
  return (
    <>
      <h3 id="known-ones">Same as before</h3>
      {last && (
        <button type="button" class="thumb main" onClick={() => onChosen(last.id)}>
          Same as last: {last.name}
        </button>
      )}
      <div class="sheet-list" role="group" aria-labelledby="known-ones">
        {ordered(known)
          .filter(({ id }) => id !== last?.id)
          .map(({ id, name }) => (
            <button key={id} type="button" onClick={() => onChosen(id)}>
              {name}
            </button>
          ))}
      </div>
    </>
  );
}

function ShapeChoice({ sitting }: { sitting: Sitting }) {
  const { shape, angularWidth } = sitting.choice.value;
  return (
    <div class="sheet-shape">
      <Switches
        label="Shape"
        value={shape}
        options={SHAPES}
        onChoose={(wanted) => sitting.choose({ shape: wanted })}
      />
      <p class="small">{SHAPE_WORDS[shape]}</p>
      {shape === 'line' && (
        <Switches
          label="How wide it looks"
          value={String(angularWidth)}
          options={WIDTHS}
          onChoose={(width) => sitting.choose({ angularWidth: Number(width) })}
        />
      )}
    </div>
  );
}
