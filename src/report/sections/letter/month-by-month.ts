import type { Block, Table } from '../../contents/report-contents.ts';
import { monthColumns } from '../../pictures/month-columns.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { PICTURE_TEXT, PICTURE_WIDTH } from './picture-size.ts';
import { pictureWords } from './picture-words.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE } from './roofs.ts';

/** The year in months: what arrives beside what would come with nothing in the way. */
export const monthByMonth: SectionKind = {
  id: 'month-by-month',
  part: 'letter',
  startsPage: true,
  write: (report, speech) => {
    const roofs = measuredRoofs(report);
    const { words } = speech;
    if (roofs.length === 0) return null;
    return {
      heading: words['columns.heading'],
      blocks: [
        { kind: 'answer', text: bestAndWorst(roofs[0], speech) },
        ...roofs.flatMap((roof, i) => [
          ...(roofs.length > 1 ? [{ kind: 'subheading' as const, text: roof.name }] : []),
          { kind: 'paragraph' as const, text: shadeText(roof, i > 0, speech) },
          ...columnBlocks(roof, speech),
        ]),
      ],
    };
  },
};

/** A month with less light than this share of the brightest is as good as dark. */
const AS_DARK = 0.005;
const PICTURE = { width: PICTURE_WIDTH, height: 190, textSize: PICTURE_TEXT };

/** Light that arrives in each month, mean of the stations, kWh/m2. */
function arriving({ plane }: MeasuredRoof): number[] {
  return plane.unshaded.monthly.map(
    (_, month) =>
      plane.stations.reduce((sum, { irradiation }) => sum + irradiation.monthly[month], 0) /
      plane.stations.length,
  );
}

function bestAndWorst(roof: MeasuredRoof, speech: Speech): string {
  const light = arriving(roof);
  const month = (value: number) => speech.month(light.indexOf(value));
  return speech.words['columns.answer'](roof.name, month(Math.max(...light)), month(Math.min(...light)));
}

function shadeText(roof: MeasuredRoof, withBest: boolean, speech: Speech): string {
  const { words } = speech;
  const most = Math.max(...roof.plane.unshaded.monthly);
  const isDark = roof.plane.unshaded.monthly.map((light) => light < AS_DARK * most);
  const shares = roof.access.monthly.map((share, month) => (isDark[month] ? 1 : (share ?? 1)));
  const worst = shares.indexOf(Math.min(...shares));
  const dark = isDark.flatMap((is, month) => (is ? [speech.month(month)] : []));
  return [
    ...(withBest ? [bestAndWorst(roof, speech)] : []),
    1 - shares[worst] < NOTICEABLE
      ? words['columns.no-shade']
      : words['columns.shade-most'](speech.month(worst), speech.percent(shares[worst])),
    ...(dark.length > 0 ? [words['columns.dark'](speech.list(dark))] : []),
  ].join(' ');
}

function columnBlocks(roof: MeasuredRoof, speech: Speech): Block[] {
  const { words } = speech;
  const inUnit = (light: readonly number[]) => light.map((value) => speech.irradiationNumber(value));
  const picture = monthColumns(
    {
      unshaded: inUnit(roof.plane.unshaded.monthly),
      measured: inUnit(arriving(roof)),
      imagined: null,
      ...PICTURE,
    },
    pictureWords(speech),
  );
  return [
    {
      kind: 'picture',
      picture,
      caption: words['columns.caption'](speech.irradiationUnit),
      alternative: words['columns.alternative'](roof.name),
    },
    { kind: 'table', table: monthsTable(roof, speech) },
  ];
}

function monthsTable(roof: MeasuredRoof, speech: Speech): Table {
  const { words } = speech;
  const { unshaded } = roof.plane;
  const light = arriving(roof);
  const inUnit = (value: number) => {
    const shown = speech.irradiationNumber(value);
    return speech.number(shown, shown < 20 ? 1 : 0);
  };
  const share = (value: number | null) => (value === null ? words['sun.no-hours'] : speech.percent(value));
  return {
    caption: words['columns.table-caption'](roof.name, speech.irradiationUnit),
    columns: [
      { head: words['columns.month'] },
      { head: words['columns.open'], number: true },
      { head: words['columns.arrives'], number: true },
      { head: words['columns.share'], number: true },
    ],
    rows: light.map((value, month) => [
      speech.month(month),
      inUnit(unshaded.monthly[month]),
      inUnit(value),
      share(roof.access.monthly[month]),
    ]),
    sums: [
      [
        words['frame.year'],
        inUnit(unshaded.annual),
        inUnit(light.reduce((sum, value) => sum + value, 0)),
        share(roof.access.annual),
      ],
    ],
  };
}
