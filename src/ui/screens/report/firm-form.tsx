import { useState } from 'preact/hooks';
import type { ReportSettings } from '../../../app/report-settings.ts';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';

type Firm = ReportSettings['firm'];

const MOST_LINES = 6;
const DEFAULT_COLOUR = '#14120d';

/** Whose letter it is; kept on this device for all reports. */
export function FirmForm({ firm, onSave }: { firm: Firm; onSave: (firm: Firm) => void }) {
  const [name, setName] = useState(firm.name);
  const [lines, setLines] = useState(firm.lines.join('\n'));
  const [colour, setColour] = useState(firm.colour);
  const [saved, setSaved] = useState(false);
  const typed = lines
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '');
  const fault = typed.length > MOST_LINES ? `A letterhead has room for ${MOST_LINES} lines.` : null;
  const edit =
    <T,>(set: (value: T) => void) =>
    (value: T) => {
      setSaved(false);
      set(value);
    };
  const save = () => {
    if (fault) return false;
    onSave({ name: name.trim(), lines: typed, colour });
    setSaved(true);
    return true;
  };
  return (
    <fieldset>
      <legend>Letterhead</legend>
      <Form label="Letterhead" action="Keep the letterhead" onSubmit={save}>
        <TextField
          label="Firm"
          value={name}
          maxLength={120}
          onInput={edit(setName)}
          hint="Empty: no letterhead."
        />
        <TextField
          label="Address, telephone, mail"
          value={lines}
          lines={4}
          maxLength={600}
          onInput={edit(setLines)}
          fault={fault}
        />
        <div class="field">
          <label class="colour">
            <input
              type="checkbox"
              checked={colour !== null}
              onChange={({ currentTarget }) => edit(setColour)(currentTarget.checked ? DEFAULT_COLOUR : null)}
            />
            <span>Rules in the firm’s colour</span>
          </label>
          {colour !== null && (
            <input
              type="color"
              aria-label="The firm’s colour"
              value={colour}
              onInput={({ currentTarget }) => edit(setColour)(currentTarget.value)}
            />
          )}
        </div>
      </Form>
      <p role="status" class="small">
        {saved ? 'Kept on this device.' : ''}
      </p>
    </fieldset>
  );
}
