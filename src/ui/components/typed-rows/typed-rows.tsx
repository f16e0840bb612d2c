import { useRef } from 'preact/hooks';
import './typed-rows.css';

/** A row as it is typed; `key` tells it from the others for as long as the form is open. */
export type TypedRow<Field extends string> = { key: number } & Record<Field, string>;

export interface TypedColumn<Field extends string> {
  field: Field;
  head: string;
  /** What a field of it is called where the head cannot be seen. */
  spoken: string;
}

interface Props<Field extends string> {
  rows: readonly TypedRow<Field>[];
  columns: readonly TypedColumn<Field>[];
  /** Head of the column of numbers. */
  head: string;
  /** What one row is: `sighting`. */
  one: string;
  /** Words of the button that adds a row. */
  add: string;
  fewest: number;
  /** Whether letters may be typed too, as in 4' 6". */
  letters?: boolean;
  fault: string | null;
  onChange: (rows: TypedRow<Field>[]) => void;
}

/** A table to type into: fields side by side, rows added at its end and taken out anywhere. */
export function TypedRows<Field extends string>(props: Props<Field>) {
  const { rows, columns, fault, onChange } = props;
  const table = useRef<HTMLTableElement>(null);
  const named = (place: number) => `${props.one} ${place + 1}`;
  const add = () => {
    const key = Math.max(-1, ...rows.map((row) => row.key)) + 1;
    const empty = Object.fromEntries(columns.map(({ field }) => [field, ''])) as Record<Field, string>;
    onChange([...rows, { ...empty, key }]);
    requestAnimationFrame(() =>
      table.current?.querySelector<HTMLInputElement>('tbody tr:last-child input')?.focus(),
    );
  };
  return (
    <>
      <table ref={table} class="typed-rows">
        <thead>
          <tr>
            <th scope="col">{props.head}</th>
            {columns.map(({ field, head }) => (
              <th key={field} scope="col">
                {head}
              </th>
            ))}
            <th scope="col">
              <span class="visually-hidden">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row, place) => (
            <tr key={row.key}>
              <th scope="row">{place + 1}</th>
              {columns.map(({ field, spoken }) => (
                <td key={field}>
                  <input
                    type="text"
                    inputMode={props.letters ? undefined : 'decimal'}
                    autocomplete="off"
                    aria-label={`${capital(named(place))}, ${spoken}`}
                    aria-invalid={fault ? true : undefined}
                    value={row[field]}
                    onInput={({ currentTarget: { value } }) =>
                      onChange(rows.map((one) => (one.key === row.key ? { ...one, [field]: value } : one)))
                    }
                  />
                </td>
              ))}
              <td>
                <button
                  type="button"
                  aria-label={`Remove ${named(place)}`}
                  disabled={rows.length <= props.fewest}
                  onClick={() => onChange(rows.filter(({ key }) => key !== row.key))}
                >
                  ×
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {fault && (
        <p class="field-fault small" role="alert">
          {fault}
        </p>
      )}
      <div>
        <button type="button" onClick={add}>
          {props.add}
        </button>
      </div>
    </>
  );
}

const capital = (text: string) => text[0].toUpperCase() + text.slice(1);
