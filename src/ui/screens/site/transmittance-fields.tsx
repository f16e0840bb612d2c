import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import type { ObstructionKind } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { percentText } from '../../value-text.ts';
import { monthNames } from './month-names.ts';
import { kindMonths, typedTransmittance, type TransmittanceDraft } from './transmittance-draft.ts';

const rangeText = ([least, most]: readonly [number, number]) =>
  `${percentText(least)} to ${percentText(most)}`;

/** What the kind lets through, with its spread and where it is from. */
function KindValues({ kind, latitude }: { kind: ObstructionKind; latitude: number }) {
  const { leaves } = obstructionKind(kind);
  if (!leaves) return <p class="small">Nothing passes through it.</p>;
  const months = kindMonths(kind, latitude);
  return (
    <div class="stack small">
      <p>
        In leaf {percentText(leaves.on)} of the light passes ({rangeText(leaves.onRange)} from tree to tree),
        bare {percentText(leaves.off)} ({rangeText(leaves.offRange)}). By month at this latitude:
      </p>
      <ul class="month-values">
        {monthNames().map((month, place) => (
          <li key={month}>
            <span class="faint">{month}</span> {percentText(months[place])}
          </li>
        ))}
      </ul>
      <p class="faint">{leaves.source}.</p>
    </div>
  );
}

/** How much light passes: the kind's own, one value, or twelve. */
export function TransmittanceFields(props: {
  kind: ObstructionKind;
  latitude: number;
  draft: TransmittanceDraft;
  asked: boolean;
  onChange: (draft: TransmittanceDraft) => void;
}) {
  const { kind, latitude, draft, asked, onChange } = props;
  const typed = typedTransmittance(draft);
  const fault = asked && 'fault' in typed ? typed.fault : null;
  const choose = (by: TransmittanceDraft['by']) => {
    const months = kindMonths(kind, latitude).map((share) => String(Math.round(share * 100)));
    // The kind's own values are where twelve of one's own begin.
    onChange({ ...draft, by, ...(by === 'months' && draft.by === 'kind' && { months }) });
  };
  return (
    <fieldset class="fields">
      <legend>Light that passes through</legend>
      <ChoiceField
        label="By"
        value={draft.by}
        options={[
          { value: 'kind', label: 'What is usual for its kind' },
          { value: 'one', label: 'One value for all the year' },
          { value: 'months', label: 'A value for each month' },
        ]}
        onChoose={choose}
      />
      {draft.by === 'kind' && <KindValues kind={kind} latitude={latitude} />}
      {draft.by === 'one' && (
        <TextField
          label="Share that passes"
          unit="%"
          keys="numbers"
          value={draft.one}
          onInput={(one) => onChange({ ...draft, one })}
          fault={fault}
        />
      )}
      {draft.by === 'months' && (
        <>
          <div class="month-fields">
            {monthNames().map((month, place) => (
              <TextField
                key={month}
                label={month}
                unit="%"
                keys="numbers"
                value={draft.months[place]}
                onInput={(value) =>
                  onChange({ ...draft, months: draft.months.map((old, i) => (i === place ? value : old)) })
                }
              />
            ))}
          </div>
          {fault && <p class="field-fault small">{fault}</p>}
        </>
      )}
    </fieldset>
  );
}
