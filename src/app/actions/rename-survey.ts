import type { Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import { changeSurvey } from './change-survey.ts';

/** Gives a survey another title; an empty or unchanged one is left as it was. */
export async function renameSurvey(
  services: Pick<AppServices, 'state' | 'store'>,
  survey: Survey,
  title: string,
): Promise<void> {
  const trimmed = title.trim();
  if (trimmed === '' || trimmed === survey.title) return;
  await changeSurvey(services, survey, { ...survey, title: trimmed }, 'survey-renamed');
}
