import type { AppServices } from '../app/app-services.ts';
import { AppContext } from './app-context.ts';
import { Bars } from './components/bars.tsx';
import { LazyScreen } from './components/lazy-screen.tsx';
import { NoonMark } from './components/noon-mark.tsx';
import { ScreenHeading } from './components/screen-heading.tsx';
import { choosePaper, paperShown } from './device/paper-choice.ts';
import { pathname } from './router.ts';
import { placeOf, type Place } from './routes.ts';
import { SurveyListScreen } from './screens/survey-list/survey-list-screen.tsx';
import './paper.css';
import './shell.css';

const loadSurvey = async () => (await import('./screens/survey/survey-screen.tsx')).SurveyScreen;

function PaperToggle() {
  const dusk = paperShown() === 'dusk';
  return (
    <button
      type="button"
      class="paper-toggle"
      aria-pressed={dusk}
      onClick={() => choosePaper(dusk ? 'day' : 'dusk')}
    >
      Dusk
    </button>
  );
}

function Nowhere() {
  return (
    <div class="stack">
      <ScreenHeading title="Nothing here" />
      <p>
        No screen has this address. <a href="/">Go to the surveys.</a>
      </p>
    </div>
  );
}

function Screen({ place, services }: { place: Place; services: AppServices }) {
  switch (place.screen) {
    case 'list':
      return <SurveyListScreen />;
    case 'survey':
      return (
        <LazyScreen load={loadSurvey} with={{ id: place.id, section: place.section, inner: place.inner }} />
      );
    case 'plain':
      return <LazyScreen key={place.plain.path} load={place.plain.load} with={{ services }} />;
    case 'nowhere':
      return <Nowhere />;
  }
}

/** The whole app: a head, the screen of the address, and the bars. */
export function App({ services }: { services: AppServices }) {
  const place = placeOf(pathname.value);
  return (
    <AppContext.Provider value={services}>
      <a class="jump visually-hidden" href="#screen">
        Skip to the screen
      </a>
      <header class="head">
        <a class="home" href="/">
          <NoonMark />
          Noonmark
        </a>
        <PaperToggle />
      </header>
      <main id="screen" tabIndex={-1}>
        <Screen place={place} services={services} />
      </main>
      <Bars />
    </AppContext.Provider>
  );
}
