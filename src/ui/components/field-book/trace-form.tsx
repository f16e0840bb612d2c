import { useState } from 'preact/hooks';
import { obstructionKinds } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import type {
  Obstruction,
  ObstructionKind,
  Station,
  Survey,
  Trace,
  TraceShape,
} from '../../../core/survey/survey.ts';
import { ChoiceField } from '../form/choice-field.tsx';
import { Form } from '../form/form.tsx';
import { useDraft } from '../form/use-draft.ts';
import { TextField } from '../form/text-field.tsx';
import { TypedRows } from '../typed-rows/typed-rows.tsx';
import { TapedElevation } from './taped-elevation.tsx';
import { emptyTrace, traceOfDraft, type TraceDraft } from './trace-draft.ts';

const NEW = 'new';

const SHAPES: { value: TraceShape; label: string }[] = [
  { value: 'skyline', label: 'Skyline: all below it is blocked' },
  { value: 'outline', label: 'Closed outline: open above and below' },
  { value: 'line', label: 'Line: a mast or a wire' },
];

const COLUMNS = [
  { field: 'azimuth', head: 'Azimuth (°)', spoken: 'azimuth' },
  { field: 'elevation', head: 'Elevation (°)', spoken: 'elevation' },
] as const;

/** What is typed into the form. */
interface FormTexts {
  obstruction: string;
  kind: ObstructionKind;
  name: string;
  draft: TraceDraft;
}

/** Typing a trace: of which obstruction, of what shape, and its sightings one under the other. */
export function TraceForm(props: {
  survey: Survey;
  station: Pick<Station, 'id' | 'name'>;
  order: number;
  obstructionOrder: number;
  instrumentHeight?: number;
  newId: () => string;
  onSave: (trace: Trace, added: Obstruction | null) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { survey, newId } = props;
  const known = ordered(survey.obstructions);
  const kept = useDraft<FormTexts>(
    {
      survey: survey.id,
      form: `trace/${props.station.id}`,
      label: `Typed trace from ${props.station.name}`,
      over: null,
    },
    () => ({
      obstruction: known[0]?.id ?? NEW,
      kind: 'deciduous-tree',
      name: '',
      draft: emptyTrace(),
    }),
  );
  const { kind, name, draft } = kept.typed;
  // An obstruction that was deleted after the trace was half typed is another one.
  const obstruction = known.some(({ id }) => id === kept.typed.obstruction) ? kept.typed.obstruction : NEW;
  const [fault, setFault] = useState<string | null>(null);
  const change = (part: Partial<TraceDraft>) => {
    kept.change({ draft: { ...draft, ...part } });
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
    <Form
      label="Typed trace"
      action="Add the trace"
      onSubmit={save}
      onCancel={props.onCancel}
      draft={kept.state}
    >
      <ChoiceField
        label="Obstruction"
        value={obstruction}
        options={[
          ...known.map(({ id, name: label }) => ({ value: id, label })),
          { value: NEW, label: 'Another one' },
        ]}
        onChoose={(id) => kept.change({ obstruction: id })}
      />
      {obstruction === NEW && (
        <div class="pair">
          <ChoiceField
            label="Kind"
            value={kind}
            options={obstructionKinds.map((row) => ({ value: row.kind, label: row.name }))}
            onChoose={(chosen) => kept.change({ kind: chosen })}
          />
          <TextField
            label="Name"
            value={name}
            onInput={(text) => kept.change({ name: text })}
            maxLength={200}
          />
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
      <TypedRows
        rows={draft.points}
        columns={COLUMNS}
        head="No."
        one="sighting"
        add="Add a row"
        fewest={1}
        fault={fault}
        onChange={(points) => change({ points })}
      />
      <TapedElevation instrumentHeight={props.instrumentHeight} onFound={putElevation} />
    </Form>
  );
}
