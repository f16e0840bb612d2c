import { useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import {
  addStation,
  editStation,
  freeStationName,
  type StationFacts,
} from '../../../app/capture/edit-station.ts';
import type { Station, StationPosition } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { Form } from '../../components/form/form.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { navigate } from '../../router.ts';
import type { SectionProps } from '../../section.ts';
import { faultOf, typedNumber, valueOf } from '../../typed.ts';
import { capturePath, stationPath, stationsPath } from './station-path.ts';

const textOf = (value: number | undefined) => (value === undefined ? '' : String(value));

/** Typed fields of a station, as texts. */
function useFields(station: Station | null, props: SectionProps) {
  const { survey } = props;
  const given = station?.position;
  const onPlane = given && 'on' in given ? given : null;
  const [name, setName] = useState(station?.name ?? freeStationName(survey));
  const [on, setOn] = useState(
    onPlane?.on ?? (given ? 'frame' : station ? '' : survey.planes.length === 1 ? survey.planes[0].id : ''),
  );
  const [x, setX] = useState(textOf(onPlane?.x));
  const [y, setY] = useState(textOf(onPlane?.y));
  const [height, setHeight] = useState(textOf(station ? station.instrumentHeight : 0.1));
  const [serves, setServes] = useState<string[] | null>(station?.serves ?? null);
  return { name, setName, on, setOn, x, setX, y, setY, height, setHeight, serves, setServes, given };
}

/** Planes a new station speaks for where nobody has said: the one it stands on, else all. */
const nearPlanes = (on: string, { survey }: SectionProps): string[] =>
  survey.planes.map(({ id }) => id).filter((id) => on === '' || on === 'frame' || id === on);

/** Adds a station, or changes what is said of one. */
export function StationEditor(props: SectionProps & { station: Station | null }) {
  const { station, survey, services, surveyId } = props;
  const fields = useFields(station, props);
  const { name, on, x, y, height } = fields;
  const serves = fields.serves ?? nearPlanes(on, props);
  const onPlane = on !== '' && on !== 'frame';
  const [tried, setTried] = useState(false);
  const across = typedNumber(x, { least: -1000, most: 1000, unit: ' m', optional: !y.trim() });
  const up = typedNumber(y, { least: -1000, most: 1000, unit: ' m', optional: !x.trim() });
  const lift = typedNumber(height, { least: 0, most: 100, unit: ' m', optional: true });
  const nameFault = name.trim() ? null : 'A station needs a name.';
  const position = (): StationPosition | undefined => {
    if (on === 'frame') return fields.given;
    const [along, upSlope] = [valueOf(across), valueOf(up)];
    return onPlane && along !== undefined && upSlope !== undefined ? { on, x: along, y: upSlope } : undefined;
  };
  const submit = async () => {
    setTried(true);
    if (nameFault ?? (onPlane ? (faultOf(across) ?? faultOf(up)) : null) ?? faultOf(lift)) return false;
    const facts: StationFacts = {
      name: name.trim(),
      position: position(),
      instrumentHeight: valueOf(lift),
      serves,
    };
    return attempt(services.state, async () => {
      if (station) await editStation(services, survey, station.id, facts);
      const id = station?.id ?? (await addStation(services, survey, facts));
      navigate(station ? stationPath(surveyId, id) : capturePath(surveyId, id));
    });
  };
  const places = [
    { value: '', label: 'Not known' },
    ...survey.planes.map((plane) => ({ value: plane.id, label: `On ${plane.name}` })),
    ...(fields.given && !('on' in fields.given) ? [{ value: 'frame', label: 'As it is in the record' }] : []),
  ];
  const shown = (fault: string | null) => (tried ? fault : null);
  return (
    <div class="stack">
      <h2>{station ? `Change ${station.name}` : 'New station'}</h2>
      <Form
        label={station ? 'Station' : 'New station'}
        action={station ? 'Save' : 'Add, and sight from it'}
        onSubmit={submit}
        onCancel={() => navigate(station ? stationPath(surveyId, station.id) : stationsPath(surveyId))}
      >
        <TextField
          label="Name"
          value={name}
          onInput={fields.setName}
          fault={shown(nameFault)}
          maxLength={200}
        />
        <ChoiceField label="Place" value={on} options={places} onChoose={fields.setOn} />
        {onPlane && (
          <p class="faint small">
            Measured from the lower-left corner of the plane, looking up the slope; empty where not measured.
          </p>
        )}
        {onPlane && (
          <div class="pair">
            <TextField
              label="Along the eave"
              unit="m"
              keys="numbers"
              value={x}
              onInput={fields.setX}
              fault={shown(faultOf(across))}
            />
            <TextField
              label="Up the slope"
              unit="m"
              keys="numbers"
              value={y}
              onInput={fields.setY}
              fault={shown(faultOf(up))}
            />
          </div>
        )}
        <TextField
          label="Height of the phone above the surface"
          unit="m"
          hint="Hold the phone where the module will lie; from higher up it sees over what will shade the modules."
          keys="numbers"
          value={height}
          onInput={fields.setHeight}
          fault={shown(faultOf(lift))}
        />
        {survey.planes.length > 0 && (
          <fieldset class="fields">
            <legend>Speaks for</legend>
            {survey.planes.map((plane) => (
              <label key={plane.id} class="tick">
                <input
                  type="checkbox"
                  checked={serves.includes(plane.id)}
                  onChange={({ currentTarget }) =>
                    fields.setServes(
                      currentTarget.checked ? [...serves, plane.id] : serves.filter((id) => id !== plane.id),
                    )
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
