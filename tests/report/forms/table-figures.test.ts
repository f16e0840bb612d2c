import { describe, expect, it } from 'vitest';
import type { Section, Table } from '../../../src/report/contents/report-contents.ts';
import type { FigureRow } from '../../../src/report/forms/figure-row.ts';
import { figuresOf } from '../../../src/report/forms/figure-rows.ts';
import type { Quantity } from '../../../src/report/forms/quantities.ts';
import { reportContents } from '../../../src/report/report-contents.ts';
import { reportOf } from '../report-of.ts';
import { sampleSurvey, underClearSky } from '../sample-shades.ts';

/** Which quantities the tables of a section may tell; sections that are not here have none that were worked out. */
const TOLD: Record<string, readonly Quantity[]> = {
  'sun-and-roof': ['shade-from', 'shade-to'],
  'month-by-month': ['unshaded-irradiation', 'irradiation', 'solar-access'],
  'what-could-be-done': [
    'gain-if-removed',
    'gain-if-lower',
    'gain-if-cut-clear',
    'light-if-removed',
    'light-if-lower',
    'light-if-cut-clear',
  ],
  'what-to-expect': ['irradiation', 'area', 'whole-irradiation'],
  'how-it-may-change': ['loss-if-grown'],
  'programme-table': [
    'surface-tilt',
    'surface-azimuth',
    'solar-access',
    'orientation-factor',
    'access-times-orientation',
    'asked-solar-access',
    'asked-product',
  ],
  'planes-and-stations': [
    'surface-tilt',
    'surface-azimuth',
    'width',
    'slope-length',
    'outline-corners',
    'tilt-placings',
    'tilt-scatter',
    'position-x',
    'position-y',
    'position-east',
    'position-north',
    'position-up',
    'instrument-height',
    'coverage',
    'solar-access',
  ],
  'obstruction-costs': ['gain-if-removed', 'loss-if-alone', 'distance', 'transmittance'],
  'month-tables': ['unshaded-irradiation', 'solar-access'],
  'field-book': ['sighting-azimuth', 'sighting-elevation', 'line-width', 'open-from', 'open-to'],
  'heading-evidence': [
    'heading-correction',
    'heading-deviation',
    'check-correction',
    'check-deviation',
    'check-against-compass',
    'closure-azimuth',
    'closure-elevation',
    'closure-minutes',
    'camera-index',
    'camera-index-deviation',
    'top-edge-index',
    'top-edge-index-deviation',
  ],
};

/** Columns of names and of days of the calendar. */
const NOT_FIGURES = ['Started', 'Taken', 'Run', 'Station', 'Serves', 'Where', 'Mark'];

const cellsOf = ({ columns, rows, sums = [] }: Table): string[] =>
  [...rows, ...sums].flatMap((row) =>
    row.filter((_, column) => column > 0 && !NOT_FIGURES.includes(columns[column].head)),
  );

/** Numbers of a cell, each with half a unit of its last digit; clock times as minutes. */
const numbersIn = (cell: string) =>
  [...cell.replaceAll(',', '').matchAll(/(\d+):(\d\d)|[-−]?\d+(?:\.(\d+))?/g)].map(
    ([text, hours, minutes, digits]) =>
      hours === undefined
        ? { value: Number(text.replace('−', '-')), within: 0.5 * 10 ** -(digits?.length ?? 0) }
        : { value: Number(hours) * 60 + Number(minutes), within: 0 },
  );

/** A whole roof is told to three figures. */
const withinOf = (value: number, within: number, section: string) =>
  section === 'what-to-expect' ? Math.max(within, 0.005 * Math.abs(value)) : within;

function strangers({ id, blocks }: Section, rows: readonly FigureRow[]): string[] {
  const values = rows
    .filter(({ quantity, period }) => TOLD[id].includes(quantity) && !period.includes('hour'))
    .flatMap(({ value, low, high, unit }) =>
      [value, low, high].flatMap((one) => {
        if (one === null) return [];
        if (unit === 'minute of day') return [one % 1440];
        // shares are told as percent or as points of it
        return unit === 'share' ? [100 * one] : unit === 'degrees' ? [one, one - 360, one + 360] : [one];
      }),
    );
  return blocks
    .flatMap((block) => (block.kind === 'table' ? cellsOf(block.table) : []))
    .filter((cell) =>
      numbersIn(cell).some(
        ({ value, within }) =>
          !values.some((one) => Math.abs(one - value) <= withinOf(value, within, id) + 1e-6),
      ),
    );
}

describe.each(['suburban-maple-and-gable.json', 'terrace-chimneys-mast-balcony.json'])(
  'every number in the tables of the report of %s',
  (file) => {
    it('stands among the figures beside it', async () => {
      const report = await reportOf(underClearSky(sampleSurvey(file)), {
        choices: { thresholds: { solarAccess: 0.755, product: 0.8 } },
      });
      const rows = figuresOf(report);
      const { sections } = reportContents(report);
      const told = sections.filter(({ id }) => id in TOLD);
      const missing = told.map((section) => [section.id, strangers(section, rows)]);
      expect(missing.filter(([, cells]) => cells.length > 0)).toEqual([]);
      // a table of another section would have to say where its numbers are
      const others = sections.filter(
        ({ id, blocks }) => !(id in TOLD) && blocks.some(({ kind }) => kind === 'table'),
      );
      expect(others.map(({ id }) => id).filter((id) => id !== 'site-facts')).toEqual([]);
    });
  },
);
