import type { PlainScreen, SurveySection } from './section.ts';

export const SURVEY_SECTIONS: SurveySection[] = [
  {
    path: '',
    label: 'Site',
    load: async () => (await import('./screens/site/site-section.tsx')).SiteSection,
  },
  {
    path: 'roof',
    label: 'Roof',
    load: async () => (await import('./screens/roof/roof-section.tsx')).RoofSection,
  },
  {
    path: 'stations',
    label: 'Stations',
    hasInner: true,
    load: async () => (await import('./screens/stations/stations-section.tsx')).StationsSection,
  },
  {
    path: 'shade',
    label: 'Shade',
    load: async () => (await import('./screens/shade/shade-section.tsx')).ShadeSection,
  },
  {
    path: 'report',
    label: 'Report',
    load: async () => (await import('./screens/report/report-section.tsx')).ReportSection,
  },
  {
    path: 'climb-down',
    label: 'To do',
    load: async () => (await import('./screens/climb-down/climb-down-section.tsx')).ClimbDownSection,
  },
];

export const PLAIN_SCREENS: PlainScreen[] = [
  {
    path: '/new-survey',
    label: 'New survey',
    main: true,
    load: async () => (await import('./screens/new-survey/new-survey-screen.tsx')).NewSurveyScreen,
  },
  {
    path: '/firm-lists',
    label: 'Firm’s lists',
    load: async () => (await import('./screens/firm-lists/firm-lists-screen.tsx')).FirmListsScreen,
  },
  {
    path: '/self-check',
    label: 'Self-check',
    load: async () => (await import('./screens/self-check/self-check-screen.tsx')).SelfCheckScreen,
  },
];

export type Place =
  | { screen: 'list' }
  | { screen: 'survey'; id: string; section: SurveySection; inner: string[] }
  | { screen: 'plain'; plain: PlainScreen }
  | { screen: 'nowhere' };

function decoded(part: string): string | null {
  try {
    return decodeURIComponent(part);
  } catch {
    return null;
  }
}

/** The place an address names. */
export function placeOf(pathname: string): Place {
  if (pathname === '/' || pathname === '/index.html') return { screen: 'list' };
  const plain = PLAIN_SCREENS.find(({ path }) => path === pathname);
  if (plain) return { screen: 'plain', plain };
  const [, encodedId, sectionPath = '', rest = ''] =
    /^\/survey\/([^/]+)(?:\/([^/]*)((?:\/[^/]+)*))?$/.exec(pathname) ?? [];
  const id = encodedId === undefined ? null : decoded(encodedId);
  const section = SURVEY_SECTIONS.find(({ path }) => path === sectionPath);
  const inner = rest.split('/').slice(1).map(decoded);
  if (id === null || !section || inner.includes(null)) return { screen: 'nowhere' };
  if (inner.length > 0 && !section.hasInner) return { screen: 'nowhere' };
  return { screen: 'survey', id, section, inner: inner as string[] };
}
