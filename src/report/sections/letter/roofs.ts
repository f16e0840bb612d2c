import type { PlaneEvidence } from '../../../core/assessment/survey-evidence.ts';
import type { AccessInterval, PlaneAccess, PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';

/** What takes less than this of the year's light is not worth a sentence to a homeowner. */
export const NOTICEABLE = 0.005;

/** A roof plane as the letter speaks of it. */
export interface Roof {
  name: string;
  plane: PlaneAssessment;
  evidence: PlaneEvidence;
}

/** A roof from which somebody measured. */
export interface MeasuredRoof extends Roof {
  access: PlaneAccess;
}

export const roofsOf = ({ assessment, planes }: ReportInput): Roof[] =>
  assessment.planes.map((plane, i) => ({ name: shownText(plane.name), plane, evidence: planes[i] }));

export const measuredRoofs = (report: ReportInput): MeasuredRoof[] =>
  roofsOf(report).flatMap((roof) =>
    roof.plane.solarAccess ? [{ ...roof, access: roof.plane.solarAccess }] : [],
  );

/** Names of obstructions by id, as they may be shown. */
export function obstructionNames({ survey }: ReportInput): (id: string) => string {
  const names = new Map(survey.obstructions.map(({ id, name }) => [id, shownText(name, 60)]));
  return (id) => names.get(id) ?? shownText(id, 60);
}

/** The ends of a range written out; null where none was worked out. */
export function rangeText(
  interval: Pick<AccessInterval, 'low' | 'high'> | undefined,
  speech: Speech,
  write: (share: number) => string,
): string | null {
  return interval ? speech.range(write(interval.low), write(interval.high)) : null;
}

/** A small share with a decimal, a larger one without. */
export const smallShare = (share: number, speech: Speech): string =>
  speech.percent(share, share < 0.0995 ? 1 : 0);

export const isClearSky = ({ assessment }: ReportInput): boolean => assessment.climate.source === 'clear-sky';
