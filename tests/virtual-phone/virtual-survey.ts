import { RADIANS, fullCircle, turnBetween } from '../../src/core/angles/angles.ts';
import type { SkyPoint } from '../../src/core/horizon/horizon-edge.ts';
import { magneticDeclination } from '../../src/core/pointing/declination.ts';
import { isUsable, shadowSun } from '../../src/core/pointing/shadow-error.ts';
import type { Reading, Run, Sighting, Station, Survey, Trace } from '../../src/core/survey/survey.ts';
import type { RandomSource } from '../../src/core/uncertainty/random-source.ts';
import { devicePose } from './device-pose.ts';
import type { PhoneNoise } from './phone-noise.ts';
import type { TrueFeature, TrueScene } from './true-scene.ts';

const YEAR_START = Date.UTC(2026, 0, 1);
const SECONDS_A_SIGHTING = 7;

/** Azimuths that were not looked at, clockwise. */
type Gap = { from: number; to: number } | null;

/** What a surveyor does besides sighting: a heading check by shadow or not, and the phone turned over on a mark or not. */
export interface Routine {
  shadow: number;
  twoFace: boolean;
}

export const UNCHECKED: Routine = { shadow: 0, twoFace: false };
export const SHADOW_ONLY: Routine = { shadow: 1, twoFace: false };
/** What the app asks for: a heading check, and this phone turned over on one mark. */
export const ROUTINE: Routine = { shadow: 1, twoFace: true };
/** A heading check at the beginning and at the end, and the phone turned over. */
export const CAREFUL: Routine = { shadow: 2, twoFace: true };

/**
 * One visit to a scene with a noisy phone: a compass reading, a heading check by shadow, a mark to close the horizon with,
 * every obstruction sighted at its corners or along its edge, the mark again. Every other phone has no compass frame,
 * but a compass heading read flat and azimuths that drift.
 */
export function virtualSurvey(
  scene: TrueScene,
  noise: PhoneNoise,
  random: RandomSource,
  name: string,
  routine: Routine = ROUTINE,
): Survey {
  const phone = new VirtualPhone(scene, noise, random);
  const gap = random.uniform() < noise.gapShare ? gapIn(random) : null;
  const skips = random.uniform() < noise.skipShare;
  const checks = [phone.shadowReading()];
  const mark = { azimuth: scene.features[0].edge[1].azimuth, elevation: 5 };
  const first = phone.sight(mark, 'mark');
  const faces = { id: 'faces', upright: phone.face(mark, 0), turned: phone.face(mark, 180) };
  const traces = scene.features.flatMap((feature) =>
    sightedPieces(feature, gap, skips, random).map((points, piece): Trace => ({
      id: `${feature.id} ${piece}`,
      obstruction: feature.id,
      shape: feature.shape,
      ...(feature.fullCircle && gap === null ? { fullCircle: true } : {}),
      ...(feature.angularWidth ? { angularWidth: feature.angularWidth } : {}),
      edge: feature.sightedEvery === 0 ? 'straight' : 'drawn',
      sightings: points.map((point) => phone.sight(point)),
    })),
  );
  const last = phone.sight(mark, 'mark');
  checks.push(phone.shadowReading());
  const station: Station = {
    id: 'A',
    name: 'Station A',
    serves: [scene.plane.id],
    observedOpen: gap ? [[gap.to, gap.from]] : [[0, 360]],
    headingChecks: checks
      .slice(0, routine.shadow)
      .map(({ id }, i) => ({ id: `check ${i}`, method: 'sun-shadow', reading: id })),
    indexChecks: routine.twoFace ? [faces] : [],
    markSightings: [first, last],
    traces,
  };
  return {
    format: 'noonmark-survey',
    version: 1,
    id: name,
    title: scene.name,
    site: scene.site,
    climate: { source: 'world' },
    planes: [scene.plane],
    obstructions: scene.features.map(({ id, kind }) => ({ id, name: id, kind })),
    runs: [phone.run],
    readings: phone.readings,
    stations: [station],
  };
}

class VirtualPhone {
  readonly readings: Reading[] = [];
  readonly run: Run;
  private timeMs: number;
  private readonly startMs: number;
  private readonly hasCompassFrame: boolean;
  /** True azimuth less azimuth in the frame at the start, degrees. */
  private readonly offset: number;
  private readonly drift: number;
  private readonly index: number;
  private readonly indexFixed: number;
  private readonly compassOffset: number;
  private readonly clockMs: number;
  private sightings = 0;

  constructor(
    private readonly scene: TrueScene,
    private readonly noise: PhoneNoise,
    private readonly random: RandomSource,
  ) {
    this.startMs = this.timeMs = usableInstant(scene, random);
    this.hasCompassFrame = random.uniform() < 0.5;
    const { declination } = magneticDeclination({ ...scene.site, timeMs: this.startMs });
    this.compassOffset = declination + compassBias(noise, random);
    this.offset = this.hasCompassFrame ? this.compassOffset : 360 * random.uniform();
    this.drift = this.hasCompassFrame ? 0 : noise.drift * noise.draw(random);
    this.index = noise.index * noise.draw(random);
    this.indexFixed = noise.indexFixed * noise.draw(random);
    this.clockMs = 60_000 * noise.clockMinutes * noise.draw(random);
    this.run = {
      id: 'run',
      device: 'virtual phone',
      frame: this.hasCompassFrame ? 'magnetic' : 'relative',
      startedAt: this.stamp(),
    };
  }

