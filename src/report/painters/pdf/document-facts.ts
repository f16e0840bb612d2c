import type { jsPDF } from 'jspdf';
import type { ReportContents } from '../../contents/report-contents.ts';
import type { PageOf } from './contents-list.ts';
import { plainLetters } from './plain-letters.ts';
import { hexText } from './sheet.ts';

/** What a reader shows about the file: title, author, language, date. */
export function documentFacts(doc: jsPDF, { title, firm, language }: ReportContents, madeOn: string): void {
  doc.setDocumentProperties({ title: factText(title), author: factText(firm.name) });
  doc.setLanguage(language as Parameters<jsPDF['setLanguage']>[0]);
  doc.setCreationDate(`D:${madeOn.replaceAll('-', '')}120000+00'00'`);
  doc.setFileId(fileId(title + firm.name + madeOn));
}

/** Bookmarks of the sections. */
export function outlineEntries(doc: jsPDF, { sections }: ReportContents, pageOf: PageOf): void {
  // the library writes the bytes of UTF-16 into a string where a byte 13 is read as 10
  (doc.outline as unknown as { makeString: (text: string) => string }).makeString = hexText;
  for (const { id, heading } of sections)
    doc.outline.add(null, plainLetters(heading), { pageNumber: pageOf(id) });
}

/**
 * As the library can write it. Text whose UTF-16 has a byte 13, which would be read as 10, goes as UTF-8 with its mark.
 * Ref: ISO 32000-2, 7.9.2.2.
 */
function factText(text: string): string {
  const plain = plainLetters(text);
  const codes = Array.from({ length: plain.length }, (_, i) => plain.charCodeAt(i));
  if (!codes.some((code) => (code & 0xff) === 0x0d || code >> 8 === 0x0d)) return plain;
  return `\u00ef\u00bb\u00bf${utf8(plain)}`;
}

/** Bytes of UTF-8, each as a character. */
const utf8 = (text: string) =>
  encodeURIComponent(text).replace(/%(..)/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));

/** Thirty-two hexadecimal digits of a text; FNV-1a with four starts. */
function fileId(text: string): string {
  return [0x811c9dc5, 1, 2, 3]
    .map((start) => {
      let hash = start;
      for (let i = 0; i < text.length; i++) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193) >>> 0;
      return hash.toString(16).toUpperCase().padStart(8, '0');
    })
    .join('');
}
