import type { ObstructionProspects, PlaneProspects } from '../../../core/shading/prospects.ts';
import type { Block } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { changeOf, hasDistance } from './changeable.ts';
import { gainsTable } from './gains-table.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE, obstructionNames, smallShare } from './roofs.ts';

/** What trimming, moving or removing would give back, and what has to be asked before. */
export const whatCouldBeDone: SectionKind = {
  id: 'what-could-be-done',
  part: 'letter',
  startsPage: true,
  write: (report, speech) => {
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    return {
      heading: speech.words['done.heading'],
      blocks: [
        { kind: 'answer', text: answerOf(roofs, report, speech) },
        ...roofs.flatMap((roof) => roofBlocks(roof, roofs.length, report, speech)),
        ...askFirst(roofs, report, speech),
      ],
    };
  },
};

/** Stations that differ by less are alike, share of the year's light. */
const ALIKE = 0.03;

type Group = PlaneProspects['groups'][number];

/** What of a roof's prospects could be changed, with a gain worth naming. */
function worthwhile({ evidence }: MeasuredRoof, report: ReportInput) {
  const change = changeOf(report);
  const { obstructions, groups } = evidence.prospects;
  const isOpenToChange = (id: string) => change(id) !== 'stays';
  return {
    single: obstructions.filter(({ id, gainIfRemoved }) => isOpenToChange(id) && gainIfRemoved >= NOTICEABLE),
    together: groups.filter(
      (group) =>
        group.gainIfAllRemoved >= NOTICEABLE &&
        group.gainIfAllRemoved - group.sumOfSingleGains >= NOTICEABLE &&
        group.obstructions.every(isOpenToChange),
    ),
    /** Worth something only if others went too. */
    hidden: obstructions.filter(
      ({ id, gainIfRemoved, lossIfAlone }) =>
        isOpenToChange(id) && gainIfRemoved < NOTICEABLE && lossIfAlone >= NOTICEABLE,
    ),
    staying: obstructions.filter(({ id, lossIfAlone }) => !isOpenToChange(id) && lossIfAlone >= NOTICEABLE),
  };
}

function answerOf(roofs: readonly MeasuredRoof[], report: ReportInput, speech: Speech): string {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const all = roofs.map((roof) => ({ roof, ...worthwhile(roof, report) }));
  const single = all
    .flatMap(({ roof, single: rows }) => rows.map((row) => ({ roof, row })))
    .sort((a, b) => b.row.gainIfRemoved - a.row.gainIfRemoved)[0];
  if (single) {
    const gain = smallShare(single.row.gainIfRemoved, speech);
    return words['done.answer'](nameOf(single.row.id), gain, single.roof.name);
  }
  const group = all
    .flatMap(({ roof, together }) => together.map((members) => ({ roof, members })))
    .sort((a, b) => b.members.gainIfAllRemoved - a.members.gainIfAllRemoved)[0];
  if (group) {
    const { obstructions, gainIfAllRemoved } = group.members;
    const names = speech.list(obstructions.map(nameOf));
    return words['done.answer-together'](names, smallShare(gainIfAllRemoved, speech), group.roof.name);
  }
  const isClear = roofs.every(({ access }) => 1 - access.annual < NOTICEABLE);
  return words[isClear ? 'done.answer-clear' : 'done.answer-nothing'];
}

function roofBlocks(roof: MeasuredRoof, count: number, report: ReportInput, speech: Speech): Block[] {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const { single, together, hidden, staying } = worthwhile(roof, report);
  const known = hasDistance(report);
  const change = changeOf(report);
  const items = [
    ...hidden.map((row) => hiddenText(row, roof.evidence.prospects.groups, report, speech)),
    ...together.map(({ obstructions, gainIfAllRemoved }) =>
      words['done.together'](speech.list(obstructions.map(nameOf)), smallShare(gainIfAllRemoved, speech)),
    ),
    ...single
      .filter((row) => change(row.id) === 'trim' && !known(row))
      .map(({ id }) => words['done.no-distance'](nameOf(id))),
    ...placeText(roof, speech),
    ...(staying.length > 0 ? [words['done.stays'](speech.list(staying.map(({ id }) => nameOf(id))))] : []),
  ];
  const blocks: Block[] = [
    ...(single.length > 0
      ? [{ kind: 'table' as const, table: gainsTable(roof, single, report, speech) }]
      : []),
    ...(items.length > 0 ? [{ kind: 'list' as const, items }] : []),
  ];
  return count > 1 && blocks.length > 0 ? [{ kind: 'subheading', text: roof.name }, ...blocks] : blocks;
}

function hiddenText(
  { id }: ObstructionProspects,
  groups: readonly Group[],
  report: ReportInput,
  speech: Speech,
): string {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const change = changeOf(report);
  const group = groups.find(({ obstructions }) => obstructions.includes(id));
  const others = group?.obstructions.filter((other) => other !== id) ?? [];
  return others.length > 0 && others.every((other) => change(other) !== 'stays')
    ? words['done.unless'](nameOf(id), speech.list(others.map(nameOf)))
    : words['done.hidden'](nameOf(id));
}

/** Where on the roof the most arrives, if that differs. */
function placeText({ name, plane }: MeasuredRoof, speech: Speech): string[] {
  const sorted = [...plane.stations].sort((a, b) => a.solarAccess.annual - b.solarAccess.annual);
  const [lowest, best] = [sorted[0], sorted[sorted.length - 1]];
  if (best.solarAccess.annual - lowest.solarAccess.annual < ALIKE) return [];
  const share = ({ solarAccess }: typeof best) => speech.percent(solarAccess.annual);
  const nameOf = (station: typeof best) => shownText(station.name, 60);
  return [speech.words['done.place'](name, nameOf(best), share(best), nameOf(lowest), share(lowest))];
}

/** Who has to be asked, where something could be trimmed or moved. */
function askFirst(roofs: readonly MeasuredRoof[], report: ReportInput, { words }: Speech): Block[] {
  const change = changeOf(report);
  const ids = roofs.flatMap((roof) => {
    const { single, together } = worthwhile(roof, report);
    return [...single.map(({ id }) => id), ...together.flatMap(({ obstructions }) => obstructions)];
  });
  if (ids.length === 0) return [];
  const hasTree = ids.some((id) => change(id) === 'trim');
  const hasOther = ids.some((id) => change(id) === 'move');
  return [
    {
      kind: 'caution',
      heading: words['done.before'],
      items: [
        ...(hasTree
          ? [words['done.owner'], words['done.protected'], words['done.nesting'], words['done.trained']]
          : []),
        ...(hasOther ? [words['done.permit']] : []),
      ],
    },
  ];
}
