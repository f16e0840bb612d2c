import type { SurveySummary } from '../../../app/survey-store.ts';

function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}

/** A calendar day as words of the reader's language; anything else as it stands. */
export function dayText(day: string): string {
  const date = new Date(`${day}T00:00:00Z`);
  return Number.isNaN(date.getTime())
    ? day
    : date.toLocaleDateString(undefined, { dateStyle: 'medium', timeZone: 'UTC' });
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
