import { chooseLengthUnit, lengthUnit } from '../../device/length-unit.ts';
import { ChoiceField } from '../form/choice-field.tsx';

/** Metres, or feet and inches; kept for the next time. */
export function UnitChoice() {
  return (
    <ChoiceField
      label="Lengths are typed in"
      value={lengthUnit.value}
      options={[
        { value: 'metres', label: 'Metres' },
        { value: 'feet', label: 'Feet and inches' },
      ]}
      onChoose={chooseLengthUnit}
    />
  );
}
