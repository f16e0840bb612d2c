import { ordered } from '../../../core/survey/order.ts';
import type { PointedPlane } from '../../../core/pointing/pointed-survey.ts';
import type { PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { RoofPlane, Station, Survey } from '../../../core/survey/survey.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** How each plane lies and where each station stood. */
export const planesAndStations: SectionKind = {
  id: 'planes-and-stations',
  part: 'evidence',
  write: (report, speech) => {
    const { survey } = report;
    if (survey.planes.length === 0 && survey.stations.length === 0) return null;
    const { words } = speech;
    const blocks: Block[] = [];
    if (survey.planes.length > 0) blocks.push({ kind: 'table', table: planesTable(report, speech) });
    if (survey.stations.length > 0)
      blocks.push(
        { kind: 'table', table: stationsTable(report, speech) },
        { kind: 'paragraph', text: words['places.coverage-explained'], small: true },
      );
    return { heading: words['places.heading'], blocks };
  },
};

function planesTable({ survey, pointed }: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const read = new Map(pointed.planes.map((plane) => [plane.id, plane]));
  return {
    caption: words['places.planes-caption'],
    columns: [
      { head: words['programme.plane'] },
      { head: words['programme.tilt'], number: true },
      { head: words['programme.azimuth'], number: true },
      { head: words['places.size'] },
      { head: words['places.tilt-source'] },
    ],
    rows: ordered(survey.planes).map((plane) => [
      shownText(plane.name),
      speech.angle(plane.surfaceTilt, 1),
      speech.azimuth(plane.surfaceAzimuth, 1),
      sizeText(plane, speech),
      tiltText(read.get(plane.id), speech),
    ]),
  };
}

function sizeText({ width, slopeLength, outline }: RoofPlane, speech: Speech): string {
  const { words } = speech;
  if (outline) return words['places.outlined'](outline.length);
  if (width === undefined || slopeLength === undefined) return words['places.unknown'];
  return words['places.size-text'](speech.length(width, 2), speech.length(slopeLength, 2));
}

function tiltText(plane: PointedPlane | undefined, speech: Speech): string {
  const { words } = speech;
  if (!plane?.tilt) return words['places.tilt-typed'];
  return words['places.placings'](plane.tilt.count, speech.angle(plane.tilt.scatter, 1));
}

function stationsTable({ survey, assessment }: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const planeName = new Map(survey.planes.map(({ id, name }) => [id, shownText(name)]));
  return {
    caption: words['places.stations-caption'],
    columns: [
      { head: words['places.station'] },
      { head: words['places.where'] },
      { head: words['places.height'] },
      { head: words['places.serves'] },
      { head: words['places.coverage'], number: true },
      { head: words['programme.access'], number: true },
      { head: words['programme.interval'], number: true },
    ],
    rows: ordered(survey.stations).flatMap((station) => {
      const place = [
        shownText(station.name),
        placeText(station, survey, speech),
        station.instrumentHeight === undefined
          ? words['places.unknown']
          : speech.length(station.instrumentHeight, 2),
      ];
      const results = resultsOf(station.id, assessment.planes, planeName, speech);
      return results.length > 0
        ? results.map((result) => [...place, ...result])
        : [[...place, '–', '–', '–', '–']];
    }),
  };
}

/** Plane, coverage, access and interval for each plane that a station speaks for. */
function resultsOf(
  station: string,
  planes: readonly PlaneAssessment[],
  planeName: ReadonlyMap<string, string>,
  speech: Speech,
): string[][] {
  return planes.flatMap(({ id, stations }) => {
    const found = stations.find((one) => one.id === station);
    if (!found) return [];
    const { annual, interval } = found.solarAccess;
    const share = (value: number) => speech.percent(value, 1);
    return [
      [
        planeName.get(id) ?? id,
        share(found.coverage),
        share(annual),
        interval ? speech.range(share(interval.low), share(interval.high)) : '–',
      ],
    ];
  });
}

function placeText({ position }: Station, survey: Survey, speech: Speech): string {
  const { words } = speech;
  if (!position) return words['places.unknown'];
  const length = (metres: number) => speech.length(metres, 2);
  if (!('on' in position))
    return words['places.local'](length(position.east), length(position.north), length(position.up));
  const plane = survey.planes.find(({ id }) => id === position.on)?.name ?? position.on;
  return words['places.on-plane'](shownText(plane), length(position.x), length(position.y));
}
