import { turnBetween } from '../angles/angles.ts';
import { standardOffsetMinutes } from '../solar-position/time-zone.ts';
import type { Problem } from './problem.ts';
import { sightingDirection } from './sighting-direction.ts';
import type { Site, Survey, Trace } from './survey.ts';

/** Standard time departs from the sun's by at most about this in any inhabited place, hours. */
const FURTHEST_ZONE = 3.5;

/** What is allowed in a survey and yet looks like a slip. */
export function surveyDoubts(survey: Survey): Problem[] {
  const doubts = zoneDoubts(survey.site);
  survey.stations.forEach(({ traces }, s) =>
    traces.forEach((trace, t) => {
      const why = blocksNothing(trace);
      if (why) doubts.push({ path: `stations[${s}].traces[${t}]`, message: why });
    }),
  );
  return doubts;
}

function zoneDoubts({ longitude, latitude, timeZone }: Site): Problem[] {
  if (Math.abs(latitude) > 85) return []; // near the poles any zone is as good
  const hours = standardOffsetMinutes(timeZone) / 60;
  const apart = Math.abs(turnBetween(longitude, hours * 15)) / 15;
  if (apart <= FURTHEST_ZONE) return [];
  return [
    {
      path: 'site.longitude',
      message: `The sun at longitude ${longitude} is ${apart.toFixed(0)} hours away from the clocks of ${timeZone}. West is negative: check the sign of the longitude, and the time zone.`,
    },
  ];
}

/** Why a trace of typed sightings takes no light at all; null where it may. */
function blocksNothing({ shape, sightings }: Trace): string | null {
  const directions = sightings.map(sightingDirection);
  if (directions.some((direction) => direction === null)) return null;
  const [first, ...others] = directions.map((direction) => direction!);
  const upright = others.every(({ azimuth }) => turnBetween(first.azimuth, azimuth) === 0);
  const point = upright && others.every(({ elevation }) => elevation === first.elevation);
  if (shape === 'line' ? point : upright)
    return shape === 'skyline'
      ? 'All sightings of this skyline stand at one azimuth, so it blocks nothing. Trace a mast as a line with its angular width, or sight both its sides.'
      : `All sightings of this ${shape} stand in one place, so it blocks nothing. Sight its ends apart.`;
  if ([first, ...others].every(({ elevation }) => elevation <= 0))
    return 'This trace lies wholly below the horizontal, so it blocks nothing. Check the signs of its elevations.';
  return null;
}
