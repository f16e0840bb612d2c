import { useState } from 'preact/hooks';
import { elevationByTape } from '../../../core/pointing/tape.ts';
import { lengthUnit } from '../../device/length-unit.ts';
import { lengthInput, typedLength } from '../../length-text.ts';
import { valueOf } from '../../typed.ts';
import { degreesText } from '../../value-text.ts';
import { LengthField } from '../lengths/length-field.tsx';
import { UnitChoice } from '../lengths/unit-choice.tsx';

/** An elevation from an object's height and distance by tape. */
export function TapedElevation(props: { instrumentHeight?: number; onFound: (elevation: string) => void }) {
  const unit = lengthUnit.value;
  const [height, setHeight] = useState('');
  const [distance, setDistance] = useState('');
  const [instrument, setInstrument] = useState(lengthInput(props.instrumentHeight || undefined, unit));
  const [up, far] = [valueOf(typedLength(height, unit)), valueOf(typedLength(distance, unit))];
  const held = typedLength(instrument, unit);
  const elevation =
    up === undefined || far === undefined || 'fault' in held
      ? null
      : elevationByTape({ height: up, distance: far, instrumentHeight: held.value ?? 0 });
  return (
    <details class="fold taped">
      <summary>Elevation from height and distance</summary>
      <div class="form">
        <UnitChoice />
        <div class="pair">
          <LengthField
            label="Height of its top"
            value={height}
            usual={60}
            onInput={setHeight}
            hint="Over the surface the station stands on."
          />
          <LengthField
            label="Distance"
            value={distance}
            usual={200}
            onInput={setDistance}
            hint="Along the level."
          />
          <LengthField
            label="Height of the instrument"
            value={instrument}
            usual={5}
            onInput={setInstrument}
            hint="Over the same surface; nothing counts as 0."
          />
        </div>
        <div class="form-actions">
          <button
            type="button"
            disabled={elevation === null}
            onClick={() => elevation !== null && props.onFound(elevation.toFixed(1))}
          >
            {elevation === null ? 'Use the elevation' : `Use ${degreesText(elevation)}`}
          </button>
        </div>
      </div>
    </details>
  );
}
