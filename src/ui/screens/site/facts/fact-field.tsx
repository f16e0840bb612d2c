import { useId, useState } from 'preact/hooks';
import type { FactRow } from '../../../../core/survey/site-facts-general.ts';
import { dropOwnChoice, ownChoices } from '../../../device/own-choices.ts';
import { NONE, withChoice } from './several-choices.ts';
import { TextField } from '../../../components/form/text-field.tsx';

const OTHER = ' other';

interface FactFieldProps {
  row: FactRow;
  /** What the survey has: it can be chosen again even where no list has it. */
  stored: readonly string[];
  value: string[];
  onChange: (value: string[]) => void;
}

function OwnAnswers({ id, own }: { id: string; own: string[] }) {
  return (
    <div class="row">
      {own.map((answer) => (
        <button key={answer} type="button" class="plain" onClick={() => dropOwnChoice(id, answer)}>
          Offer “{answer}” no more
        </button>
      ))}
    </div>
  );
}

/** The answers to choose from: the list's, those written on this device, and those of this survey; each once. */
const listedFor = ({ choices }: FactRow, own: readonly string[], stored: readonly string[]): string[] => [
  ...new Set([...choices, ...own, ...stored]),
];

/** One answer from a list, or one's own. */
function OneAnswer({ row, stored, value, onChange }: FactFieldProps) {
  const id = useId();
  const own = ownChoices.value[row.id] ?? [];
  const listed = listedFor(row, own, stored);
  const answer = value[0] ?? '';
  const [choseOther, setWriting] = useState(false);
  const writing = choseOther || (answer !== '' && !listed.includes(answer));
  return (
    <div class="field">
      <label for={id}>{row.label}</label>
      <select
        id={id}
        value={writing ? OTHER : answer}
        onChange={({ currentTarget }) => {
          const isOther = currentTarget.value === OTHER;
          setWriting(isOther);
          onChange(isOther || currentTarget.value === '' ? [] : [currentTarget.value]);
        }}
      >
        <option value="">Not looked at</option>
        {listed.map((choice) => (
          <option key={choice} value={choice}>
            {row.labels?.[choice] ?? choice}
          </option>
        ))}
        <option value={OTHER}>Something else…</option>
      </select>
      {writing && (
        <>
          <TextField
            label={`${row.label}, in your words`}
            value={answer}
            maxLength={1000}
            onInput={(text) => onChange([text])}
            hint="Offered next time too."
          />
          {own.length > 0 && <OwnAnswers id={row.id} own={own} />}
        </>
      )}
      {row.hint && <p class="faint small">{row.hint}</p>}
    </div>
  );
}

/** Several answers, ticked, and one's own. */
function SeveralAnswers({ row, stored, value, onChange }: FactFieldProps) {
  const own = ownChoices.value[row.id] ?? [];
  const listed = listedFor(row, own, stored);
  const written = value.find((answer) => !listed.includes(answer)) ?? '';
  const ticked = value.filter((answer) => listed.includes(answer));
  const put = (answers: string[], text: string) => onChange(text === '' ? answers : [...answers, text]);
  return (
    <fieldset class="fields">
      <legend>{row.label}</legend>
      {listed.map((choice) => (
        <label key={choice} class="tick">
          <input
            type="checkbox"
            checked={ticked.includes(choice)}
            onChange={({ currentTarget }) =>
              put(
                currentTarget.checked ? withChoice(ticked, choice) : ticked.filter((one) => one !== choice),
                choice === NONE && currentTarget.checked ? '' : written,
              )
            }
          />
          {row.labels?.[choice] ?? choice}
        </label>
      ))}
      <TextField
        label={`${row.label}, something else`}
        value={written}
        maxLength={1000}
        onInput={(text) => put(text === '' ? ticked : ticked.filter((one) => one !== NONE), text)}
      />
      {row.hint && <p class="faint small">{row.hint}</p>}
    </fieldset>
  );
}

export function FactField(props: FactFieldProps) {
  return props.row.several ? <SeveralAnswers {...props} /> : <OneAnswer {...props} />;
}
