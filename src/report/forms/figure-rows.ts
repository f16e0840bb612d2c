import type {
  AccessInterval,
  Assessment,
  PlaneAssessment,
  StationAssessment,
} from '../../core/shading/assessment.ts';
import type { ReportInput } from '../report-input.ts';
import { shownText } from '../shown-text.ts';

/** One figure of a report, unrounded. */
export interface FigureRow {
  /** What it is: a row of `QUANTITIES`. */
  quantity: Quantity;
  /** Names as a person gave them; empty where the figure is of more than one. */
  plane: string;
  station: string;
  obstruction: string;
  /**
   * `year`, `month 01` to `month 12`, `month 01 hour 00` to `month 12 hour 23` in hours of local standard time, or the
   * year's share from azimuths clockwise from true north, such as `year azimuth 20 to 41.5`.
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
}

export type Unit = 'degrees' | 'share' | 'kWh/m2' | 'count';

/** Every quantity, with what it means. */
export const QUANTITIES = {
  'surface-tilt': 'tilt of the plane from the horizontal',
  'surface-azimuth': 'azimuth the plane faces, clockwise from true north',
  'best-tilt': 'tilt of the best-lying plane at the site',
  'best-azimuth': 'azimuth of the best-lying plane at the site',
  'orientation-factor': 'unshaded irradiation on the plane over that on the best-lying plane',
  'unshaded-irradiation': 'irradiation on the plane with nothing in the way',
  irradiation: 'irradiation on the plane, shade counted',
  'solar-access': 'irradiation with obstructions over that without',
  'solar-access-deviation': 'standard deviation of the annual solar access',
  'shading-loss': 'one less the solar access',
  'access-times-orientation': 'solar access times orientation factor',
  'lowest-access': 'lowest annual solar access among the stations of the plane',
  stations: 'stations that the solar access of the plane is the mean of',
  coverage: 'share of the light that comes through azimuths somebody observed',
  'unseen-light': 'share of the light that comes from azimuths nobody observed',
  'gain-if-removed': 'solar access gained if this obstruction goes and the others stay',
  'loss-if-alone': 'solar access lost if this obstruction alone stood',
  'gain-if-all-removed': 'solar access gained if all of a group that hide each other go',
} as const;

export type Quantity = keyof typeof QUANTITIES;

type Place = Pick<FigureRow, 'plane' | 'plane_id' | 'station' | 'station_id' | 'compared'>;
type Between = { low: number; high: number } | null | undefined;

/** Every figure of a report, plane by plane: of the survey, then of what it is compared with. */
export function figuresOf({
  assessment,
  compared,
}: Pick<ReportInput, 'assessment' | 'compared'>): FigureRow[] {
  return [
    ...assessmentRows(assessment, ''),
    ...(compared ? assessmentRows(compared.assessment, shownText(compared.name)) : []),
  ];
}

const assessmentRows = ({ planes }: Assessment, compared: string): FigureRow[] =>
  planes.flatMap((plane) => {
    const at = { plane: shownText(plane.name), plane_id: plane.id, station: '', station_id: '', compared };
    return [
      ...planeRows(plane, at),
      ...plane.stations.flatMap((station) =>
        stationRows(station, { ...at, station: shownText(station.name), station_id: station.id }),
      ),
    ];
  });

function planeRows(plane: PlaneAssessment, at: Place): FigureRow[] {
  const { surfaceTilt, surfaceAzimuth, bestPlane, orientationFactor, unshaded, solarAccess } = plane;
  const year = (quantity: Quantity, value: number, unit: Unit, between?: Between) =>
    figure(at, quantity, 'year', value, unit, between);
  const rows = [
    year('surface-tilt', surfaceTilt, 'degrees'),
    year('surface-azimuth', surfaceAzimuth, 'degrees'),
    year('best-tilt', bestPlane.surfaceTilt, 'degrees'),
    year('best-azimuth', bestPlane.surfaceAzimuth, 'degrees'),
    year('orientation-factor', orientationFactor, 'share'),
    year('unshaded-irradiation', unshaded.annual, 'kWh/m2'),
    ...months(at, 'unshaded-irradiation', unshaded.monthly, 'kWh/m2'),
  ];
  if (!solarAccess) return rows;
  const { annual, monthly, interval, lowest, count } = solarAccess;
  const light = monthly.map((share, month) => (share === null ? null : share * unshaded.monthly[month]));
  return [
    ...rows,
    ...accessRows(at, annual, monthly, interval),
    year('access-times-orientation', annual * orientationFactor, 'share', times(interval, orientationFactor)),
    year('irradiation', annual * unshaded.annual, 'kWh/m2', times(interval, unshaded.annual)),
    ...months(at, 'irradiation', light, 'kWh/m2'),
    year('lowest-access', lowest, 'share'),
    year('stations', count, 'count'),
  ];
}

function stationRows(station: StationAssessment, at: Place): FigureRow[] {
  const { solarAccess, coverage, unseen, irradiation, obstructions, groups } = station;
  const names = new Map(obstructions.map(({ id, name }) => [id, shownText(name)]));
  const of = (ids: readonly string[], row: FigureRow): FigureRow => ({
    ...row,
    obstruction: ids.map((id) => names.get(id) ?? id).join(' + '),
    obstruction_id: ids.join(' '),
  });
  return [
    ...accessRows(at, solarAccess.annual, solarAccess.monthly, solarAccess.interval),
    ...solarAccess.hourly.flatMap((hours, month) =>
      hours.flatMap((share, hour) =>
        share === null ? [] : figure(at, 'solar-access', `${monthName(month)} hour ${two(hour)}`, share),
      ),
    ),
    figure(at, 'irradiation', 'year', irradiation.annual, 'kWh/m2'),
    ...months(at, 'irradiation', irradiation.monthly, 'kWh/m2'),
    figure(at, 'coverage', 'year', coverage),
    ...unseen.map(({ from, to, share }) =>
      figure(at, 'unseen-light', `year azimuth ${from} to ${to}`, share),
    ),
    ...obstructions.flatMap(({ id, gainIfRemoved, lossIfAlone, monthly }) =>
      [
        figure(at, 'gain-if-removed', 'year', gainIfRemoved),
        ...months(at, 'gain-if-removed', monthly, 'share'),
        figure(at, 'loss-if-alone', 'year', lossIfAlone),
      ].map((row) => of([id], row)),
    ),
    ...groups.map((group) =>
      of(group.obstructions, figure(at, 'gain-if-all-removed', 'year', group.gainIfAllRemoved)),
    ),
  ];
}

function accessRows(
  at: Place,
  annual: number,
  monthly: readonly (number | null)[],
  interval: AccessInterval | undefined,
): FigureRow[] {
  const lost = interval && { low: 1 - interval.high, high: 1 - interval.low };
  return [
    figure(at, 'solar-access', 'year', annual, 'share', interval),
    ...months(at, 'solar-access', monthly, 'share'),
    figure(at, 'shading-loss', 'year', 1 - annual, 'share', lost),
    ...(interval ? [figure(at, 'solar-access-deviation', 'year', interval.standardDeviation)] : []),
  ];
}

const times = (between: Between, factor: number): Between =>
  between && { low: between.low * factor, high: between.high * factor };

const two = (number: number) => String(number).padStart(2, '0');
const monthName = (month: number) => `month ${two(month + 1)}`;

const months = (at: Place, quantity: Quantity, values: readonly (number | null)[], unit: Unit) =>
  values.map((value, month) => figure(at, quantity, monthName(month), value, unit));

function figure(
  at: Place,
  quantity: Quantity,
  period: string,
  value: number | null,
  unit: Unit = 'share',
  between?: Between,
): FigureRow {
  const { plane, plane_id, station, station_id, compared } = at;
  return {
    quantity,
    plane,
    station,
    obstruction: '',
    period,
    value,
    low: between?.low ?? null,
    high: between?.high ?? null,
    unit,
    plane_id,
    station_id,
    obstruction_id: '',
    compared,
  };
}