  /** The top edge laid along the shadow of an upright edge, the phone flat; its compass is read with it. */
  shadowReading(): Reading {
    const { noise, random, scene } = this;
    const { solarAzimuth, apparentElevation } = shadowSun(this.timeMs, scene.site);
    const leaning = noise.lean * noise.draw(random) * Math.tan(apparentElevation * RADIANS);
    const azimuth = solarAzimuth + 180 + leaning + noise.shadow * noise.draw(random);
    const pose = devicePose(
      'top-edge',
      { azimuth: this.inFrame(azimuth), elevation: 0 },
      2 * random.normal(),
    );
    const compass = this.hasCompassFrame
      ? {}
      : { compassHeading: fullCircle(azimuth - this.compassOffset), compassAccuracy: 5 };
    return this.keep({ ...pose, ...compass, axis: 'top-edge' });
  }

  sight(point: SkyPoint, mark?: string): Sighting {
    const reading = this.face(point, 0);
    return { id: `s${this.sightings++}`, reading, ...(mark ? { mark } : {}) };
  }

  /** A reading of the camera, the phone turned about its axis; the index turns with it, but for a small part. */
  face({ azimuth, elevation }: SkyPoint, turn: number): string {
    const { noise, random } = this;
    const index = this.index * Math.cos(turn * RADIANS) + this.indexFixed;
    const aimed = {
      azimuth: this.inFrame(azimuth + (noise.tremor * noise.draw(random)) / Math.cos(elevation * RADIANS)),
      elevation: Math.min(89.9, elevation + index + noise.tremor * noise.draw(random)),
    };
    return this.keep(devicePose('camera', aimed, turn + 2 * random.normal())).id;
  }

  private inFrame(azimuth: number): number {
    const minutes = (this.timeMs - this.startMs) / 60_000;
    return azimuth - this.offset - this.drift * minutes;
  }

  private keep(reading: Omit<Reading, 'id' | 'run' | 'takenAt'>): Reading {
    const kept = { id: `r${this.readings.length}`, run: 'run', takenAt: this.stamp(), ...reading };
    this.readings.push(kept);
    this.timeMs += 1000 * SECONDS_A_SIGHTING;
    return kept;
  }

  private stamp(): string {
    return new Date(this.timeMs + this.clockMs).toISOString();
  }
}

function compassBias(noise: PhoneNoise, random: RandomSource): number {
  const usual = noise.compass * noise.draw(random);
  const far = (10 + (noise.outlierReach - 10) * random.uniform()) * (random.uniform() < 0.5 ? -1 : 1);
  return random.uniform() < noise.outlierShare ? far : usual;
}

/** A moment of the year with a sun that a heading check by shadow may use. */
function usableInstant({ site }: TrueScene, random: RandomSource): number {
  for (;;) {
    const timeMs = YEAR_START + Math.floor(365 * 1440 * random.uniform()) * 60_000;
    if (isUsable(shadowSun(timeMs, site))) return timeMs;
  }
}

function gapIn(random: RandomSource): { from: number; to: number } {
  const from = 360 * random.uniform();
  return { from, to: fullCircle(from + 5 + 7 * random.uniform()) };
}

/**
 * The points of a feature that are sighted, in pieces where the edge goes through what was not looked at: up to there it was
 * followed.
 */
function sightedPieces(feature: TrueFeature, gap: Gap, skips: boolean, random: RandomSource): SkyPoint[][] {
  const { edge, sightedEvery, fullCircle: whole } = feature;
  if (sightedEvery === 0) return [edge];
  const points = alongEdge(feature, random);
  const sighted = new Set(skips ? withSkip(points, random) : points);
  if (!gap) return [[...sighted]];
  const width = turnFrom(gap.from, gap.to);
  const isHidden = edge.map(({ azimuth }) => turnFrom(gap.from, azimuth) <= width);
  const pieces: SkyPoint[][] = [[]];
  edge.forEach((point, i) => {
    if (isHidden[i]) pieces.push([]);
    else if (sighted.has(point) || isHidden[i - 1] || isHidden[i + 1]) pieces[pieces.length - 1].push(point);
  });
  if (whole && pieces.length > 1) pieces[0] = [...pieces.pop()!, ...pieces[0]];
  return pieces.filter((piece) => piece.length > 1);
}

/** Points of a rough edge about `sightedEvery` degrees apart on the sky, its ends always. */
function alongEdge({ edge, sightedEvery, fullCircle: whole }: TrueFeature, random: RandomSource): SkyPoint[] {
  const points = [edge[0]];
  let left = sightedEvery * random.uniform();
  for (let i = 1; i < edge.length - 1; i++) {
    left -= stepBetween(edge[i - 1], edge[i]);
    if (left > 0) continue;
    points.push(edge[i]);
    left = sightedEvery * (0.7 + 0.6 * random.uniform());
  }
  return whole ? points : [...points, edge[edge.length - 1]];
}

const stepBetween = (a: SkyPoint, b: SkyPoint) =>
  Math.hypot(turnBetween(a.azimuth, b.azimuth) * Math.cos(a.elevation * RADIANS), b.elevation - a.elevation);

/** Leaves out the inner points of 10° to 20° of an edge. */
function withSkip(points: SkyPoint[], random: RandomSource): SkyPoint[] {
  const from = points[Math.floor(points.length * random.uniform())].azimuth;
  const width = 10 + 10 * random.uniform();
  return points.filter(
    ({ azimuth }, i) => i === 0 || i === points.length - 1 || turnFrom(from, azimuth) > width,
  );
}

const turnFrom = (from: number, to: number) => fullCircle(to - from);
