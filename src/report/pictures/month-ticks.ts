import type { MonthlyShares } from '../../core/shading/assessment.ts';
import type { Line, Picture } from '../marks.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';

const [PITCH, HEIGHT] = [7, 24];

/** Twelve small ink bars on a line: the share of each month's light an obstruction takes; `full` fills the height. */
export function monthTicks(
  monthly: MonthlyShares,
  full: number,
  { months }: PictureWords = ENGLISH,
): Picture {
  const size = 9;
  const bars = monthly.map((share, month): Line => {
    const [x, high] = [month * PITCH + 1, Math.min(1, (share ?? 0) / full) * HEIGHT];
    return [x, HEIGHT, x, HEIGHT - high, x + PITCH - 2, HEIGHT - high, x + PITCH - 2, HEIGHT];
  });
  const width = 12 * PITCH;
  return {
    width,
    height: HEIGHT + size + 4,
    marks: [
      { kind: 'path', lines: bars, closed: true, fill: { tone: 'ink' } },
      { kind: 'path', lines: [[0, HEIGHT, width, HEIGHT]], pen: { tone: 'ink', width: 1 } },
      { kind: 'text', x: 0, y: HEIGHT + size + 2, text: months[0], size, tone: 'faint' },
      { kind: 'text', x: width, y: HEIGHT + size + 2, text: months[11], size, anchor: 'end', tone: 'faint' },
    ],
  };
}
