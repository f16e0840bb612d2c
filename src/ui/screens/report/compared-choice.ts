import { AppError } from '../../../app/app-error.ts';
import type { AppServices } from '../../../app/app-services.ts';
import type { Assessment } from '../../../core/shading/assessment.ts';
import type { Survey } from '../../../core/survey/survey.ts';

/** What a report is set beside: the same survey with an obstruction thought away, or another survey on this device. */
export type ComparedChoice = { kind: 'without'; obstruction: string } | { kind: 'survey'; id: string };

/** The name is the other survey's; null for this one without an obstruction. */
export interface ComparedResult {
  without: string | null;
  title: string | null;
  assessment: Assessment;
}

/** The survey to assess for it. Rejects with `survey-missing` or `survey-unreadable`. */
export async function comparedSurvey(
  { store }: Pick<AppServices, 'store'>,
  survey: Survey,
  choice: ComparedChoice,
): Promise<{ survey: Survey } & Omit<ComparedResult, 'assessment'>> {
  if (choice.kind === 'without') {
    const name = survey.obstructions.find(({ id }) => id === choice.obstruction)?.name ?? '';
    return { survey: withoutObstruction(survey, choice.obstruction), without: name, title: null };
  }
  const stored = await store.load(choice.id);
  if (!stored) throw new AppError('survey-missing');
  if (stored.state === 'unreadable') throw new AppError('survey-unreadable');
  return { survey: stored.survey, without: null, title: stored.survey.title };
}

/** All its light passes, so that what was looked at stays looked at. */
export function withoutObstruction(survey: Survey, id: string): Survey {
  const obstructions = survey.obstructions.map((one) => (one.id === id ? { ...one, transmittance: 1 } : one));
  return { ...survey, obstructions };
}
