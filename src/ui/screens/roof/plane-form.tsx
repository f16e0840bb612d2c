import { useMemo, useState } from 'preact/hooks';
import { magneticDeclination } from '../../../core/pointing/declination.ts';
import { gridConvergence } from '../../../core/pointing/grid-convergence.ts';
import { centralMeridian, utmZoneNumber } from '../../../core/pointing/utm.ts';
import type { JsonValue } from '../../../core/survey/json-value.ts';
import type { PlaneSort } from '../../../core/survey/plane-name.ts';
import { planeName } from '../../../core/survey/plane-name.ts';
import type { RoofPlane, Site, Survey } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { Form } from '../../components/form/form.tsx';
import { useDraft } from '../../components/form/use-draft.ts';
import { TextField } from '../../components/form/text-field.tsx';
import { LengthField } from '../../components/lengths/length-field.tsx';
import { UnitChoice } from '../../components/lengths/unit-choice.tsx';
import { lengthUnit } from '../../device/length-unit.ts';
import { valueOf } from '../../typed.ts';
import { degreesText } from '../../value-text.ts';
import { AzimuthFields } from './azimuth-fields.tsx';
import { OutlineEditor } from './outline-editor.tsx';
import {
  draftIn,
  draftOf,
  planeOfDraft,
  typedTilt,
  type NorthTurns,
  type PlaneDraft,
} from './plane-draft.ts';

/** Longer roofs are rare; beyond, feet may have been typed as metres. */
const USUAL_METRES = 40;

const SORTS: { value: PlaneSort; label: string; tilt?: string }[] = [
  { value: 'pitched', label: 'Pitched roof' },
  { value: 'flat', label: 'Flat roof', tilt: '0' },
  { value: 'wall', label: 'Wall (façade)', tilt: '90' },
  { value: 'ground', label: 'Ground mount' },
];

function northTurns({ latitude, longitude, altitude }: Site, timeMs: number): NorthTurns {
  const zone = utmZoneNumber(latitude, longitude);
  return {
    true: 0,
    grid: gridConvergence(latitude, longitude, centralMeridian(zone)),
    magnetic: magneticDeclination({ latitude, longitude, altitude, timeMs }).declination,
  };
}

function PlaceFieldset(props: {
  draft: PlaneDraft;
  stored: RoofPlane['corner'];
  fault: string | null;
  onChange: (c: Partial<PlaneDraft>) => void;
}) {
  const { draft, stored, fault, onChange } = props;
  const length = (key: 'east' | 'northward' | 'up', label: string, stored?: number) => (
    <LengthField
      label={label}
      value={draft[key]}
      signed
      stored={stored}
      usual={USUAL_METRES}
      onInput={(value) => onChange({ [key]: value })}
    />
  );
  return (
    <fieldset class="fields">
      <legend>Place of its lower-left corner</legend>
      <label class="tick">
        <input
          type="checkbox"
          checked={draft.placed}
          onChange={({ currentTarget }) => onChange({ placed: currentTarget.checked })}
        />
        Known, from one point of the site chosen for all planes
      </label>
      {draft.placed && (
        <div class="pair">
          {length('east', 'East', stored?.east)}
          {length('northward', 'North', stored?.north)}
          {length('up', 'Up', stored?.up)}
        </div>
      )}
      {fault && draft.placed && <p class="field-fault small">{fault}</p>}
    </fieldset>
  );
}

/** Name of the form of a plane, or of a new one. */
export const planeForm = (plane: RoofPlane | null): string => `plane/${plane?.id ?? 'new'}`;

