import { useId } from 'preact/hooks';
import './form.css';

/** One of a few, from a list that opens. */
export function ChoiceField<T extends string>(props: {
  label: string;
  value: T;
  options: readonly { value: T; label: string }[];
  onChoose: (value: T) => void;
  hint?: string;
}) {
  const id = useId();
  return (
    <div class="field">
      <label for={id}>{props.label}</label>
      <select
        id={id}
        value={props.value}
        aria-describedby={props.hint ? `${id}-told` : undefined}
        onChange={({ currentTarget }) => props.onChoose(currentTarget.value as T)}
      >
        {props.options.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      {props.hint && (
        <p id={`${id}-told`} class="faint small">
          {props.hint}
        </p>
      )}
    </div>
  );
}
