import type { Station, Survey } from '../../../src/core/survey/survey.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';
import { SOUTH } from './found-points.ts';

const WIDTH = 8;
const SLOPE = 4;

/** A roof of known size with its corners and centre sighted and all around looked at; nothing in the way. */
export function completeSurvey(changes: Partial<Survey> = {}): Survey {
  const places = [
    [0, 0],
    [WIDTH, 0],
    [0, SLOPE],
    [WIDTH, SLOPE],
    [WIDTH / 2, SLOPE / 2],
  ];
  return inventedSurvey('complete', {
    planes: [{ ...SOUTH, width: WIDTH, slopeLength: SLOPE }],
    runs: [],
    readings: [],
    obstructions: [],
    stations: places.map(([x, y], i): Station => ({
      id: `S${i}`,
      name: `Station ${i}`,
      position: { on: 'south', x, y },
      serves: ['south'],
      observedOpen: [[0, 360]],
      traces: [],
    })),
    ...changes,
  });
}
