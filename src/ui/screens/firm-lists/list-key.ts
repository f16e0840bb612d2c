import type { ListKey } from '../../../core/survey/fact-lists.ts';
import { factGroups } from '../../../core/survey/site-fact-groups.ts';
import { ELECTRICAL_LISTS } from '../../../core/survey/site-facts-electrical.ts';

/** The things to know whose answers differ by country. */
const ELECTRICAL_GROUP = 'electrical';

const GROUPS = factGroups({ country: 'ZZ', timeZone: '' });

/** The questions of all lists, those that differ by country first. */
export const questions: readonly { value: string; label: string }[] = [
  ...GROUPS.filter(({ id }) => id === ELECTRICAL_GROUP),
  ...GROUPS.filter(({ id }) => id !== ELECTRICAL_GROUP),
].flatMap(({ label, rows }) => rows.map((row) => ({ value: row.id, label: `${label}: ${row.label}` })));

export const isByCountry = (fact: string): boolean =>
  GROUPS.some(({ id, rows }) => id === ELECTRICAL_GROUP && rows.some((row) => row.id === fact));

export const listKey = (fact: string, country: string): ListKey =>
  isByCountry(fact) ? { country, fact } : { fact };

export const countries: readonly { value: string; label: string }[] = ELECTRICAL_LISTS.map(
  ({ country, name }) => ({ value: country, label: name }),
);
