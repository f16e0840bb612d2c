import { transpositionOf } from '../../../core/transposition/transposition-models.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** Who, when, with what climate and by which methods, and the survey's fingerprint. */
export const method: SectionKind = {
  id: 'method',
  part: 'evidence',
  startsPage: true,
  write: (report, speech) => {
    const { words } = speech;
    const notes = notesOf(report);
    return {
      heading: words['method.heading'],
      blocks: [
        { kind: 'pairs', pairs: pairsOf(report, speech) },
        { kind: 'subheading', text: words['method.assumptions'] },
        {
          kind: 'list',
          items: (['clear', 'reflection', 'disc', 'far'] as const).map(
            (id) => words[`method.assumption-${id}`],
          ),
        },
        ...(notes.length > 0
          ? [
              { kind: 'subheading' as const, text: words['method.notes'] },
              { kind: 'list' as const, items: notes },
            ]
          : []),
      ],
    };
  },
};

function pairsOf(report: ReportInput, speech: Speech): { term: string; text: string }[] {
  const { survey, assessment, version, fingerprint } = report;
  const { words } = speech;
  const { site, surveyor, surveyedOn } = survey;
  const { name, reference } = transpositionOf(assessment.transposition);
  const interval = assessment.planes.find(({ solarAccess }) => solarAccess?.interval)?.solarAccess?.interval;
  const place = words['method.place-text'](
    degreesText(site.latitude, [0, 4], speech),
    degreesText(site.longitude, [2, 6], speech),
    speech.length(site.altitude ?? 0, 0),
  );
  const pairs: [string, string | undefined][] = [
    [words['method.surveyor'], surveyor && shownText(surveyor)],
    [words['method.visited'], surveyedOn && speech.day(surveyedOn)],
    [words['method.place'], place],
    [words['method.clock'], site.timeZone],
    [words['method.climate'], sentences(assessment.climate.name, assessment.climate.reference)],
    [words['method.transposition'], reference.startsWith(name) ? reference : sentences(name, reference)],
    [words['method.sun'], words['method.sun-text'](assessment.stepMinutes)],
    [words['method.albedo'], speech.percent(site.albedo ?? 0.2)],
    [
      words['method.declination'],
      survey.runs.some(({ frame }) => frame === 'magnetic') ? words['method.declination-text'] : undefined,
    ],
    [words['method.interval'], interval && words['method.interval-text'](interval.draws)],
    [words['method.version'], `Noonmark ${version}`],
    [words['method.fingerprint'], words['method.fingerprint-text'](fingerprint)],
  ];
  return pairs.flatMap(([term, text]) => (text ? [{ term, text }] : []));
}

const sentences = (...parts: string[]): string => parts.map((part) => shownText(part, 400)).join('. ');

/** `sides`: places in the compass of what is above and what is below zero. */
const degreesText = (degrees: number, [above, below]: [number, number], speech: Speech): string =>
  `${speech.angle(Math.abs(degrees), 5)} ${speech.words['compass.letters'][degrees < 0 ? below : above]}`;

function notesOf({ survey, assessment }: ReportInput): string[] {
  return [
    ...(survey.notes ? [survey.notes] : []),
    ...assessment.climate.warnings,
    ...assessment.warnings.map(({ message }) => message),
  ].map((note) => shownText(note, 1200));
}
