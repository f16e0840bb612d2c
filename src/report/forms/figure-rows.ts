import type { ReportInput, Thresholds } from '../report-input.ts';
import { shownText } from '../shown-text.ts';
import { assessmentFigures } from './assessment-figures.ts';
import { fieldFigures, obstructionNameOf } from './field-figures.ts';
import type { FigureRow } from './figure-row.ts';
import { figure } from './figure-row.ts';
import { prospectFigures } from './prospect-figures.ts';

const ASKED = [
  ['solarAccess', 'asked-solar-access'],
  ['orientationFactor', 'asked-orientation-factor'],
  ['product', 'asked-product'],
] as const satisfies readonly (readonly [keyof Thresholds, FigureRow['quantity']])[];

/** Every figure of a report: what was found, what changes would bring, what it is compared with, what was measured. */
export function figuresOf(report: ReportInput): FigureRow[] {
  const { assessment, planes, compared, choices } = report;
  const nameOf = obstructionNameOf(report);
  return [
    ...assessmentFigures(assessment, ''),
    ...assessment.planes.flatMap((plane, i) => prospectFigures(plane, planes[i], nameOf)),
    ...ASKED.flatMap(([asked, quantity]) => {
      const least = choices.thresholds[asked];
      return least === undefined ? [] : figure({}, quantity, least);
    }),
    ...(compared ? assessmentFigures(compared.assessment, shownText(compared.name)) : []),
    ...fieldFigures(report),
  ];
}
