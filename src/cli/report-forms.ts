import { reportContents } from '../report/report-contents.ts';
import type { ReportInput } from '../report/report-input.ts';
import { figuresOf } from '../report/forms/figure-rows.ts';
import { figuresCsv } from '../report/forms/figures-csv.ts';
import { figuresDocument } from '../report/forms/figures-json.ts';
import { htmlPage } from '../report/painters/html.ts';

/** One form of a report as a file. */
export interface ReportForm {
  /** The option that asks for it. */
  option: string;
  /** What comes after the survey's name in that of the file. */
  ending: string;
  /** How such a file begins, so that no other is replaced. */
  begins: string;
  write(report: ReportInput): Promise<string | Uint8Array> | string | Uint8Array;
}

export const REPORT_FORMS: readonly ReportForm[] = [
  {
    option: 'html',
    ending: '-report.html',
    begins: '<!doctype html>',
    write: (report) => htmlPage(reportContents(report)),
  },
  {
    option: 'csv',
    ending: '-figures.csv',
    begins: 'quantity,plane,',
    write: (report) => figuresCsv(figuresOf(report)),
  },
  {
    option: 'json',
    ending: '-figures.json',
    begins: '{\n "format": "noonmark-figures"',
    write: (report) => `${JSON.stringify(figuresDocument(report), null, 1)}\n`,
  },
];
