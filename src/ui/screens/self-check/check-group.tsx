import { useId } from 'preact/hooks';
import type { CheckRow, SelfCheckGroup } from '../../../core/self-check/check-row.ts';
import { shownRow } from '../../../core/self-check/shown-row.ts';
import { ColumnHeads } from '../../components/column-heads.tsx';

const HEADS = [
  'What',
  { number: 'Published' },
  { number: 'Computed here' },
  { number: 'Difference' },
  { number: 'Allowed' },
  'Result',
];

/** One source: what it prints, what this device computes, row by row. */
export function CheckGroup({ group }: { group: SelfCheckGroup }) {
  const headingId = useId();
  const wrong = group.rows.filter(({ ok }) => !ok).length;
  return (
    <section class="check-group stack">
      <h2 id={headingId}>{group.title}</h2>
      <p class="small">
        {wrong === 0 ? `All ${group.rows.length} met.` : `${wrong} of ${group.rows.length} not met.`}{' '}
        {group.allowance}
      </p>
      <div class="scroll-x" role="region" aria-labelledby={headingId} tabIndex={0}>
        <table>
          <ColumnHeads heads={HEADS} />
          <tbody>
            {group.rows.map((row) => (
              <ValueRow key={`${row.name} ${row.quantity}`} row={row} />
            ))}
          </tbody>
        </table>
      </div>
      <p class="faint small">Source: {group.source}.</p>
    </section>
  );
}

function ValueRow({ row }: { row: CheckRow }) {
  const { published, computed, difference, allowed } = shownRow(row);
  return (
    <tr class={row.ok ? undefined : 'not-met'}>
      <th scope="row">
        {row.quantity} <span class="faint small">{row.name}</span>
      </th>
      <td class="number">{published}</td>
      <td class="number">{computed}</td>
      <td class="number">{difference}</td>
      <td class="number">{allowed}</td>
      <td>{row.ok ? 'met' : <strong>NOT MET</strong>}</td>
    </tr>
  );
}
