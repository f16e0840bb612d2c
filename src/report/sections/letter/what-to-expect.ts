import { planeArea } from '../../../core/survey/plane-area.ts';
import type { RoofPlane } from '../../../core/survey/survey.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import type { MeasuredRoof } from './roofs.ts';
import { isClearSky, measuredRoofs, rangeText } from './roofs.ts';

/** Sunlight of a year on each roof, by area and as a whole, with its range. */
export const whatToExpect: SectionKind = {
  id: 'what-to-expect',
  part: 'letter',
  write: (report, speech) => {
    const { words } = speech;
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    const clear = isClearSky(report);
    const answer = words[clear ? 'expect.answer-clear-sky' : 'expect.answer'];
    const notes = [
      words['expect.kwh-means'],
      ...(roofs.some(({ access }) => access.interval) ? [words['expect.range-note']] : []),
      ...(clear ? [words['expect.clear-sky']] : []),
      words['expect.not-power'],
    ];
    return {
      heading: words['expect.heading'],
      blocks: [
        ...roofs.map((roof): Block => ({
          kind: 'answer',
          text: answer(roof.name, speech.irradiation(lightOf(roof))),
        })),
        { kind: 'table', table: lightTable(roofs, report, speech) },
        ...notes.map((text): Block => ({ kind: 'paragraph', text })),
      ],
    };
  },
};

const lightOf = ({ plane, access }: MeasuredRoof) => access.annual * plane.unshaded.annual;

function lightTable(roofs: readonly MeasuredRoof[], { survey }: ReportInput, speech: Speech): Table {
  const { words } = speech;
  const drawn = new Map<string, RoofPlane>(survey.planes.map((plane) => [plane.id, plane]));
  return {
    caption: words['expect.caption'],
    columns: [
      { head: words['expect.roof'] },
      { head: words['expect.light'](speech.irradiationUnit), number: true },
      { head: words['expect.range'], number: true },
      { head: words['expect.size'], number: true },
      { head: words['expect.whole'], number: true },
      { head: words['expect.whole-range'], number: true },
    ],
    rows: roofs.map(({ name, plane, access: { annual, interval } }) => {
      const area = planeArea(drawn.get(plane.id) ?? {});
      const unknown = words['expect.not-known'];
      const light = (share: number) => {
        const amount = speech.irradiationNumber(share * plane.unshaded.annual);
        return speech.number(amount, amount < 10 ? 1 : 0);
      };
      const whole = (share: number) => speech.number(roughly(share * plane.unshaded.annual * (area ?? 0)));
      return [
        name,
        light(annual),
        rangeText(interval, speech, light) ?? unknown,
        area === null ? unknown : speech.area(area),
        area === null ? unknown : whole(annual),
        area === null ? unknown : (rangeText(interval, speech, whole) ?? unknown),
      ];
    }),
  };
}

/** To three figures: a whole roof is not known to the last kWh. */
function roughly(amount: number): number {
  return Number(amount.toPrecision(3));
}
