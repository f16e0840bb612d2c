import { pointedDirections } from '../../../core/horizon/station-horizon.ts';
import type { PointedSighting } from '../../../core/pointing/pointed-survey.ts';
import { obstructionKinds, traceEdge } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { Obstruction, Sighting, Station, Trace } from '../../../core/survey/survey.ts';
import type { Block } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** Every sighting that a result stands on. */
export const fieldBook: SectionKind = {
  id: 'field-book',
  part: 'evidence',
  startsPage: true,
  write: (report, speech) => {
    const { words } = speech;
    const stations = ordered(report.survey.stations);
    if (stations.length === 0) return null;
    return {
      heading: words['book.heading'],
      blocks: [
        { kind: 'paragraph', text: words['book.explained'], small: true },
        ...stations.map((station) => stationBlock(station, report, speech)),
      ],
    };
  },
};

function stationBlock(station: Station, report: ReportInput, speech: Speech): Block {
  const { words } = speech;
  const rows = [
    ...ordered(station.traces).map((trace) => traceRow(trace, report, speech)),
    ...markRows(station, report, speech),
    ...openRows(station, report, speech),
  ];
  if (rows.length === 0)
    return { kind: 'paragraph', text: `${shownText(station.name)}: ${words['book.none']}` };
  const columns = (['obstruction', 'shape', 'sightings'] as const).map((column) => ({
    head: words[`book.${column}`],
  }));
  return { kind: 'table', table: { caption: words['book.caption'](shownText(station.name)), columns, rows } };
}

function traceRow(trace: Trace, { survey, pointed }: ReportInput, speech: Speech): string[] {
  const obstruction = obstructionsById(survey).get(trace.obstruction);
  const sightings = ordered(trace.sightings).map((sighting) =>
    sightingText(sighting, pointed.sightings.get(sighting.id), speech),
  );
  return [
    shownText(obstruction?.name ?? trace.obstruction),
    traceText(trace, obstruction, speech),
    sightings.join('; '),
  ];
}

function traceText(trace: Trace, obstruction: Obstruction | undefined, speech: Speech): string {
  const { words } = speech;
  const shape =
    trace.shape === 'line'
      ? words['book.line'](speech.angle(trace.angularWidth ?? 0, 2))
      : words[`book.${trace.shape}`];
  const edge = traceEdge(trace, obstruction ?? { kind: obstructionKinds[0].kind });
  return [shape, words[`book.${edge}`], ...(trace.fullCircle ? [words['book.full-circle']] : [])].join(', ');
}

/** Such as `131.2° 24.6° a`; a mark is named. */
function sightingText(sighting: Sighting, pointed: PointedSighting | undefined, speech: Speech): string {
  const mark = sighting.mark ? `${shownText(sighting.mark, 40)} ` : '';
  const direction = pointed?.direction;
  if (!direction) return `${mark}${speech.words['book.undirected']}`;
  const letter = { amendment: ' a', typed: ' t', reading: '' }[pointed.source];
  return `${mark}${speech.azimuth(direction.azimuth, 1)} ${speech.angle(direction.elevation, 1)}${letter}`;
}

function markRows({ markSightings }: Station, { pointed }: ReportInput, speech: Speech): string[][] {
  if (!markSightings || markSightings.length === 0) return [];
  const texts = ordered(markSightings).map((sighting) =>
    sightingText(sighting, pointed.sightings.get(sighting.id), speech),
  );
  return [[speech.words['book.marks'], '–', texts.join('; ')]];
}

function openRows(
  { observedOpen, openLooks }: Station,
  { pointed }: ReportInput,
  speech: Speech,
): string[][] {
  const directionOf = pointedDirections(pointed);
  const read = ordered(openLooks ?? []).map((look) => rangeText(directionOf.openRange(look), speech));
  const kept = (observedOpen ?? []).map((range) => rangeText(range, speech));
  const ranges = [...read, ...kept];
  return ranges.length > 0 ? [[speech.words['book.open'], '–', ranges.join('; ')]] : [];
}

function rangeText(range: readonly [number, number] | null, speech: Speech): string {
  if (!range) return speech.words['book.undirected'];
  const [from, to] = range;
  const end = to - from >= 360 ? speech.angle(360, 1) : speech.azimuth(to, 1);
  return speech.range(speech.azimuth(from, 1), end);
}
