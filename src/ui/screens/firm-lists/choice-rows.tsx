import { useState } from 'preact/hooks';
import type { FirmChoice } from '../../../core/survey/fact-lists.ts';
import { wordsFault } from '../../../core/survey/parse-fact-lists.ts';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';

const shownOf = ({ value, label }: FirmChoice) => label ?? value;

interface RowProps {
  choice: FirmChoice;
  /** Comes with the app: hidden instead of taken away. */
  isBuiltIn: boolean;
  isTaken: (label: string) => boolean;
  onUp: (() => void) | null;
  onDown: (() => void) | null;
  onRename: (label: string) => void;
  onHide: (hidden: boolean) => void;
  onRemove: () => void;
}

function RenameForm(props: {
  choice: FirmChoice;
  isTaken: (label: string) => boolean;
  onRename: (label: string) => void;
  onDone: () => void;
}) {
  const { choice, onRename, onDone } = props;
  const [label, setLabel] = useState(shownOf(choice));
  const wrong = wordsFault(label.trim());
  const fault = wrong
    ? `The name ${wrong}.`
    : props.isTaken(label.trim())
      ? 'Another answer of the list is shown so.'
      : null;
  const save = () => {
    if (fault !== null) return false;
    onRename(label.trim());
    onDone();
    return true;
  };
  return (
    <Form label={`Rename ${shownOf(choice)}`} action="Save the name" onSubmit={save} onCancel={onDone}>
      <TextField
        label="Shown as"
        value={label}
        onInput={setLabel}
        maxLength={200}
        fault={fault}
        hint={`Surveys record “${choice.value}”, so that they can be read without this list.`}
      />
    </Form>
  );
}

function Row(props: RowProps) {
  const { choice, isBuiltIn, onUp, onDown } = props;
  const [renaming, setRenaming] = useState(false);
  const name = shownOf(choice);
  const about = [
    choice.label && `recorded as ${choice.value}`,
    choice.hidden && 'not offered',
    !isBuiltIn && 'the firm’s own',
  ]
    .filter(Boolean)
    .join('; ');
  return (
    <li class="stack entry firm-choice">
      <div>
        <strong>{name}</strong> {about && <span class="faint small">{about}</span>}
      </div>
      {renaming ? (
        <RenameForm
          choice={choice}
          isTaken={props.isTaken}
          onRename={props.onRename}
          onDone={() => setRenaming(false)}
        />
      ) : (
        <div class="row">
          <button type="button" aria-label={`Move ${name} up`} disabled={!onUp} onClick={() => onUp?.()}>
            ↑
          </button>
          <button
            type="button"
            aria-label={`Move ${name} down`}
            disabled={!onDown}
            onClick={() => onDown?.()}
          >
            ↓
          </button>
          <button type="button" aria-label={`Rename ${name}`} onClick={() => setRenaming(true)}>
            Rename
          </button>
          {isBuiltIn ? (
            <button
              type="button"
              aria-label={choice.hidden ? `Offer ${name} again` : `Hide ${name}`}
              onClick={() => props.onHide(!choice.hidden)}
            >
              {choice.hidden ? 'Offer again' : 'Hide'}
            </button>
          ) : (
            <button type="button" aria-label={`Remove ${name}`} onClick={props.onRemove}>
              Remove
            </button>
          )}
        </div>
      )}
    </li>
  );
}

/** The answers of a list in the order in which they are offered, each with its acts. */
export function ChoiceRows(props: {
  choices: readonly FirmChoice[];
  isBuiltIn: (value: string) => boolean;
  onChange: (choices: FirmChoice[], done: string) => void;
}) {
  const { choices, isBuiltIn, onChange } = props;
  const put = (place: number, part: Partial<FirmChoice>, done: string) =>
    onChange(
      choices.map((choice, i) => (i === place ? { ...choice, ...part } : choice)),
      done,
    );
  const move = (place: number, to: number) => {
    const moved = [...choices];
    moved.splice(to, 0, ...moved.splice(place, 1));
    onChange(moved, `“${shownOf(choices[place])}” now stands at place ${to + 1}.`);
  };
  return (
    <ol class="entries" aria-label="Answers offered">
      {choices.map((choice, place) => (
        <Row
          key={choice.value}
          choice={choice}
          isBuiltIn={isBuiltIn(choice.value)}
          isTaken={(label) => choices.some((other) => other !== choice && shownOf(other) === label)}
          onUp={place === 0 ? null : () => move(place, place - 1)}
          onDown={place === choices.length - 1 ? null : () => move(place, place + 1)}
          onRename={(label) => put(place, { label }, `“${choice.value}” is shown as “${label}”.`)}
          onHide={(hidden) =>
            put(
              place,
              { hidden },
              `“${shownOf(choice)}” is ${hidden ? 'not offered any more' : 'offered again'}.`,
            )
          }
          onRemove={() =>
            onChange(
              choices.filter((_, i) => i !== place),
              `“${shownOf(choice)}” is removed. Surveys that have it keep it.`,
            )
          }
        />
      ))}
    </ol>
  );
}
