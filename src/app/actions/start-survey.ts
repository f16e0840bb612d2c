import { clockTime } from '../../core/solar-position/time-zone.ts';
import type { Site, Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import { refreshList } from './refresh-list.ts';

/** What a survey is started with; an empty title gets the one proposed. */
export interface SurveyStart {
  title: string;
  site: Site;
  notes?: string;
}

const twoDigits = (value: number) => String(value).padStart(2, '0');

/** The calendar day at a place, YYYY-MM-DD. */
export function dayAt(timeMs: number, timeZone: string): string {
  const { year, month, day } = clockTime(timeMs, timeZone);
  return `${year}-${twoDigits(month)}-${twoDigits(day)}`;
}

/** A title nobody has to think of: the address if there is one, else the day; numbered where it is taken. */
export function proposedTitle(address: string, day: string, taken: readonly string[]): string {
  const stem = address.trim() || `Survey of ${day}`;
  for (let count = 1; ; count++) {
    const candidate = count === 1 ? stem : `${stem}, ${count}`;
    if (!taken.includes(candidate)) return candidate;
  }
}

/** Stores a new survey with nothing in it but its site, and gives its id. */
export async function startSurvey(
  services: Pick<AppServices, 'state' | 'store' | 'newId' | 'now' | 'keepStorage'>,
  { title, site, notes }: SurveyStart,
): Promise<string> {
  const { store, newId, now, keepStorage } = services;
  const surveyedOn = dayAt(now(), site.timeZone);
  const taken = (await store.list()).map((summary) => summary.title);
  const survey: Survey = {
    format: 'noonmark-survey',
    version: 1,
    id: newId(),
    title: title.trim() || proposedTitle(site.address ?? '', surveyedOn, taken),
    surveyedOn,
    ...(notes?.trim() && { notes: notes.trim() }),
    site,
    climate: { source: 'world' },
    planes: [],
    obstructions: [],
    runs: [],
    readings: [],
    stations: [],
  };
  await store.create(survey);
  await refreshList(services);
  await keepStorage();
  return survey.id;
}
