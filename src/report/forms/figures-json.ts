import type { ReportInput } from '../report-input.ts';
import { shownText } from '../shown-text.ts';
import type { FigureRow } from './figure-row.ts';
import { figuresOf } from './figure-rows.ts';
import { QUANTITIES } from './quantities.ts';

/** The figures of a report with what they are of and how they came about. */
export interface FiguresDocument {
  format: 'noonmark-figures';
  version: 1;
  survey: { id: string; title: string; surveyedOn: string | null; fingerprint: string };
  madeOn: string;
  /** Of the program. */
  program: string;
  climate: { source: string; name: string; reference: string };
  transposition: string;
  stepMinutes: number;
  /** What each quantity means. */
  quantities: typeof QUANTITIES;
  figures: FigureRow[];
}

/** The figures of a report as JSON: a `FiguresDocument`. */
export const figuresJson = (report: ReportInput): string =>
  `${JSON.stringify(figuresDocument(report), null, 1)}\n`;

function figuresDocument(report: ReportInput): FiguresDocument {
  const { survey, assessment, fingerprint, madeOn, version } = report;
  const { source, name, reference } = assessment.climate;
  return {
    format: 'noonmark-figures',
    version: 1,
    survey: {
      id: survey.id,
      title: shownText(survey.title),
      surveyedOn: survey.surveyedOn ?? null,
      fingerprint,
    },
    madeOn,
    program: version,
    climate: { source, name, reference },
    transposition: assessment.transposition,
    stepMinutes: assessment.stepMinutes,
    quantities: QUANTITIES,
    figures: figuresOf(report),
  };
}
