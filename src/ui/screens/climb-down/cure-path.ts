import type { OpenPoint } from '../../../core/completeness/open-point.ts';
import { surveyPath } from '../../survey-path.ts';
import {
  capturePath,
  editStationPath,
  newStationPath,
  stationPath,
  type CaptureStart,
} from '../stations/station-path.ts';

/** Address of the place where a point is put right. */
export function curePath(surveyId: string, point: Pick<OpenPoint, 'kind' | 'shrunkBy' | 'cure'>): string {
  const { cure } = point;
  switch (cure.at) {
    case 'site':
      return surveyPath(surveyId);
    case 'light':
      return surveyPath(surveyId, 'shade');
    case 'roof':
    case 'plane':
      return surveyPath(surveyId, 'roof');
    case 'new-station':
      return newStationPath(surveyId, cure.plane);
    case 'run':
      return capturePath(surveyId, cure.station, startOf(point));
    case 'station':
      if (cure.act === 'edit') return editStationPath(surveyId, cure.station);
      if (cure.act === 'book') return stationPath(surveyId, cure.station);
      return capturePath(surveyId, cure.station, startOf(point));
  }
}

/** What cures these kinds of points; the others are sighted as usual. */
const STARTS: Partial<Record<string, CaptureStart>> = {
  'no-heading-check': 'check',
  'doubtful-check': 'check',
  'disturbed-compass': 'check',
  'undirected-sightings': 'check',
  'no-closure': 'mark',
};

/** The same of what makes an interval wide. */
const SHRUNK_BY: Partial<Record<string, CaptureStart>> = {
  'heading-check': 'check',
  'second-heading-check': 'check',
  'known-bearing': 'check',
  'two-face-check': 'faces',
};

function startOf({ kind, shrunkBy }: Pick<OpenPoint, 'kind' | 'shrunkBy'>): CaptureStart | undefined {
  if (shrunkBy !== undefined) return SHRUNK_BY[shrunkBy];
  return /two-face|faces/.test(kind) ? 'faces' : STARTS[kind];
}
