import type { Assessment, PlaneAssessment, StationAssessment } from '../core/shading/assessment.ts';
import { TRANSPOSITIONS } from '../core/transposition/transposition-models.ts';
import { spreadText, withInterval } from './interval-text.ts';
import { shownName, shownWords } from './shown-name.ts';
import { grouped, monthsTable, percent, table } from './table.ts';

/** The result of one survey for a person to read. */
export function assessmentText(assessed: Assessment & { file: string; title: string }): string {
  const { climate, transposition, planes } = assessed;
  const model = TRANSPOSITIONS.find(({ id }) => id === transposition)?.name ?? transposition;
  const lines = [
    `${shownName(assessed.title)} (${shownWords(assessed.file)})`,
    `Climate: ${shownName(climate.name)}. ${shownWords(climate.reference)}.`,
    ...climate.warnings.map((warning) => `Note: ${shownWords(warning)}`),
    `Sky light on the tilted plane: ${model}. Steps of ${assessed.stepMinutes} minutes.`,
    'Solar access is the light that obstructions leave, in percent of the light without them.',
    'In brackets: the truth is expected between these 95 times in 100.',
    '',
  ];
  const results =
    planes.length > 0
      ? planes.map(planeText).join('\n')
      : 'The survey has no roof planes, so there is nothing to assess.\n';
  return `${lines.join('\n')}\n${results}\n`;
}

function planeText(plane: PlaneAssessment): string {
  const { bestPlane, solarAccess, unshaded } = plane;
  const monthly = unshaded.monthly.map((light) => grouped(light, 1));
  const rows = [{ label: 'unshaded, kWh/m2', cells: [...monthly, grouped(unshaded.annual, 1)] }];
  for (const { name, solarAccess: access } of plane.stations)
    rows.push({
      label: `access at ${shownName(name)}, %`,
      cells: [...access.monthly.map(percent), percent(access.annual)],
    });
  if (solarAccess && plane.stations.length > 1)
    rows.push({
      label: 'mean access, %',
      cells: [...solarAccess.monthly.map(percent), percent(solarAccess.annual)],
    });
  return [
    `${shownName(plane.name)}: tilt ${rounded(plane.surfaceTilt)}°, facing ${rounded(plane.surfaceAzimuth)}°`,
    verdict(plane),
    `Orientation factor ${withInterval(plane.orientationFactor, plane.orientationInterval)} %: a plane lying best here, tilt ${Math.round(bestPlane.surfaceTilt)}°, facing ${Math.round(bestPlane.surfaceAzimuth)}°, is 100 %.`,
    '',
    monthsTable(rows),
    ...plane.stations.map(stationText),
  ].join('\n');
}

function verdict({ solarAccess }: PlaneAssessment): string {
  if (!solarAccess) return 'No station serves this plane, so its solar access is not known.';
  const { annual, count, lowest, interval } = solarAccess;
  const of = count === 1 ? 'one station' : `${count} stations, lowest ${percent(lowest)} %`;
  return `Solar access ${withInterval(annual, interval)} %, shading loss ${percent(1 - annual)} % a year (${of}).${interval ? `\n${spreadText(interval)}` : ''}`;
}

function stationText(station: StationAssessment): string {
  const { annual, interval } = station.solarAccess;
  const heading = `At ${shownName(station.name)}: access ${withInterval(annual, interval)} %, observed ${percent(station.coverage)} % of the light's directions.`;
  if (station.obstructions.length === 0) return `${heading} Nothing was traced.\n`;
  const names = new Map(station.obstructions.map(({ id, name }) => [id, shownName(name)]));
  const rows = station.obstructions.map(({ name, gainIfRemoved, lossIfAlone }) => [
    shownName(name),
    percent(gainIfRemoved),
    percent(lossIfAlone),
  ]);
  const groups = station.groups.map(
    ({ obstructions, gainIfAllRemoved, sumOfSingleGains }) =>
      `${obstructions.map((id) => names.get(id) ?? id).join(' and ')} hide each other: removing all gives ${percent(gainIfAllRemoved)}, one at a time ${percent(sumOfSingleGains)} in sum.\n`,
  );
  const columns = [
    { head: 'obstruction' },
    { head: 'gain if removed, points', number: true },
    { head: 'loss if alone, points', number: true },
  ];
  return `${heading}\n${table(columns, rows)}${groups.join('')}`;
}

/** To a tenth, and without it where it is none. */
const rounded = (degrees: number): string => String(Math.round(degrees * 10) / 10);
