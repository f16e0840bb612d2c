import { describe, expect, it } from 'vitest';
import { parseSurvey } from '../../../src/core/survey/parse-survey.ts';
import { withoutObstruction, withoutPlane } from '../../../src/core/survey/removed-entries.ts';
import {
  amended,
  unamended,
  withoutSighting,
  withoutTrace,
  withSighting,
  withSightingAfter,
} from '../../../src/core/survey/sighting-edits.ts';
import type { Photo, Survey } from '../../../src/core/survey/survey.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';
import { sampleSurvey, sampleTexts } from './sample-surveys.ts';

const photo = (id: string, of: Photo['of']): Photo => ({
  id,
  of,
  takenAt: '2026-05-14T09:30:00Z',
  width: 10,
  height: 10,
  bytes: 10,
  sha256: 'a'.repeat(64),
});

const withPhotos: Survey = inventedSurvey('one', {
  photos: [photo('p', { kind: 'plane', id: 'south' }), photo('o', { kind: 'obstruction', id: 'maple' })],
});

const isReadable = (survey: Survey) => parseSurvey(JSON.stringify(survey)).ok;

describe('taking out', () => {
  it('a plane takes its photos, its place in stations and places on it along', () => {
    const [station] = withPhotos.stations;
    const placed = { ...withPhotos, stations: [{ ...station, position: { on: 'south', x: 1, y: 1 } }] };
    const after = withoutPlane(placed, 'south');
    expect(after.planes).toEqual([]);
    expect(after.stations).toEqual([{ ...station, serves: [] }]);
    expect(after.photos?.map(({ id }) => id)).toEqual(['o']);
  });

  it('an obstruction takes its traces and photos along; readings stay', () => {
    const after = withoutObstruction(withPhotos, 'maple');
    expect(after.obstructions).toEqual([]);
    expect(after.stations[0].traces).toEqual([]);
    expect(after.readings).toEqual(withPhotos.readings);
    expect(after.photos?.map(({ id }) => id)).toEqual(['p']);
    expect(withoutPlane(after, 'south')).not.toHaveProperty('photos');
  });

  it.each(sampleTexts.map(({ file }) => file))(
    'any plane or obstruction of %s leaves a survey that can be read',
    (file) => {
      const survey = sampleSurvey(file);
      for (const { id } of survey.planes) expect(isReadable(withoutPlane(survey, id))).toBe(true);
      for (const { id } of survey.obstructions) expect(isReadable(withoutObstruction(survey, id))).toBe(true);
    },
  );
});

describe('the sightings of a trace', () => {
  const list = { station: 'A', trace: 't1' };
  const rows = (survey: Survey) => survey.stations[0].traces[0].sightings;

  it('get another after one of them, at the end, or after the first', () => {
    const added = { id: 'new', azimuth: 135, elevation: 30 };
    const ids = (after: string | null) =>
      rows(withSightingAfter(inventedSurvey(), list, added, after)).map(({ id }) => id);
    expect(ids(null)).toEqual(['s1', 's2', 's3', 'new']);
    expect(ids('s1')).toEqual(['s1', 'new', 's2', 's3']);
  });

  it('are changed and taken out by id, nothing else with them', () => {
    const survey = inventedSurvey();
    const [first] = rows(survey);
    const amendment = { azimuth: 1, elevation: 2, reason: 'misread', madeAt: '2026-05-14T10:00:00Z' };
    const changed = withSighting(survey, list, amended(first, amendment));
    expect(rows(changed)[0]).toEqual({ ...first, amendments: [amendment] });
    expect(rows(changed).slice(1)).toEqual(rows(survey).slice(1));
    expect(withSighting(changed, list, unamended(rows(changed)[0]))).toEqual(survey);
    expect(rows(withoutSighting(survey, list, 's2')).map(({ id }) => id)).toEqual(['s1', 's3']);
    expect(withoutTrace(survey, 'A', 't1').stations[0].traces).toEqual([]);
  });
});
