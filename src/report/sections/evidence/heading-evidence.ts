import type { CheckResult, PointedRun } from '../../../core/pointing/pointed-survey.ts';
import type { Run } from '../../../core/survey/survey.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** What ties the azimuths to true north, and what repeating showed. */
export const headingEvidence: SectionKind = {
  id: 'heading-evidence',
  part: 'evidence',
  write: (report, speech) => {
    const { words } = speech;
    const { runs } = report.pointed;
    if (report.survey.stations.length === 0) return null;
    if (runs.length === 0)
      return {
        heading: words['headings.heading'],
        blocks: [{ kind: 'paragraph', text: words['headings.no-sensor'] }],
      };
    const tables = [runsTable, checksTable, closureTable, indexTable].map((table) => table(report, speech));
    const blocks = tables.flatMap((table): Block[] =>
      table.rows.length > 0 ? [{ kind: 'table', table }] : [],
    );
    return { heading: words['headings.heading'], blocks };
  },
};

const signed = (degrees: number, speech: Speech): string =>
  `${degrees < 0 ? '−' : '+'}${speech.angle(Math.abs(degrees), 1)}`;

/** Runs are numbered in the order they began, as their ids say nothing to a reader. */
const numberOf = (id: string, { survey }: ReportInput): string =>
  String(survey.runs.findIndex((run) => run.id === id) + 1);

const instant = (timeMs: number, { survey }: ReportInput, speech: Speech): string =>
  speech.instant(timeMs, survey.site.timeZone);

function runsTable(report: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const raw = new Map(report.survey.runs.map((run) => [run.id, run]));
  return {
    caption: words['headings.runs-caption'],
    columns: [
      { head: words['headings.run'] },
      { head: words['headings.started'] },
      { head: words['headings.frame'] },
      { head: words['headings.source'] },
      { head: words['headings.offset'], number: true },
      { head: words['headings.deviation'], number: true },
    ],
    rows: report.pointed.runs.map((run) => runRow(run, raw.get(run.id)!, report, speech)),
  };
}

function runRow(pointed: PointedRun, run: Run, report: ReportInput, speech: Speech): string[] {
  const { words } = speech;
  const { heading, refused } = pointed;
  const source = refused
    ? words['headings.refused']
    : heading
      ? words[`headings.source-${heading.source}`]
      : words['headings.source-none'];
  return [
    `${numberOf(run.id, report)}${run.device ? ` (${shownText(run.device, 40)})` : ''}`,
    instant(Date.parse(run.startedAt), report, speech),
    words[`headings.frame-${run.frame}`],
    source,
    heading ? signed(heading.offset, speech) : '–',
    heading ? speech.angle(heading.standardDeviation, 1) : '–',
  ];
}

function checksTable(report: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const stations = new Map(report.survey.stations.map(({ id, name }) => [id, shownText(name)]));
  const row = (check: CheckResult) => [
    instant(check.takenAtMs, report, speech),
    stations.get(check.station) ?? check.station,
    numberOf(check.run, report),
    words[`headings.method-${check.method}`],
    check.offset === null ? words['headings.not-counted'] : signed(check.offset, speech),
    check.offset === null ? '–' : speech.angle(check.standardDeviation, 1),
    check.againstCompass === null ? '–' : signed(check.againstCompass, speech),
  ];
  return {
    caption: words['headings.checks-caption'],
    columns: [
      { head: words['headings.check-at'] },
      { head: words['places.station'] },
      { head: words['headings.run'] },
      { head: words['headings.method'] },
      { head: words['headings.offset'], number: true },
      { head: words['headings.deviation'], number: true },
      { head: words['headings.against-compass'], number: true },
    ],
    rows: report.pointed.runs.flatMap(({ checks }) => checks.map(row)),
  };
}

function closureTable(report: ReportInput, speech: Speech): Table {
  const { words } = speech;
  return {
    caption: words['headings.closure-caption'],
    columns: [
      { head: words['headings.run'] },
      { head: words['headings.mark'] },
      { head: words['headings.minutes'], number: true },
      { head: words['headings.closure-azimuth'], number: true },
      { head: words['headings.closure-elevation'], number: true },
    ],
    rows: report.pointed.runs.flatMap(({ id, closure }) =>
      closure
        ? [
            [
              numberOf(id, report),
              shownText(closure.mark),
              speech.number(closure.minutes, 1),
              signed(closure.azimuth, speech),
              signed(closure.elevation, speech),
            ],
          ]
        : [],
    ),
  };
}

function indexTable(report: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const used = new Set([...report.pointed.sightings.values()].map(({ run, axis }) => `${run} ${axis}`));
  return {
    caption: words['headings.index-caption'],
    columns: [
      { head: words['headings.run'] },
      { head: words['headings.method'] },
      { head: words['headings.index'], number: true },
      { head: words['headings.deviation'], number: true },
    ],
    rows: report.pointed.runs.flatMap(({ id, index }) =>
      (['camera', 'top-edge'] as const)
        .filter((axis) => used.has(`${id} ${axis}`))
        .map((axis) => [
          numberOf(id, report),
          words[`headings.index-${index[axis].source}`],
          signed(index[axis].value, speech),
          speech.angle(index[axis].standardDeviation, 1),
        ]),
    ),
  };
}
