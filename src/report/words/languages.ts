import type { Catalogue } from './catalogue.ts';
import { DE } from './de/de.ts';
import { EN } from './en/en.ts';
import { ES } from './es/es.ts';
import { FR } from './fr/fr.ts';

/** Languages a report can be written in; `tag` is for dates, numbers and plurals. */
export const LANGUAGES = [
  { id: 'en', tag: 'en-GB', usTag: 'en-US', name: 'English', words: EN },
  { id: 'es', tag: 'es-ES', usTag: 'es-US', name: 'Español', words: ES },
  { id: 'de', tag: 'de-DE', name: 'Deutsch', words: DE },
  { id: 'fr', tag: 'fr-FR', name: 'Français', words: FR },
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
