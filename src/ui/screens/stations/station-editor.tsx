import { useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { addStation, editStation } from '../../../app/capture/edit-station.ts';
import type { JsonValue } from '../../../core/survey/json-value.ts';
import type { Station } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { useDraft } from '../../components/form/use-draft.ts';
import { LengthField } from '../../components/lengths/length-field.tsx';
import { UnitChoice } from '../../components/lengths/unit-choice.tsx';
import { lengthUnit } from '../../device/length-unit.ts';
import { navigate } from '../../router.ts';
import type { SectionProps } from '../../section.ts';
import { PlaceChoice } from './place-choice.tsx';
import {
  IN_FRAME,
  nearPlanes,
  stationDraft,
  stationDraftIn,
  typedStation,
  type StationDraft,
} from './station-draft.ts';
import { capturePath, stationForm, stationPath, stationsPath } from './station-path.ts';
import { StationPlace } from './station-place.tsx';

/** Held higher than a person's eyes is rare; a larger number may have been feet, metres. */
const USUAL_HEIGHT = 2.5;

/** Adds a station, or changes what is said of one. `plane`: the one somebody comes from. */
export function StationEditor(props: SectionProps & { station: Station | null; plane?: string }) {
  const { station, survey, services, surveyId } = props;
  const unit = lengthUnit.value;
  const kept = useDraft<StationDraft>(
    {
      survey: surveyId,
      form: stationForm(station),
      label: station ? `Change ${station.name}` : 'New station',
      over: station && ({ ...station, traces: [], markSightings: [] } as unknown as JsonValue),
    },
    () => stationDraft(station, survey, unit, props.plane),
  );
  const { typed: draft, change } = kept;
  if (draft.unit !== unit) kept.restate(stationDraftIn(draft, unit, station));
  const [tried, setTried] = useState(false);
  const { facts, faults } = typedStation(draft, station, survey);
  const serves = draft.serves ?? nearPlanes(draft.on, survey);
  const plane = survey.planes.find(({ id }) => id === draft.on);
  const submit = async () => {
    setTried(true);
    if (!facts) return false;
    return attempt(services.state, async () => {
      if (station) await editStation(services, survey, station.id, facts);
      const id = station?.id ?? (await addStation(services, survey, facts));
      navigate(station ? stationPath(surveyId, id) : capturePath(surveyId, id));
    });
  };
  const places = [
    { value: '', label: 'Not known' },
    ...survey.planes.map((plane) => ({ value: plane.id, label: `On ${plane.name}` })),
    { value: IN_FRAME, label: 'From the site’s one point' },
  ];
  return (
    <div class="stack station-form">
      <h2>{station ? `Change ${station.name}` : 'New station'}</h2>
      <Form
        label={station ? 'Station' : 'New station'}
        action={station ? 'Save' : 'Add, and sight from it'}
        onSubmit={submit}
        onCancel={() => navigate(station ? stationPath(surveyId, station.id) : stationsPath(surveyId))}
        draft={kept.state}
      >
        <TextField
          label="Name"
          value={draft.name}
          onInput={(name) => change({ name })}
          fault={tried ? faults.name : null}
          maxLength={200}
        />
        <ChoiceField label="Place" value={draft.on} options={places} onChoose={(on) => change({ on })} />
        {!station && plane && <PlaceChoice draft={draft} survey={survey} plane={plane} onChange={change} />}
        <UnitChoice />
        <StationPlace
          draft={draft}
          survey={survey}
          station={station}
          faults={tried ? faults : {}}
          onChange={change}
        />
        <LengthField
          label="Height of the phone above the surface"
          hint="Hold the phone where the module will lie; from higher up it sees over what will shade the modules."
          value={draft.height}
          signed
          stored={station?.instrumentHeight}
          usual={USUAL_HEIGHT}
          onInput={(height) => change({ height })}
          fault={faults.height}
        />
        {survey.planes.length > 0 && (
          <fieldset class="fields">
            <legend>Counts for</legend>
            {survey.planes.map((plane) => (
              <label key={plane.id} class="tick">
                <input
                  type="checkbox"
                  checked={serves.includes(plane.id)}
                  onChange={({ currentTarget }) =>
                    change({
                      serves: currentTarget.checked
                        ? [...serves, plane.id]
                        : serves.filter((id) => id !== plane.id),
                    })
                  }
                />
                {plane.name}
              </label>
            ))}
          </fieldset>
        )}
      </Form>
    </div>
  );
}
