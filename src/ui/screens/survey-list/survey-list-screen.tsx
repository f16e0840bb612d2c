import { useEffect } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { findUnreadable } from '../../../app/actions/find-unreadable.ts';
import { refreshList } from '../../../app/actions/refresh-list.ts';
import { useApp } from '../../app-context.ts';
import { ScreenHeading } from '../../components/screen-heading.tsx';
import { PLAIN_SCREENS } from '../../routes.ts';
import { BackupSection } from './backup-section.tsx';
import { DeletedSurveys } from './deleted-surveys.tsx';
import { ImportFiles } from './import-files.tsx';
import { SampleList } from './sample-list.tsx';
import { StorageLine } from './storage-line.tsx';
import { SurveyRow } from './survey-row.tsx';
import { WeatherFiles } from './weather-files.tsx';
import './survey-list.css';

function MainScreens() {
  return (
    <p class="row">
      {PLAIN_SCREENS.filter(({ main }) => main).map(({ path, label }) => (
        <a key={path} class="button main" href={path}>
          {label}
        </a>
      ))}
    </p>
  );
}

function OtherScreens() {
  return (
    <p class="row">
      {PLAIN_SCREENS.filter(({ main }) => !main).map(({ path, label }) => (
        <a key={path} class="button" href={path}>
          {label}
        </a>
      ))}
    </p>
  );
}

/** The surveys on this device, and what can be done with each. */
export function SurveyListScreen() {
  const services = useApp();
  const { state } = services;
  useEffect(() => {
    const read = () =>
      attempt(state, async () => {
        await refreshList(services);
        await findUnreadable(services);
      });
    // Another tab may have changed the list meanwhile.
    const readAgain = () => void (document.visibilityState === 'visible' && read());
    void read();
    document.addEventListener('visibilitychange', readAgain);
    return () => document.removeEventListener('visibilitychange', readAgain);
  }, [services, state]);
  const surveys = state.surveys.value;
  const present = surveys?.filter(({ deletedAt }) => deletedAt === null) ?? [];
  const deleted = surveys?.filter(({ deletedAt }) => deletedAt !== null) ?? [];
  return (
    <div class="stack survey-list">
      <ScreenHeading title="Surveys" />
      <MainScreens />
      {surveys !== null && present.length === 0 && (
        <p>
          No surveys on this device yet. Start one, open a sample to see what one holds, or import a survey
          file.
        </p>
      )}
      {present.length > 0 && (
        <ul class="ledger">
          {present.map((summary) => (
            <SurveyRow key={summary.id} summary={summary} />
          ))}
        </ul>
      )}
      <ImportFiles />
      <BackupSection surveys={present} />
      <SampleList open={surveys !== null && present.length === 0} />
      {deleted.length > 0 && <DeletedSurveys surveys={deleted} />}
      <WeatherFiles />
      <StorageLine />
      <OtherScreens />
    </div>
  );
}
