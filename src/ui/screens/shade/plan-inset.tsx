import { useMemo } from 'preact/hooks';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { Site } from '../../../core/survey/survey.ts';
import { obstructionShapes } from '../../../report/pictures/horizon-obstructions.ts';
import { planView } from '../../../report/pictures/plan-view.ts';
import { dayLines } from '../../../report/pictures/sun-lines.ts';
import { Drawing } from './drawing.tsx';

interface Props {
  site: Site;
  shade: StationShade;
  names: ReadonlyMap<string, string>;
}

/** The same sky as a small round plan, north up. */
export function PlanInset({ site, shade, names }: Props) {
  const picture = useMemo(
    () =>
      planView({
        shapes: obstructionShapes(shade.profile, names, shade.imaginedProfile),
        days: dayLines(site).slice(0, 2),
        surfaceAzimuth: shade.surfaceTilt < 1 ? null : shade.surfaceAzimuth,
        size: 220,
      }),
    [site, shade, names],
  );
  return (
    <figure class="plan-inset">
      <Drawing
        picture={picture}
        id="plan"
        label={`Plan of the sky, north up: what stands around ${shade.measured.name}`}
      />
      <figcaption class="small">
        On a plan, north up: the rim is the horizon, the middle the zenith. The two lines are the sun on the
        longest and the shortest day{shade.surfaceTilt < 1 ? '' : '; the arrow is the way the plane faces'}.
      </figcaption>
    </figure>
  );
}
