import { surveyPath } from '../../survey-path.ts';

const below = (surveyId: string, ...parts: string[]) =>
  [surveyPath(surveyId, 'stations'), ...parts.map(encodeURIComponent)].join('/');

export const stationsPath = (surveyId: string): string => below(surveyId);
export const newStationPath = (surveyId: string): string => below(surveyId, 'new');
export const stationPath = (surveyId: string, stationId: string): string => below(surveyId, 'at', stationId);
export const editStationPath = (surveyId: string, stationId: string): string =>
  below(surveyId, 'at', stationId, 'edit');
export const capturePath = (surveyId: string, stationId: string): string =>
  below(surveyId, 'at', stationId, 'capture');
/** The phone laid on a plane, or sighted along its edge. */
export const measurePath = (surveyId: string, planeId: string): string => below(surveyId, 'plane', planeId);
