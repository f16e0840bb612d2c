import { describe, expect, test } from 'vitest';
import { Speech } from '../../../src/report/speech.ts';
import type { Catalogue } from '../../../src/report/words/catalogue.ts';
import { EN } from '../../../src/report/words/en/en.ts';
import { LANGUAGES } from '../../../src/report/words/languages.ts';

type Key = keyof Catalogue;
type Sentence = (...fill: unknown[]) => string;

const KEYS = Object.keys(EN) as Key[];
const SENTENCES = KEYS.filter((key) => typeof EN[key] === 'function');
const COMPASS = ['compass.words', 'compass.letters'] as const;
const TRANSLATED = LANGUAGES.filter(({ id }) => id !== 'en');
/** Numbers a sentence can count; no word of a catalogue has them. */
const FIRST_MARK = 7001;

/** A sentence filled in with numbers that cannot be mistaken; its function that picks a plural takes the last form. */
function filled(words: Catalogue, key: Key): { text: string; marks: string[] } {
  const sentence = words[key] as unknown as Sentence;
  const picksPlural = key === 'glance.several' || key === 'glance.range-note';
  const marks = Array.from({ length: sentence.length - (picksPlural ? 1 : 0) }, (_, i) => FIRST_MARK + i);
  const other = (_count: number, forms: { other: string }) => forms.other;
  return {
    text: picksPlural ? sentence(other, ...marks.map(String)) : sentence(...marks.map(String)),
    marks: marks.map(String),
  };
}

/** Everything a catalogue says, sentences filled in. */
function textOf(words: Catalogue, key: Key): string {
  const value: unknown = words[key];
  if (typeof value === 'function') return filled(words, key).text;
  return Array.isArray(value) ? value.join(', ') : String(value);
}

describe.each(LANGUAGES.map(({ id, words }) => [id, words] as const))('words in %s', (id, words) => {
  test('has the keys of the English ones and no others, each with something to say', () => {
    expect(Object.keys(words).sort()).toEqual([...KEYS].sort());
    for (const key of KEYS) expect(textOf(words, key).trim(), key).not.toBe('');
  });

  test('has every figure and name that a sentence is given, once', () => {
    expect(SENTENCES.length).toBeGreaterThan(60);
    for (const key of SENTENCES) {
      expect((words[key] as Sentence).length, key).toBe((EN[key] as Sentence).length);
      const { text, marks } = filled(words, key);
      for (const mark of marks) expect(text.split(mark).length - 1, `${key}: ${text}`).toBe(1);
    }
  });

  test('has single spaces, none at an end', () => {
    for (const key of KEYS) {
      expect(textOf(words, key), key).not.toMatch(/\s\s|^\s|\s$|\s[,.]/);
    }
  });

  test('opens and closes what it puts in brackets and quotation marks', () => {
    for (const key of KEYS) {
      const count = (letter: string) => textOf(words, key).split(letter).length - 1;
      const [open, close] = { en: '“”', de: '„“', es: '«»', fr: '«»' }[id];
      expect(count(close), key).toBe(count(open));
      expect(count(')'), key).toBe(count('('));
    }
  });

  test.each(COMPASS)('has eight different %s', (list) => {
    expect(new Set(words[list]).size).toBe(8);
    expect(words[list]).toHaveLength(8);
  });

  test('counts one place and two places in different words', () => {
    const { plural } = new Speech({ language: id, units: 'metric' });
    const [one, two] = [1, 2].map((count) => words['glance.range-note'](plural, count));
    const withoutFigures = (text: string) => text.replace(/\d/g, '');
    expect(withoutFigures(one)).not.toBe(withoutFigures(two));
    expect(two).toContain('2');
  });

  test('asks in the headings of the letter', () => {
    const letter = ['glance', 'sun', 'columns', 'done', 'expect', 'change', 'compared', 'sure', 'cautions'];
    for (const section of letter)
      expect(words[`${section}.heading` as Key], section).toMatch(id === 'es' ? /^¿.+\?$/ : /\?$/);
  });
});

describe.each(TRANSLATED.map(({ id, words }) => [id, words] as const))('translated to %s', (_, words) => {
  test('leaves nothing of more than three words in English', () => {
    const left = KEYS.filter(
      (key) => textOf(EN, key).split(/\s+/).length > 3 && textOf(words, key) === textOf(EN, key),
    );
    expect(left).toEqual([]);
  });
});

describe('French', () => {
  const { words } = LANGUAGES.find(({ id }) => id === 'fr')!;

  test('does not let a line end before a colon or inside quotation marks', () => {
    for (const key of KEYS) {
      expect(textOf(words, key), key).not.toMatch(/[^\u202f][:;?!»%]|«[^\u202f]/);
    }
  });

  test('writes the first of a month as French does', () => {
    const speech = new Speech({ language: 'fr', units: 'metric' });
    const [first, eleventh] = [speech.dayOfYear(4, 1), speech.dayOfYear(4, 11)];
    expect(words['sun.from-to'](first, eleventh)).toBe('du 1er mai au 11 mai');
    expect(words['frame.made'](speech.day('2026-05-01'))).toBe('Rapport du 1er mai 2026');
  });

  test('puts articles to the compass so that nothing elides before it', () => {
    const speech = new Speech({ language: 'fr', units: 'metric' });
    expect(words['photos.toward'](speech.compass(90))).toBe('vue vers l’est');
    expect(words['sure.between'](speech.compass(270), speech.compass(45))).toBe(
      'depuis l’ouest jusque vers le nord-est',
    );
  });
});

test('German and Spanish make whole phrases of days and of hours', () => {
  const [de, es] = (['de', 'es'] as const).map((language) => new Speech({ language, units: 'metric' }));
  expect(de.words['sun.from-to'](de.dayOfYear(9, 7), de.dayOfYear(2, 5))).toBe(
    'vom 7. Oktober bis zum 5. März',
  );
  expect(de.words['sun.hours'](de.clock(546), de.clock(715))).toBe('von 09:06 bis 11:55 Uhr');
  expect(es.words['sun.from-to'](es.dayOfYear(9, 7), es.dayOfYear(2, 5))).toBe(
    'del 7 de octubre al 5 de marzo',
  );
  expect(es.words['sun.hours'](es.clock(546), es.clock(715))).toBe('de 9:06 a 11:55');
});

test('Spanish in the United States ends a sentence with one stop where the hour ends with one', () => {
  const es = new Speech({ language: 'es', units: 'us' });
  const hours = es.words['sun.hours'](es.clock(546), es.clock(899));
  expect(hours).toMatch(/m\.$/);
  expect(es.words['sun.longest'](es.dayOfYear(11, 14), hours)).toMatch(/m\.$(?<!\.\.)/);
});
