import { useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { JsonValue } from '../../../core/survey/json-value.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { Form } from '../../components/form/form.tsx';
import { useDraft } from '../../components/form/use-draft.ts';
import { TextField } from '../../components/form/text-field.tsx';
import { PlaceFields } from '../../components/site-fields/place-fields.tsx';
import { placeTexts, usePlace } from '../../components/site-fields/use-place.ts';
import { faultOf, typedNumber, valueOf } from '../../typed.ts';

const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** An empty text stands for nothing at all. */
const orNothing = (text: string): string | undefined => text.trim() || undefined;

/** Name of this form. */
export const SITE_FORM = 'site';

/** What this form changes, as it is stored. */
const storedOf = ({ site, notes, surveyedOn, surveyor }: Survey) =>
  ({ site, notes, surveyedOn, surveyor }) as unknown as JsonValue;

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
  const draft = useDraft(
    { survey: survey.id, form: SITE_FORM, label: 'Change the site', over: storedOf(survey) },
    () => ({
      ...placeTexts(site),
      address: site.address ?? '',
      notes: survey.notes ?? '',
      day: survey.surveyedOn ?? '',
      surveyor: survey.surveyor ?? '',
      albedo: site.albedo === undefined ? '' : String(Math.round(site.albedo * 1e6) / 1e4),
    }),
  );
  const { change } = draft;
  const { address, notes, day, surveyor, albedo } = draft.typed;
  const place = usePlace(services, nowMs, draft.typed, change, site);
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
      surveyor: orNothing(surveyor),
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
    <Form label="Site" action="Save the site" onSubmit={save} onCancel={props.onCancel} draft={draft.state}>
      <PlaceFields place={place} nowMs={nowMs} asked={asked} />
      <TextField
        label="Address"
        value={address}
        onInput={(text) => change({ address: text })}
        maxLength={500}
      />
      <TextField
        label="Day of the visit"
        value={day}
        onInput={(text) => change({ day: text })}
        fault={dayFault}
        hint="Such as 2026-05-14."
      />
      <TextField
        label="Surveyor"
        value={surveyor}
        onInput={(text) => change({ surveyor: text })}
        maxLength={200}
        hint="Who took the sightings; the report names them."
      />
      <TextField
        label="Light the ground reflects"
        unit="%"
        keys="numbers"
        value={albedo}
        onInput={(text) => change({ albedo: text })}
        fault={faultOf(reflects)}
        hint="20 % for grass and soil where nothing is given; fresh snow about 80 %, light gravel about 30 %."
      />
      <TextField
        label="Notes"
        value={notes}
        onInput={(text) => change({ notes: text })}
        lines={4}
        maxLength={20_000}
      />
    </Form>
  );
}
