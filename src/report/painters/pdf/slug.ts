import type { Sheet } from './sheet.ts';

/** A piece of a page that is never cut: a line of text, a row of a table, a picture. Heights in points. */
export interface Slug {
  height: number;
  /** Space above it, unless it is the first on its page. */
  gap?: number;
  /** Stays on one page with the slug that follows. */
  keep?: boolean;
  startsPage?: boolean;
  /** Set again above it where it is the first on its page: the heads of a table. */
  repeat?: readonly Slug[];
  /** The section that begins here. */
  section?: string;
  /** `y` is the top of the slug from the top of the page. */
  paint: (sheet: Sheet, y: number) => void;
}
