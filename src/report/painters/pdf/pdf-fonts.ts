/** The three files of the report's typeface, TrueType; see `public/fonts/source-serif-4.txt`. */
export interface PdfFonts {
  regular: Uint8Array;
  bold: Uint8Array;
  italic: Uint8Array;
}

export type Face = keyof PdfFonts;
export const FACES: readonly Face[] = ['regular', 'bold', 'italic'];

/** Where the files lie, from the app's own address or from the folder `public`. */
export const PDF_FONT_FILES: Readonly<Record<Face, string>> = {
  regular: 'fonts/source-serif-4-regular.ttf',
  bold: 'fonts/source-serif-4-semibold.ttf',
  italic: 'fonts/source-serif-4-italic.ttf',
};
