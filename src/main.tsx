import { render } from 'preact';
import { version } from '../package.json';
import { AppError } from './app/app-error.ts';
import { appState } from './app/app-state.ts';
import type { AppServices, SampleSurvey } from './app/app-services.ts';
import { seeChange } from './app/actions/see-change.ts';
import { offerUpdates } from './app/update-flow.ts';
import { backupDatabase } from './storage/backup-database.ts';
import { Connection } from './storage/connection.ts';
import { draftDatabase } from './storage/draft-database.ts';
import { OtherTabs, toldStore } from './storage/other-tabs.ts';
import { photoDatabase } from './storage/photo-database.ts';
import { reportSettingsDatabase } from './storage/report-settings-database.ts';
import { sha256Of } from './storage/sha256-of.ts';
import { surveyDatabase } from './storage/survey-database.ts';
import { deviceLocation } from './sensors/location.ts';
import type { Recordings } from './sensors/recorded-stream.ts';
import { weatherDatabase } from './storage/weather-database.ts';
import { App } from './ui/app.tsx';
import { startInstallOffer } from './ui/device/install-offer.ts';
import { watchOfflineReadiness } from './ui/device/offline-readiness.ts';
import { startPaper } from './ui/device/paper-choice.ts';
import { startRouter } from './ui/router.ts';
import { AssessOnWorker } from './workers/assess-on-worker.ts';

// WARNING: what is imported here by name is part of the first screen. Parsers, screens and workers are not.
const parser = () =>
  import('./core/survey/parse-survey.ts').catch((cause: unknown) => {
    throw new AppError('part-missing', cause);
  });
const newId = () => crypto.randomUUID();
const now = () => Date.now();

const titles = import.meta.glob<string>('../survey-samples/*.json', { eager: true, import: 'title' });
const texts = import.meta.glob<string>('../survey-samples/*.json', { query: '?raw', import: 'default' });
const samples: SampleSurvey[] = Object.entries(titles).map(([name, title]) => ({
  name,
  title,
  text: texts[name],
}));

async function practiceRecordings(): Promise<Recordings> {
  const response = await fetch('/practice-recording.json');
  if (!response.ok)
    throw new AppError('part-missing', new Error(`practice-recording.json: ${response.status}`));
  return (await response.json()) as Recordings;
}

/** Once a survey is stored there is something to lose; most browsers answer by their own rules, some ask. */
async function keepStorage(): Promise<void> {
  try {
    await navigator.storage.persist();
  } catch {
    // Not offered here; the list says what that means.
  }
}

const checker = async () => (await parser()).surveyFromJson;
const state = appState();
const connection = new Connection((report) => (state.database.value = report));
const otherTabs = new OtherTabs();
const services: AppServices = {
  state,
  store: toldStore(surveyDatabase({ connection, checker, now, newId }), (id) => otherTabs.tell(id)),
  weather: weatherDatabase(connection, now),
  photos: photoDatabase(connection, now),
  backup: backupDatabase({ connection, checker, now }),
  drafts: draftDatabase(connection),
  reportSettings: reportSettingsDatabase(connection),
  hash: sha256Of,
  location: deviceLocation,
  assess: new AssessOnWorker(
    () => new Worker(new URL('./workers/assess-worker.ts', import.meta.url), { type: 'module' }),
  ),
  capture: async () => {
    const { captureDevices } = await import('./sensors/capture-devices.ts');
    return captureDevices(practiceRecordings);
  },
  version,
  samples,
  parse: async (text) => (await parser()).parseSurvey(text),
  newId,
  now,
  keepStorage,
  useNewVersion: () => undefined,
};

async function startServiceWorker(): Promise<void> {
  if (!import.meta.env.PROD || !('serviceWorker' in navigator)) return;
  const wasControlled = navigator.serviceWorker.controller !== null;
  watchOfflineReadiness();
  const { Workbox } = await import('workbox-window');
  const workbox = new Workbox('/service-worker.js', { scope: '/', type: 'classic' });
  services.useNewVersion = offerUpdates(
    state,
    {
      onWaiting: (listener) => workbox.addEventListener('waiting', listener),
      onControlling: (listener) => workbox.addEventListener('controlling', listener),
      takeOver: () => workbox.messageSkipWaiting(),
    },
    {
      wasControlled,
      reload: () => location.reload(),
      after: (timeMs, act) => setTimeout(act, timeMs),
    },
  );
  await workbox.register();
  // A phone keeps an installed app open for days: look again whenever it comes back into view.
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') void workbox.update().catch(() => undefined);
  });
}

otherTabs.listen((id) => void seeChange(services, id).catch(() => undefined)); // what is shown stays, as stored before
startPaper();
startRouter();
startInstallOffer();
render(<App services={services} />, document.getElementById('app')!);
void startServiceWorker().catch(() => undefined);
