import { describe, expect, it } from 'vitest';
import { LARGEST_WEATHER_FILE, parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import type { Problem } from '../../../src/core/survey/problem.ts';
import { bentLines, EPW, headerLines, TMY3, withCell } from './bent-weather.ts';

function problemsOf(text: string): Problem[] {
  const parsed = parseWeatherFile(text, 'bent');
  if (parsed.ok) throw new Error('the file was read');
  return parsed.problems;
}

/** Expects one problem at a line, with words in it, that says what to do. */
function expectProblem(text: string, path: string, words: RegExp): void {
  const problems = problemsOf(text);
  expect(problems).toHaveLength(1);
  expect(problems[0].path).toBe(path);
  expect(problems[0].message).toMatch(words);
  expect(problems[0].message).toMatch(/get the file again|choose|correct the line/i);
}

describe.each([EPW, TMY3])('%s is refused', (name) => {
  const first = headerLines(name) + 1; // number of the first hour's line
  const ghi = name === EPW ? 13 : 4;

  it('cut short after a whole line', () => {
    const text = bentLines(name, (lines) => lines.splice(5000));
    expectProblem(
      text,
      'line 5000',
      new RegExp(`after ${5001 - first} of 8,760 hours: the file is cut short`),
    );
  });

  it('cut short within a line', () => {
    const text = bentLines(name, (lines) => lines.splice(5000));
    expectProblem(text.slice(0, -120), 'line 5000', /columns where .* cut short/);
  });

  it('with an hour missing', () => {
    const text = bentLines(name, (lines, at) => lines.splice(at + 30, 1));
    expectProblem(
      text,
      `line ${first + 30}`,
      /is 2 January, hour 8 where 2 January, hour 7 should be: hours are missing/,
    );
  });

  it('with an hour twice', () => {
    const text = bentLines(name, (lines, at) => lines.splice(at + 30, 0, lines[at + 29]));
    expectProblem(text, `line ${first + 30}`, /repeats 2 January, hour 6/);
  });

  it('with hours shuffled', () => {
    const text = bentLines(name, (lines, at) => lines.push(...lines.splice(at, 200)));
    expectProblem(text, `line ${first}`, /is 9 January, hour 9 where 1 January, hour 1 should be/);
  });

  it('with more hours than a year', () => {
    const text = bentLines(name, (lines, at) => lines.push(lines[at]));
    expectProblem(text, `line ${first + 8760}`, /where the end of the year should be/);
  });

  it('with a line of another number of columns', () => {
    const text = bentLines(name, (lines, at) => (lines[at + 4] += ',0'));
    expectProblem(text, `line ${first + 4}`, /has \d+ columns where .* \d+/);
  });

  it.each([
    ['-3', /global irradiance -3 W\/m2, which cannot be \(0 to 1500\)/],
    ['1501', /global irradiance 1501 W\/m2/],
    ['', /no number for global irradiance/],
    ['abc', /no number for global irradiance/],
    ['1e9999', /no number|cannot be|lacks/],
  ])('with an irradiance of "%s"', (value, words) => {
    const text = withCell(name, 12, ghi, value);
    if (name === EPW && value === '1e9999') return expect(parseWeatherFile(text, name).ok).toBe(true); // above 9999: missing
    expectProblem(text, `line ${first + 12}`, words);
  });

  it('with too many hours marked as missing', () => {
    const missing = name === EPW ? '9999' : '-9900';
    const text = bentLines(name, (lines, at) => {
      for (let hour = 0; hour < 25; hour++) {
        const cells = lines[at + 4000 + hour].split(',');
        cells[ghi] = missing;
        lines[at + 4000 + hour] = cells.join(',');
      }
    });
    expectProblem(text, 'file', /lacks global irradiance in 25 hours; at most 24 are filled/);
  });

  it('with many bad values: the first dozen listed, the rest counted', () => {
    const text = bentLines(name, (lines, at) => {
      for (let hour = 0; hour < 100; hour++) {
        const cells = lines[at + hour].split(',');
        cells[ghi] = '-1';
        lines[at + hour] = cells.join(',');
      }
    });
    const problems = problemsOf(text);
    expect(problems).toHaveLength(13);
    expect(problems[12].message).toMatch(/88 more problems/);
  });

  it('with no sun in any hour', () => {
    const text = bentLines(name, (lines, at) => {
      for (let hour = at; hour < lines.length; hour++) {
        const cells = lines[hour].split(',');
        cells[ghi] = '0';
        lines[hour] = cells.join(',');
      }
    });
    expectProblem(text, 'file', /no sunlight in any hour/);
  });

  it('with the header alone', () => {
    expect(problemsOf(bentLines(name, (lines, at) => lines.splice(at)))).toHaveLength(1);
  });
});

describe('a weather file is refused', () => {
  it('with no place or zone in the header', () => {
    const text = bentLines(EPW, (lines) => (lines[0] = 'LOCATION,Somewhere,-,-,x,1,95.0,nowhere,,1e9'));
    expect(problemsOf(text).map(({ message }) => /has no ([a-z ]+) of/.exec(message)?.[1])).toEqual([
      'latitude',
      'longitude',
      'altitude',
      'time zone',
    ]);
  });

  it('with records of half an hour', () => {
    const text = bentLines(
      EPW,
      (lines) => (lines[7] = lines[7].replace('DATA PERIODS,1,1', 'DATA PERIODS,1,2')),
    );
    expectProblem(text, 'line 8', /one record an hour/);
  });

  it('without a column that is needed', () => {
    const text = bentLines(TMY3, (lines) => (lines[1] = lines[1].replace('DNI (W/m^2)', 'something')));
    expectProblem(text, 'line 2', /no column "DNI \(W\/m\^2\)"/);
  });

  it('with a date that is none', () => {
    expectProblem(withCell(TMY3, 3, 0, '13/41/2001'), 'line 6', /no date and hour that exist/);
    expectProblem(withCell(TMY3, 3, 1, '04:30'), 'line 6', /full hour/);
    expectProblem(withCell(EPW, 3, 3, '0'), 'line 12', /hours run from 1 to 24/);
  });

  it.each(['', ' ', '{"format":"noonmark-survey"}', 'a,b,c\n1,2,3\n', '%PDF-1.7', '\u0000\u0001'])(
    'that is none: %j',
    (text) => expectProblem(text, 'line 1', /neither .* EPW .* nor .* TMY3/),
  );

  it('over 20 MB', () => {
    expectProblem('L'.repeat(LARGEST_WEATHER_FILE + 1), 'file', /larger than 20 MB/);
  });
});
