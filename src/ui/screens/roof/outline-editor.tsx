import { useRef } from 'preact/hooks';
import type { LengthUnit } from '../../../core/pointing/tape-length.ts';
import type { CornerDraft } from './plane-draft.ts';

/** The corners of a plane as a table: lengths along the eave and up the slope, in order around the edge. */
export function OutlineEditor(props: {
  corners: CornerDraft[];
  unit: LengthUnit;
  fault: string | null;
  onChange: (corners: CornerDraft[]) => void;
}) {
  const { corners, unit, fault, onChange } = props;
  const table = useRef<HTMLTableElement>(null);
  const put = (key: number, change: Partial<CornerDraft>) =>
    onChange(corners.map((corner) => (corner.key === key ? { ...corner, ...change } : corner)));
  const add = () => {
    const key = Math.max(-1, ...corners.map((corner) => corner.key)) + 1;
    onChange([...corners, { key, x: '', y: '' }]);
    requestAnimationFrame(() =>
      table.current?.querySelector<HTMLInputElement>('tbody tr:last-child input')?.focus(),
    );
  };
  const input = (corner: CornerDraft, place: number, axis: 'x' | 'y', what: string) => (
    <input
      type="text"
      inputMode={unit === 'feet' ? undefined : 'decimal'}
      autocomplete="off"
      aria-label={`Corner ${place + 1}, ${what}`}
      aria-invalid={fault ? true : undefined}
      value={corner[axis]}
      onInput={({ currentTarget }) => put(corner.key, { [axis]: currentTarget.value })}
    />
  );
  return (
    <div class="stack">
      <p class="faint small">
        From the lower-left corner, looking up the slope;{' '}
        {unit === 'feet' ? `feet, such as 4' 6",` : 'metres'} along the eave to the right, then up the slope.
        In order around the edge.
      </p>
      <table ref={table} class="corner-table">
        <thead>
          <tr>
            <th scope="col">Corner</th>
            <th scope="col">Along ({unit === 'feet' ? 'ft' : 'm'})</th>
            <th scope="col">Up ({unit === 'feet' ? 'ft' : 'm'})</th>
            <th scope="col">
              <span class="visually-hidden">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {corners.map((corner, place) => (
            <tr key={corner.key}>
              <th scope="row">{place + 1}</th>
              <td>{input(corner, place, 'x', 'along the eave')}</td>
              <td>{input(corner, place, 'y', 'up the slope')}</td>
              <td>
                <button
                  type="button"
                  aria-label={`Remove corner ${place + 1}`}
                  disabled={corners.length <= 3}
                  onClick={() => onChange(corners.filter(({ key }) => key !== corner.key))}
                >
                  ×
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {fault && <p class="field-fault small">{fault}</p>}
      <div>
        <button type="button" onClick={add}>
          Add a corner
        </button>
      </div>
    </div>
  );
}
