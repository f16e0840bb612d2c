import { accessTimesOrientation } from '../../core/assessment/access-times-orientation.ts';
import type {
  AccessInterval,
  Assessment,
  PlaneAssessment,
  StationAssessment,
} from '../../core/shading/assessment.ts';
import { shownText } from '../shown-text.ts';
import type { Between, FigureRow, Subject } from './figure-row.ts';
import { figure, monthFigures, monthPeriod, twoDigits } from './figure-row.ts';

/** What an assessment found, plane by plane, each followed by its stations. */
export const assessmentFigures = ({ planes }: Assessment, compared: string): FigureRow[] =>
  planes.flatMap((plane) => {
    const at = { plane: shownText(plane.name), plane_id: plane.id, compared };
    return [
      ...planeFigures(plane, at),
      ...plane.stations.flatMap((station) =>
        stationFigures(station, { ...at, station: shownText(station.name), station_id: station.id }),
      ),
    ];
  });

function planeFigures(plane: PlaneAssessment, at: Subject): FigureRow[] {
  const {
    surfaceTilt,
    surfaceAzimuth,
    bestPlane,
    orientationFactor,
    orientationInterval,
    unshaded,
    solarAccess,
  } = plane;
  const year = { ...at, period: 'year' };
  const rows = [
    figure(year, 'surface-tilt', surfaceTilt, 'degrees'),
    figure(year, 'surface-azimuth', surfaceAzimuth, 'degrees'),
    figure(year, 'best-tilt', bestPlane.surfaceTilt, 'degrees'),
    figure(year, 'best-azimuth', bestPlane.surfaceAzimuth, 'degrees'),
    figure(year, 'orientation-factor', orientationFactor, 'share', orientationInterval),
    figure(year, 'unshaded-irradiation', unshaded.annual, 'kWh/m2'),
    ...monthFigures(at, 'unshaded-irradiation', unshaded.monthly, 'kWh/m2'),
  ];
  if (!solarAccess) return rows;
  const { annual, monthly, interval, lowest, count } = solarAccess;
  const product = accessTimesOrientation(plane)!;
  const light = monthly.map((share, month) => (share === null ? null : share * unshaded.monthly[month]));
  return [
    ...rows,
    ...accessFigures(at, annual, monthly, interval),
    figure(year, 'access-times-orientation', product.value, 'share', interval && product),
    figure(year, 'irradiation', annual * unshaded.annual, 'kWh/m2', times(interval, unshaded.annual)),
    ...monthFigures(at, 'irradiation', light, 'kWh/m2'),
    figure(year, 'lowest-access', lowest),
    figure(year, 'stations', count, 'count'),
  ];
}

function stationFigures(station: StationAssessment, at: Subject): FigureRow[] {
  const { solarAccess, coverage, unseen, irradiation, obstructions, groups } = station;
  const year = { ...at, period: 'year' };
  const names = new Map(obstructions.map(({ id, name }) => [id, shownText(name)]));
  const nameOf = (id: string) => names.get(id) ?? id;
  return [
    ...accessFigures(at, solarAccess.annual, solarAccess.monthly, solarAccess.interval),
    ...solarAccess.hourly.flatMap((hours, month) =>
      hours.flatMap((share, hour) => {
        const period = `${monthPeriod(month)} hour ${twoDigits(hour)}`;
        return share === null ? [] : figure({ ...at, period }, 'solar-access', share);
      }),
    ),
    figure(year, 'irradiation', irradiation.annual, 'kWh/m2'),
    ...monthFigures(at, 'irradiation', irradiation.monthly, 'kWh/m2'),
    figure(year, 'coverage', coverage),
    ...unseen.map(({ from, to, share }) =>
      figure({ ...at, period: `year azimuth ${from} to ${to}` }, 'unseen-light', share),
    ),
    ...obstructions.flatMap(({ id, gainIfRemoved, lossIfAlone, monthly }) => {
      const of = obstructionSubject([id], nameOf);
      return [
        figure({ ...year, ...of }, 'gain-if-removed', gainIfRemoved),
        ...monthFigures({ ...at, ...of }, 'gain-if-removed', monthly),
        figure({ ...year, ...of }, 'loss-if-alone', lossIfAlone),
      ];
    }),
    ...groups.map(({ obstructions: members, gainIfAllRemoved }) =>
      figure({ ...year, ...obstructionSubject(members, nameOf) }, 'gain-if-all-removed', gainIfAllRemoved),
    ),
  ];
}

/** One obstruction, or several that hide each other. */
export const obstructionSubject = (ids: readonly string[], nameOf: (id: string) => string): Subject => ({
  obstruction: ids.map(nameOf).join(' + '),
  obstruction_id: ids.join(' '),
});

function accessFigures(
  at: Subject,
  annual: number,
  monthly: readonly (number | null)[],
  interval: AccessInterval | undefined,
): FigureRow[] {
  const year = { ...at, period: 'year' };
  const lost = interval && { low: 1 - interval.high, high: 1 - interval.low };
  return [
    figure(year, 'solar-access', annual, 'share', interval),
    ...monthFigures(at, 'solar-access', monthly),
    figure(year, 'shading-loss', 1 - annual, 'share', lost),
    ...(interval ? [figure(year, 'solar-access-deviation', interval.standardDeviation)] : []),
  ];
}

/** Both ends of a range by a factor. */
export const times = (between: Between, factor: number): Between =>
  between && { low: between.low * factor, high: between.high * factor };
