import { changeSurvey } from '../actions/change-survey.ts';
import type { AppServices } from '../app-services.ts';
import type { HeadingCheck, Survey } from '../../core/survey/survey.ts';
import { withStation } from './station-edits.ts';

/** Gives a heading check the bearing that was read from a plan afterwards. */
export function giveBearing(
  services: Pick<AppServices, 'state' | 'store'>,
  survey: Survey,
  stationId: string,
  checkId: string,
  facts: Pick<HeadingCheck, 'bearing' | 'frame' | 'gridZone'>,
): Promise<void> {
  const after = withStation(survey, stationId, (station) => ({
    ...station,
    headingChecks: station.headingChecks?.map((check) =>
      check.id === checkId ? { ...check, ...facts } : check,
    ),
  }));
  return changeSurvey(services, survey, after, 'entry-changed', 'Heading check');
}
