import { useMemo } from 'preact/hooks';
import { openPoints } from '../../../core/completeness/open-points.ts';
import type { OpenPoint } from '../../../core/completeness/open-point.ts';
import type { Assessment } from '../../../core/shading/assessment.ts';
import type { ObstructionChange } from '../../../core/shading/what-if.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import type { SectionProps } from '../../section.ts';
import { Fault } from '../shade/fault.tsx';
import { useShade } from '../shade/use-shade.ts';
import { Working } from '../shade/working.tsx';
import { ClimbCaution } from './climb-caution.tsx';
import { PointRow } from './point-row.tsx';
import './climb-down.css';

const NOTHING_IMAGINED: readonly ObstructionChange[] = [];

/** What is missing or weak while somebody is still up there, worst first, each one tap from its cure. */
export function ClimbDownSection({ surveyId, survey, services }: SectionProps) {
  const { working, fault, assessment, cancel, retry } = useShade(services, {
    survey,
    plane: null,
    station: null,
    changes: NOTHING_IMAGINED,
  });
  const points = usePoints(survey, assessment, fault !== null);
  return (
    <div class="stack climb-down">
      <h2>Before you climb down</h2>
      <Working working={working} onCancel={cancel} />
      {fault && <Fault fault={fault} onRetry={retry} />}
      {fault && <p>What follows can be told without figures, so it is not in order of effect.</p>}
      {points ? <Points surveyId={surveyId} points={points} /> : <p>Looking for what is missing…</p>}
      <ClimbCaution />
    </div>
  );
}

/** Null while the figures are being worked out; without figures where they cannot be had. */
function usePoints(survey: Survey, assessment: Assessment | null, isWithout: boolean): OpenPoint[] | null {
  return useMemo(
    () => (assessment || isWithout ? openPoints(survey, assessment) : null),
    [survey, assessment, isWithout],
  );
}

function Points({ surveyId, points }: { surveyId: string; points: readonly OpenPoint[] }) {
  if (points.length === 0)
    return (
      <p class="nothing-missing" role="status">
        <strong>Nothing is missing.</strong> Every plane has its stations, the sun’s band was looked at, and
        the figures are as sure as this survey can make them.
      </p>
    );
  return (
    <>
      <p role="status">
        {points.length === 1 ? 'One point is' : `${points.length} points are`} missing or weak, the worst
        first.
      </p>
      <p class="small faint">
        The numerals say how many percentage points a plane’s yearly solar access may be off by for that
        reason alone, 95 times in 100.
      </p>
      <ol class="open-points" aria-label="Missing or weak, worst first">
        {points.map((point, place) => (
          <PointRow key={place} surveyId={surveyId} point={point} />
        ))}
      </ol>
    </>
  );
}
