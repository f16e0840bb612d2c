import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { assessmentText } from '../../src/cli/assessment-text.ts';
import { problemLines, warningLines } from '../../src/cli/problem-lines.ts';
import { shownName, shownWords } from '../../src/cli/shown-name.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import { sampleSurvey, underClearSky } from '../report/sample-shades.ts';
import { clearSkyClimate } from '../../src/core/irradiance/clear-sky-climate.ts';

// ECMA-48 controls (C0, DEL, C1) and the bidirectional controls of Unicode's Annex 9
const STEERING = /[\p{Cc}\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069\u2028\u2029]/u;
const EVIL = '\u001b[2Jwiped\u0007\nline\r\u202edab\u2066\u009b31m';

describe('names in a terminal', () => {
  it('lose what steers it, and stay on one line', () => {
    expect(shownName(EVIL)).toBe('[2Jwiped line dab31m');
    expect(shownName('Old maple, north-east')).toBe('Old maple, north-east');
    expect(shownName('Köşk · 木')).toBe('Köşk · 木');
  });

  it('are cut at 40 characters, whole ones', () => {
    expect(shownName('a'.repeat(40))).toBe('a'.repeat(40));
    expect(shownName('a'.repeat(10_000))).toBe(`${'a'.repeat(39)}…`);
    expect(shownName('🌳'.repeat(50))).toBe(`${'🌳'.repeat(39)}…`);
  });

  test.prop([fc.string({ unit: 'binary', maxLength: 300 })])('whatever they hold', (name) => {
    expect(shownName(name)).not.toMatch(STEERING);
    expect([...shownName(name)].length).toBeLessThanOrEqual(40);
    expect(shownWords(name)).not.toMatch(STEERING);
  });
});

describe('where names are printed', () => {
  it('problems and warnings keep a line each', () => {
    const problems = [{ path: 'title', message: `is ${EVIL}` }];
    expect(problemLines('a.json', problems)).toBe('a.json: title: is [2Jwiped line dab31m\n');
    expect(warningLines('a.json', problems)).toBe('a.json: title: Warning: is [2Jwiped line dab31m\n');
  });

  it('an assessment with such names everywhere neither steers the terminal nor grows wide', async () => {
    const name = `${EVIL}${'x'.repeat(10_000)}`;
    const survey = underClearSky(sampleSurvey('suburban-maple-and-gable.json'));
    const renamed = <T>(things: T[]) => things.map((thing) => ({ ...thing, name }));
    const assessed = await assessSurvey(
      {
        ...survey,
        planes: renamed(survey.planes),
        stations: renamed(survey.stations),
        obstructions: renamed(survey.obstructions),
      },
      clearSkyClimate('ineichen'),
      { stepMinutes: 15, intervals: false },
    );
    const lines = assessmentText({ ...assessed, file: 'a.json', title: name }).split('\n');
    for (const line of lines) {
      expect(line).not.toMatch(STEERING);
      expect(line.length).toBeLessThan(260);
    }
    expect(lines.some((line) => line.startsWith(shownName(name)))).toBe(true);
  });
});
