import { useEffect, useMemo, useState } from 'preact/hooks';
import { dayAt, proposedTitle, startSurvey } from '../../../app/actions/start-survey.ts';
import { refreshList } from '../../../app/actions/refresh-list.ts';
import type { AppServices } from '../../../app/app-services.ts';
import { attempt } from '../../../app/attempt.ts';
import { Form } from '../../components/form/form.tsx';
import { useDraft } from '../../components/form/use-draft.ts';
import { TextField } from '../../components/form/text-field.tsx';
import { ScreenHeading } from '../../components/screen-heading.tsx';
import { PlaceFields } from '../../components/site-fields/place-fields.tsx';
import { placeTexts, usePlace } from '../../components/site-fields/use-place.ts';
import { navigate } from '../../router.ts';
import { surveyPath } from '../../survey-path.ts';

/** A new survey: only the place is needed, all else can come later. */
export function NewSurveyScreen({ services }: { services: AppServices }) {
  const { state } = services;
  const nowMs = useMemo(() => services.now(), [services]);
  const draft = useDraft({ survey: '', form: 'new-survey', label: 'New survey', over: null }, () => ({
    ...placeTexts(),
    title: '',
    address: '',
    notes: '',
  }));
  const { change } = draft;
  const { title, address, notes } = draft.typed;
  const place = usePlace(services, nowMs, draft.typed, change);
  const [asked, setAsked] = useState(false);
  useEffect(() => void attempt(state, () => refreshList(services)), [services, state]);

  const taken = state.surveys.value?.map((summary) => summary.title) ?? [];
  const day = dayAt(nowMs, place.site?.timeZone ?? 'UTC');
  const start = async () => {
    setAsked(true);
    if (!place.site) return false;
    const site = { ...place.site, ...(address.trim() && { address: address.trim() }) };
    return attempt(state, async () => {
      const id = await startSurvey(services, { title, site, notes });
      navigate(surveyPath(id, 'roof'), true); // Back leads to the list, not to a form for yet another one
    });
  };
  return (
    <div class="stack">
      <ScreenHeading title="New survey" />
      <Form
        label="New survey"
        action="Start the survey"
        onSubmit={start}
        onCancel={() => navigate('/')}
        draft={draft.state}
      >
        <PlaceFields place={place} nowMs={nowMs} asked={asked} />
        <TextField
          label="Title"
          value={title}
          onInput={(text) => change({ title: text })}
          maxLength={200}
          hint={`Without one: ${proposedTitle(address, day, taken)}`}
        />
        <TextField
          label="Address"
          value={address}
          onInput={(text) => change({ address: text })}
          maxLength={500}
          hint="Optional."
        />
        <TextField
          label="Notes"
          value={notes}
          onInput={(text) => change({ notes: text })}
          lines={3}
          maxLength={20_000}
          hint="Optional."
        />
      </Form>
    </div>
  );
}
