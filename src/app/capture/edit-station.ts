import type { AppServices } from '../app-services.ts';
import { changeSurvey } from '../actions/change-survey.ts';
import type { Station, Survey } from '../../core/survey/survey.ts';
import { nextOrder } from './station-edits.ts';

/** What a person says of a station. */
export type StationFacts = Pick<Station, 'name' | 'position' | 'instrumentHeight' | 'serves'>;

type Needs = Pick<AppServices, 'state' | 'store' | 'newId'>;

/** A name that no station of the survey has: the next free letter, then numbers. */
export function freeStationName(survey: Survey): string {
  const taken = new Set(survey.stations.map(({ name }) => name));
  const names = [...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'].map((letter) => `Station ${letter}`);
  return names.find((name) => !taken.has(name)) ?? `Station ${survey.stations.length + 1}`;
}

/** Adds a station; gives its id. */
export async function addStation(services: Needs, survey: Survey, facts: StationFacts): Promise<string> {
  const id = services.newId();
  const station: Station = { id, ...facts, order: nextOrder(survey.stations), traces: [] };
  const after = { ...survey, stations: [...survey.stations, station] };
  await changeSurvey(services, survey, after, 'entry-added', facts.name);
  services.state.notice.value = null;
  return id;
}

/** Changes what is said of a station; what is undefined in the facts is taken away. */
export function editStation(services: Needs, survey: Survey, id: string, facts: StationFacts): Promise<void> {
  const stations = survey.stations.map((station) => (station.id === id ? { ...station, ...facts } : station));
  return changeSurvey(services, survey, { ...survey, stations }, 'entry-changed', facts.name);
}

/** Removes a station with all it has; raw readings stay. */
export function deleteStation(services: Needs, survey: Survey, station: Station): Promise<void> {
  const stations = survey.stations.filter(({ id }) => id !== station.id);
  return changeSurvey(services, survey, { ...survey, stations }, 'entry-deleted', station.name);
}
