import type { AccessInterval } from '../../../core/shading/assessment.ts';
import type { Block, KeyFigure } from '../../contents/report-contents.ts';
import { roofBars } from '../../pictures/roof-bars.ts';
import type { ReportInput } from '../../report-input.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { PICTURE_WIDTH } from './picture-size.ts';
import { pictureWords } from './picture-words.ts';
import type { MeasuredRoof, Roof } from './roofs.ts';
import { isClearSky, measuredRoofs, NOTICEABLE, rangeText, roofsOf } from './roofs.ts';

/** The first page: the answer in a sentence, three figures with their ranges, one picture. */
export const atAGlance: SectionKind = {
  id: 'at-a-glance',
  part: 'letter',
  write: (report, speech) => ({
    heading: speech.words['glance.heading'],
    blocks: glanceBlocks(report, speech),
  }),
};

function glanceBlocks(report: ReportInput, speech: Speech): Block[] {
  const { words } = speech;
  const [roofs, measured] = [roofsOf(report), measuredRoofs(report)];
  if (roofs.length === 0) return [{ kind: 'answer', text: words['glance.no-roof'] }];
  const sunniest = [...measured].sort((a, b) => lightOf(b) - lightOf(a))[0];
  const blocks: Block[] = [{ kind: 'answer', text: answerOf(roofs, sunniest, speech) }];
  if (roofs.length > 1) blocks.push({ kind: 'list', items: roofs.map((roof) => lineOf(roof, speech)) });
  if (!sunniest) return blocks;
  if (roofs.length > 1) blocks.push({ kind: 'subheading', text: words['glance.figures-of'](sunniest.name) });
  blocks.push({ kind: 'key-figures', figures: keyFigures(sunniest, isClearSky(report), speech) });
  if (sunniest.access.interval)
    blocks.push({
      kind: 'paragraph',
      text: words['glance.range-note'](speech.plural, sunniest.access.count),
      small: true,
    });
  blocks.push(pictureBlock(roofs, speech));
  return blocks;
}

const lightOf = ({ plane, access }: MeasuredRoof) => access.annual * plane.unshaded.annual;

function answerOf(roofs: readonly Roof[], sunniest: MeasuredRoof | undefined, speech: Speech): string {
  const { words } = speech;
  if (roofs.length === 1) return sentenceOf(roofs[0], speech);
  if (!sunniest) return words['glance.several-unknown'];
  const light = speech.irradiation(lightOf(sunniest));
  return words['glance.several'](speech.plural, roofs.length, sunniest.name, light);
}

function sentenceOf({ name, plane: { solarAccess } }: Roof, speech: Speech): string {
  const { words } = speech;
  if (!solarAccess) return words['glance.unknown'](name);
  return 1 - solarAccess.annual < NOTICEABLE
    ? words['glance.answer-clear'](name)
    : words['glance.answer'](name, speech.percent(solarAccess.annual));
}

/** One of several, in a line. */
function lineOf(roof: Roof, speech: Speech): string {
  const { solarAccess } = roof.plane;
  return solarAccess
    ? speech.words['glance.each'](roof.name, speech.percent(solarAccess.annual))
    : sentenceOf(roof, speech);
}

function keyFigures(
  { access: { annual, interval }, plane: { orientationFactor, orientationInterval, unshaded } }: MeasuredRoof,
  clearSky: boolean,
  speech: Speech,
): KeyFigure[] {
  const { words } = speech;
  const percent = (share: number) => speech.percent(share);
  const light = (share: number) => speech.irradiation(share * unshaded.annual);
  return [
    {
      label: words['glance.access'],
      value: percent(annual),
      range: percentRange(interval, speech),
      note: words['glance.access-note'],
    },
    {
      label: words['glance.facing'],
      value: percent(orientationFactor),
      range: percentRange(orientationInterval, speech),
      note: words['glance.facing-note'],
    },
    {
      label: words['glance.light'],
      value: light(annual),
      range: rangeText(interval, speech, light),
      note: words[clearSky ? 'glance.light-note-clear-sky' : 'glance.light-note'],
    },
  ];
}

/** With a decimal where the ends would look the same without. */
function percentRange(
  interval: Pick<AccessInterval, 'low' | 'high'> | undefined,
  speech: Speech,
): string | null {
  const [whole, finer] = [0, 1].map((decimals) => (share: number) => speech.percent(share, decimals));
  const isNarrow = interval && whole(interval.low) === whole(interval.high);
  return rangeText(interval, speech, isNarrow ? finer : whole);
}

function pictureBlock(roofs: readonly Roof[], speech: Speech): Block {
  const { words } = speech;
  const bars = roofs.map(({ name, plane: { unshaded, solarAccess } }) => ({
    name,
    unshaded: speech.irradiationNumber(unshaded.annual),
    access: solarAccess?.annual ?? null,
    interval: solarAccess?.interval ?? null,
    value: solarAccess ? speech.percent(solarAccess.annual) : words['glance.bar-unknown'],
  }));
  const axis = words['glance.axis'](speech.irradiationUnit);
  return {
    kind: 'picture',
    picture: roofBars({ bars, axis, width: PICTURE_WIDTH }, pictureWords(speech)),
    caption: words['glance.picture-caption'],
    alternative: roofs.map((roof) => lineOf(roof, speech)).join(' '),
  };
}