/** Typing a roof plane: tilt and azimuth in whatever way they are known, size, and place. */
export function PlaneForm(props: {
  survey: Survey;
  /** Null for a new one. */
  plane: RoofPlane | null;
  newId: string;
  order: number;
  nowMs: number;
  onSave: (plane: RoofPlane) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { survey, plane } = props;
  const unit = lengthUnit.value;
  const kept = useDraft(
    {
      survey: survey.id,
      form: planeForm(plane),
      label: plane ? `Change ${plane.name}` : 'New roof plane',
      over: (plane ?? null) as JsonValue,
    },
    () => draftOf(plane, unit),
  );
  const { typed: draft, change } = kept;
  const [asked, setAsked] = useState(false);
  const turns = useMemo(() => northTurns(survey.site, props.nowMs), [survey.site, props.nowMs]);
  if (draft.unit !== unit) kept.restate(draftIn(draft, unit, plane));
  const taken = survey.planes.filter((other) => other !== plane).map(({ name }) => name);
  const given = { before: plane, id: props.newId, order: props.order, turns, taken };
  const { plane: drafted, faults } = planeOfDraft(draft, given);
  const told = <T,>(fault: T, text: string): T | null => (asked || text.trim() !== '' ? fault : null);
  const tilt = valueOf(typedTilt(draft.tilt));
  const save = () => {
    setAsked(true);
    return drafted ? props.onSave(drafted) : false;
  };
  return (
    <Form
      label={plane ? `Change ${plane.name}` : 'New roof plane'}
      action={plane ? 'Save the plane' : 'Add the plane'}
      onSubmit={save}
      onCancel={props.onCancel}
      draft={kept.state}
    >
      {!plane && (
        <ChoiceField
          label="It is a"
          value={draft.sort}
          options={SORTS}
          onChoose={(sort) => change({ sort, ...tiltOfSort(sort, draft.tilt) })}
        />
      )}
      <TextField
        label="Tilt"
        value={draft.tilt}
        onInput={(value) => change({ tilt: value })}
        fault={told(faults.tilt, draft.tilt)}
        hint={
          tilt === undefined
            ? 'From the horizontal: 30 for degrees, 6/12 or 1:2 for rise over run, 50 % for percent.'
            : `= ${degreesText(tilt)} from the horizontal`
        }
      />
      <AzimuthFields
        draft={draft}
        turns={turns}
        fault={told(faults.bearing, draft.bearing)}
        onChange={change}
      />
      <fieldset class="fields">
        <legend>Size</legend>
        <ChoiceField
          label="Outline"
          value={draft.shape}
          options={[
            { value: 'rectangle', label: 'Rectangle' },
            { value: 'polygon', label: 'By its corners' },
          ]}
          onChoose={(shape) => change({ shape })}
        />
        <UnitChoice />
        {draft.shape === 'polygon' ? (
          <OutlineEditor
            corners={draft.corners}
            unit={unit}
            fault={asked ? faults.outline : null}
            onChange={(corners) => change({ corners })}
          />
        ) : (
          <div class="pair">
            <LengthField
              label="Width along the eave"
              value={draft.width}
              stored={plane?.width}
              usual={USUAL_METRES}
              onInput={(width) => change({ width })}
              hint="By tape; can come later."
            />
            <LengthField
              label={draft.sort === 'wall' ? 'Height' : 'Length up the slope'}
              value={draft.slopeLength}
              stored={plane?.slopeLength}
              usual={USUAL_METRES}
              onInput={(slopeLength) => change({ slopeLength })}
              hint="By tape; can come later."
            />
          </div>
        )}
      </fieldset>
      <PlaceFieldset
        draft={draft}
        stored={plane?.corner}
        fault={asked ? faults.corner : null}
        onChange={change}
      />
      <TextField
        label="Name"
        value={draft.name}
        onInput={(name) => change({ name })}
        maxLength={200}
        hint={drafted ? `Without one: ${planeName(draft.sort, drafted.surfaceAzimuth, taken)}` : undefined}
      />
    </Form>
  );
}

/** What a sort says of the tilt; a tilt that only another sort gave is taken away. */
function tiltOfSort(sort: PlaneSort, tilt: string): { tilt?: string } {
  const given = SORTS.find(({ value }) => value === sort)?.tilt;
  if (given !== undefined) return { tilt: given };
  return tilt === '0' || tilt === '90' ? { tilt: '' } : {};
}
