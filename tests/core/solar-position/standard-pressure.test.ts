import { expect, it } from 'vitest';
import { standardPressure } from '../../../src/core/solar-position/refraction.ts';
import { readTable } from '../../reference-values/read-table.ts';

it('standardPressure gives altitude_pressure.csv (standard atmosphere) within 0.05 hPa', () => {
  const rows = readTable('altitude_pressure.csv');
  expect(rows).toHaveLength(21);
  for (const { altitude_m, pressure_pa } of rows)
    expect(Math.abs(standardPressure(altitude_m) - pressure_pa / 100)).toBeLessThan(0.05);
});
