import { FACT_LISTS_FORMAT, FACT_LISTS_VERSION, builtInRow } from './fact-lists.ts';
import type { FactLists, FirmChoice, FirmList } from './fact-lists.ts';
import { jsonFault } from './json-fault.ts';
import { isRecord, shown, type JsonRecord } from './json-value.ts';
import { ProblemList } from './problem-list.ts';
import type { Parsed, Problem } from './problem.ts';
import { pathBelow } from './record-path.ts';

/** What a file of lists may hold. */
export const FACT_LIST_LIMITS = { textLength: 1_000_000, lists: 1_000, choices: 200, words: 200 } as const;

const COUNTRY = /^[A-Z]{2}$/;
/** Signs that steer a terminal or hide text. */
const UNSEEN = /\p{Cc}|[\u202a-\u202e\u2066-\u2069]/u;

/**
 * Reads a firm's lists from the text of a file: the lists with what a person should know of them, or all that is wrong.
 * Lists of things or countries this version does not know are kept, with a warning; fields it does not know are left out.
 */
export function parseFactLists(text: string): Parsed<FactLists> {
  if (text.length > FACT_LIST_LIMITS.textLength)
    return refused(
      'file',
      'The file has over a million characters; that is another thing. Choose a file of lists.',
    );
  let value: unknown;
  try {
    value = JSON.parse(text.startsWith('\ufeff') ? text.slice(1) : text);
  } catch {
    const fault = jsonFault(text);
    const place = fault ? `line ${fault.line}, column ${fault.column}` : 'file';
    return refused(
      place,
      'The text is not JSON here: the file is cut short, damaged or of another kind. Export the lists again.',
    );
  }
  return factListsFromJson(value);
}

/** Reads a firm's lists from a value such as `JSON.parse` gives. The value is not changed. */
export function factListsFromJson(value: unknown): Parsed<FactLists> {
  if (!isRecord(value))
    return refused(
      'file',
      `The file must hold lists, an object; it holds ${shown(value)}. Choose a file of lists.`,
    );
  const { format, version, lists } = value;
  if (format !== FACT_LISTS_FORMAT)
    return refused(
      'format',
      `The file holds no lists: its format is ${shown(format)}, where "${FACT_LISTS_FORMAT}" is needed. Choose a file of lists.`,
    );
  if (typeof version === 'number' && Number.isInteger(version) && version > FACT_LISTS_VERSION)
    return refused(
      'version',
      `The lists are of version ${version}; this Noonmark reads version ${FACT_LISTS_VERSION}. Update Noonmark, then import them again.`,
    );
  if (version !== FACT_LISTS_VERSION)
    return refused('version', `version must be ${FACT_LISTS_VERSION}; it is ${shown(version)}. Correct it.`);
  if (!Array.isArray(lists))
    return refused('lists', `lists must be a list; it is ${shown(lists)}. Correct it.`);
  if (lists.length > FACT_LIST_LIMITS.lists)
    return refused(
      'lists',
      `The file has ${lists.length} lists; the limit is ${FACT_LIST_LIMITS.lists}. Split it.`,
    );
  const reader = new ListReader();
  const read = lists.map((list, i) => reader.list(list, pathBelow('lists', i)));
  reader.repeated(read);
  if (!reader.problems.isEmpty) return { ok: false, problems: reader.problems.list() };
  const known: FactLists = { format: FACT_LISTS_FORMAT, version: FACT_LISTS_VERSION, lists: read };
  return { ok: true, value: known, warnings: reader.warnings };
}

const refused = (path: string, message: string): Parsed<never> => ({
  ok: false,
  problems: [{ path, message }],
});

class ListReader {
  readonly problems = new ProblemList();
  readonly warnings: Problem[] = [];

