import type { PlaneEvidence } from '../../core/assessment/survey-evidence.ts';
import type { PlaneAssessment } from '../../core/shading/assessment.ts';
import type { ObstructionProspects } from '../../core/shading/prospects.ts';
import type { ObstructionTimes } from '../../core/shading/shade-times.ts';
import { DAYS_IN_MONTH } from '../../core/solar-position/sun-track.ts';
import { shownText } from '../shown-text.ts';
import { obstructionSubject } from './assessment-figures.ts';
import type { FigureRow, Subject } from './figure-row.ts';
import { figure, monthPeriod } from './figure-row.ts';

type NameOf = (id: string) => string;

/** What removing, cutting and growing would change for a plane, and when its darkest station lies in shade. */
export function prospectFigures(
  plane: PlaneAssessment,
  { prospects, lowest }: PlaneEvidence,
  nameOf: NameOf,
): FigureRow[] {
  const at: Subject = { plane: shownText(plane.name), plane_id: plane.id };
  const station = plane.stations.find(({ id }) => id === lowest?.id);
  const there = { ...at, station: shownText(station?.name ?? ''), station_id: station?.id ?? '' };
  return [
    ...prospects.obstructions.flatMap((one) =>
      changeFigures(
        one,
        { ...at, period: 'year', ...obstructionSubject([one.id], nameOf) },
        plane.unshaded.annual,
      ),
    ),
    ...prospects.groups.map(({ obstructions, gainIfAllRemoved }) =>
      figure(
        { ...at, period: 'year', ...obstructionSubject(obstructions, nameOf) },
        'gain-if-all-removed',
        gainIfAllRemoved,
      ),
    ),
    ...(lowest?.times ?? []).flatMap((one) =>
      shadeFigures(one, { ...there, ...obstructionSubject([one.obstruction], nameOf) }),
    ),
  ];
}

function changeFigures(
  { gainIfRemoved, lossIfAlone, lower, clear, grown }: ObstructionProspects,
  of: Subject,
  unshaded: number,
): FigureRow[] {
  const changed = (by: number) => ({ ...of, change_m: by });
  return [
    figure(of, 'gain-if-removed', gainIfRemoved),
    figure(of, 'light-if-removed', gainIfRemoved * unshaded, 'kWh/m2'),
    figure(of, 'loss-if-alone', lossIfAlone),
    ...lower.flatMap(({ by, gain }) => [
      figure(changed(by), 'gain-if-lower', gain),
      figure(changed(by), 'light-if-lower', gain * unshaded, 'kWh/m2'),
    ]),
    ...(clear
      ? [
          figure(changed(clear.by), 'gain-if-cut-clear', clear.gain),
          figure(changed(clear.by), 'light-if-cut-clear', clear.gain * unshaded, 'kWh/m2'),
        ]
      : []),
    ...grown.map(({ by, loss }) => figure(changed(by), 'loss-if-grown', loss)),
  ];
}

function shadeFigures({ months, stretches }: ObstructionTimes, of: Subject): FigureRow[] {
  return [
    ...months.flatMap((spans, month) =>
      spans.flatMap(({ from, to }, i) => {
        const at = { ...of, period: `${monthPeriod(month)} day 21 span ${i + 1}` };
        return [figure(at, 'shade-from', from, 'minute of day'), figure(at, 'shade-to', to, 'minute of day')];
      }),
    ),
    ...stretches.flatMap(({ from, to, longest }, i) => {
      const at = { ...of, period: `stretch ${i + 1}` };
      return [
        figure(at, 'shade-first-day', dayNumber(from), 'day of year'),
        figure(at, 'shade-last-day', dayNumber(to), 'day of year'),
        figure(at, 'shade-longest-day', dayNumber(longest), 'day of year'),
        figure(at, 'shade-longest', longest.minutes, 'minutes'),
      ];
    }),
  ];
}

/** 1 to 365. */
const dayNumber = ({ month, day }: { month: number; day: number }): number =>
  DAYS_IN_MONTH.slice(0, month).reduce((sum, days) => sum + days, day);
