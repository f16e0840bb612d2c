import { openSurvey } from '../../../src/app/actions/open-survey.ts';
import { CaptureSession } from '../../../src/app/capture/capture-session.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { inventedSurvey } from '../invented-survey.ts';
import { plainServices } from '../plain-services.ts';
import { CountedFeedback, HandHeldSensor } from './hand-held-sensor.ts';

const bare = (): Survey =>
  inventedSurvey('bare', {
    obstructions: [{ id: 'maple', name: 'Maple', order: 0, kind: 'deciduous-tree' }],
    runs: [],
    readings: [],
    stations: [{ id: 'A', name: 'A', order: 0, serves: ['south'], traces: [] }],
  });

/** A started session on a survey with one station, without a browser. */
export async function inventedSitting(kind: 'magnetic' | 'carried' | 'relative' = 'magnetic') {
  const services = plainServices();
  await services.store.create(bare());
  await openSurvey(services, 'bare');
  const sensor = new HandHeldSensor(kind);
  const feedback = new CountedFeedback();
  const session = new CaptureSession(services, sensor, feedback, 'bare');
  await session.start();
  /** What a person would find after a restart. */
  const stored = async (): Promise<Survey> => {
    const found = await services.store.load('bare');
    if (found?.state !== 'readable') throw new Error(JSON.stringify(found));
    return found.survey;
  };
  return { services, sensor, feedback, session, stored };
}
