import type { Line, Mark, Picture } from '../marks.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';

export interface HourBarsInput {
  /** kWh/m2 with nothing in the way, [month][hour]. */
  unshaded: readonly (readonly number[])[];
  /** Solar access, [month][hour]; null without light. */
  access: readonly (readonly (number | null)[])[];
  width: number;
}

/** Hours that have light in some month: first and last. */
export function hoursWithLight(access: HourBarsInput['access']): [first: number, last: number] | null {
  const lit = Array.from({ length: 24 }, (_, hour) => hour).filter((hour) =>
    access.some((row) => row[hour] !== null),
  );
  return lit.length > 0 ? [lit[0], lit[lit.length - 1]] : null;
}

/**
 * A ruled line a month and a bar an hour: the outline is as high as the light of the hour with nothing in the way, the ink in
 * it as high as what arrives.
 */
export function hourBars({ unshaded, access, width }: HourBarsInput, words: PictureWords = ENGLISH): Picture {
  const size = 11;
  const [left, right, above, row] = [30, width - 9, size + 8, 24];
  const height = above + 12 * row + 4;
  const hours = hoursWithLight(access);
  if (!hours) return { width, height, marks: [] };
  const [first, last] = hours;
  const pitch = (right - left) / (last - first + 1);
  const most = Math.max(...unshaded.flat());
  const outlines: Line[] = [];
  const filled: Line[] = [];
  const bar = (month: number, hour: number, height: number): Line => {
    const [x0, x1] = [left + pitch * (hour - first + 0.14), left + pitch * (hour - first + 0.86)];
    const y = above + (month + 1) * row;
    return [x0, y, x0, y - height, x1, y - height, x1, y];
  };
  access.forEach((shares, month) =>
    shares.forEach((share, hour) => {
      if (share === null) return;
      const whole = (unshaded[month][hour] / most) * (row - 4);
      outlines.push(bar(month, hour, whole));
      filled.push(bar(month, hour, whole * share));
    }),
  );
  const rules = words.months.map((_, month): Line => [
    left,
    above + (month + 1) * row,
    right,
    above + (month + 1) * row,
  ]);
  const marks: Mark[] = [
    { kind: 'path', lines: rules, pen: { tone: 'rule', width: 0.8 } },
    { kind: 'path', lines: filled, closed: true, fill: { tone: 'ink' } },
    { kind: 'path', lines: outlines, closed: true, pen: { tone: 'ink', width: 0.7 } },
    ...words.months.map((text, month): Mark => ({
      kind: 'text',
      x: left - 5,
      y: above + (month + 1) * row - 3,
      text,
      size,
      anchor: 'end',
    })),
  ];
  const every = pitch < 15 ? 3 : pitch < 26 ? 2 : 1;
  for (let hour = first; hour <= last + 1; hour++)
    if (hour % every === 0) {
      const x = left + pitch * (hour - first);
      marks.push({ kind: 'text', x, y: size, text: words.hour(hour), size, anchor: 'middle' });
      marks.push({ kind: 'path', lines: [[x, size + 3, x, above]], pen: { tone: 'ink', width: 0.8 } });
    }
  return { width, height, marks };
}
