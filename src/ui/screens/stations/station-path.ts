import { surveyPath } from '../../survey-path.ts';

const below = (surveyId: string, ...parts: string[]) =>
  [surveyPath(surveyId, 'stations'), ...parts.map(encodeURIComponent)].join('/');

export const stationsPath = (surveyId: string): string => below(surveyId);
/** `planeId`: the plane that the new station will stand on. */
export const newStationPath = (surveyId: string, planeId?: string): string =>
  below(surveyId, 'new', ...(planeId === undefined ? [] : [planeId]));
export const stationPath = (surveyId: string, stationId: string): string => below(surveyId, 'at', stationId);
export const editStationPath = (surveyId: string, stationId: string): string =>
  below(surveyId, 'at', stationId, 'edit');
/** What a sitting may open with: a heading check, the two-face check, or sighting marks. */
export type CaptureStart = 'check' | 'faces' | 'mark';
export const capturePath = (surveyId: string, stationId: string, start?: CaptureStart): string =>
  below(surveyId, 'at', stationId, 'capture', ...(start === undefined ? [] : [start]));
/** Name of the form of a station, or of a new one. */
export const stationForm = (station: { id: string } | null): string => `station/${station?.id ?? 'new'}`;
/** The phone laid on a plane, or sighted along its edge. */
export const measurePath = (surveyId: string, planeId: string): string => below(surveyId, 'plane', planeId);
