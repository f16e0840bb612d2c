import { useEffect, useState } from 'preact/hooks';
import type { FormDraft } from '../../../app/draft-store.ts';
import { useApp } from '../../app-context.ts';
import { focusHeading } from '../screen-heading.tsx';
import { draftTurns } from './draft-keeper.ts';
import './form.css';

type Unfinished = Pick<FormDraft, 'form' | 'label'>;

/** Offers forms of a survey that were typed into and not saved. */
export function UnfinishedForms(props: {
  survey: string;
  /** What opens a form; null where it is not one of these, or what it changes is gone. */
  opens: (form: string) => (() => void) | null;
}) {
  const { drafts } = useApp();
  const [known, setKnown] = useState<Unfinished[]>([]);
  const turn = draftTurns.value;
  useEffect(() => {
    let wanted = true;
    void drafts
      .list(props.survey)
      .catch(() => [])
      .then((list) => wanted && setKnown(list));
    return () => {
      wanted = false;
    };
  }, [drafts, props.survey, turn]);
  const throwAway = async (form: string) => {
    await drafts.drop(props.survey, form).catch(() => undefined);
    draftTurns.value++;
    focusHeading();
  };
  const offered = known.flatMap(({ form, label }) => {
    const open = props.opens(form);
    return open ? [{ form, label, open }] : [];
  });
  if (offered.length === 0) return null;
  return (
    <ul class="unfinished" aria-label="Typed, not saved">
      {offered.map(({ form, label, open }) => (
        <li key={form} class="found-draft">
          <p>
            <strong>Not saved yet:</strong> {label}
          </p>
          <div class="form-actions">
            <button type="button" aria-label={`Go on with: ${label}`} onClick={open}>
              Go on
            </button>
            <button type="button" aria-label={`Throw away: ${label}`} onClick={() => void throwAway(form)}>
              Throw away
            </button>
          </div>
        </li>
      ))}
    </ul>
  );
}
