import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import {
  builtInRow,
  firmChoices,
  firmRow,
  isBuiltIn,
  isChanged,
  noFactLists,
  withChoices,
  withoutList,
  type FactLists,
} from '../../../src/core/survey/fact-lists.ts';
import { factListsFromJson, parseFactLists } from '../../../src/core/survey/parse-fact-lists.ts';

const US_BUSBAR = { country: 'US', fact: 'busbar' };
const offered = (lists: FactLists) => firmRow(builtInRow(US_BUSBAR)!, lists, 'US').choices;

describe('a firm’s list', () => {
  it('is the app’s own as long as nothing is changed, and again when all is as it was', () => {
    const plain = builtInRow(US_BUSBAR)!.choices;
    expect(offered(noFactLists())).toEqual(plain);
    const same = withChoices(noFactLists(), US_BUSBAR, firmChoices(noFactLists(), US_BUSBAR));
    expect(same).toEqual(noFactLists());
    expect(isChanged(same, US_BUSBAR)).toBe(false);
  });

  it('offers what is added, in the order chosen, without what is hidden, under other names', () => {
    const [first, second, ...rest] = firmChoices(noFactLists(), US_BUSBAR);
    const lists = withChoices(noFactLists(), US_BUSBAR, [
      { value: '320 A' },
      { ...second, label: 'Second' },
      { ...first, hidden: true },
      ...rest,
    ]);
    expect(offered(lists).slice(0, 2)).toEqual(['320 A', second.value]);
    expect(offered(lists)).not.toContain(first.value);
    expect(firmRow(builtInRow(US_BUSBAR)!, lists, 'US').labels).toEqual({ [second.value]: 'Second' });
    expect(isBuiltIn(US_BUSBAR, '320 A')).toBe(false);
    expect(isBuiltIn(US_BUSBAR, first.value)).toBe(true);
    // Other countries have their own.
    expect(firmRow(builtInRow({ country: 'DE', fact: 'busbar' })!, lists, 'DE').choices).not.toContain(
      '320 A',
    );
    expect(offered(withoutList(lists, US_BUSBAR))).toEqual(offered(noFactLists()));
  });

  it('still offers what a later version of the app adds', () => {
    const lists: FactLists = { ...noFactLists(), lists: [{ ...US_BUSBAR, choices: [{ value: '320 A' }] }] };
    expect(offered(lists)).toEqual(['320 A', ...builtInRow(US_BUSBAR)!.choices]);
  });
});

describe('a file of lists', () => {
  const words = fc.string({ minLength: 1, maxLength: 20 }).map((text) => `a${text.replace(/\W/g, '')}`);
  const choices = fc.uniqueArray(
    fc.record({ value: words, label: fc.option(words, { nil: undefined }), hidden: fc.boolean() }),
    { selector: ({ value }) => value, maxLength: 8 },
  );

  property.prop([choices, fc.constantFrom('US', 'DE', 'ZZ')])(
    'is read as it was written',
    (list, country) => {
      const lists = withChoices(noFactLists(), { country, fact: 'meter' }, list);
      expect(parseFactLists(JSON.stringify(lists))).toEqual({ ok: true, value: lists, warnings: [] });
    },
  );

  const head = { format: 'noonmark-fact-lists', version: 1 };
  const meter = (choice: unknown) => ({
    ...head,
    lists: [{ country: 'US', fact: 'meter', choices: [choice] }],
  });
  it.each<[string, unknown, string, RegExp]>([
    ['a list', [], 'file', /must hold lists, an object/],
    [
      'a survey',
      { format: 'noonmark-survey', version: 1 },
      'format',
      /"noonmark-survey", where "noonmark-fact-lists"/,
    ],
    ['a later version', { ...head, version: 2 }, 'version', /Update Noonmark/],
    ['no version', { format: head.format }, 'version', /version must be 1/],
    ['no lists', head, 'lists', /must be a list/],
    ['no object', { ...head, lists: [3] }, 'lists[0]', /An object is needed; it is 3/],
    [
      'a wrong country',
      { ...head, lists: [{ country: 'usa', fact: 'meter', choices: [] }] },
      'lists[0].country',
      /two capital letters/,
    ],
    ['no choices', { ...head, lists: [{ fact: 'meter' }] }, 'lists[0].choices', /must be a list/],
    ['an empty value', meter({ value: ' ' }), 'lists[0].choices[0].value', /must not be empty/],
    ['a value that is no text', meter({ value: 3 }), 'lists[0].choices[0].value', /must be a text; it is 3/],
    ['an unseen sign', meter({ value: 'a\u202eb' }), 'lists[0].choices[0].value', /cannot be seen/],
    [
      'too long a value',
      meter({ value: 'x'.repeat(201) }),
      'lists[0].choices[0].value',
      /200 characters; it has 201/,
    ],
    ['a wrong label', meter({ value: 'a', label: '' }), 'lists[0].choices[0].label', /must not be empty/],
    ['a wrong mark', meter({ value: 'a', hidden: 'yes' }), 'lists[0].choices[0].hidden', /true or false/],
    [
      'a value twice',
      { ...head, lists: [{ fact: 'meter', choices: [{ value: 'a' }, { value: 'a' }] }] },
      'lists[0].choices[1]',
      /"a" twice/,
    ],
    [
      'a list twice',
      {
        ...head,
        lists: [
          { fact: 'meter', choices: [] },
          { fact: 'meter', choices: [] },
        ],
      },
      'lists[1]',
      /two lists for "meter"/,
    ],
  ])('with %s is refused, with the place', (_, value, path, message) => {
    const parsed = factListsFromJson(value);
    if (parsed.ok) throw new Error('it was taken');
    expect(parsed.problems[0].path).toBe(path);
    expect(parsed.problems[0].message).toMatch(message);
  });

  it('that is cut short names the place', () => {
    expect(parseFactLists('{"format": "noonmark-fact-lists",')).toMatchObject({
      ok: false,
      problems: [{ path: 'line 1, column 34' }],
    });
  });

  it('keeps a list of what this version does not ask, and leaves out fields it does not know', () => {
    const parsed = factListsFromJson({
      ...head,
      lists: [{ fact: 'tide', choices: [{ value: 'High', colour: 'red' }] }],
    });
    if (!parsed.ok) throw new Error('it was refused');
    expect(parsed.value.lists).toEqual([{ fact: 'tide', choices: [{ value: 'High' }] }]);
    expect(parsed.warnings.map(({ path }) => path).sort()).toEqual([
      'lists[0]',
      'lists[0].choices[0].colour',
    ]);
  });

  property.prop([fc.json()])('or any JSON gets an answer', (text) => {
    const parsed = parseFactLists(text);
    expect(parsed.ok || parsed.problems.length > 0).toBe(true);
  });
});
