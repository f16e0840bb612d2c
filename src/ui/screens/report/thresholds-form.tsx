import { useState } from 'preact/hooks';
import type { ReportSettings } from '../../../app/report-settings.ts';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { faultOf, typedNumber } from '../../typed.ts';

type Thresholds = ReportSettings['thresholds'];

const ROWS = [
  { id: 'solarAccess', label: 'Solar access' },
  { id: 'orientationFactor', label: 'Orientation factor' },
  { id: 'product', label: 'Access × orientation' },
] as const;

const shown = (share: number | undefined): string =>
  share === undefined ? '' : String(Math.round(share * 10_000) / 100);

/** What a programme or a building code asks of a plane; nothing is asked unless it is typed. */
export function ThresholdsForm(props: { thresholds: Thresholds; onSave: (thresholds: Thresholds) => void }) {
  const [texts, setTexts] = useState(() =>
    Object.fromEntries(ROWS.map(({ id }) => [id, shown(props.thresholds[id])])),
  );
  const [saved, setSaved] = useState(false);
  const typed = ROWS.map(({ id }) => ({
    id,
    value: typedNumber(texts[id], { least: 0, most: 100, unit: '%', optional: true }),
  }));
  const save = () => {
    const asked: Thresholds = {};
    for (const { id, value } of typed) {
      if ('fault' in value) return false;
      if (value.value !== undefined) asked[id] = value.value / 100;
    }
    props.onSave(asked);
    setSaved(true);
    return true;
  };
  return (
    <fieldset>
      <legend>What a programme asks for</legend>
      <p class="small">
        Typed from the programme’s own rules; the evidence then says for each plane whether it was met.
      </p>
      <Form label="What a programme asks for" action="Keep what is asked" onSubmit={save}>
        {ROWS.map(({ id, label }, row) => (
          <TextField
            key={id}
            label={`${label}, at least`}
            unit="%"
            keys="numbers"
            value={texts[id]}
            fault={faultOf(typed[row].value)}
            onInput={(text) => {
              setSaved(false);
              setTexts((before) => ({ ...before, [id]: text }));
            }}
          />
        ))}
      </Form>
      <p role="status" class="small">
        {saved ? 'Kept on this device.' : ''}
      </p>
    </fieldset>
  );
}
