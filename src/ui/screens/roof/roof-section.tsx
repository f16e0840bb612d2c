import { useMemo, useState } from 'preact/hooks';
import { changeSurvey } from '../../../app/actions/change-survey.ts';
import { attempt } from '../../../app/attempt.ts';
import { nextOrder } from '../../../app/capture/station-edits.ts';
import { ordered } from '../../../core/survey/order.ts';
import { withoutPlane } from '../../../core/survey/removed-entries.ts';
import type { RoofPlane } from '../../../core/survey/survey.ts';
import { copyTitle } from '../../../app/actions/duplicate-survey.ts';
import { EditHeading } from '../../components/edit-heading.tsx';
import { useBackCloses } from '../../components/form/use-back-closes.ts';
import { UnfinishedForms } from '../../components/form/unfinished-forms.tsx';
import { focusHeading } from '../../components/screen-heading.tsx';
import { roofPlan } from '../../../report/pictures/roof-plan.ts';
import type { SectionProps } from '../../section.ts';
import { Drawing } from '../shade/drawing.tsx';
import { PlaneForm, planeForm } from './plane-form.tsx';
import { PlaneRow } from './plane-row.tsx';
import { RoofCaution } from './roof-caution.tsx';
import './roof.css';

const PLAN_WIDTH = 360;

/** The roof planes: a plan of them, a list, and the form to add or change one. */
export function RoofSection({ survey, services }: SectionProps) {
  const [edited, setEdited] = useState<{ plane: RoofPlane | null; newId: string } | null>(null);
  const nowMs = useMemo(() => services.now(), [services]);
  const planes = useMemo(() => ordered(survey.planes), [survey.planes]);
  const plan = useMemo(() => (planes.length > 0 ? roofPlan(planes, PLAN_WIDTH) : null), [planes]);

  const store = (
    after: typeof survey,
    code: 'entry-added' | 'entry-changed' | 'entry-deleted',
    name: string,
  ) => attempt(services.state, () => changeSurvey(services, survey, after, code, name));

  const save = async (plane: RoofPlane) => {
    // One that was deleted meanwhile, in another tab, comes back with what was typed.
    const isNew = !survey.planes.some((other) => other.id === plane.id);
    const list = isNew
      ? [...survey.planes, plane]
      : survey.planes.map((other) => (other.id === plane.id ? plane : other));
    const done = await store(
      { ...survey, planes: list },
      isNew ? 'entry-added' : 'entry-changed',
      plane.name,
    );
    if (done) close();
    return done;
  };
  const close = () => {
    setEdited(null);
    focusHeading();
  };
  const duplicate = (plane: RoofPlane) => {
    const name = copyTitle(
      plane.name,
      survey.planes.map((other) => other.name),
    );
    const copy = { ...plane, id: services.newId(), name, order: nextOrder(survey.planes) };
    // Readings tell how the first one lies, not its copy.
    delete copy.tiltPlacings;
    delete copy.azimuthSightings;
    void store({ ...survey, planes: [...survey.planes, copy] }, 'entry-added', name);
  };
  const remove = async ({ id, name }: RoofPlane) => {
    if (await store(withoutPlane(survey, id), 'entry-deleted', name)) focusHeading();
  };

  useBackCloses(edited !== null, close);

  /** What goes on with a form that was typed into and not saved. */
  const opens = (form: string): (() => void) | null => {
    if (form === planeForm(null)) return () => setEdited({ plane: null, newId: services.newId() });
    const plane = survey.planes.find((one) => planeForm(one) === form);
    return plane ? () => setEdited({ plane, newId: plane.id }) : null;
  };

  if (edited)
    return (
      <div class="stack">
        <EditHeading>{edited.plane ? `Change ${edited.plane.name}` : 'New roof plane'}</EditHeading>
        <PlaneForm
          survey={survey}
          plane={edited.plane}
          newId={edited.newId}
          order={nextOrder(survey.planes)}
          nowMs={nowMs}
          onSave={save}
          onCancel={close}
        />
      </div>
    );
  return (
    <div class="stack">
      <UnfinishedForms survey={survey.id} opens={opens} />
      <h2>Roof planes</h2>
      {plan && (
        <div class="roof-plan">
          <Drawing
            picture={plan}
            id="roof-plan"
            label="Plan of the roof planes, north up; the list says the same"
          />
        </div>
      )}
      {planes.length === 0 && (
        <p>
          No roof plane yet. Add one with its tilt and bearing as far as you know them; the phone can then
          measure both.
        </p>
      )}
      {planes.length > 0 && (
        <ul class="entries" aria-label="Roof planes">
          {planes.map((plane) => (
            <PlaneRow
              key={plane.id}
              survey={survey}
              plane={plane}
              onEdit={() => setEdited({ plane, newId: plane.id })}
              onDuplicate={() => duplicate(plane)}
              onDelete={() => void remove(plane)}
            />
          ))}
        </ul>
      )}
      <div class="form-actions">
        <button
          type="button"
          class="main"
          onClick={() => setEdited({ plane: null, newId: services.newId() })}
        >
          Add a plane
        </button>
      </div>
      <RoofCaution />
    </div>
  );
}
