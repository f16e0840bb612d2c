import { changeSurvey } from '../../../app/actions/change-survey.ts';
import { attempt } from '../../../app/attempt.ts';
import { nextOrder, withStation, withTrace } from '../../../app/capture/station-edits.ts';
import type { StepCode } from '../../../app/survey-store.ts';
import {
  unamended,
  withoutSighting,
  withSighting,
  withSightingAfter,
} from '../../../core/survey/sighting-edits.ts';
import type { Sighting, Station, Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { ERROR_MESSAGES } from '../../messages.ts';
import { Dialog } from '../dialog.tsx';
import type { BookEdit } from './book-edit.ts';
import { hasReading, SightingForm } from './sighting-form.tsx';
import { TraceForm } from './trace-form.tsx';

/** Why the last change was refused; the bars stand behind the dialog. */
function Refusal() {
  const { code, detail } = useApp().state.trouble.value ?? {};
  return (
    <p role="alert" class={code ? 'field-fault' : undefined}>
      {code && `${ERROR_MESSAGES[code].what} ${detail ?? ERROR_MESSAGES[code].remedy}`}
    </p>
  );
}

/** The form of what is being typed in the field book; each save is one step that can be taken back. */
export function BookDialog(props: { station: Station; survey: Survey; edit: BookEdit; onDone: () => void }) {
  const services = useApp();
  const { station, survey, edit, onDone } = props;
  const store = async (after: Survey, code: StepCode, name: string) => {
    const done = await attempt(services.state, () => changeSurvey(services, survey, after, code, name));
    if (done) onDone();
    return done;
  };
  const shared = {
    instrumentHeight: station.instrumentHeight,
    nowMs: services.now(),
    newId: services.newId(),
    onCancel: onDone,
  };
  switch (edit.what) {
    case 'sighting': {
      const { list, sighting, number } = edit;
      const name = `Sighting ${number} from ${station.name}`;
      const put = (changed: Sighting) => store(withSighting(survey, list, changed), 'entry-changed', name);
      return (
        <Dialog title={name} onCancel={onDone}>
          <SightingForm {...shared} sighting={sighting} direction={edit.direction} onSave={put} />
          <Refusal />
          <div class="row row-acts">
            {hasReading(sighting) && sighting.amendments && (
              <button type="button" onClick={() => void put(unamended(sighting))}>
                Go back to the reading
              </button>
            )}
            <button
              type="button"
              onClick={() => void store(withoutSighting(survey, list, sighting.id), 'entry-deleted', name)}
            >
              Delete this sighting
            </button>
          </div>
        </Dialog>
      );
    }
    case 'new-sighting': {
      const { list, after, name } = edit;
      const add = (sighting: Sighting) =>
        store(withSightingAfter(survey, list, sighting, after), 'entry-added', `Sighting of ${name}`);
      return (
        <Dialog title={`New sighting of ${name}`} onCancel={onDone}>
          <SightingForm {...shared} sighting={null} direction={null} onSave={add} />
          <Refusal />
        </Dialog>
      );
    }
    case 'trace':
      return (
        <Dialog title={`Typed trace from ${station.name}`} onCancel={onDone}>
          <TraceForm
            {...shared}
            survey={survey}
            station={station}
            order={nextOrder(station.traces)}
            obstructionOrder={nextOrder(survey.obstructions)}
            newId={services.newId}
            onSave={(trace, added) => {
              const known = added ? [...survey.obstructions, added] : survey.obstructions;
              const after = withStation({ ...survey, obstructions: known }, station.id, (one) =>
                withTrace(one, trace),
              );
              const of = known.find(({ id }) => id === trace.obstruction)?.name ?? '';
              return store(after, 'entry-added', `Trace of ${of}`);
            }}
          />
          <Refusal />
        </Dialog>
      );
  }
}
