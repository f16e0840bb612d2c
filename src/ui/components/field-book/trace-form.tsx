import { useRef, useState } from 'preact/hooks';
import { obstructionKinds } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Obstruction, ObstructionKind, Survey, Trace, TraceShape } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../form/choice-field.tsx';
import { Form } from '../form/form.tsx';
import { TextField } from '../form/text-field.tsx';
import { TapedElevation } from './taped-elevation.tsx';
import { emptyTrace, traceOfDraft, type PointDraft, type TraceDraft } from './trace-draft.ts';

const NEW = 'new';

const SHAPES: { value: TraceShape; label: string }[] = [
  { value: 'skyline', label: 'Skyline: all below it is blocked' },
  { value: 'outline', label: 'Closed outline: open above and below' },
  { value: 'line', label: 'Line: a mast or a wire' },
];

function PointTable(props: {
  points: PointDraft[];
  fault: boolean;
  onChange: (points: PointDraft[]) => void;
}) {
  const { points, onChange } = props;
  const table = useRef<HTMLTableElement>(null);
  const add = () => {
    const key = Math.max(-1, ...points.map((point) => point.key)) + 1;
    onChange([...points, { key, azimuth: '', elevation: '' }]);
    requestAnimationFrame(() =>
      table.current?.querySelector<HTMLInputElement>('tbody tr:last-child input')?.focus(),
    );
  };
  const input = (point: PointDraft, place: number, angle: 'azimuth' | 'elevation') => (
    <input
      type="text"
      inputMode="decimal"
      autocomplete="off"
      aria-label={`Sighting ${place + 1}, ${angle}`}
      aria-invalid={props.fault ? true : undefined}
      value={point[angle]}
      onInput={({ currentTarget }) =>
        onChange(
          points.map((one) => (one.key === point.key ? { ...one, [angle]: currentTarget.value } : one)),
        )
      }
    />
  );
  return (
    <>
      <table ref={table} class="point-table">
        <thead>
          <tr>
            <th scope="col">No.</th>
            <th scope="col">Azimuth (°)</th>
            <th scope="col">Elevation (°)</th>
            <th scope="col">
              <span class="visually-hidden">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {points.map((point, place) => (
            <tr key={point.key}>
              <th scope="row">{place + 1}</th>
              <td>{input(point, place, 'azimuth')}</td>
              <td>{input(point, place, 'elevation')}</td>
              <td>
                <button
                  type="button"
                  aria-label={`Remove sighting ${place + 1}`}
                  disabled={points.length <= 1}
                  onClick={() => onChange(points.filter(({ key }) => key !== point.key))}
                >
                  ×
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <div>
        <button type="button" onClick={add}>
          Add a row
        </button>
      </div>
    </>
  );
}

/** Typing a trace: of which obstruction, of what shape, and its sightings one under the other. */
export function TraceForm(props: {
  survey: Survey;
  order: number;
  obstructionOrder: number;
  instrumentHeight?: number;
  newId: () => string;
  onSave: (trace: Trace, added: Obstruction | null) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { survey, newId } = props;
  const known = ordered(survey.obstructions);
  const [obstruction, setObstruction] = useState(known[0]?.id ?? NEW);
  const [kind, setKind] = useState<ObstructionKind>('deciduous-tree');
  const [name, setName] = useState('');
  const [draft, setDraft] = useState<TraceDraft>(emptyTrace);
  const [fault, setFault] = useState<string | null>(null);
  const change = (part: Partial<TraceDraft>) => {
    setDraft((now) => ({ ...now, ...part }));
    setFault(null);
  };
  const save = () => {
    const kindName = obstructionKinds.find((row) => row.kind === kind)?.name ?? kind;
    const added: Obstruction | null =
      obstruction === NEW
        ? { id: newId(), order: props.obstructionOrder, name: name.trim() || kindName, kind }
        : null;
    const typed = traceOfDraft(draft, { obstruction: added?.id ?? obstruction, order: props.order, newId });
    if ('value' in typed) return props.onSave(typed.value, added);
    setFault(typed.fault);
    return false;
  };
  const lastEmpty = draft.points.find(({ elevation }) => elevation.trim() === '');
  const putElevation = (elevation: string) =>
    lastEmpty &&
    change({ points: draft.points.map((one) => (one.key === lastEmpty.key ? { ...one, elevation } : one)) });
  return (
    <Form label="Typed trace" action="Add the trace" onSubmit={save} onCancel={props.onCancel}>
      <ChoiceField
        label="Obstruction"
        value={obstruction}
        options={[
          ...known.map(({ id, name: label }) => ({ value: id, label })),
          { value: NEW, label: 'Another one' },
        ]}
        onChoose={setObstruction}
      />
      {obstruction === NEW && (
        <div class="pair">
          <ChoiceField
            label="Kind"
            value={kind}
            options={obstructionKinds.map((row) => ({ value: row.kind, label: row.name }))}
            onChoose={setKind}
          />
          <TextField label="Name" value={name} onInput={setName} maxLength={200} />
        </div>
      )}
      <ChoiceField
        label="Shape"
        value={draft.shape}
        options={SHAPES}
        onChoose={(shape) => change({ shape })}
      />
      {draft.shape === 'line' && (
        <TextField
          label="Its width as seen"
          unit="degrees"
          keys="numbers"
          value={draft.angularWidth}
          onInput={(angularWidth) => change({ angularWidth })}
        />
      )}
      <ChoiceField
        label="Between sightings the edge is"
        value={draft.edge}
        options={[
          { value: 'kind', label: 'As usual for its kind' },
          { value: 'straight', label: 'Straight: a ridge, a wall, a wire' },
          { value: 'drawn', label: 'Drawn: a crown, a hill' },
        ]}
        onChoose={(edge) => change({ edge })}
      />
      {draft.shape === 'skyline' && (
        <label class="tick">
          <input
            type="checkbox"
            checked={draft.fullCircle}
            onChange={({ currentTarget }) => change({ fullCircle: currentTarget.checked })}
          />
          It goes once around the whole horizon
        </label>
      )}
      <p class="faint small">
        From left to right; azimuths from true north: to a compass bearing add the declination, east as plus.
      </p>
      <PointTable points={draft.points} fault={fault !== null} onChange={(points) => change({ points })} />
      {fault && (
        <p class="field-fault small" role="alert">
          {fault}
        </p>
      )}
      <TapedElevation instrumentHeight={props.instrumentHeight} onFound={putElevation} />
    </Form>
  );
}
