import { readFileSync } from 'node:fs';
import { reportContents } from '../report/report-contents.ts';
import type { ReportInput } from '../report/report-input.ts';
import { figuresOf } from '../report/forms/figure-rows.ts';
import { figuresCsv } from '../report/forms/figures-csv.ts';
import { figuresJson } from '../report/forms/figures-json.ts';
import type { PdfFonts } from '../report/painters/pdf/pdf-fonts.ts';
import { PDF_FONT_FILES } from '../report/painters/pdf/pdf-fonts.ts';
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
    option: 'pdf',
    ending: '-report.pdf',
    begins: '%PDF-',
    async write(report) {
      const { pdfDocument } = await import('../report/painters/pdf/pdf-document.ts');
      return pdfDocument(reportContents(report), pdfFonts(), { madeOn: report.madeOn });
    },
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
    write: figuresJson,
  },
];

/** The typeface that ships with Noonmark. */
function pdfFonts(): PdfFonts {
  const bytes = (face: keyof PdfFonts): Uint8Array =>
    readFileSync(new URL(`../../public/${PDF_FONT_FILES[face]}`, import.meta.url));
  return { regular: bytes('regular'), bold: bytes('bold'), italic: bytes('italic') };
}
