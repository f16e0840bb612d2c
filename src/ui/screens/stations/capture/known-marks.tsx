import { bearingFrom, checkMarksOf } from '../../../../app/capture/marks.ts';
import { stationOf } from '../../../../app/capture/station-edits.ts';
import type { HeadingCheck } from '../../../../core/survey/survey.ts';
import type { Sitting } from './sitting.ts';

export interface KnownBearing {
  bearing: number;
  frame: NonNullable<HeadingCheck['frame']>;
}

/**
 * Names given before, each one tap. A bearing is never taken over from another station, where it is another one; what
 * was given at this very station is offered.
 */
export function KnownMarks(props: {
  sitting: Sitting;
  mark: string;
  onMark: (mark: string) => void;
  onBearing?: (known: KnownBearing) => void;
}) {
  const { sitting, mark, onMark, onBearing } = props;
  const { survey } = sitting.session.record;
  const known = checkMarksOf(survey);
  if (known.length === 0) return null;
  const from = onBearing ? bearingFrom(stationOf(survey, sitting.stationId), mark) : null;
  return (
    <div class="mark-row" role="group" aria-label="Named before">
      {known.map((name) => (
        <button key={name} type="button" aria-pressed={name === mark} onClick={() => onMark(name)}>
          {name}
        </button>
      ))}
      {from && (
        <button type="button" onClick={() => onBearing?.(from)}>
          {from.bearing}° as from here before
        </button>
      )}
    </div>
  );
}
