// Writes public/practice-recording.json: npx tsx tests/sensors/practice-recording.ts
// The movements are those of a simulated phone with a hand's tremor and a compass that is 4° off; no device was at hand.
import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { PRACTICE_SITE } from '../../src/app/capture/practice-place.ts';
import { fullCircle, turnBetween } from '../../src/core/angles/angles.ts';
import { magneticDeclination } from '../../src/core/pointing/declination.ts';
import { solarPosition } from '../../src/core/solar-position/solar-position.ts';
import type { ReadingSample } from '../../src/core/survey/survey.ts';
import type { RecordedPart, Recordings, RecordedStream } from '../../src/sensors/recorded-stream.ts';
import { cameraAt, laidOn, topEdgeAt } from './posed-phone.ts';

const STARTED_AT = '2026-05-14T07:30:00.000Z';
const STEP_MS = 50;
const COMPASS_OFF = 4;
const STARTED_MS = Date.parse(STARTED_AT);

type Hold = 'camera' | 'edge';
interface Pose {
  azimuth: number;
  elevation: number;
  hold: Hold;
}

/** Numbers that look like chance and are the same each time (Park and Miller's generator, Lehmer's method). */
function seeded(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

const chance = seeded(20260514);
const normal = () => Math.sqrt(-2 * Math.log(chance())) * Math.cos(2 * Math.PI * chance());

/** A hand's tremor: it wanders about its middle by some tenths of a degree. */
function tremor(size: number): () => number {
  let at = 0;
  return () => (at = 0.85 * at + size * Math.sqrt(1 - 0.85 ** 2) * normal());
}

const { declination } = magneticDeclination({ ...PRACTICE_SITE, timeMs: STARTED_MS });
/** True azimuth as the compass of the simulated phone has it. */
const asRead = (azimuth: number) => fullCircle(azimuth - declination + COMPASS_OFF);
const tenth = (angle: number) => Math.round(angle * 10) / 10;

function angles({ azimuth, elevation, hold }: Pose) {
  return hold === 'camera' ? cameraAt(asRead(azimuth), elevation) : topEdgeAt(asRead(azimuth), elevation);
}

const shake = { azimuth: tremor(0.12), elevation: tremor(0.12) };

function row(ms: number, pose: Pose): ReadingSample {
  const level = Math.max(0.2, Math.cos((pose.elevation * Math.PI) / 180));
  const shaken = {
    ...pose,
    azimuth: pose.azimuth + shake.azimuth() / level,
    elevation: pose.elevation + shake.elevation(),
  };
  const { alpha, beta, gamma } = angles(shaken);
  return [ms, tenth(fullCircle(alpha)) % 360, tenth(beta), tenth(gamma)];
}

const eased = (share: number) => share * share * (3 - 2 * share);

function between(from: Pose, to: Pose, share: number): Pose {
  return {
    hold: to.hold,
    azimuth: fullCircle(from.azimuth + turnBetween(from.azimuth, to.azimuth) * share),
    elevation: from.elevation + (to.elevation - from.elevation) * share,
  };
}

/** A way through some poses, `seconds` each, then a rest of some seconds in the last. */
function part(cue: string, poses: Pose[], seconds: number): RecordedPart {
  const rows: ReadingSample[] = [];
  const steps = Math.round((seconds * 1000) / STEP_MS);
  for (let leg = 1; leg < poses.length; leg++)
    for (let step = 0; step < steps; step++) {
      // only the ends of the way are eased, so that a sweep does not stop at every corner
      const share = poses.length === 2 ? eased(step / steps) : step / steps;
      rows.push(row(rows.length * STEP_MS, between(poses[leg - 1], poses[leg], share)));
    }
  const restFrom = rows.length;
  for (let step = 0; step < 2000 / STEP_MS; step++) rows.push(row(rows.length * STEP_MS, poses.at(-1)!));
  return { cue, rows, restFrom };
}

const look = (azimuth: number, elevation: number): Pose => ({ azimuth, elevation, hold: 'camera' });

function sighting(): RecordedStream {
  const sun = solarPosition(
    STARTED_MS + 40_000,
    PRACTICE_SITE.latitude,
    PRACTICE_SITE.longitude,
    PRACTICE_SITE.altitude,
  );
  const shadow: Pose = { azimuth: fullCircle(sun.solarAzimuth + 180), elevation: 0, hold: 'edge' };
  const tip = look(152, 17);
  const maple = [
    [196, 5],
    [198, 13],
    [203, 20],
    [209, 24.5],
    [215, 23],
    [220, 17],
    [224, 11],
    [227, 5],
  ].map(([azimuth, elevation]) => look(azimuth, elevation));
  const [foot, ...crown] = maple;
  return {
    title: 'Sighting from a station',
    device: 'Practice recording (simulated phone)',
    kind: 'magnetic',
    startedAt: STARTED_AT,
    parts: [
      part('The phone lies along the shadow of a post. Choose Heading, then Take the shadow.', [shadow], 1),
      part(
        'It looks east, low over the meadow. Choose Open, then Open from here on.',
        [look(60, 3), look(62, 2)],
        2,
      ),
      part(
        'It has turned to the neighbour’s roof. Tap Open up to here.',
        [look(62, 2), look(90, 1), look(117, 2)],
        2,
      ),
      part(
        'It points at the left end of the neighbour’s ridge. Choose Trace, Straight edge, then One end.',
        [look(117, 2), look(118, 14)],
        2,
      ),
      part(
        'It points at the other end of the ridge, the gable tip. Tap Other end, and say that it is a building.',
        [look(118, 14), tip],
        3,
      ),
      part('Still the gable tip. Choose Mark, name it, and sight it.', [tip, tip], 1),
      part(
        'It points at the left foot of a maple. Choose Trace, Sweep, then Start sweep, and Go on.',
        [tip, foot],
        3,
      ),
      part(
        'It has followed the maple’s crown to its right foot. Tap End sweep, and say that it is a deciduous tree.',
        [foot, ...crown],
        1.2,
      ),
      part(
        'West of the maple all is open. Choose Open, then Open from here on.',
        [look(227, 5), look(229, 3)],
        1,
      ),
      part(
        'It has turned to the north-west. Tap Open up to here.',
        [look(229, 3), look(265, 2), look(300, 2)],
        2,
      ),
      part(
        'The gap between gable and maple: nothing stands there. Choose Open, and call the whole gap open.',
        [look(300, 2), look(235, 6), look(175, 6)],
        2,
      ),
      part(
        'Back at the gable tip, a minute or more later. Choose Mark, and sight it again: the horizon is closed.',
        [look(175, 6), tip],
        2,
      ),
    ],
  };
}

/** The phone put to a plane; its own sensor leans by 0.6° towards its top. */
function plane(): RecordedStream {
  const lying =
    (turned: boolean) =>
    (ms: number): ReadingSample => {
      const { alpha, beta, gamma } = laidOn(32, asRead(183), turned);
      return [
        ms,
        tenth(alpha + 0.1 * normal()),
        tenth(beta + 0.6 + 0.03 * normal()),
        tenth(gamma + 0.03 * normal()),
      ];
    };
  const still = (cue: string, turned: boolean): RecordedPart => {
    const rows = Array.from({ length: 40 }, (_, i) => lying(turned)(i * STEP_MS));
    return { cue, rows, restFrom: 1 };
  };
  return {
    title: 'Measuring a plane',
    device: 'Practice recording (simulated phone)',
    kind: 'magnetic',
    startedAt: STARTED_AT,
    parts: [
      still('The phone lies on a board along the slope. Take the placing.', false),
      still('It has been turned end for end. Take the placing again: its own error cancels.', true),
      part(
        'It looks along the eave from its left end. Choose Eave or ridge, then sight the edge.',
        [look(92, 1), look(93, 0.5)],
        1,
      ),
    ],
  };
}

const recordings: Recordings = { sighting: sighting(), plane: plane() };
const path = fileURLToPath(new URL('../../public/practice-recording.json', import.meta.url));
writeFileSync(path, `${JSON.stringify(recordings)}\n`);
