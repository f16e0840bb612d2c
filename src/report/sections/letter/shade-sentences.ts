import type { ClockSpan, DayStretch, ObstructionTimes } from '../../../core/shading/shade-times.ts';
import type { Speech } from '../../speech.ts';

const DAY = 1440;

/** Parts of the day by the clock, each from its hour on. */
const PARTS = [
  { from: 0, word: 'sun.in-the-night' },
  { from: 5, word: 'sun.in-the-morning' },
  { from: 11, word: 'sun.at-midday' },
  { from: 14, word: 'sun.in-the-afternoon' },
  { from: 18, word: 'sun.in-the-evening' },
  { from: 22, word: 'sun.in-the-night' },
] as const;
type PartWord = (typeof PARTS)[number]['word'];
/** A part of the day is named where so much of the shade lies in it. */
const LEAST_PART = 0.2;
/** More stretches of days than this are not told one by one. */
const MOST_STRETCHES = 3;

/** When an obstruction shades a roof, as two sentences: the days and part of the day, then the longest hours. */
export function shadeSentences(
  { stretches, months }: ObstructionTimes,
  obstruction: string,
  roof: string,
  speech: Speech,
): string {
  const { words } = speech;
  const { longest } = stretches.reduce((most, one) =>
    one.longest.minutes > most.longest.minutes ? one : most,
  );
  const first = words['sun.shades'](
    obstruction,
    roof,
    daysText(stretches, speech),
    partText([...months.flat(), ...longest.spans], speech),
  );
  const hours = speech.list(longest.spans.map((span) => hoursText(span, speech)));
  return longest.spans.length > 0
    ? `${first} ${words['sun.longest'](speech.dayOfYear(longest.month, longest.day), hours)}`
    : first;
}

function daysText(stretches: readonly DayStretch[], speech: Speech): string {
  const { words } = speech;
  const day = ({ month, day: of }: DayStretch['from']) => speech.dayOfYear(month, of);
  if (stretches.some(({ wholeYear }) => wholeYear)) return words['sun.all-year'];
  if (stretches.length > MOST_STRETCHES)
    return words['sun.now-and-then'](day(stretches[0].from), day(stretches[stretches.length - 1].to));
  return speech.list(
    stretches.map(({ from, to }) =>
      day(from) === day(to) ? words['sun.on'](day(from)) : words['sun.from-to'](day(from), day(to)),
    ),
  );
}

function partText(spans: readonly ClockSpan[], speech: Speech): string {
  const minutes = new Map<PartWord, number>();
  let whole = 0;
  for (const { from, to } of spans)
    for (let minute = from; minute < to; minute++, whole++) {
      const hour = (minute % DAY) / 60;
      const { word } = PARTS.findLast((part) => hour >= part.from)!;
      minutes.set(word, (minutes.get(word) ?? 0) + 1);
    }
  const inOrder = PARTS.slice(1).map(({ word }) => word);
  const named = inOrder.filter((word) => (minutes.get(word) ?? 0) >= LEAST_PART * Math.max(1, whole));
  const { words } = speech;
  return named.length > 3 || named.length === 0
    ? words['sun.at-changing-hours']
    : speech.list(named.map((word) => words[word]));
}

function hoursText({ from, to }: ClockSpan, speech: Speech): string {
  const { words } = speech;
  return to - from >= DAY
    ? words['sun.all-day']
    : words['sun.hours'](speech.clock(from), speech.clock(to % DAY));
}

/** The hours of one month for a cell of a table. */
export function hoursCell(spans: readonly ClockSpan[], speech: Speech): string {
  const { words } = speech;
  if (spans.length === 0) return words['sun.no-hours'];
  return spans
    .map(({ from, to }) =>
      to - from >= DAY
        ? words['sun.all-day']
        : words['sun.hours-short'](speech.clock(from), speech.clock(to % DAY)),
    )
    .join(', ');
}
