import type { AppServices } from '../../../app/app-services.ts';
import { attempt } from '../../../app/attempt.ts';
import { makePracticeSurvey } from '../../../app/capture/practice-survey.ts';
import { navigate } from '../../router.ts';
import { stationsPath } from './station-path.ts';

/** Makes the survey that the recorded movement belongs to, and goes to its stations. */
export async function startPractice(services: AppServices): Promise<void> {
  await attempt(services.state, async () => {
    navigate(stationsPath(await makePracticeSurvey(services)));
  });
}
