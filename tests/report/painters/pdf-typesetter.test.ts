import { describe, expect, it } from 'vitest';
import { FACES } from '../../../src/report/painters/pdf/pdf-fonts.ts';
import { plainLetters, rightToLeft } from '../../../src/report/painters/pdf/plain-letters.ts';
import { TrueTypeFace } from '../../../src/report/painters/pdf/true-type-face.ts';
import type { DrawnText } from '../../../src/report/painters/pdf/typesetter.ts';
import { Typesetter } from '../../../src/report/painters/pdf/typesetter.ts';
import { fontBytes, fontsOnDisk } from './pdf-fonts-on-disk.ts';

const STYLE = { face: 'regular', size: 10 } as const;
const fonts = fontsOnDisk();

/** Letters of the languages that addresses in Europe and the Americas are written in; from memory. */
const NEEDED = [
  'abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789',
  'äöüßÄÖÜẞéèêëàâçîïôùûœæñáíóúü¿¡ÀÉÇŒãõ',
  'ąćęłńśźżĄĆĘŁŃŚŹŻčďěňřšťůžČĎĚŇŘŠŤŮŽőűŐŰășțâîđćžšåøæðþ',
  'αβγδεζηθικλμνξοπρστυφχψωςάέήίόύώΑΒΓΔΕΖΗΘΙΚΛΜΝΞΟΠΡΣΤΥΦΧΨΩ',
  'абвгдежзийклмнопрстуфхцчшщъыьэюяїієґАБВГДЕЖЗИЙКЛМНОПРСТУФХЦЧШЩЪЫЬЭЮЯ',
  '°²³×−±·…–—‘’“”„«»€£$%‰§©™≤≥≈√½¼¾′″→←↑↓•',
].join('');

describe.each(FACES)('the %s face', (name) => {
  const face = new TrueTypeFace(fontBytes(name));

  it('has the letters that names, addresses and figures are written in', () => {
    expect([...NEEDED].filter((letter) => !face.has(letter.codePointAt(0)!))).toEqual([]);
  });

  it('says of other letters that it lacks them', () => {
    for (const letter of '光שع🙂क한ไ') expect(face.has(letter.codePointAt(0)!), letter).toBe(false);
  });

  it('sets every letter it has wider than nothing, and figures in a row add up', () => {
    for (const letter of NEEDED) expect(face.width(letter, 10), letter).toBeGreaterThan(0.5);
    expect(face.width('2026', 10)).toBeCloseTo(
      [...'2026'].reduce((sum, figure) => sum + face.width(figure, 10), 0),
      9,
    );
    expect(face.width('roof', 20)).toBeCloseTo(2 * face.width('roof', 10), 9);
  });
});

describe('a file that is no TrueType file', () => {
  it.each([new Uint8Array(), new Uint8Array(400), new TextEncoder().encode('wOF2'.repeat(40))])(
    'is refused',
    (bytes) => expect(() => new TrueTypeFace(bytes)).toThrow(RangeError),
  );
});

describe('text made fit for setting', () => {
  it('has composed letters, plain spaces and no marks of control or direction', () => {
    expect(plainLetters('Z\u030c\u202e\u200f a\tb\u0000')).toBe('Ž a b');
    expect(plainLetters('12\u202f345\u00a0m')).toBe('12\u00a0345\u00a0m');
  });

  it('shows half a letter as one that is missing', () => {
    expect(plainLetters('a\ud83db\udc00c')).toBe('a\ufffdb\ufffdc');
    expect(plainLetters('🙂')).toBe('🙂');
  });

  it('finds what is written from right to left, figures between included', () => {
    expect(rightToLeft('Haus')).toEqual([0, 0]);
    const text = 'Flat 3, שלום 12 עולם, top';
    expect(text.slice(...rightToLeft(text))).toBe('שלום 12 עולם');
  });
});

describe('runs of a text', () => {
  const DRAWN: DrawnText = { png: new Uint8Array(), width: 37, height: 12, baseline: 9 };
  const kinds = (text: string, setter: Typesetter) =>
    setter.runs(text, STYLE).map(({ kind, text: part }) => [kind, part]);

  it('come from the typeface where it has the letters', () => {
    const setter = new Typesetter(fonts, () => DRAWN);
    expect(kinds('Żółta ściana', setter)).toEqual([['letters', 'Żółta ściana']]);
  });

  it('ask for a picture of what the typeface lacks, spaces between and right-to-left order included', () => {
    const asked: string[] = [];
    const setter = new Typesetter(fonts, (text) => (asked.push(text), DRAWN));
    expect(kinds('Roof of 光 伏 (north)', setter)).toEqual([
      ['letters', 'Roof of '],
      ['drawn', '光 伏'],
      ['letters', ' (north)'],
    ]);
    expect(kinds('A שלום 12 עולם B', setter)[1]).toEqual(['drawn', 'שלום 12 עולם']);
    expect(setter.width('光 伏', STYLE)).toBe(37);
    expect(asked).toEqual(['光 伏', 'שלום 12 עולם']);
    expect(setter.boxed).toBe(false);
  });

  it('put a box for each letter where there is no picture, and remember that', () => {
    for (const drawText of [undefined, () => null]) {
      const setter = new Typesetter(fonts, drawText);
      expect(setter.boxed).toBe(false);
      const runs = setter.runs('a光伏 👨‍👩‍👧b', STYLE);
      expect(runs.map(({ kind }) => kind)).toEqual(['letters', 'boxes', 'letters', 'boxes', 'letters']);
      expect(runs.map((run) => (run.kind === 'boxes' ? run.count : 0))).toEqual([0, 2, 0, 1, 0]);
      expect(runs.map(({ text }) => text).join('')).toBe('a光伏 👨‍👩‍👧b');
      expect(setter.boxed).toBe(true);
    }
  });
});
