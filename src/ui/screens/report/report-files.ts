import type { ReportContents } from '../../../report/contents/report-contents.ts';
import { figuresOf } from '../../../report/forms/figure-rows.ts';
import { figuresCsv } from '../../../report/forms/figures-csv.ts';
import { figuresJson } from '../../../report/forms/figures-json.ts';
import { htmlPage } from '../../../report/painters/html.ts';
import type { ReportInput } from '../../../report/report-input.ts';

/** The ways a report leaves the device. */
export type ReportForm = 'page' | 'pdf' | 'figures-csv' | 'figures-json';

export interface WrittenReport {
  input: ReportInput;
  contents: ReportContents;
}

/** A report as a file; the painters of print are loaded when first wanted. */
export async function reportFile({ input, contents }: WrittenReport, form: ReportForm): Promise<File> {
  const name = fileName(input);
  switch (form) {
    case 'page':
      return new File([htmlPage(contents)], `${name}.html`, { type: 'text/html' });
    case 'pdf': {
      const { pdfFile } = await import('./report-pdf.ts');
      return new File([await pdfFile(contents, input.madeOn)], `${name}.pdf`, { type: 'application/pdf' });
    }
    case 'figures-csv':
      return new File([figuresCsv(figuresOf(input))], `${name}-figures.csv`, { type: 'text/csv' });
    case 'figures-json':
      return new File([figuresJson(input)], `${name}-figures.json`, { type: 'application/json' });
  }
}

/** Letters that every file system takes. */
function fileName({ survey, madeOn }: ReportInput): string {
  const title = survey.title
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .toLowerCase();
  return `${Array.from(title).slice(0, 60).join('') || 'survey'}-${madeOn}`;
}
