import { RADIANS } from '../angles/angles.ts';
import { horizonProfile } from '../horizon/horizon-profile.ts';
import { skyViewFactor } from '../horizon/blocked-view.ts';
import type { TracedObstruction } from '../horizon/traced-obstruction.ts';
import type { Months } from '../survey/survey.ts';
import type { CheckRow, SelfCheckGroup } from './check-row.ts';
import { checkValue } from './check-row.ts';

const cos = (angle: number) => Math.cos(angle * RADIANS);
const sin = (angle: number) => Math.sin(angle * RADIANS);

/** A drawn edge at one elevation through azimuths. */
function edge(azimuths: number[], elevation: number, fullCircle: boolean, passes = 0): TracedObstruction[] {
  const points = azimuths.map((azimuth) => ({ azimuth, elevation }));
  const trace = { shape: 'skyline' as const, straight: false, fullCircle, angularWidth: 0, points };
  return [{ id: 'edge', transmittance: Array<number>(12).fill(passes) as Months, traces: [trace] }];
}

const ring = (elevation: number, passes = 0) => edge([0, 90, 180, 270], elevation, true, passes);
const southWall = () => edge([90, 180, 270], 90, false);
const northWall = () => edge([270, 0, 90], 90, false);

function row(name: string, obstructions: TracedObstruction[], tilt: number, published: number): CheckRow {
  const computed = skyViewFactor(horizonProfile(obstructions), tilt, 0)[0];
  return checkValue({
    name,
    quantity: 'sky-view factor',
    unit: '',
    decimals: 5,
    published,
    computed,
    allowed: 0.0002,
  });
}

/** Views of the sky that have a closed form; the planes face north. */
export function skyViewCheck(): SelfCheckGroup {
  return {
    id: 'sky-view',
    title: 'How much sky a plane sees',
    source:
      'Closed forms of the view of an even sky: Liu and Jordan, Solar Energy 7 (1963), for the open sky; the masked ones by integration over the sphere',
    allowance: 'Allowed: 0.0002 of the whole sky.',
    rows: [
      ...[0, 20, 45, 90].map((tilt) => row(`open sky, tilt ${tilt}°`, [], tilt, (1 + cos(tilt)) / 2)),
      ...[5, 20, 45].map((high) => row(`${high}° all around, flat`, ring(high), 0, cos(high) ** 2)),
      row('30° all around, tilt 20°', ring(30), 20, cos(20) * cos(30) ** 2),
      row('60° all around, tilt 45°', ring(60), 45, cos(45) * cos(60) ** 2),
      row('20° all around that lets 0.7 pass, flat', ring(20, 0.7), 0, cos(20) ** 2 + 0.7 * sin(20) ** 2),
      ...[30, 60].map((tilt) =>
        row(`wall behind, tilt ${tilt}°`, southWall(), tilt, (sin(tilt) + cos(tilt)) / 2),
      ),
      ...[30, 60].map((tilt) => row(`wall in front, tilt ${tilt}°`, northWall(), tilt, (1 - sin(tilt)) / 2)),
    ],
  };
}
