import type { Survey } from '../../core/survey/survey.ts';
import { refreshList } from '../actions/refresh-list.ts';
import type { AppServices } from '../app-services.ts';
import { PRACTICE_SITE } from './practice-place.ts';

type Needs = Pick<AppServices, 'state' | 'store' | 'newId' | 'keepStorage'>;

/** A survey at the recording's place, with one plane and one station to practise from; gives its id. */
export async function makePracticeSurvey(services: Needs): Promise<string> {
  const survey: Survey = {
    format: 'noonmark-survey',
    version: 1,
    id: services.newId(),
    title: 'Practice: the house at Amselweg',
    site: { ...PRACTICE_SITE },
    climate: { source: 'world' },
    planes: [
      {
        id: 'south',
        name: 'South roof',
        order: 0,
        surfaceTilt: 30,
        surfaceAzimuth: 180,
        width: 8,
        slopeLength: 5,
      },
    ],
    obstructions: [],
    runs: [],
    readings: [],
    stations: [
      {
        id: 'A',
        name: 'Station A',
        order: 0,
        position: { on: 'south', x: 4, y: 2.5 },
        instrumentHeight: 0.1,
        serves: ['south'],
        traces: [],
      },
    ],
  };
  await services.store.create(survey);
  await services.keepStorage();
  await refreshList(services);
  return survey.id;
}
