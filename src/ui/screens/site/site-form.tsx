import { useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { PlaceFields } from '../../components/site-fields/place-fields.tsx';
import { usePlace } from '../../components/site-fields/use-place.ts';
import { faultOf, typedNumber, valueOf } from '../../typed.ts';

const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** An empty text stands for nothing at all. */
const orNothing = (text: string): string | undefined => text.trim() || undefined;

/** Changing where the site is and what is known of the visit. */
export function SiteForm(props: {
  survey: Survey;
  services: AppServices;
  nowMs: number;
  onSave: (survey: Survey) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { survey, services, nowMs } = props;
  const { site } = survey;
  const place = usePlace(services, nowMs, site);
  const [address, setAddress] = useState(site.address ?? '');
  const [notes, setNotes] = useState(survey.notes ?? '');
  const [day, setDay] = useState(survey.surveyedOn ?? '');
  const [albedo, setAlbedo] = useState(site.albedo === undefined ? '' : String(site.albedo * 100));
  const [asked, setAsked] = useState(false);
  const reflects = typedNumber(albedo, { least: 0, most: 100, unit: ' %', optional: true });
  const dayFault =
    day.trim() === '' || (DAY.test(day.trim()) && !Number.isNaN(Date.parse(day.trim())))
      ? null
      : 'Write the day as 2026-05-14, or leave it out.';
  const save = () => {
    setAsked(true);
    if (!place.site || dayFault || 'fault' in reflects) return false;
    const share = valueOf(reflects);
    const after: Survey = {
      ...survey,
      surveyedOn: orNothing(day),
      notes: orNothing(notes),
      site: {
        ...site,
        altitude: undefined,
        ...place.site,
        address: orNothing(address),
        albedo: share === undefined ? undefined : share / 100,
      },
    };
    return props.onSave(after);
  };
  return (
    <Form label="Site" action="Save the site" onSubmit={save} onCancel={props.onCancel}>
      <PlaceFields place={place} nowMs={nowMs} asked={asked} />
      <TextField label="Address" value={address} onInput={setAddress} maxLength={500} />
      <TextField
        label="Day of the visit"
        value={day}
        onInput={setDay}
        fault={dayFault}
        hint="Such as 2026-05-14."
      />
      <TextField
        label="Light the ground reflects"
        unit="%"
        keys="numbers"
        value={albedo}
        onInput={setAlbedo}
        fault={faultOf(reflects)}
        hint="20 % for grass and soil where nothing is given; fresh snow about 80 %, light gravel about 30 %."
      />
      <TextField label="Notes" value={notes} onInput={setNotes} lines={4} maxLength={20_000} />
    </Form>
  );
}
