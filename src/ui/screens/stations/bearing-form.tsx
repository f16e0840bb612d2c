import { useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { giveBearing } from '../../../app/capture/edit-check.ts';
import type { HeadingCheck, Station } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import type { SectionProps } from '../../section.ts';
import { faultOf, typedNumber, valueOf } from '../../typed.ts';
import { utmZone } from '../../../core/pointing/utm.ts';

type Frame = NonNullable<HeadingCheck['frame']>;

/** The bearing of a mark or an eave, read from a plan at the office, for a check that waits for it. */
export function BearingForm(props: SectionProps & { station: Station; check: HeadingCheck }) {
  const { services, survey, station, check } = props;
  const [bearing, setBearing] = useState('');
  const [frame, setFrame] = useState<Frame>('true');
  const [tried, setTried] = useState(false);
  const typed = typedNumber(bearing, { least: 0, most: 360, unit: '°' });
  const zone = utmZone(survey.site);
  const submit = async () => {
    setTried(true);
    const value = valueOf(typed);
    if (value === undefined) return false;
    const facts = { bearing: value, frame, ...(frame === 'grid' && { gridZone: zone }) };
    return attempt(services.state, () => giveBearing(services, survey, station.id, check.id, facts));
  };
  return (
    <Form
      label={`Bearing of ${check.mark ?? 'the sighted edge'}`}
      action="Give the bearing"
      onSubmit={submit}
    >
      <TextField
        label={`Bearing of ${check.mark ?? 'the sighted edge'} from ${station.name}`}
        unit="degrees"
        keys="numbers"
        value={bearing}
        onInput={setBearing}
        fault={tried ? faultOf(typed) : null}
      />
      <ChoiceField
        label="North of the plan"
        value={frame}
        options={[
          { value: 'true', label: 'True north' },
          { value: 'grid', label: `Map grid, UTM zone ${zone}` },
          { value: 'magnetic', label: 'Magnetic north' },
        ]}
        onChoose={setFrame}
      />
    </Form>
  );
}
