import { fc, test } from '@fast-check/vitest';
import { describe, expect } from 'vitest';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { weatherText } from '../../reference-values/weather-text.ts';
import { bentLines, EPW, headerLines, TMY3 } from './bent-weather.ts';

/** Reading must end in a whole year or in problems that say where and what, whatever the text. */
function expectAnswer(text: string): void {
  const parsed = parseWeatherFile(text, 'fuzz');
  if (!parsed.ok) {
    expect(parsed.problems.length).toBeGreaterThan(0);
    for (const { path, message } of parsed.problems) {
      expect(path).toMatch(/^(file|line \d+)$/);
      expect(message.length).toBeGreaterThan(20);
    }
    return;
  }
  const { ghi, dni, dhi, temperature, latitude, longitude, altitude, utcOffset } = parsed.value;
  for (const values of [ghi, dni, dhi]) {
    expect(values).toHaveLength(8760);
    expect(values.every((value) => value >= 0 && value <= 1500)).toBe(true);
  }
  expect(temperature.every((value) => value >= -95 && value <= 65)).toBe(true);
  expect([latitude, longitude, altitude, utcOffset].every(Number.isFinite)).toBe(true);
}

const file = fc.constantFrom(EPW, TMY3);
const runs = { numRuns: 40 };

describe('parseWeatherFile never throws', () => {
  test.prop([fc.string({ unit: 'binary', maxLength: 3000 })])('on any text', expectAnswer);

  test.prop([fc.string({ maxLength: 500 })])('on any text after the start of an EPW file', (rest) =>
    expectAnswer(`LOCATION,${rest}`),
  );

  test.prop([fc.array(fc.string({ maxLength: 60 }), { maxLength: 8 })])(
    'on any lines after TMY3 names',
    (lines) =>
      expectAnswer(['1,"x",AZ,-7.0,33,-112,300', weatherText(TMY3).split('\n', 2)[1], ...lines].join('\n')),
  );

  test.prop([file, fc.double({ min: 0, max: 1, noNaN: true })], runs)(
    'on a file cut anywhere',
    (name, share) => {
      const text = weatherText(name);
      expectAnswer(text.slice(0, Math.floor(share * text.length)));
    },
  );

  test.prop([file, fc.nat(8759), fc.nat(8759)], runs)(
    'on two hours exchanged, which it refuses',
    (name, a, b) => {
      fc.pre(a !== b);
      const text = bentLines(name, (lines, at) => {
        [lines[at + a], lines[at + b]] = [lines[at + b], lines[at + a]];
      });
      const parsed = parseWeatherFile(text, name);
      expect(parsed.ok).toBe(false);
      if (!parsed.ok) expect(parsed.problems[0].path).toBe(`line ${headerLines(name) + 1 + Math.min(a, b)}`);
    },
  );

  test.prop(
    [
      file,
      fc.array(fc.tuple(fc.nat(1_500_000), fc.string({ unit: 'binary', maxLength: 4 })), {
        minLength: 1,
        maxLength: 20,
      }),
    ],
    runs,
  )('on bytes overwritten anywhere', (name, changes) => {
    let text = weatherText(name);
    for (const [at, put] of changes) text = text.slice(0, at) + put + text.slice(at + put.length);
    expectAnswer(text);
  });
});
