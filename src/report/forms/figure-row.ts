import type { Quantity } from './quantities.ts';

/** One figure of a report, unrounded. */
export interface FigureRow {
  quantity: Quantity;
  /** Names as a person gave them; empty where the figure is of more than one. */
  plane: string;
  station: string;
  obstruction: string;
  /**
   * `year`, `month 01` to `month 12`, `month 01 hour 00` to `month 12 hour 23` in hours of local standard time, the year's
   * share from azimuths clockwise from true north, such as `year azimuth 20 to 41.5`, `month 06 day 21 span 1` for the
   * first hours of shade of a day, `stretch 1` for the first days of shade of a year, the instant of a heading check, or
   * empty.
   */
  period: string;
  /** Null in a month without sun. */
  value: number | null;
  /** The truth is expected between them 95 times in 100; null where nothing is known of it. */
  low: number | null;
  high: number | null;
  unit: Unit;
  plane_id: string;
  station_id: string;
  /** Several, parted by spaces, for a group that hide each other. */
  obstruction_id: string;
  /** Empty for this survey; else what is set beside it. */
  compared: string;
  /** Of the sensor, numbered as in the report. */
  run: string;
  run_id: string;
  /** Of the sighting, trace or heading check; of an azimuth range its place in the list. */
  item_id: string;
  /** What an obstruction is taken to be lower or higher by, metres. */
  change_m: number | null;
}

export type Unit =
  'degrees' | 'share' | 'kWh/m2' | 'kWh' | 'm' | 'm2' | 'count' | 'minutes' | 'minute of day' | 'day of year';

/** What a figure is of. */
export type Subject = Partial<Omit<FigureRow, 'quantity' | 'value' | 'low' | 'high' | 'unit'>>;

export type Between = { low: number; high: number } | null | undefined;

/** The order of the columns, too. */
const NOTHING: FigureRow = {
  quantity: 'solar-access',
  plane: '',
  station: '',
  obstruction: '',
  period: '',
  value: null,
  low: null,
  high: null,
  unit: 'share',
  plane_id: '',
  station_id: '',
  obstruction_id: '',
  compared: '',
  run: '',
  run_id: '',
  item_id: '',
  change_m: null,
};

export const FIGURE_COLUMNS = Object.keys(NOTHING) as (keyof FigureRow)[];

export const figure = (
  subject: Subject,
  quantity: Quantity,
  value: number | null,
  unit: Unit = 'share',
  between?: Between,
): FigureRow => ({
  ...NOTHING,
  ...subject,
  quantity,
  value,
  low: between?.low ?? null,
  high: between?.high ?? null,
  unit,
});

/** A row a month. */
export const monthFigures = (
  subject: Subject,
  quantity: Quantity,
  values: readonly (number | null)[],
  unit: Unit = 'share',
): FigureRow[] =>
  values.map((value, month) => figure({ ...subject, period: monthPeriod(month) }, quantity, value, unit));

/** Of months 0 to 11. */
export const monthPeriod = (month: number): string => `month ${twoDigits(month + 1)}`;

export const twoDigits = (number: number): string => String(number).padStart(2, '0');
