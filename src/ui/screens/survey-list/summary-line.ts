import type { SurveySummary } from '../../../app/survey-store.ts';
import { dayText } from '../../value-text.ts';

function counted(count: number, one: string, many: string): string {
  return `${count}\u00a0${count === 1 ? one : many}`;
}

/** Place, day and what was measured, in one line. */
export function summaryLine({ address, surveyedOn, planes, stations, obstructions }: SurveySummary): string {
  return [
    address,
    surveyedOn && dayText(surveyedOn),
    counted(planes, 'plane', 'planes'),
    counted(stations, 'station', 'stations'),
    counted(obstructions, 'obstruction', 'obstructions'),
  ]
    .filter(Boolean)
    .join(' · ');
}
