import { describe, expect, it } from 'vitest';
import { parseSurvey } from '../../../src/core/survey/parse-survey.ts';
import { pathWords, problemInWords } from '../../../src/core/survey/path-words.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';

const survey = inventedSurvey();
const PATH = /[a-z]\[\d+\]|\.[a-z]/;

/** What is wrong with a changed survey, in words. */
function saidOf(change: (survey: Survey) => void): string {
  const changed = structuredClone(survey);
  change(changed);
  const parsed = parseSurvey(JSON.stringify(changed));
  if (parsed.ok) throw new Error('the survey is still right');
  return problemInWords(parsed.problems[0], changed);
}

describe('a place in a survey', () => {
  it.each([
    ['stations[0].traces[0].sightings[2].elevation', 'sighting 3 of “Maple in the street” from “Eave, left”'],
    ['stations[0].traces[0]', 'the trace of “Maple in the street” from “Eave, left”'],
    ['stations[0].traces[0].angularWidth', 'the trace of “Maple in the street” from “Eave, left”'],
    ['stations[0].headingChecks[1]', 'heading check 2 from “Eave, left”'],
    ['planes[0].width', '“South roof”'],
    ['planes[0].outline[2].x', 'corner 3 of “South roof”'],
    ['planes[7]', 'plane 8'],
    ['site.latitude', 'the site'],
    ['title', ''],
  ])('%s is called %s', (path, words) => expect(pathWords(path, survey)).toBe(words));

  it('is numbered as the field book shows it, by the order of the entries', () => {
    const turned = structuredClone(survey);
    const { sightings } = turned.stations[0].traces[0];
    sightings.forEach((sighting, i) => (sighting.order = -i));
    expect(pathWords('stations[0].traces[0].sightings[0]', turned)).toMatch(
      new RegExp(`^sighting ${sightings.length} of`),
    );
  });

  it('in what is no survey still gets words', () => {
    expect(pathWords('stations[0].traces[0].sightings[0]', null)).toBe(
      'sighting 1 of trace 1 from station 1',
    );
  });
});

describe('what is wrong, in words', () => {
  it('names the sighting and has no path', () => {
    const said = saidOf(({ stations }) => (stations[0].traces[0].sightings[1].elevation = 95));
    expect(said).toMatch(/^Sighting 2 of “Maple in the street” from “Eave, left”: elevation must be .*95/);
    expect(said).not.toMatch(PATH);
  });

  it('names the neighbour of a sighting that makes no edge', () => {
    const said = saidOf(({ stations }) => {
      const [first, second] = stations[0].traces[0].sightings;
      delete first.reading;
      Object.assign(first, { azimuth: 10, elevation: 20 });
      Object.assign(second, { azimuth: 190, elevation: 20 });
    });
    expect(said).toMatch(/180 degrees from its neighbour sighting 1 \(azimuths/);
    expect(said).not.toMatch(PATH);
  });

  it('names the corners and sightings between which an outline crosses itself', () => {
    const said = saidOf(({ stations }) => {
      const [trace] = stations[0].traces;
      trace.shape = 'outline';
      trace.sightings = [
        [10, 10],
        [20, 20],
        [20, 10],
        [10, 20],
      ].map(([azimuth, elevation], i) => ({ id: `s${i}`, azimuth, elevation }));
    });
    expect(said).toMatch(/its edge after sighting \d meets its edge after sighting \d/);
    expect(said).not.toMatch(PATH);
  });

  it('calls fields by their words', () => {
    expect(saidOf(({ planes }) => (planes[0].surfaceTilt = 120))).toMatch(/^“South roof”: tilt must be/);
    expect(saidOf(({ site }) => (site.latitude = 120))).toMatch(/^The site: latitude must be/);
    expect(saidOf((one) => (one.surveyedOn = 'soon'))).toMatch(/^Day of the visit must be/);
  });
});
