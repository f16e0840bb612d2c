import { describe, expect, it } from 'vitest';
import { rangeOf } from '../../../src/app/capture/open-take.ts';
import { freeStationName } from '../../../src/app/capture/edit-station.ts';
import { freeName } from '../../../src/app/capture/obstruction-edits.ts';
import { compassPoint } from '../../../src/ui/screens/stations/capture/compass-point.ts';
import { newsWords } from '../../../src/ui/screens/stations/capture/capture-words.ts';
import { hasParts, placeWords } from '../../../src/ui/screens/stations/station-facts.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';

describe('words of a capture', () => {
  it('say what was stored, and why something was not taken with what to do', () => {
    expect(newsWords({ kind: 'stored', what: 'trace', name: 'Maple', count: 12, number: 1 })).toBe(
      'Maple traced with 12 points. Stored.',
    );
    expect(newsWords({ kind: 'refused', why: 'moving', degrees: 2.34, number: 2 })).toBe(
      'Not taken: the phone moved by 2.3°. Hold still and tap again.',
    );
  });

  it('name the nearest of eight points', () => {
    expect([0, 22, 23, 181, 315, 359].map(compassPoint)).toEqual(['N', 'N', 'NE', 'S', 'NW', 'N']);
    expect(compassPoint(null)).toBe('');
  });
});

describe('words of a station', () => {
  const survey = inventedSurvey();
  const [station] = survey.stations;

  it('say what it has', () => {
    expect(hasParts(station)).toEqual(['1 trace']);
    const more = {
      ...station,
      observedOpen: [
        [0, 10],
        [20, 30],
      ] as [number, number][],
      markSightings: [{ id: 'm', mark: 'tip' }, { id: 'l' }, { id: 's', readings: ['r1', 'r2'] }],
    };
    expect(hasParts(more)).toEqual([
      '1 trace',
      '2 open ranges',
      '1 mark',
      '1 interrupted sweep',
      '1 sighting in no trace yet',
    ]);
  });

  it('say where it stands', () => {
    expect(placeWords({ ...station, serves: [] }, survey)).toBe('Place unknown');
    expect(placeWords({ ...station, serves: ['south'] }, survey)).toBe('Not measured on South roof');
    expect(placeWords({ ...station, position: { on: 'south', x: 1, y: 2 } }, survey)).toBe(
      'On South roof, 1 m along the eave, 2 m up the slope',
    );
  });

  it('offer names that are free', () => {
    expect(freeStationName(survey)).toBe('Station A');
    const taken = { ...survey, stations: [{ ...station, name: 'Station A' }] };
    expect(freeStationName(taken)).toBe('Station B');
    const trees = { ...survey, obstructions: [{ ...survey.obstructions[0], name: 'Deciduous tree' }] };
    expect(freeName(trees, 'deciduous-tree')).toBe('Deciduous tree 2');
  });
});

describe('an open range', () => {
  it('runs clockwise whichever way it was turned, and over north', () => {
    expect(rangeOf(350, 30)).toEqual([350, 20]);
    expect(rangeOf(20, -30)).toEqual([350, 20]);
    expect(rangeOf(10, -370)).toEqual([0, 360]);
  });
});
