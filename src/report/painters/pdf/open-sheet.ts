import type { jsPDF } from 'jspdf';
import type { Face, PdfFonts } from './pdf-fonts.ts';
import { FACES } from './pdf-fonts.ts';
import { Sheet } from './sheet.ts';
import type { Typesetter } from './typesetter.ts';

/** A new file with one empty page, in points, and the typeface in it. The library is loaded here, when first needed. */
export async function openSheet(
  fonts: PdfFonts,
  setter: Typesetter,
  { width, height }: { width: number; height: number },
): Promise<Sheet> {
  const { jsPDF: Document } = await import('jspdf');
  const doc = new Document({
    unit: 'pt',
    format: [width, height],
    orientation: width > height ? 'landscape' : 'portrait',
    compress: true,
    precision: 3,
    putOnlyUsedFonts: true,
  });
  for (const face of FACES) addFont(doc, face, fonts[face]);
  return new Sheet(doc, setter, height);
}

function addFont(doc: jsPDF, face: Face, bytes: Uint8Array): void {
  let letters = '';
  for (let i = 0; i < bytes.length; i += 8192) letters += String.fromCharCode(...bytes.subarray(i, i + 8192));
  doc.addFileToVFS(`${face}.ttf`, letters);
  doc.addFont(`${face}.ttf`, face, 'normal');
}
