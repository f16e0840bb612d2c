import type { PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { Table } from '../../contents/report-contents.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** Stations side by side in one table. */
const MOST_COLUMNS = 5;

/** Irradiation and access of each plane and station by month. */
export const monthTables: SectionKind = {
  id: 'month-tables',
  part: 'evidence',
  write: ({ assessment }, speech) => {
    const blocks = assessment.planes.flatMap((plane) =>
      tablesOf(plane, speech).map((table) => ({ kind: 'table' as const, table })),
    );
    return blocks.length > 0 ? { heading: speech.words['months.heading'], blocks } : null;
  },
};

function tablesOf(plane: PlaneAssessment, speech: Speech): Table[] {
  const { words } = speech;
  const share = (value: number | null) => (value === null ? '–' : speech.percent(value, 1));
  const unshaded = [...plane.unshaded.monthly, plane.unshaded.annual].map((light) => speech.number(light, 1));
  const labels = [...Array.from({ length: 12 }, (_, month) => speech.month(month)), words['months.year']];
  const parts = chunks(plane.stations, MOST_COLUMNS);
  return parts.map((stations) => {
    const rows = labels.map((label, i) => [
      label,
      unshaded[i],
      ...stations.map(({ solarAccess: { monthly, annual } }) => share(i < 12 ? monthly[i] : annual)),
    ]);
    return {
      caption: words['months.caption'](shownText(plane.name)),
      columns: [
        { head: words['months.month'] },
        { head: words['months.unshaded'], number: true },
        ...stations.map(({ name }) => ({ head: shownText(name, 40), number: true })),
      ],
      rows: rows.slice(0, 12),
      sums: rows.slice(12),
    };
  });
}

/** At least one part, so that a plane without stations shows its light. */
function chunks<T>(list: readonly T[], size: number): T[][] {
  const parts = Array.from({ length: Math.ceil(list.length / size) }, (_, i) =>
    list.slice(i * size, (i + 1) * size),
  );
  return parts.length > 0 ? parts : [[]];
}
