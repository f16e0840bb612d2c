import type { JsonRecord } from './json-value.ts';
import { LIMITS } from './limits.ts';
import { polygonCrossing } from './outline-crossing.ts';
import type { ProblemList } from './problem-list.ts';
import { pathBelow } from './record-path.ts';
import { rowsOf } from './record-rows.ts';
import type { PlanePoint } from './survey.ts';

/** Adds a problem for each plane whose outline meets itself, or has too many corners to tell. */
export function addPlaneProblems(document: JsonRecord, problems: ProblemList): void {
  for (const { value, path } of rowsOf(document, 'planes')) {
    const corners = rowsOf(value, 'outline', path).map((row) => row.value as unknown as PlanePoint);
    const place = pathBelow(path, 'outline');
    if (corners.length > LIMITS.outlineSightings)
      problems.add(
        place,
        `The outline has ${corners.length} corners; the limit is ${LIMITS.outlineSightings}. Simplify it.`,
      );
    else if (corners.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))) {
      const crossing = polygonCrossing(corners);
      if (crossing)
        problems.add(
          place,
          `The outline crosses or touches itself: its edge after corner ${crossing[0] + 1} meets its edge after corner ${crossing[1] + 1}. Put the corners in order around the edge.`,
        );
    }
  }
}
