import type { SkyPoint } from '../../src/core/horizon/horizon-edge.ts';
import type { TracedObstruction } from '../../src/core/horizon/traced-obstruction.ts';
import { monthlyTransmittance } from '../../src/core/survey/obstruction-kinds.ts';
import type { ObstructionKind, RoofPlane, Site } from '../../src/core/survey/survey.ts';
import { randomSource } from '../../src/core/uncertainty/random-source.ts';

/** A made-up place as it truly is. */
export interface TrueScene {
  name: string;
  site: Site;
  plane: RoofPlane;
  features: TrueFeature[];
}

/** One thing that stands around, and the points of it that a surveyor sights. */
export interface TrueFeature {
  id: string;
  kind: ObstructionKind;
  shape: 'skyline' | 'outline' | 'line';
  fullCircle?: boolean;
  angularWidth?: number;
  /** Its true edge; for a rough edge a point every half degree. */
  edge: SkyPoint[];
  /** A rough edge is sighted every so many degrees along it on the sky; 0: at every corner. */
  sightedEvery: number;
}

const corners = (...pairs: [number, number][]): SkyPoint[] =>
  pairs.map(([azimuth, elevation]) => ({ azimuth: (azimuth + 360) % 360, elevation }));

/** Something built: straight between its corners, every corner sighted. */
export const built = (id: string, kind: ObstructionKind, ...pairs: [number, number][]): TrueFeature => ({
  id,
  kind,
  shape: 'skyline',
  edge: corners(...pairs),
  sightedEvery: 0,
});

export const closed = (id: string, kind: ObstructionKind, ...pairs: [number, number][]): TrueFeature => ({
  ...built(id, kind, ...pairs),
  shape: 'outline',
});

export const line = (
  id: string,
  kind: ObstructionKind,
  angularWidth: number,
  ...pairs: [number, number][]
): TrueFeature => ({ ...built(id, kind, ...pairs), shape: 'line', angularWidth });

/** A crown that stands on the ground: half an ellipse, ragged by waves of 2° to 20°. */
export function crown(
  id: string,
  kind: ObstructionKind,
  azimuth: number,
  halfWidth: number,
  height: number,
): TrueFeature {
  const ragged = waves(id, height * 0.03);
  const count = Math.round(4 * halfWidth);
  const edge = Array.from({ length: count + 1 }, (_, i) => {
    const at = -1 + (2 * i) / count;
    const round = Math.sqrt(Math.max(0, 1 - at * at));
    const elevation = height * (0.25 + 0.75 * round) + ragged(at * halfWidth) * round;
    return { azimuth: (azimuth + at * halfWidth + 360) % 360, elevation };
  });
  return { id, kind, shape: 'skyline', edge, sightedEvery: 5 };
}

/** A hill or a wood through given points, smooth between them, with waves of `rough` degrees on it. */
export function ridge(
  id: string,
  kind: ObstructionKind,
  rough: number,
  sightedEvery: number,
  ...pairs: [number, number][]
): TrueFeature {
  const whole = pairs[pairs.length - 1][0] - pairs[0][0] >= 360;
  const ragged = waves(id, rough);
  const edge: SkyPoint[] = [];
  const end = pairs[pairs.length - 1][0];
  for (let azimuth = pairs[0][0]; whole ? azimuth < end : azimuth <= end; azimuth += 0.5) {
    const i = Math.max(
      1,
      pairs.findIndex(([from]) => from >= azimuth),
    );
    const [[a, low], [b, high]] = [pairs[i - 1], pairs[i]];
    const share = (1 - Math.cos((Math.PI * (azimuth - a)) / (b - a))) / 2;
    edge.push({
      azimuth: (azimuth + 360) % 360,
      elevation: Math.max(0.5, low + share * (high - low) + ragged(azimuth)),
    });
  }
  return { id, kind, shape: 'skyline', fullCircle: whole, edge, sightedEvery };
}

/** A ragged line of standard deviation `size`: waves whose height grows with their length, whole in 360°. */
function waves(name: string, size: number): (azimuth: number) => number {
  const random = randomSource('ragged', name);
  const parts = [2, 3, 5, 8, 13, 20].map((length) => ({
    turns: Math.round(360 / length),
    height: Math.sqrt(length),
    phase: 2 * Math.PI * random.uniform(),
  }));
  const scale = size / Math.sqrt(parts.reduce((sum, { height }) => sum + height ** 2 / 2, 0));
  return (azimuth) =>
    parts.reduce(
      (sum, { turns, height, phase }) =>
        sum + scale * height * Math.sin((turns * azimuth * Math.PI) / 180 + phase),
      0,
    );
}

/** The whole truth of a scene, for the profile. */
export const trueObstructions = ({ site, features }: TrueScene): TracedObstruction[] =>
  features.map(({ id, kind, shape, fullCircle = false, angularWidth = 0, edge, sightedEvery }) => ({
    id,
    transmittance: monthlyTransmittance({ id, name: id, kind }, site.latitude),
    traces: [{ shape, straight: sightedEvery === 0, fullCircle, angularWidth, points: edge }],
  }));
