import { factGroups } from './site-fact-groups.ts';
import type { FactRow } from './site-facts-general.ts';

export const FACT_LISTS_FORMAT = 'noonmark-fact-lists';
export const FACT_LISTS_VERSION = 1;

/** One answer that a firm offers. */
export interface FirmChoice {
  /** What a survey records, in plain words, so that it can be read without the list. */
  value: string;
  /** What is shown in its place; absent means the value. */
  label?: string;
  /** Not offered; surveys that have it keep it. */
  hidden?: boolean;
}

/** A firm's answers to one thing to know of a site, in the order in which they are offered. */
export interface FirmList {
  /** ISO 3166-1 code of the country it holds in; absent for things that are asked alike everywhere. */
  country?: string;
  /** Id of the thing, such as `phases`. */
  fact: string;
  choices: FirmChoice[];
}

/** What a firm has changed of the lists: a file of its own that one person edits and all phones take in. */
export interface FactLists {
  format: typeof FACT_LISTS_FORMAT;
  version: typeof FACT_LISTS_VERSION;
  lists: FirmList[];
}

export const noFactLists = (): FactLists => ({
  format: FACT_LISTS_FORMAT,
  version: FACT_LISTS_VERSION,
  lists: [],
});

/** Which list: the thing, and the country where the answers differ by country. */
export type ListKey = Pick<FirmList, 'country' | 'fact'>;

/** The thing to know that a list answers, with the answers that come with the app; null where there is none. */
export function builtInRow({ country, fact }: ListKey): FactRow | null {
  const groups = factGroups({ country: country ?? 'ZZ', timeZone: '' });
  return groups.flatMap(({ rows }) => rows).find(({ id }) => id === fact) ?? null;
}

const found = ({ lists }: FactLists, key: ListKey): FirmList | undefined =>
  lists.find(({ country, fact }) => country === key.country && fact === key.fact);

/** All answers to a thing: the firm's in its order, then those of the app that the firm's list does not name. */
export function firmChoices(lists: FactLists, key: ListKey): FirmChoice[] {
  const own = found(lists, key)?.choices ?? [];
  const named = new Set(own.map(({ value }) => value));
  const others = builtInRow(key)?.choices.filter((value) => !named.has(value)) ?? [];
  return [...own, ...others.map((value): FirmChoice => ({ value }))];
}

/** Whether an answer comes with the app: it can be hidden, but not taken away. */
export const isBuiltIn = (key: ListKey, value: string): boolean =>
  builtInRow(key)?.choices.includes(value) ?? false;

/** Whether a firm has changed a list. */
export const isChanged = (lists: FactLists, key: ListKey): boolean => found(lists, key) !== undefined;

/** The lists with one of them answered anew; where nothing differs from the app's own, the firm's is taken away. */
export function withChoices(lists: FactLists, key: ListKey, choices: readonly FirmChoice[]): FactLists {
  const others = lists.lists.filter((list) => list !== found(lists, key));
  const plain = builtInRow(key)?.choices ?? [];
  const isPlain =
    choices.length === plain.length &&
    choices.every(({ value, label, hidden }, i) => value === plain[i] && !label && !hidden);
  if (isPlain) return { ...lists, lists: others };
  const list = { ...(key.country !== undefined && { country: key.country }), fact: key.fact };
  return { ...lists, lists: [...others, { ...list, choices: choices.map(withoutEmpty) }] };
}

/** What is not said is left out, as in a file. */
function withoutEmpty({ value, label, hidden }: FirmChoice): FirmChoice {
  return { value, ...(label && label !== value && { label }), ...(hidden && { hidden }) };
}

/** The lists without what a firm changed in one of them. */
export const withoutList = (lists: FactLists, key: ListKey): FactLists => ({
  ...lists,
  lists: lists.lists.filter((list) => list !== found(lists, key)),
});

/** A thing to know with the answers that a firm offers, and what is shown for them. */
export function firmRow(row: FactRow, lists: FactLists, country?: string): FactRow {
  const list = found(lists, { country, fact: row.id });
  if (!list) return row;
  const choices = firmChoices(lists, { country, fact: row.id });
  const labels = Object.fromEntries(choices.flatMap(({ value, label }) => (label ? [[value, label]] : [])));
  return { ...row, labels, choices: choices.filter(({ hidden }) => !hidden).map(({ value }) => value) };
}
