import type { AzimuthRange } from '../../core/angles/azimuth-ranges.ts';
import { pointedDirections } from '../../core/horizon/station-horizon.ts';
import type { PointedRun, PointedSurvey } from '../../core/pointing/pointed-survey.ts';
import { monthlyTransmittance } from '../../core/survey/obstruction-kinds.ts';
import { planeArea } from '../../core/survey/plane-area.ts';
import type { Obstruction, RoofPlane, Sighting, Station } from '../../core/survey/survey.ts';
import type { ReportInput } from '../report-input.ts';
import { shownText } from '../shown-text.ts';
import { obstructionSubject, times } from './assessment-figures.ts';
import type { FigureRow, Subject } from './figure-row.ts';
import { figure, monthFigures } from './figure-row.ts';
import type { Quantity } from './quantities.ts';

/** What was measured on site: planes, obstructions, stations with their sightings, runs of the sensor. */
export function fieldFigures(report: ReportInput): FigureRow[] {
  const { survey, pointed } = report;
  const nameOf = obstructionNameOf(report);
  return [
    ...survey.planes.flatMap((plane) => planeFigures(plane, report)),
    ...survey.obstructions.flatMap((one) => obstructionFigures(one, survey.site.latitude, nameOf)),
    ...survey.stations.flatMap((station) => stationFigures(station, pointed, nameOf)),
    ...pointed.runs.flatMap((run) => runFigures(run, report)),
  ];
}

/** Names of obstructions by id, as they may be shown. */
export function obstructionNameOf({ survey }: Pick<ReportInput, 'survey'>): (id: string) => string {
  const names = new Map(survey.obstructions.map(({ id, name }) => [id, shownText(name)]));
  return (id) => names.get(id) ?? id;
}

/** Rows of what is known. */
const known = (subject: Subject, rows: readonly [Quantity, number | undefined | null, FigureRow['unit']][]) =>
  rows.flatMap(([quantity, value, unit]) =>
    value === undefined || value === null ? [] : figure(subject, quantity, value, unit),
  );

function planeFigures(plane: RoofPlane, { assessment, pointed }: ReportInput): FigureRow[] {
  const at = { plane: shownText(plane.name), plane_id: plane.id };
  const read = pointed.planes.find(({ id }) => id === plane.id)?.tilt;
  const area = planeArea(plane);
  const found = assessment.planes.find(({ id }) => id === plane.id);
  const access = found?.solarAccess;
  const whole = area === null || !found ? null : area * found.unshaded.annual;
  return [
    ...known(at, [
      ['width', plane.width, 'm'],
      ['slope-length', plane.slopeLength, 'm'],
      ['outline-corners', plane.outline?.length, 'count'],
      ['area', area, 'm2'],
      ['tilt-placings', read?.count, 'count'],
      ['tilt-scatter', read?.scatter, 'degrees'],
    ]),
    ...(whole !== null && access
      ? [
          figure(
            { ...at, period: 'year' },
            'whole-irradiation',
            access.annual * whole,
            'kWh',
            times(access.interval, whole),
          ),
        ]
      : []),
  ];
}

function obstructionFigures(one: Obstruction, latitude: number, nameOf: (id: string) => string): FigureRow[] {
  const of = obstructionSubject([one.id], nameOf);
  return [
    ...known(of, [['distance', one.distance, 'm']]),
    ...monthFigures(of, 'transmittance', monthlyTransmittance(one, latitude)),
  ];
}

function stationFigures(
  station: Station,
  pointed: PointedSurvey,
  nameOf: (id: string) => string,
): FigureRow[] {
  const { traces, markSightings = [], observedOpen = [], openLooks = [] } = station;
  const at = { station: shownText(station.name), station_id: station.id };
  const directions = pointedDirections(pointed);
  const looks: [string, AzimuthRange | null][] = [
    ...openLooks.map((look): [string, AzimuthRange | null] => [look.id, directions.openRange(look)]),
    ...observedOpen.map((range, i): [string, AzimuthRange] => [String(i + 1), range]),
  ];
  return [
    ...placeFigures(station, at),
    ...traces.flatMap(({ id, obstruction, angularWidth, sightings }) => {
      const of = { ...at, ...obstructionSubject([obstruction], nameOf) };
      return [
        ...known({ ...of, item_id: id }, [['line-width', angularWidth, 'degrees']]),
        ...sightings.flatMap((sighting) => sightingFigures(sighting, of, pointed)),
      ];
    }),
    ...markSightings.flatMap((sighting) => sightingFigures(sighting, at, pointed)),
    ...looks.flatMap(([item_id, range]) =>
      known({ ...at, item_id }, [
        ['open-from', range?.[0], 'degrees'],
        ['open-to', range?.[1], 'degrees'],
      ]),
    ),
  ];
}

function placeFigures({ position, instrumentHeight }: Station, at: Subject): FigureRow[] {
  const on = position && 'on' in position ? position : undefined;
  const local = position && !('on' in position) ? position : undefined;
  return known(at, [
    ['position-x', on?.x, 'm'],
    ['position-y', on?.y, 'm'],
    ['position-east', local?.east, 'm'],
    ['position-north', local?.north, 'm'],
    ['position-up', local?.up, 'm'],
    ['instrument-height', instrumentHeight, 'm'],
  ]);
}

function sightingFigures({ id }: Sighting, at: Subject, { sightings }: PointedSurvey): FigureRow[] {
  const direction = sightings.get(id)?.direction;
  return known({ ...at, item_id: id }, [
    ['sighting-azimuth', direction?.azimuth, 'degrees'],
    ['sighting-elevation', direction?.elevation, 'degrees'],
  ]);
}

function runFigures(
  { id, heading, closure, index, checks }: PointedRun,
  { survey }: ReportInput,
): FigureRow[] {
  const at = { run: String(survey.runs.findIndex((run) => run.id === id) + 1), run_id: id };
  const stationName = (station: string) =>
    shownText(survey.stations.find((one) => one.id === station)?.name ?? station);
  const from = (station: string) => ({ ...at, station: stationName(station), station_id: station });
  return [
    ...known(at, [
      ['heading-correction', heading?.offset, 'degrees'],
      ['heading-deviation', heading?.standardDeviation, 'degrees'],
      ['camera-index', index.camera.value, 'degrees'],
      ['camera-index-deviation', index.camera.standardDeviation, 'degrees'],
      ['top-edge-index', index['top-edge'].value, 'degrees'],
      ['top-edge-index-deviation', index['top-edge'].standardDeviation, 'degrees'],
    ]),
    ...checks.flatMap(({ check, station, takenAtMs, offset, standardDeviation, againstCompass }) =>
      known({ ...from(station), item_id: check, period: new Date(takenAtMs).toISOString() }, [
        ['check-correction', offset, 'degrees'],
        ['check-deviation', offset === null ? null : standardDeviation, 'degrees'],
        ['check-against-compass', againstCompass, 'degrees'],
      ]),
    ),
    ...(closure
      ? known(from(closure.station), [
          ['closure-azimuth', closure.azimuth, 'degrees'],
          ['closure-elevation', closure.elevation, 'degrees'],
          ['closure-minutes', closure.minutes, 'minutes'],
        ])
      : []),
  ];
}
