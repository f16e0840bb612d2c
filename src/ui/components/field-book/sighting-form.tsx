import { useState } from 'preact/hooks';
import type { SightingDirection } from '../../../core/survey/sighting-direction.ts';
import { amended } from '../../../core/survey/sighting-edits.ts';
import type { Sighting } from '../../../core/survey/survey.ts';
import { faultOf, typedNumber } from '../../typed.ts';
import { degreesText } from '../../value-text.ts';
import { Form } from '../form/form.tsx';
import { TextField } from '../form/text-field.tsx';
import { TapedElevation } from './taped-elevation.tsx';

const shown = (value: number | undefined) =>
  value === undefined ? '' : String(Math.round(value * 100) / 100);

/** Whether a sighting has a raw reading, over which only an amendment may stand. */
export const hasReading = ({ reading, readings }: Sighting): boolean =>
  reading !== undefined || (readings ?? []).length > 0;

/** Typing a sighting: a new one, or a change; over a raw reading the change is an amendment with its reason. */
export function SightingForm(props: {
  /** Null for a new one. */
  sighting: Sighting | null;
  newId: string;
  /** Where it points now. */
  direction: SightingDirection | null;
  instrumentHeight?: number;
  nowMs: number;
  onSave: (sighting: Sighting) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { sighting, direction } = props;
  const [azimuth, setAzimuth] = useState(shown(direction?.azimuth));
  const [elevation, setElevation] = useState(shown(direction?.elevation));
  const [mark, setMark] = useState(sighting?.mark ?? '');
  const [reason, setReason] = useState('');
  const [asked, setAsked] = useState(false);
  const overReading = sighting !== null && hasReading(sighting);
  const moved = azimuth !== shown(direction?.azimuth) || elevation !== shown(direction?.elevation);
  const typedAzimuth = typedNumber(azimuth, { least: 0, most: 360, unit: '°' });
  const typedElevation = typedNumber(elevation, { least: -90, most: 90, unit: '°' });
  const needsReason = overReading && moved;
  const reasonFault = needsReason && reason.trim() === '' ? 'Say why, so that it can be judged later.' : null;
  const untouched = sighting !== null && !moved;
  const save = () => {
    setAsked(true);
    const named: Sighting = { ...(sighting ?? { id: props.newId }) };
    if (mark.trim()) named.mark = mark.trim();
    else delete named.mark;
    if (untouched) return props.onSave(named);
    if (reasonFault || !('value' in typedAzimuth) || !('value' in typedElevation)) return false;
    const [a, e] = [typedAzimuth.value, typedElevation.value];
    if (a === undefined || e === undefined) return false;
    const angles = { azimuth: a % 360, elevation: e };
    const madeAt = new Date(props.nowMs).toISOString();
    return props.onSave(
      overReading ? amended(named, { ...angles, reason: reason.trim(), madeAt }) : { ...named, ...angles },
    );
  };
  const told = (typed: typeof typedAzimuth) => (asked && !untouched ? faultOf(typed) : null);
  return (
    <Form
      label="Sighting"
      action={sighting ? 'Save the sighting' : 'Add the sighting'}
      onSubmit={save}
      onCancel={props.onCancel}
    >
      {overReading && (
        <p class="small">
          {direction
            ? `Now ${degreesText(direction.azimuth)} and ${degreesText(direction.elevation)}. `
            : 'It points nowhere yet. '}
          The raw reading stays; what you type stands over it.
        </p>
      )}
      <div class="pair">
        <TextField
          label="Azimuth"
          unit="degrees from true north"
          keys="numbers"
          value={azimuth}
          onInput={setAzimuth}
          fault={told(typedAzimuth)}
        />
        <TextField
          label="Elevation"
          unit="degrees"
          keys="numbers"
          value={elevation}
          onInput={setElevation}
          fault={told(typedElevation)}
        />
      </div>
      <TapedElevation instrumentHeight={props.instrumentHeight} onFound={setElevation} />
      {needsReason && (
        <TextField
          label="Reason for the change"
          value={reason}
          onInput={setReason}
          maxLength={500}
          fault={asked ? reasonFault : null}
        />
      )}
      <TextField
        label="Mark"
        value={mark}
        onInput={setMark}
        maxLength={200}
        hint="Its name, where it is a point seen from elsewhere too. Optional."
      />
    </Form>
  );
}
