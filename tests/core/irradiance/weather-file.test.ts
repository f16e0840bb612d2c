import { describe, expect, it } from 'vitest';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { weatherText } from '../../reference-values/weather-text.ts';
import { bentLines, EPW, TMY3 } from './bent-weather.ts';
import { WEATHER_FILES, weatherFile } from './weather-files.ts';

/** Column of a data line by the plain way, for comparison with the fast one. */
const column = (text: string, header: number, index: number) =>
  text
    .split(/\r?\n/)
    .slice(header, header + 8760)
    .map((line) => Number(line.split(',')[index]));

describe('parseWeatherFile', () => {
  it.each(WEATHER_FILES)('reads $name without a warning', ({ name, ghi }) => {
    const file = weatherFile(name);
    const sum = file.ghi.reduce((total, value) => total + value, 0);
    expect(Math.abs(sum / 365_000 - ghi)).toBeLessThan(0.006);
    expect(file.warnings).toEqual([]);
    expect(file.name).toBe(name);
  });

  it('reads every column of an EPW hour from its place (EnergyPlus data dictionary: N6, N13, N14, N15)', () => {
    const text = weatherText(EPW);
    const file = weatherFile(EPW);
    expect([...file.temperature]).toEqual([...Float32Array.from(column(text, 8, 6))]);
    expect([...file.ghi]).toEqual(column(text, 8, 13));
    expect([...file.dni]).toEqual(column(text, 8, 14));
    expect([...file.dhi]).toEqual(column(text, 8, 15));
  });

  it('reads every column of a TMY3 hour from its place (NREL/TP-581-43156, table 3: 5, 8, 11, 32)', () => {
    const text = weatherText(TMY3);
    const file = weatherFile(TMY3);
    expect([...file.ghi]).toEqual(column(text, 2, 4));
    expect([...file.dni]).toEqual(column(text, 2, 7));
    expect([...file.dhi]).toEqual(column(text, 2, 10));
    expect([...file.temperature]).toEqual([...Float32Array.from(column(text, 2, 31))]);
  });

  it('reads the station from the header', () => {
    const colombo = {
      place: 'COLOMBO/KATUNAYAKE, LKA',
      latitude: 7.17,
      longitude: 79.88,
      altitude: 8,
      utcOffset: 360,
    };
    expect(weatherFile('LKA_Colombo-Katunayake.434500_SWERA.epw')).toMatchObject({
      ...colombo,
      format: 'EPW',
    });
    const phoenix = {
      place: 'PHOENIX SKY HARBOR INTL AP, AZ',
      latitude: 33.45,
      longitude: -111.983,
      altitude: 337,
    };
    expect(weatherFile(TMY3)).toMatchObject({ ...phoenix, utcOffset: -420, format: 'TMY3' });
  });

  it.each([EPW, TMY3])(
    '%s reads the same with other line ends, a byte-order mark and no last line end',
    (name) => {
      const text = weatherText(name).replaceAll('\r\n', '\n');
      const plain = parseWeatherFile(text, name);
      expect(plain.ok).toBe(true);
      const ways = [
        text.replaceAll('\n', '\r\n'),
        text.replaceAll('\n', '\r'),
        `\uFEFF${text}`,
        text.trimEnd(),
        `${text}\n\n`,
      ];
      for (const way of ways) expect(parseWeatherFile(way, name)).toEqual(plain);
    },
  );

  it('keeps zones of half and quarter hours', () => {
    const text = weatherText(EPW);
    const [header] = text.split('\n', 1);
    expect(header).toContain(',-7.0,');
    const kathmandu = parseWeatherFile(text.replace(header, header.replace(',-7.0,', ',5.75,')), 'zone.epw');
    expect(kathmandu.ok && kathmandu.value.utcOffset).toBe(345);
  });

  it.each([EPW, TMY3])('%s: leaves out 29 February of a leap year, and says so', (name) => {
    const plain = weatherFile(name);
    const leap = bentLines(name, (lines, first) => {
      const march = first + 59 * 24;
      const day = lines
        .slice(march - 24, march)
        .map((line) => line.replace(/^02\/28|,2,28,/, (at) => at.replace('28', '29')));
      lines.splice(march, 0, ...day);
    });
    const parsed = parseWeatherFile(leap, name);
    if (!parsed.ok) throw new Error(parsed.problems[0].message);
    expect(parsed.value.ghi).toEqual(plain.ghi);
    expect(parsed.warnings).toHaveLength(1);
    expect(parsed.value.warnings[0]).toMatch(/29 February/);
  });

  it('fills a few missing hours from the days around, and says so', () => {
    const noon = 100 * 24 + 11;
    const text = bentLines(EPW, (lines, first) => {
      for (const hour of [noon, noon + 24]) {
        const cells = lines[first + hour].split(',');
        cells[6] = '99.9';
        cells[13] = cells[14] = cells[15] = '9999';
        lines[first + hour] = cells.join(',');
      }
    });
    const plain = weatherFile(EPW);
    const parsed = parseWeatherFile(text, EPW);
    if (!parsed.ok) throw new Error(parsed.problems[0].message);
    const { ghi, temperature } = parsed.value;
    const [before, after] = [plain.ghi[noon - 24], plain.ghi[noon + 48]];
    expect(ghi[noon]).toBeCloseTo((2 * before + after) / 3, 3);
    expect(ghi[noon + 24]).toBeCloseTo((before + 2 * after) / 3, 3);
    expect(temperature[noon]).toBeCloseTo(
      (2 * plain.temperature[noon - 24] + plain.temperature[noon + 48]) / 3,
      3,
    );
    expect(parsed.warnings.map(({ message }) => message)).toEqual([
      expect.stringMatching(/global irradiance in 2 hours/),
      expect.stringMatching(/direct normal irradiance in 2 hours/),
      expect.stringMatching(/diffuse irradiance in 2 hours/),
      expect.stringMatching(/air temperature in 2 hours/),
    ]);
  });
});
