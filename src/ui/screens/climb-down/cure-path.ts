import type { Cure } from '../../../core/completeness/open-point.ts';
import { surveyPath } from '../../survey-path.ts';
import { capturePath, editStationPath, newStationPath, stationPath } from '../stations/station-path.ts';

/** Address of the place where a point is put right. */
export function curePath(surveyId: string, cure: Cure): string {
  switch (cure.at) {
    case 'site':
      return surveyPath(surveyId);
    case 'light':
      return surveyPath(surveyId, 'shade');
    case 'roof':
    case 'plane':
      return surveyPath(surveyId, 'roof');
    case 'new-station':
      return newStationPath(surveyId);
    case 'run':
      return capturePath(surveyId, cure.station);
    case 'station':
      return stationPaths[cure.act](surveyId, cure.station);
  }
}

const stationPaths = { sight: capturePath, edit: editStationPath, book: stationPath } as const;
