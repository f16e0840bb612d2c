import { describe, expect, it } from 'vitest';
import type { Station } from '../../../src/core/survey/survey.ts';
import {
  proposedName,
  stationDraft,
  stationDraftIn,
  typedStation,
  type StationDraft,
} from '../../../src/ui/screens/stations/station-draft.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';

const [south] = inventedSurvey().planes;
const survey = inventedSurvey('invented-1', { planes: [south, { ...south, id: 'shed', name: 'Shed' }] });
const typed = (
  part: Partial<StationDraft>,
  station: Station | null = null,
  unit: 'metres' | 'feet' = 'metres',
) => typedStation({ ...stationDraft(station, survey, unit), ...part }, station, survey);

describe('a new station', () => {
  it('stands on the plane somebody comes from, and speaks for it', () => {
    expect(stationDraft(null, survey, 'metres', 'shed').on).toBe('shed');
    expect(typed({ on: 'shed' }).facts?.serves).toEqual(['shed']);
    expect(stationDraft(null, survey, 'metres').on).toBe('');
    expect(stationDraft(null, survey, 'metres', 'gone').on).toBe('');
    expect(stationDraft(null, inventedSurvey(), 'metres').on).toBe(south.id);
    expect(typed({ on: '' }).facts?.serves).toEqual([south.id, 'shed']);
  });

  it('stands on the plane of the last station, where somebody comes from none', () => {
    const last = {
      id: 'B',
      order: 9,
      name: 'B',
      position: { on: 'shed', x: 1, y: 1 },
      serves: ['shed'],
      traces: [],
    };
    const stations = [...survey.stations, last];
    const draft = stationDraft(null, { ...survey, stations }, 'metres');
    expect(draft).toMatchObject({ on: 'shed', x: '', y: '' });
    expect(stationDraft(null, { ...survey, stations }, 'metres', south.id).on).toBe(south.id);
  });

  it('is named after its place, but not over a typed name nor with one that is taken', () => {
    const shed = survey.planes[1];
    const draft = stationDraft(null, survey, 'metres', 'shed');
    const named = { ...draft, ...proposedName(draft, survey, shed, 'centre') };
    expect(named.name).toBe('Shed, centre');
    expect(proposedName(named, survey, shed, 'lower left corner').name).toBe('Shed, lower left corner');
    expect(proposedName({ ...draft, name: 'Ladder' }, survey, shed, 'centre').name).toBe('Ladder');
    const stations = [{ ...survey.stations[0], name: 'Shed, centre' }];
    expect(proposedName(named, { ...survey, stations }, shed, 'centre').name).toMatch(/^Station /);
  });

  // The foot is 0.3048 m, the inch 0.0254 m (international yard and pound agreement, 1959).
  it('is placed in feet and inches, on a plane or in the frame', () => {
    expect(typed({ on: 'shed', x: `3' 6"`, y: '-2', height: `4"` }, null, 'feet').facts).toMatchObject({
      position: { on: 'shed', x: 1.0668, y: -0.6096 },
      instrumentHeight: 0.1016,
    });
    expect(
      typed({ on: 'frame', east: `-10'`, northward: '0', up: `8' 3"` }, null, 'feet').facts?.position,
    ).toEqual({ east: -3.048, north: 0, up: 2.5146 });
  });

  it('need not be placed, but not by halves', () => {
    expect(typed({ on: 'shed' }).facts?.position).toBeUndefined();
    expect(typed({ on: 'shed', x: '2' }).faults).toMatchObject({ x: null, y: expect.any(String) as string });
    const { facts, faults } = typed({ on: 'frame', east: '1', up: 'high' });
    expect(facts).toBeNull();
    expect(faults).toMatchObject({ east: null, northward: expect.any(String) as string });
    expect(faults.up).toMatch(/not understood/);
    expect(typed({ name: ' ' }).faults.name).toMatch(/needs a name/);
    expect(typed({ height: '-1' }).faults.height).toMatch(/0 to 100/);
  });
});

describe('a stored station', () => {
  const station: Station = {
    ...inventedSurvey().stations[0],
    position: { on: south.id, x: 1.2345678, y: -0.4 },
    instrumentHeight: 0.123456,
  };

  it('that nobody touched keeps every digit, in either unit', () => {
    for (const unit of ['metres', 'feet'] as const) {
      const draft = stationDraft(station, survey, unit);
      for (const shown of [draft, stationDraftIn(draft, unit === 'feet' ? 'metres' : 'feet', station)])
        expect(typedStation(shown, station, survey).facts).toEqual({
          name: station.name,
          position: station.position,
          instrumentHeight: station.instrumentHeight,
          serves: station.serves,
        });
    }
  });

  it('on a plane that was taken away meanwhile has no place, and does not speak for it', () => {
    const draft = { ...stationDraft(null, survey, 'metres', 'shed'), x: '1', y: '1', serves: ['shed'] };
    const { facts } = typedStation(draft, null, inventedSurvey());
    expect(facts).toMatchObject({ position: undefined, serves: [] });
  });
});
