import { useEffect, useRef } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { exportSurvey } from '../../../app/actions/export-survey.ts';
import { openSurvey } from '../../../app/actions/open-survey.ts';
import type { StoredSurvey } from '../../../app/survey-store.ts';
import { useApp } from '../../app-context.ts';
import { LazyScreen } from '../../components/lazy-screen.tsx';
import { ProblemList } from '../../components/problem-list.tsx';
import { ScreenHeading } from '../../components/screen-heading.tsx';
import { saveFile } from '../../device/save-file.ts';
import { ERROR_MESSAGES } from '../../messages.ts';
import { SURVEY_SECTIONS } from '../../routes.ts';
import type { SurveySection } from '../../section.ts';
import { surveyPath } from '../../survey-path.ts';
import { HistoryButtons } from './history-buttons.tsx';
import { SurveyTitle } from './survey-title.tsx';
import './survey.css';

function Sections({ id, shown }: { id: string; shown: SurveySection }) {
  const { notice } = useApp().state;
  // Who goes to another section has read what was done in this one; Take back stands under each of them.
  const goOn = () => {
    if (notice.value?.of) notice.value = null;
  };
  return (
    <nav aria-label="Sections of this survey">
      <ul class="sections">
        {SURVEY_SECTIONS.map(({ path, label }) => (
          <li key={path}>
            <a
              href={surveyPath(id, path)}
              aria-current={path === shown.path ? 'page' : undefined}
              onClick={goOn}
            >
              {label}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function Missing() {
  const { what, remedy } = ERROR_MESSAGES['survey-missing'];
  return (
    <>
      <ScreenHeading title="Not on this device" />
      <p>
        {what} {remedy}
      </p>
      <p>
        <a href="/">Go to the surveys.</a>
      </p>
    </>
  );
}

function Unreadable({ stored }: { stored: Extract<StoredSurvey, { state: 'unreadable' }> }) {
  const services = useApp();
  const save = async () => {
    const { fileName, text } = await exportSurvey(services, stored.id);
    saveFile(fileName, text);
  };
  const { what, remedy } = ERROR_MESSAGES['survey-unreadable'];
  return (
    <>
      <ScreenHeading title="Cannot be read" />
      <p>
        {what} {remedy}
      </p>
      <ProblemList problems={stored.problems} />
      <div>
        <button type="button" class="main" onClick={() => void attempt(services.state, save)}>
          Export as stored
        </button>
      </div>
    </>
  );
}

function Readable(props: {
  stored: Extract<StoredSurvey, { state: 'readable' }>;
  section: SurveySection;
  inner: readonly string[];
}) {
  const services = useApp();
  const { stored, section, inner } = props;
  const content = useRef<HTMLElement>(null);
  const shown = useRef(section.path);
  useEffect(() => {
    if (shown.current !== section.path) content.current?.focus();
    shown.current = section.path;
  }, [section.path]);
  return (
    <>
      <SurveyTitle survey={stored.survey} />
      {stored.deletedAt !== null && <p>This survey is among the deleted ones; restore it from the list.</p>}
      <Sections id={stored.id} shown={section} />
      <section ref={content} class="section" tabIndex={-1} aria-label={section.label}>
        <LazyScreen
          load={section.load}
          with={{ surveyId: stored.id, survey: stored.survey, services, inner }}
        />
      </section>
      <HistoryButtons surveyId={stored.id} />
    </>
  );
}

/** A survey: its title, its sections, and the section that the address names. */
export function SurveyScreen({
  id,
  section,
  inner,
}: {
  id: string;
  section: SurveySection;
  inner: readonly string[];
}) {
  const services = useApp();
  const { state } = services;
  useEffect(() => void attempt(state, () => openSurvey(services, id)), [id, services, state]);
  const stored = state.open.value?.id === id ? state.open.value.stored : null;
  if (stored === null) return <p role="status">Opening the survey…</p>;
  return (
    <div class="stack">
      {stored === 'missing' && <Missing />}
      {stored !== 'missing' && stored.state === 'unreadable' && <Unreadable stored={stored} />}
      {stored !== 'missing' && stored.state === 'readable' && (
        <Readable stored={stored} section={section} inner={inner} />
      )}
    </div>
  );
}
