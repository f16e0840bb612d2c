import { plainLetters } from './plain-letters.ts';
import type { TextStyle } from './text-style.ts';
import type { Typesetter } from './typesetter.ts';

/** Where a line may end: behind a space, behind a hyphen or slash between words, between East Asian letters. */
const BREAKS =
  /(?<= )(?! )|(?<=\p{L}{3}[-–—/])(?=\p{L}{3})|(?<=[\u2e80-\u9fff\uac00-\ud7af\uff01-\uffef])(?=[\u2e80-\u9fff\uac00-\ud7af])/u;

/** Breaks text into lines no wider than `width`, in points; a word wider than a line is broken between letters. */
export function wrapText(text: string, width: number, style: TextStyle, setter: Typesetter): string[] {
  const lines: string[] = [];
  let line = '';
  let used = 0;
  for (const word of plainLetters(text).trim().split(BREAKS)) {
    const wide = setter.width(word.trimEnd(), style);
    if (used + wide > width && line !== '') {
      lines.push(line);
      [line, used] = ['', 0];
    }
    if (wide <= width) {
      line += word;
      used += word.endsWith(' ') ? setter.width(word, style) : wide;
      continue;
    }
    const parts = brokenWord(word, width, style, setter);
    lines.push(...parts.slice(0, -1));
    line = parts.at(-1)!;
    used = setter.width(line, style);
  }
  if (line !== '') lines.push(line);
  return lines.map((whole) => whole.trimEnd());
}

function brokenWord(word: string, width: number, style: TextStyle, setter: Typesetter): string[] {
  const parts = [''];
  let used = 0;
  for (const cluster of setter.letterClusters(word)) {
    const wide = setter.width(cluster, style);
    if (used + wide > width && parts.at(-1) !== '') {
      parts.push('');
      used = 0;
    }
    parts[parts.length - 1] += cluster;
    used += wide;
  }
  return parts;
}

/** The width of the widest piece that a line cannot break, and of the whole on one line, in points. */
export function textExtent(
  text: string,
  style: TextStyle,
  setter: Typesetter,
): { word: number; whole: number } {
  const words = plainLetters(text).trim().split(BREAKS);
  return {
    word: Math.max(0, ...words.map((word) => setter.width(word.trimEnd(), style))),
    whole: setter.width(words.join(''), style),
  };
}
