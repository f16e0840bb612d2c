import type { jsPDF } from 'jspdf';
import type { ReportContents } from '../../contents/report-contents.ts';
import type { PageOf } from './contents-list.ts';
import { plainLetters } from './plain-letters.ts';
import { hexText } from './sheet.ts';

/** What a reader shows about the file: title, author, language, date. */
export function documentFacts(doc: jsPDF, { title, firm, language }: ReportContents, madeOn: string): void {
  doc.setDocumentProperties({
    title: standIn(plainLetters(title)),
    author: standIn(plainLetters(firm.name)),
  });
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
 * The library writes the bytes of UTF-16 into strings where a reader takes a byte 13 for 10. Title and author therefore
 * go in as stand-ins of the length that they have in hexadecimal, and change places with it in the finished file.
 */
const standIn = (text: string) => '='.repeat(hexText(text).length - 2);

/** The finished file, one character for each byte, with title and author in it. */
export function withFacts(file: string, { title, firm }: ReportContents): string {
  return [['Title', title] as const, ['Author', firm.name] as const].reduce((written, [key, text]) => {
    const plain = plainLetters(text);
    return written.replace(`/${key} (${standIn(plain)})`, () => `/${key} ${hexText(plain)}`);
  }, file);
}

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
