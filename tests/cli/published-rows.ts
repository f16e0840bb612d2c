import { cell, readTable } from '../reference-values/published-table.ts';

/** The twelve test values of the WMM2025 report as rows for the command, and the declinations it prints. */
export function publishedTableText() {
  const rows = readTable('wmm2025_12.csv');
  const lines = rows.map((row) =>
    [row.decimal_year, row.lat_deg, turned(cell(row, 'lon_deg')), cell(row, 'altitude_km') * 1000].join(','),
  );
  return {
    input: ['date,latitude,longitude,elevation', ...lines].join('\n'),
    expected: rows.map((row) => cell(row, 'D_deg')),
  };
}

const turned = (longitude: number) => (longitude > 180 ? longitude - 360 : longitude);
