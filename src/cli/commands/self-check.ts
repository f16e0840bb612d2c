import type { SelfCheckGroup } from '../../core/self-check/check-row.ts';
import { runSelfCheck } from '../../core/self-check/run-self-check.ts';
import { shownRow } from '../../core/self-check/shown-row.ts';
import type { Command } from '../command.ts';
import { table } from '../table.ts';

export const selfCheck: Command = {
  name: 'self-check',
  usage: '[--json]',
  summary: 'Recomputes published values on this machine and shows the differences.',
  help: `
  --json   { ok, groups: [ { title, source, allowance, rows: [ { name, quantity, unit, published, computed,
             difference, allowed, ok } ] } ] }

Exit code 1 where a value differs by more than is allowed.`,
  options: { json: { type: 'boolean' } },
  run({ values, terminal }) {
    const groups = runSelfCheck();
    const rows = groups.flatMap((group) => group.rows);
    const wrong = rows.filter(({ ok }) => !ok).length;
    if (values.json) terminal.out(`${JSON.stringify({ ok: wrong === 0, groups }, null, 1)}\n`);
    else {
      const verdict =
        wrong === 0
          ? `All ${rows.length} published values are met.`
          : `${wrong} of ${rows.length} published values are NOT met. Do not trust results from this machine.`;
      terminal.out(`${groups.map(groupText).join('\n')}\n${verdict}\n`);
    }
    return wrong === 0 ? 0 : 1;
  },
};

const COLUMNS = [
  { head: 'what' },
  { head: 'quantity' },
  ...['published', 'computed', 'difference', 'allowed'].map((head) => ({ head, number: true })),
  { head: '' },
];

function groupText({ title, source, allowance, rows }: SelfCheckGroup): string {
  const cells = rows.map((row) => {
    const { published, computed, difference, allowed } = shownRow(row);
    return [row.name, row.quantity, published, computed, difference, allowed, row.ok ? 'met' : 'NOT MET'];
  });
  return `${title}\nSource: ${source}\n${allowance}\n\n${table(COLUMNS, cells)}`;
}
