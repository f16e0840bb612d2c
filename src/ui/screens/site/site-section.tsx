import { useMemo, useState } from 'preact/hooks';
import { changeSurvey } from '../../../app/actions/change-survey.ts';
import { attempt } from '../../../app/attempt.ts';
import { nextOrder } from '../../../app/capture/station-edits.ts';
import type { StepCode } from '../../../app/survey-store.ts';
import { withoutObstruction } from '../../../core/survey/removed-entries.ts';
import type { FactGroup } from '../../../core/survey/site-facts-general.ts';
import type { Obstruction, Survey } from '../../../core/survey/survey.ts';
import { EditHeading } from '../../components/edit-heading.tsx';
import { PhotoSpace } from '../../components/photos/photo-space.tsx';
import { PhotoStrip } from '../../components/photos/photo-strip.tsx';
import { useBackCloses } from '../../components/form/use-back-closes.ts';
import { UnfinishedForms } from '../../components/form/unfinished-forms.tsx';
import { focusHeading } from '../../components/screen-heading.tsx';
import type { SectionProps } from '../../section.ts';
import { Caution } from './facts/cautions.tsx';
import { FactForm, factForm } from './facts/fact-form.tsx';
import { FactGroups } from './facts/fact-groups.tsx';
import { firmGroups } from './facts/firm-groups.ts';
import { ObstructionForm, obstructionForm } from './obstruction-form.tsx';
import { ObstructionList } from './obstruction-list.tsx';
import { SiteForm, SITE_FORM } from './site-form.tsx';
import { SiteSummary } from './site-summary.tsx';
import './site.css';

type Editing =
  | { what: 'site' }
  | { what: 'facts'; group: FactGroup }
  | { what: 'obstruction'; obstruction: Obstruction | null; newId: string };

/** Where the site is, what is known of it, and what stands around. */
export function SiteSection({ survey, services }: SectionProps) {
  const [editing, setEditing] = useState<Editing | null>(null);
  const nowMs = useMemo(() => services.now(), [services]);
  const store = (after: Survey, code: StepCode, name: string) =>
    attempt(services.state, () => changeSurvey(services, survey, after, code, name));
  const close = () => {
    setEditing(null);
    focusHeading();
  };
  const saved = async (done: Promise<boolean>) => {
    const isDone = await done;
    if (isDone) close();
    return isDone;
  };
  const saveObstruction = (obstruction: Obstruction) => {
    const { obstructions } = survey;
    // One that was deleted meanwhile, in another tab, comes back with what was typed.
    const isMissing = !obstructions.some((other) => other.id === obstruction.id);
    const list = isMissing
      ? [...obstructions, obstruction]
      : obstructions.map((other) => (other.id === obstruction.id ? obstruction : other));
    return saved(
      store({ ...survey, obstructions: list }, isMissing ? 'entry-added' : 'entry-changed', obstruction.name),
    );
  };
  const remove = async ({ id, name }: Obstruction) => {
    if (await store(withoutObstruction(survey, id), 'entry-deleted', name)) focusHeading();
  };

  useBackCloses(editing !== null, close);

  /** What goes on with a form that was typed into and not saved. */
  const opens = (form: string): (() => void) | null => {
    if (form === SITE_FORM) return () => setEditing({ what: 'site' });
    const group = firmGroups(survey.site).find((one) => factForm(one) === form);
    if (group) return () => setEditing({ what: 'facts', group });
    if (form === obstructionForm(null))
      return () => setEditing({ what: 'obstruction', obstruction: null, newId: services.newId() });
    const obstruction = survey.obstructions.find((one) => obstructionForm(one) === form);
    return obstruction ? () => setEditing({ what: 'obstruction', obstruction, newId: obstruction.id }) : null;
  };

  if (editing?.what === 'site')
    return (
      <div class="stack">
        <EditHeading>Change the site</EditHeading>
        <SiteForm
          survey={survey}
          services={services}
          nowMs={nowMs}
          onSave={(after) => saved(store(after, 'survey-changed', survey.title))}
          onCancel={close}
        />
      </div>
    );
  if (editing?.what === 'facts')
    return (
      <div class="stack">
        <EditHeading>{editing.group.label}</EditHeading>
        <Caution group={editing.group.id} />
        <FactForm
          survey={survey}
          group={editing.group}
          newId={services.newId}
          onSave={(after) => saved(store(after, 'entry-changed', editing.group.label))}
          onCancel={close}
        />
      </div>
    );
  if (editing)
    return (
      <div class="stack">
        <EditHeading>
          {editing.obstruction ? `Change ${editing.obstruction.name}` : 'New obstruction'}
        </EditHeading>
        <ObstructionForm
          surveyId={survey.id}
          obstruction={editing.obstruction}
          newId={editing.newId}
          order={nextOrder(survey.obstructions)}
          latitude={survey.site.latitude}
          taken={survey.obstructions.filter((other) => other !== editing.obstruction).map(({ name }) => name)}
          onSave={saveObstruction}
          onCancel={close}
        />
      </div>
    );
  return (
    <div class="stack">
      <UnfinishedForms survey={survey.id} opens={opens} />
      <h2>Site</h2>
      <SiteSummary survey={survey} />
      <div class="form-actions">
        <button type="button" onClick={() => setEditing({ what: 'site' })}>
          Change the site
        </button>
      </div>
      <h2>Obstructions</h2>
      {survey.obstructions.length === 0 && <p>No obstruction yet. Name one here, or while sighting it.</p>}
      {survey.obstructions.length > 0 && (
        <ObstructionList
          survey={survey}
          onEdit={(obstruction) => setEditing({ what: 'obstruction', obstruction, newId: obstruction.id })}
          onDelete={(obstruction) => void remove(obstruction)}
        />
      )}
      <div class="form-actions">
        <button
          type="button"
          onClick={() => setEditing({ what: 'obstruction', obstruction: null, newId: services.newId() })}
        >
          Add an obstruction
        </button>
      </div>
      <h2>For the order</h2>
      <FactGroups
        survey={survey}
        onEdit={(group) => setEditing({ what: 'facts', group })}
        onCountry={(country) =>
          void store({ ...survey, site: { ...survey.site, country } }, 'survey-changed', survey.title)
        }
      />
      <h2>Photos of the site</h2>
      <PhotoStrip survey={survey} subject={{ kind: 'site' }} name="the site" />
      <PhotoSpace survey={survey} />
    </div>
  );
}
