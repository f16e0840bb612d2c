import type { ObstructionProspects } from '../../../core/shading/prospects.ts';
import { GROWTHS } from '../../../core/shading/prospects.ts';
import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { hasDistance } from './changeable.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE, obstructionNames, smallShare } from './roofs.ts';

/** Growth of trees, new buildings, one's own trees, other years. */
export const howItMayChange: SectionKind = {
  id: 'how-it-may-change',
  part: 'letter',
  write: (report, speech) => {
    const { words } = speech;
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    const hasTrees = roofs.some((roof) => treesOf(roof, report).length > 0);
    return {
      heading: words['change.heading'],
      blocks: [
        { kind: 'answer', text: words[hasTrees ? 'change.answer-trees' : 'change.answer'] },
        ...roofs.flatMap((roof) => growthBlocks(roof, report, speech)),
        {
          kind: 'list',
          items: [
            ...unknownTrees(roofs, report, speech),
            words['change.buildings'],
            ownTreesText(report.survey.site.latitude, speech),
            words['change.years'],
            words['change.again'],
          ],
        },
      ],
    };
  },
};

/** Growth that takes less is none, share of the year's light. */
const LEAST = 0.0005;
/** Latitude of the tropics, degrees: the obliquity of the ecliptic. */
const TROPIC = 23.44;

/** Trees that some station of the roof saw. */
function treesOf({ evidence }: MeasuredRoof, { survey }: ReportInput): ObstructionProspects[] {
  const known = obstructionsById(survey);
  return evidence.prospects.obstructions.filter(
    ({ id }) => obstructionKind(known.get(id)?.kind ?? 'other').leaves !== undefined,
  );
}

function growthBlocks(roof: MeasuredRoof, report: ReportInput, speech: Speech): Block[] {
  const growing = treesOf(roof, report).filter(({ grown }) => grown.some(({ loss }) => loss >= LEAST));
  return growing.length > 0 ? [{ kind: 'table', table: growthTable(roof, growing, report, speech) }] : [];
}

function growthTable(
  roof: MeasuredRoof,
  trees: readonly ObstructionProspects[],
  report: ReportInput,
  speech: Speech,
): Table {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const lossText = (loss: number) =>
    loss < LEAST ? words['change.no-more'] : words['change.more'](smallShare(loss, speech));
  return {
    caption: words['change.table-caption'](roof.name),
    columns: [
      { head: words['change.tree'] },
      ...GROWTHS.map((by) => ({ head: words['change.grown'](speech.length(by, 0)), number: true })),
    ],
    rows: trees.map(({ id, grown }) => [nameOf(id), ...grown.map(({ loss }) => lossText(loss))]),
  };
}

/** Trees of which nobody knows how far they stand, so that no growth can be worked out. */
function unknownTrees(roofs: readonly MeasuredRoof[], report: ReportInput, speech: Speech): string[] {
  const known = hasDistance(report);
  const nameOf = obstructionNames(report);
  const ids = new Set(
    roofs.flatMap((roof) =>
      treesOf(roof, report)
        .filter((row) => !known(row) && row.lossIfAlone >= NOTICEABLE)
        .map(({ id }) => id),
    ),
  );
  if (ids.size === 0) return [];
  return [speech.words['change.no-distance'](speech.list([...ids].map(nameOf)))];
}

function ownTreesText(latitude: number, speech: Speech): string {
  const { words } = speech;
  return Math.abs(latitude) <= TROPIC
    ? words['change.own-trees-tropics']
    : words['change.own-trees'](speech.compass(latitude > 0 ? 0 : 180));
}
