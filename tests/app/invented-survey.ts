import type { Reading, Survey } from '../../src/core/survey/survey.ts';

export const rawReading = (id: string, alpha = 10): Reading => ({
  id,
  run: 'r1',
  takenAt: `2026-05-14T09:30:0${id.length % 10}.000Z`,
  alpha,
  beta: 80,
  gamma: 1,
});

/** An invented survey with every kind of part in it. */
export function inventedSurvey(id = 'invented-1', changes: Partial<Survey> = {}): Survey {
  return {
    format: 'noonmark-survey',
    version: 1,
    id,
    title: 'Mill lane 4, Nowhere',
    surveyedOn: '2026-05-14',
    site: {
      latitude: 44.91,
      longitude: -72.2,
      altitude: 270,
      timeZone: 'America/New_York',
      address: 'Mill lane 4',
    },
    climate: { source: 'world' },
    planes: [
      { id: 'south', name: 'South roof', surfaceTilt: 30, surfaceAzimuth: 178, width: 9.2, slopeLength: 4.8 },
    ],
    obstructions: [{ id: 'maple', name: 'Maple in the street', kind: 'deciduous-tree', distance: 14.5 }],
    runs: [{ id: 'r1', frame: 'magnetic', startedAt: '2026-05-14T09:00:00.000Z' }],
    readings: [rawReading('raw-1')],
    stations: [
      {
        id: 'A',
        name: 'Eave, left',
        serves: ['south'],
        traces: [
          {
            id: 't1',
            obstruction: 'maple',
            shape: 'skyline',
            sightings: [
              { id: 's1', azimuth: 131.2, elevation: 24.6, reading: 'raw-1' },
              { id: 's2', azimuth: 140, elevation: 31, mark: 'top' },
              { id: 's3', azimuth: 151.5, elevation: 22 },
            ],
          },
        ],
      },
    ],
    ...changes,
  };
}
