import { isEmpty } from '../../../../core/completeness/kinds/station-empty.ts';
import { navigate } from '../../../router.ts';
import type { SectionProps } from '../../../section.ts';
import type { Station } from '../../../../core/survey/survey.ts';
import { newStationPath } from '../station-path.ts';
import { unseenRanges } from '../strip/unseen-in-band.ts';
import type { LiveAccess } from '../strip/use-live-access.ts';
import type { Sitting } from './sitting.ts';

const CHECKED = new Set(['check', 'tied', 'shared']);

/** Once all of the sun's band is seen and the heading is checked: the way on, in one tap. */
export function NextStation(
  props: Pick<SectionProps, 'surveyId'> & { sitting: Sitting; station: Station; live: LiveAccess },
) {
  const { surveyId, sitting, station, live } = props;
  const { session, sweep, points } = sitting;
  const heading = session.pointed.value && session.runNow?.heading;
  const isAtWork =
    session.phase.value !== 'idle' ||
    sitting.open.looking.value ||
    points.trace.value !== null ||
    points.waiting().length > 0 ||
    sweep.unfinished() !== null;
  if (isAtWork || isEmpty(station) || !heading || !CHECKED.has(heading.source)) return null;
  if (!live.found || live.stale || unseenRanges(live.found.unseen).length > 0) return null;
  return (
    <button type="button" onClick={() => navigate(newStationPath(surveyId))}>
      Next station
    </button>
  );
}
