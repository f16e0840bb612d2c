import { useState } from 'preact/hooks';
import type { FirmChoice } from '../../../core/survey/fact-lists.ts';
import { wordsFault } from '../../../core/survey/parse-fact-lists.ts';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';

function faultOf(value: string, choices: readonly FirmChoice[]): string | null {
  const fault = wordsFault(value);
  if (fault !== null) return `The answer ${fault}.`;
  const isTaken = choices.some((choice) => choice.value === value || choice.label === value);
  return isTaken ? 'The list has it already.' : null;
}

/** An answer of the firm's own, offered first. */
export function AddChoice(props: { choices: readonly FirmChoice[]; onAdd: (choice: FirmChoice) => void }) {
  const [value, setValue] = useState('');
  const [asked, setAsked] = useState(false);
  const fault = faultOf(value.trim(), props.choices);
  const add = () => {
    setAsked(fault !== null);
    if (fault !== null) return false;
    props.onAdd({ value: value.trim() });
    setValue('');
    return true;
  };
  return (
    <Form label="New answer" action="Add the answer" onSubmit={add}>
      <TextField
        label="New answer"
        value={value}
        maxLength={200}
        onInput={(text) => {
          setValue(text);
          setAsked(false);
        }}
        fault={asked ? fault : null}
        hint="Offered first. Surveys record it as it is written here."
      />
    </Form>
  );
}
