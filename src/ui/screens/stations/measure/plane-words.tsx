import type { PlaneAngle, PointedPlane } from '../../../../core/pointing/pointed-survey.ts';
import type { RoofPlane } from '../../../../core/survey/survey.ts';
import { within } from '../heading-words.ts';

const times = (count: number, one: string) => `${count} ${count === 1 ? one : `${one}s`}`;

function tiltWords({ count, scatter, standardDeviation, bothWays }: PlaneAngle): string {
  const spread = count > 1 ? `, scatter ${scatter.toFixed(1)}°` : '';
  const turn = bothWays ? 'both ways round' : 'one way round only: turn the phone and take it again';
  return `${within(standardDeviation)} from ${times(count, 'placing')}${spread}, ${turn}.`;
}

function azimuthWords({ count, scatter, standardDeviation }: PlaneAngle): string {
  const spread = count > 1 ? `, scatter ${scatter.toFixed(1)}°` : '';
  return `${within(standardDeviation)} from ${times(count, 'sighting')}${spread}.`;
}

/** What the plane has, and from what. */
export function PlaneWords({ plane, found }: { plane: RoofPlane; found: PointedPlane | null }) {
  const sighted = (plane.azimuthSightings ?? []).length > 0;
  return (
    <dl class="plane-words">
      <div>
        <dt>Tilt</dt>
        <dd>
          <strong>{plane.surfaceTilt.toFixed(1)}°</strong>{' '}
          {found?.tilt ? tiltWords(found.tilt) : 'as typed; not measured with the phone.'}
        </dd>
      </div>
      <div>
        <dt>Facing</dt>
        <dd>
          <strong>{plane.surfaceAzimuth.toFixed(1)}°</strong>{' '}
          {found?.azimuth && sighted ? azimuthWords(found.azimuth) : 'as typed; not sighted with the phone.'}
        </dd>
      </div>
    </dl>
  );
}
