import type { Line, Mark, Picture } from '../marks.ts';
import { hatchFor } from './hatches.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';
import { roundStep } from './round-step.ts';

export interface MonthColumnsInput {
  /** kWh/m2, twelve each. */
  unshaded: readonly number[];
  measured: readonly number[];
  imagined: readonly number[] | null;
  width: number;
  height: number;
  textSize?: number;
}

/** A column a month: outline without obstructions, ink with them, hatched what an imagined change gives back. */
export function monthColumns(
  { unshaded, measured, imagined, width, height, textSize: size = 11 }: MonthColumnsInput,
  words: PictureWords = ENGLISH,
): Picture {
  const [left, right, above, below] = [size * 2.7, width - 2, 10, height - size - 8];
  const step = roundStep(Math.max(...unshaded, 0.01) / 4);
  const top = Math.max(step, Math.ceil(Math.max(...unshaded) / step) * step);
  const yOf = (light: number) => below - (light / top) * (below - above);
  const pitch = (right - left) / 12;
  const column = (month: number, from: number, to: number): Line => {
    const [x0, x1] = [left + pitch * (month + 0.16), left + pitch * (month + 0.84)];
    return [x0, yOf(from), x0, yOf(to), x1, yOf(to), x1, yOf(from)];
  };
  const marks: Mark[] = [];
  for (let light = 0; light <= top + 1e-9; light += step) {
    const y = yOf(light);
    if (light > 0)
      marks.push({ kind: 'path', lines: [[left, y, right, y]], pen: { tone: 'rule', width: 0.6 } });
    marks.push({ kind: 'text', x: left - 5, y: y + 4, text: words.number(light), size, anchor: 'end' });
  }
  const columns = (of: (month: number) => Line | null) => unshaded.flatMap((_, month) => [of(month) ?? []]);
  marks.push(
    { kind: 'path', lines: columns((m) => column(m, 0, measured[m])), closed: true, fill: { tone: 'ink' } },
    ...(imagined ? [imaginedColumns(columns((m) => column(m, measured[m], imagined[m])))] : []),
    {
      kind: 'path',
      lines: columns((m) => column(m, 0, unshaded[m])),
      closed: true,
      pen: { tone: 'ink', width: 1 },
    },
    { kind: 'path', lines: [[left, below, right, below]], pen: { tone: 'ink', width: 1.6 } },
  );
  (pitch > 2.75 * size ? words.months : words.initials).forEach((text, month) =>
    marks.push({
      kind: 'text',
      x: left + pitch * (month + 0.5),
      y: below + size + 4,
      text,
      size,
      anchor: 'middle',
    }),
  );
  return { width, height, marks };
}

const imaginedColumns = (lines: Line[]): Mark => ({
  kind: 'path',
  lines,
  closed: true,
  fill: { hatch: { ...hatchFor(0), spacing: 4 } },
});
