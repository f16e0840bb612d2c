import type { ReportContents } from '../../../report/contents/report-contents.ts';
import { pdfDocument } from '../../../report/painters/pdf/pdf-document.ts';
import { PDF_FONT_FILES } from '../../../report/painters/pdf/pdf-fonts.ts';
import { drawnText } from './drawn-text.ts';

/** A report as PDF, made on this device. Rejects where a font could not be had. */
export async function pdfFile(contents: ReportContents, madeOn: string): Promise<Uint8Array<ArrayBuffer>> {
  const [regular, bold, italic] = await Promise.all(
    (['regular', 'bold', 'italic'] as const).map((face) => fontBytes(PDF_FONT_FILES[face])),
  );
  const bytes = await pdfDocument(contents, { regular, bold, italic }, { madeOn, drawText: drawnText });
  return Uint8Array.from(bytes);
}

async function fontBytes(path: string): Promise<Uint8Array> {
  const response = await fetch(`/${path}`);
  if (!response.ok) throw new Error(`${path}: ${response.status}`);
  return new Uint8Array(await response.arrayBuffer());
}
