import type { ComponentType } from 'preact';
import type { AppServices } from '../app/app-services.ts';
import type { Survey } from '../core/survey/survey.ts';

/** What every section of a survey is given: the survey as stored now, and the services to act on it. */
export interface SectionProps {
  surveyId: string;
  survey: Survey;
  services: AppServices;
  /** What stands in the address after the section's own part. */
  inner: readonly string[];
}

/** A section of a survey, a tab on its screen: one row in `routes.ts`, one folder in `screens/`. */
export interface SurveySection {
  /** Last part of the address; empty for the first section. */
  path: string;
  label: string;
  /** Whether addresses go on below it. */
  hasInner?: boolean;
  load: () => Promise<ComponentType<SectionProps>>;
}

/** A screen of its own, not part of a survey. */
export interface PlainScreen {
  path: string;
  label: string;
  /** Stands at the head of the list of surveys, not at its foot. */
  main?: boolean;
  load: () => Promise<ComponentType<{ services: AppServices }>>;
}
