import type { Catalogue } from './catalogue.ts';
import { EN } from './en/en.ts';

/** Languages a report can be written in; `tag` is for dates, numbers and plurals. */
export const LANGUAGES = [
  { id: 'en', tag: 'en-GB', usTag: 'en-US', name: 'English', words: EN },
] as const satisfies readonly Language[];

export interface Language {
  id: string;
  /** BCP 47. */
  tag: string;
  /** The same with the customs of the United States, for US units. */
  usTag?: string;
  /** In the language itself. */
  name: string;
  words: Catalogue;
}

export type LanguageId = (typeof LANGUAGES)[number]['id'];
