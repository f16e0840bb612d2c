import { useState } from 'preact/hooks';
import { obstructionKinds } from '../../../core/survey/obstruction-kinds.ts';
import type { JsonValue } from '../../../core/survey/json-value.ts';
import type { Obstruction, ObstructionKind } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { Form } from '../../components/form/form.tsx';
import { useDraft } from '../../components/form/use-draft.ts';
import { TextField } from '../../components/form/text-field.tsx';
import { LengthField } from '../../components/lengths/length-field.tsx';
import { UnitChoice } from '../../components/lengths/unit-choice.tsx';
import { lengthUnit } from '../../device/length-unit.ts';
import { inUnit, lengthInput, typedLength } from '../../length-text.ts';
import { valueOf } from '../../typed.ts';
import { transmittanceDraft, typedTransmittance } from './transmittance-draft.ts';
import { TransmittanceFields } from './transmittance-fields.tsx';

/** Farther off, feet may have been typed as metres. */
const USUAL_METRES = 200;

const kindOptions = obstructionKinds.map(({ kind, name }) => ({ value: kind, label: name }));

/** First of the kind's name, "… 2" and so on that is not taken. */
function proposedName(kind: ObstructionKind, taken: readonly string[]): string {
  const stem = obstructionKinds.find((row) => row.kind === kind)?.name ?? kind;
  for (let count = 1; ; count++) {
    const name = count === 1 ? stem : `${stem} ${count}`;
    if (!taken.includes(name)) return name;
  }
}

/** Name of the form of an obstruction, or of a new one. */
export const obstructionForm = (obstruction: Obstruction | null): string =>
  `obstruction/${obstruction?.id ?? 'new'}`;

/** Typing an obstruction: what it is, how far it stands, what passes through it. */
export function ObstructionForm(props: {
  surveyId: string;
  /** Null for a new one. */
  obstruction: Obstruction | null;
  newId: string;
  order: number;
  latitude: number;
  taken: readonly string[];
  onSave: (obstruction: Obstruction) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { obstruction: before, latitude } = props;
  const unit = lengthUnit.value;
  const draft = useDraft(
    {
      survey: props.surveyId,
      form: obstructionForm(before),
      label: before ? `Change ${before.name}` : 'New obstruction',
      over: (before ?? null) as JsonValue,
    },
    () => ({
      unit,
      name: before?.name ?? '',
      kind: before?.kind ?? 'deciduous-tree',
      distance: lengthInput(before?.distance, unit),
      shares: transmittanceDraft(before, latitude),
    }),
  );
  const { change } = draft;
  const { name, kind, distance, shares } = draft.typed;
  if (draft.typed.unit !== unit)
    draft.restate({ unit, distance: inUnit(distance, draft.typed.unit, unit, before?.distance) });
  const [asked, setAsked] = useState(false);
  const typedDistance = typedLength(distance, unit, before?.distance);
  const transmittance = typedTransmittance(shares);
  const fallback = proposedName(kind, props.taken);
  const save = () => {
    setAsked(true);
    if ('fault' in typedDistance || 'fault' in transmittance) return false;
    const after: Obstruction = {
      ...(before ?? { id: props.newId, order: props.order }),
      name: name.trim() || fallback,
      kind,
      distance: valueOf(typedDistance),
      transmittance: valueOf(transmittance),
    };
    for (const key of ['distance', 'transmittance'] as const) if (after[key] === undefined) delete after[key];
    return props.onSave(after);
  };
  return (
    <Form
      label={before ? `Change ${before.name}` : 'New obstruction'}
      action={before ? 'Save the obstruction' : 'Add the obstruction'}
      onSubmit={save}
      onCancel={props.onCancel}
      draft={draft.state}
    >
      <ChoiceField
        label="Kind"
        value={kind}
        options={kindOptions}
        onChoose={(chosen) => change({ kind: chosen })}
      />
      <TextField
        label="Name"
        value={name}
        onInput={(text) => change({ name: text })}
        maxLength={200}
        hint={`So that it is known again from another station. Without one: ${fallback}`}
      />
      <UnitChoice />
      <LengthField
        label="Distance from the stations"
        value={distance}
        stored={before?.distance}
        usual={USUAL_METRES}
        onInput={(text) => change({ distance: text })}
        hint="Along the ground, by tape. Unknown counts as far."
      />
      <TransmittanceFields
        kind={kind}
        latitude={latitude}
        draft={shares}
        asked={asked}
        onChange={(typed) => change({ shares: typed })}
      />
    </Form>
  );
}
