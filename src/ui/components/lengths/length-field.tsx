import { feetDoubt } from '../../../core/pointing/tape-length.ts';
import { lengthUnit } from '../../device/length-unit.ts';
import { lengthText, typedLength, typedOffset } from '../../length-text.ts';
import { faultOf, valueOf } from '../../typed.ts';
import { TextField } from '../form/text-field.tsx';

const FOOT = 0.3048;

/** A length by tape; what is typed is repeated in the other way of writing, so that a wrong unit shows. */
export function LengthField(props: {
  label: string;
  value: string;
  onInput: (value: string) => void;
  /** Metres over which it is asked whether feet were meant. */
  usual: number;
  /** A place along an axis: it may be 0, or lie the other way. */
  signed?: boolean;
  stored?: number;
  hint?: string;
  /** What is odd about the length, instead of repeating it. */
  notice?: string;
  fault?: string | null;
}) {
  const unit = lengthUnit.value;
  const typed = (props.signed ? typedOffset : typedLength)(props.value, unit, props.stored);
  const metres = valueOf(typed);
  const doubt = metres === undefined || unit === 'feet' ? null : feetDoubt(Math.abs(metres), props.usual);
  const same = metres === undefined ? undefined : `= ${shown(metres, unit === 'feet' ? 'metres' : 'feet')}`;
  const isMuch = metres !== undefined && Math.abs(metres) > props.usual;
  const repeated = isMuch ? `${same}. That is more than usual; check the number.` : same;
  return (
    <div class="length-field">
      <TextField
        label={props.label}
        unit={unit === 'feet' ? 'feet, such as 41\' 6"' : 'metres'}
        value={props.value}
        onInput={props.onInput}
        keys={unit === 'feet' ? 'text' : 'numbers'}
        fault={faultOf(typed) ?? props.fault}
        hint={doubt ?? props.notice ?? repeated ?? props.hint}
      />
      {doubt !== null && metres !== undefined && (
        <button
          type="button"
          aria-label={`${props.label}: it was feet`}
          onClick={() => props.onInput(String(Math.round(metres * FOOT * 1000) / 1000))}
        >
          It was feet
        </button>
      )}
    </div>
  );
}

const shown = (metres: number, unit: 'feet' | 'metres') =>
  `${metres < 0 ? '−' : ''}${lengthText(Math.abs(metres), unit)}`;
