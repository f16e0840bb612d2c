import { useId } from 'preact/hooks';
import './form.css';

export interface TextFieldProps {
  label: string;
  value: string;
  onInput: (value: string) => void;
  /** What is wrong with the value; shown under it and read out with it. */
  fault?: string | null;
  hint?: string;
  unit?: string;
  /** `numbers`: a keyboard of figures where the device has one. */
  keys?: 'text' | 'numbers';
  /** Values to pick from; any other may be typed too. */
  choices?: readonly string[];
  lines?: number;
  maxLength?: number;
}

/** A line to type in, with its label above and what is wrong with it below. */
export function TextField(props: TextFieldProps) {
  const { label, value, onInput, fault, hint, unit, keys = 'text', choices, lines, maxLength } = props;
  const id = useId();
  const told = fault ?? hint;
  const shared = {
    id,
    value,
    maxLength,
    autocomplete: 'off',
    'aria-invalid': fault ? true : undefined,
    'aria-describedby': told ? `${id}-told` : undefined,
  };
  return (
    <div class="field">
      <label for={id}>
        {label}
        {unit && <span class="faint"> ({unit})</span>}
      </label>
      {lines ? (
        <textarea {...shared} rows={lines} onInput={({ currentTarget }) => onInput(currentTarget.value)} />
      ) : (
        <input
          {...shared}
          type="text"
          inputMode={keys === 'numbers' ? 'decimal' : undefined}
          list={choices && `${id}-choices`}
          onInput={({ currentTarget }) => onInput(currentTarget.value)}
        />
      )}
      {choices && (
        <datalist id={`${id}-choices`}>
          {choices.map((choice) => (
            <option key={choice} value={choice} />
          ))}
        </datalist>
      )}
      {told && (
        <p id={`${id}-told`} class={fault ? 'field-fault small' : 'faint small'}>
          {told}
        </p>
      )}
    </div>
  );
}