  list(value: unknown, path: string): FirmList {
    const row = this.record(value, path);
    this.unknown(row, ['country', 'fact', 'choices'], path);
    const fact = this.words(row.fact, pathBelow(path, 'fact'));
    const { country, choices } = row;
    if (country !== undefined && !(typeof country === 'string' && COUNTRY.test(country)))
      this.problems.add(
        pathBelow(path, 'country'),
        `country must be two capital letters; it is ${shown(country)}. Correct it, or take it out.`,
      );
    const place = pathBelow(path, 'choices');
    if (!Array.isArray(choices) || choices.length > FACT_LIST_LIMITS.choices) {
      const is = Array.isArray(choices) ? `it has ${choices.length}` : `it is ${shown(choices)}`;
      this.problems.add(
        place,
        `choices must be a list of at most ${FACT_LIST_LIMITS.choices}; ${is}. Correct it.`,
      );
      return { fact, choices: [] };
    }
    const read = choices.map((choice, i) => this.choice(choice, pathBelow(place, i)));
    this.twice(read, place);
    if (fact !== '' && !builtInRow({ fact }))
      this.warnings.push({
        path,
        message: `This Noonmark asks nothing called “${fact}”; the list is kept and does nothing.`,
      });
    return { ...(typeof country === 'string' && { country }), fact, choices: read };
  }

  /** A thing that has two lists in one country: which holds cannot be told. */
  repeated(lists: readonly FirmList[]): void {
    const seen = new Set<string>();
    lists.forEach(({ country, fact }, i) => {
      const key = JSON.stringify([country, fact]);
      if (seen.has(key))
        this.problems.add(
          pathBelow('lists', i),
          `There are two lists for ${shown(fact)}${country ? ` in ${country}` : ''}. Keep one.`,
        );
      seen.add(key);
    });
  }

  private choice(value: unknown, path: string): FirmChoice {
    const row = this.record(value, path);
    this.unknown(row, ['value', 'label', 'hidden'], path);
    const { label, hidden } = row;
    if (hidden !== undefined && typeof hidden !== 'boolean')
      this.problems.add(
        pathBelow(path, 'hidden'),
        `hidden must be true or false; it is ${shown(hidden)}. Correct it.`,
      );
    return {
      value: this.words(row.value, pathBelow(path, 'value')),
      ...(label !== undefined && { label: this.words(label, pathBelow(path, 'label')) }),
      ...(hidden === true && { hidden }),
    };
  }

  private twice(choices: readonly FirmChoice[], path: string): void {
    const seen = new Set<string>();
    choices.forEach(({ value }, i) => {
      if (value !== '' && seen.has(value))
        this.problems.add(pathBelow(path, i), `The list has ${shown(value)} twice. Take one out.`);
      seen.add(value);
    });
  }

  private record(value: unknown, path: string): JsonRecord {
    if (isRecord(value)) return value;
    this.problems.add(path, `An object is needed; it is ${shown(value)}. Correct it.`);
    return {};
  }

  private words(value: unknown, path: string): string {
    const fault = typeof value === 'string' ? wordsFault(value) : `must be a text; it is ${shown(value)}`;
    if (fault === null) return value as string;
    this.problems.add(path, `${path.slice(path.lastIndexOf('.') + 1)} ${fault}. Correct it.`);
    return '';
  }

  private unknown(row: JsonRecord, known: readonly string[], path: string): void {
    for (const key of Object.keys(row))
      if (!known.includes(key))
        this.warnings.push({
          path: pathBelow(path, key),
          message: 'This Noonmark does not know the field; it is left out.',
        });
  }
}

/** What is wrong with the words of an answer, as the rest of a sentence; null where nothing is. */
export function wordsFault(text: string): string | null {
  if (text.trim() === '') return 'must not be empty';
  if (text !== text.trim()) return 'must not begin or end with a space';
  if (text.length > FACT_LIST_LIMITS.words)
    return `may have ${FACT_LIST_LIMITS.words} characters; it has ${text.length}`;
  return UNSEEN.test(text) ? 'must not hold signs that cannot be seen' : null;
}
