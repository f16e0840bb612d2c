import { readFileSync } from 'node:fs';
import type { Face, PdfFonts } from '../../../src/report/painters/pdf/pdf-fonts.ts';
import { PDF_FONT_FILES } from '../../../src/report/painters/pdf/pdf-fonts.ts';

export const fontBytes = (face: Face): Uint8Array =>
  new Uint8Array(readFileSync(new URL(`../../../public/${PDF_FONT_FILES[face]}`, import.meta.url)));

/** The report's typeface as it ships. */
export const fontsOnDisk = (): PdfFonts => ({
  regular: fontBytes('regular'),
  bold: fontBytes('bold'),
  italic: fontBytes('italic'),
});
