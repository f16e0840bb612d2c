import { feetDoubt } from '../../../core/pointing/tape-length.ts';
import { lengthUnit } from '../../device/length-unit.ts';
import { lengthText, typedLength } from '../../length-text.ts';
import { faultOf, valueOf } from '../../typed.ts';
import { TextField } from '../form/text-field.tsx';

/** A length by tape; what is typed is repeated in the other way of writing, so that a wrong unit shows. */
export function LengthField(props: {
  label: string;
  value: string;
  onInput: (value: string) => void;
  /** Metres over which it is asked whether feet were meant. */
  usual: number;
  stored?: number;
  hint?: string;
  fault?: string | null;
}) {
  const unit = lengthUnit.value;
  const typed = typedLength(props.value, unit, props.stored);
  const metres = valueOf(typed);
  const doubt = metres === undefined || unit === 'feet' ? null : feetDoubt(metres, props.usual);
  const repeated =
    metres === undefined ? props.hint : `= ${lengthText(metres, unit === 'feet' ? 'metres' : 'feet')}`;
  return (
    <TextField
      label={props.label}
      unit={unit === 'feet' ? 'feet, such as 41\' 6"' : 'metres'}
      value={props.value}
      onInput={props.onInput}
      keys={unit === 'feet' ? 'text' : 'numbers'}
      fault={faultOf(typed) ?? props.fault}
      hint={doubt ?? repeated}
    />
  );
}
