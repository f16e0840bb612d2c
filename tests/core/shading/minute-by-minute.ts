import { RADIANS, turnBetween } from '../../../src/core/angles/angles.ts';
import { skyViewFactor } from '../../../src/core/horizon/blocked-view.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import type { SettledTrace, TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { skyStates } from '../../../src/core/irradiance/climate.ts';
import { extraterrestrialNormal } from '../../../src/core/irradiance/extraterrestrial.ts';
import { cosZenithOf, dayOf, sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import type { Transposition } from '../../../src/core/transposition/transposition.ts';

/**
 * The same sums without a sky map and without slices: every minute of the year asks of every trace whether it stands
 * before the sun. Only the dome's share is taken from the project's view factor, which has its own closed forms.
 */
export function minuteByMinute(
  site: { latitude: number; longitude: number; altitude: number; utcOffset: number },
  plane: { tilt: number; azimuth: number },
  climate: Climate,
  transposition: Transposition,
  scene: readonly TracedObstruction[],
): { whole: number[]; light: number[] } {
  const track = sunTrack(site, 1);
  const read = climate.over(track);
  const sky = skyStates(climate.stateCount);
  const whole = Array<number>(12).fill(0);
  const light = Array<number>(12).fill(0);
  const seen = skyViewFactor(horizonProfile(scene), plane.tilt, plane.azimuth);
  const openView = (1 + Math.cos(plane.tilt * RADIANS)) / 2;
  const normal = [
    Math.sin(plane.tilt * RADIANS) * Math.sin(plane.azimuth * RADIANS),
    Math.sin(plane.tilt * RADIANS) * Math.cos(plane.azimuth * RADIANS),
    Math.cos(plane.tilt * RADIANS),
  ];
  for (let step = 0; step < track.steps; step++) {
    if (!read(step, sky)) continue;
    const day = dayOf(track, step);
    const month = track.monthOfDay[day];
    const cosZenith = cosZenithOf(track, step);
    const cosine =
      (normal[0] * (track.east[step] + track.east[step + 1]) +
        normal[1] * (track.north[step] + track.north[step + 1]) +
        normal[2] * (track.up[step] + track.up[step + 1])) /
      2;
    const elevation = Math.asin(cosZenith) / RADIANS;
    const turn = turnBetween(track.azimuth[step], track.azimuth[step + 1]);
    const azimuth = (track.azimuth[step] + turn / 2 + 360) % 360;
    const passes = elevation > 0 && cosine > 0 ? passing(scene, azimuth, elevation, month) : 0;
    for (let state = 0; state < climate.stateCount; state++) {
      const energy = sky.weight[state] / 60 / 1000;
      const parts = { circumsolarNormal: 0, dome: 0, band: 0 };
      const dniExtra = extraterrestrialNormal(day + 1);
      transposition.split({ dni: sky.dni[state], dhi: sky.dhi[state], dniExtra, cosZenith }, parts);
      const direct =
        elevation > 0 ? energy * (sky.dni[state] + parts.circumsolarNormal) * Math.max(0, cosine) : 0;
      const ground = energy * sky.ghi[state] * 0.2 * (1 - openView);
      whole[month] += direct + energy * parts.dome * openView + ground;
      light[month] += direct * passes + energy * parts.dome * seen[month] + ground;
    }
  }
  return { whole, light };
}

function passing(
  scene: readonly TracedObstruction[],
  azimuth: number,
  elevation: number,
  month: number,
): number {
  let share = 1;
  for (const { transmittance, traces } of scene)
    if (traces.some((trace) => stands(trace, azimuth, elevation))) share *= transmittance[month];
  return share;
}

function stands(trace: SettledTrace, azimuth: number, elevation: number): boolean {
  const { points, shape } = trace;
  if (shape === 'line')
    return points.some(
      (p, i) => i > 0 && distanceToArc(points[i - 1], p, azimuth, elevation) < trace.angularWidth / 2,
    );
  let crossings = 0;
  const count = shape === 'outline' || trace.fullCircle ? points.length : points.length - 1;
  for (let i = 0; i < count; i++) {
    const edge = elevationOn(points[i], points[(i + 1) % points.length], trace.straight, azimuth);
    if (edge === null) continue;
    if (shape === 'skyline' && elevation < edge) return true;
    if (elevation < edge) crossings++;
  }
  return shape === 'outline' && crossings % 2 === 1;
}

type Point = { azimuth: number; elevation: number };

/** By vectors, not by the tangent rule: the direction in the plane of both ends at this azimuth. */
function elevationOn(a: Point, b: Point, straight: boolean, azimuth: number): number | null {
  const turn = turnBetween(a.azimuth, b.azimuth);
  const at = turnBetween(a.azimuth, azimuth);
  const share = turn === 0 ? -1 : at / turn;
  if (share < 0 || share >= 1) return null;
  if (!straight) return a.elevation + share * (b.elevation - a.elevation);
  const n = cross(vector(a), vector(b));
  const level = n[0] * Math.sin(azimuth * RADIANS) + n[1] * Math.cos(azimuth * RADIANS);
  return Math.atan(-level / n[2]) / RADIANS;
}

function distanceToArc(a: Point, b: Point, azimuth: number, elevation: number): number {
  const [p, q, s] = [vector(a), vector(b), vector({ azimuth, elevation })];
  const n = cross(p, q);
  const size = Math.hypot(...n);
  const aside = dot(n, s) / size;
  const along = dot(cross(n, p), s) >= 0 && dot(cross(q, n), s) >= 0;
  return along ? Math.abs(Math.asin(aside)) / RADIANS : 180;
}

const vector = ({ azimuth, elevation }: Point): [number, number, number] => [
  Math.sin(azimuth * RADIANS) * Math.cos(elevation * RADIANS),
  Math.cos(azimuth * RADIANS) * Math.cos(elevation * RADIANS),
  Math.sin(elevation * RADIANS),
];
const dot = (a: number[], b: number[]) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: number[], b: number[]): [number, number, number] => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
