import { useEffect, useLayoutEffect, useRef, useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { renameSurvey } from '../../../app/actions/rename-survey.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { ScreenHeading } from '../../components/screen-heading.tsx';

const LONGEST_TITLE = 200;

function TitleForm({ survey, onDone }: { survey: Survey; onDone: () => void }) {
  const services = useApp();
  const input = useRef<HTMLInputElement>(null);
  // before the next key can arrive: what is typed at once must land in the field
  useLayoutEffect(() => {
    input.current?.focus();
    input.current?.select();
  }, []);
  const save = async () => {
    const title = input.current?.value ?? survey.title;
    if (await attempt(services.state, () => renameSurvey(services, survey, title))) onDone();
  };
  return (
    <form
      class="row title-form"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
      onKeyDown={({ key }) => key === 'Escape' && onDone()}
    >
      <label class="grow">
        Title
        <input ref={input} type="text" required maxLength={LONGEST_TITLE} defaultValue={survey.title} />
      </label>
      <button type="submit" class="main">
        Save
      </button>
      <button type="button" onClick={onDone}>
        Cancel
      </button>
    </form>
  );
}

/** The title as heading, and the way to change it. */
export function SurveyTitle({ survey }: { survey: Survey }) {
  const [editing, setEditing] = useState(false);
  const edit = useRef<HTMLButtonElement>(null);
  const wasEditing = useRef(false);
  useEffect(() => {
    // The field is gone after editing; the focus goes back to where it came from.
    if (wasEditing.current && !editing) edit.current?.focus();
    wasEditing.current = editing;
  }, [editing]);
  return (
    <div class="row survey-title">
      <ScreenHeading title={survey.title} />
      {editing ? (
        <TitleForm survey={survey} onDone={() => setEditing(false)} />
      ) : (
        <button ref={edit} type="button" class="plain" onClick={() => setEditing(true)}>
          Rename
        </button>
      )}
    </div>
  );
}
