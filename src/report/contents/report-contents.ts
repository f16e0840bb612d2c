import type { Picture } from '../marks.ts';

/**
 * A report as data: what it says, in its language, with numbers and dates written out. Painters lay it on pages and add
 * nothing to it. All text is plain text; none of it is markup.
 */
export interface ReportContents {
  /** BCP 47, such as `de`. */
  language: string;
  paper: PaperSize;
  title: string;
  /** Whose report it is, for the head of the first page. */
  firm: FirmHead;
  /** Lines under the title: address, day of the visit, day of the report. */
  about: string[];
  sections: Section[];
  /** The foot of every page. */
  foot: string;
  /** Words of the frame around the sections. */
  frame: {
    contents: string;
    page: (page: number, pages: number) => string;
    letter: string;
    evidence: string;
    /** For a form whose typeface lacks letters. */
    boxes: string;
  };
}

export type PaperSize = 'a4' | 'letter';

export interface FirmHead {
  name: string;
  lines: string[];
  /** Six hexadecimal digits after `#`; it colours rules, never words. */
  colour: string | null;
}

/** The letter is for the homeowner, the evidence for whoever has to stand behind it. */
export type Part = 'letter' | 'evidence';

export interface Section {
  /** Unique in the report; letters and hyphens. */
  id: string;
  part: Part;
  heading: string;
  /** Begins a page of its own. */
  startsPage?: boolean;
  blocks: Block[];
}

export type Block =
  /** The sentence that answers the heading, set large. */
  | { kind: 'answer'; text: string }
  | { kind: 'paragraph'; text: string; small?: boolean }
  | { kind: 'subheading'; text: string }
  | { kind: 'key-figures'; figures: KeyFigure[] }
  | { kind: 'picture'; picture: Picture; caption: string; alternative: string }
  | { kind: 'table'; table: Table }
  | { kind: 'list'; items: string[] }
  | { kind: 'pairs'; pairs: { term: string; text: string }[] }
  | { kind: 'caution'; heading: string; items: string[] }
  | { kind: 'photos'; photos: ContentsPhoto[] };

export interface KeyFigure {
  label: string;
  value: string;
  /** Within what the truth is expected; null where nothing is known of it. */
  range: string | null;
  /** What it means, in a sentence. */
  note: string;
}

export interface Table {
  caption: string;
  /** The first column names its row. */
  columns: { head: string; number?: boolean }[];
  rows: string[][];
  /** Rows at the end that sum up. */
  sums?: string[][];
}

export interface ContentsPhoto {
  /** Null where the picture itself is not at hand. */
  image: PhotoImage | null;
  caption: string;
  alternative: string;
}

export interface PhotoImage {
  type: 'image/jpeg' | 'image/png';
  bytes: Uint8Array;
  width: number;
  height: number;
}
