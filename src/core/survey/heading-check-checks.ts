import type { JsonRecord } from './json-value.ts';
import type { ProblemList } from './problem-list.ts';
import { pathBelow } from './record-path.ts';
import { rowsOf } from './record-rows.ts';

/** Adds a problem for each check that has a shadow's length or its height without the other. */
export function addHeadingCheckProblems(document: JsonRecord, problems: ProblemList): void {
  for (const station of rowsOf(document, 'stations'))
    for (const { value, path } of rowsOf(station.value, 'headingChecks', station.path)) {
      const hasHeight = value.shadowHeight !== undefined;
      if (hasHeight === (value.shadowLength !== undefined)) continue;
      problems.add(
        pathBelow(path, hasHeight ? 'shadowLength' : 'shadowHeight'),
        `The check has the ${hasHeight ? 'height of what throws the shadow, but not the shadow’s length' : 'shadow’s length, but not the height of what throws it'}. Give both, or neither.`,
      );
    }
}
