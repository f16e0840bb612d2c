import type { EN } from './en/en.ts';

/**
 * The sentences of a report in one language, under the keys of the English ones. A sentence with something to fill in is a
 * function of the same arguments as in English, so that the compiler finds a missing or a wrong one.
 */
export type Catalogue = { readonly [K in keyof typeof EN]: Same<(typeof EN)[K]> };

type Same<T> = T extends string ? string : T extends readonly string[] ? readonly string[] : T;
