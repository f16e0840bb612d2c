import { turnBetween } from '../angles/angles.ts';
import type { SkyPoint } from '../horizon/horizon-edge.ts';
import { lineStrips } from '../horizon/line-strip.ts';
import { BULGE, DRAWN_STRAY, STRAIGHT_STRAY } from './planning-values.ts';
import type { SightingError, UncertainObstruction, UncertainTrace } from './uncertain-station.ts';

/**
 * The traces of a station as corners that move and edges between them. A corner moves with two sightings, in shares:
 * its own alone, or both neighbours' for the side of a wide line.
 */
export interface DrawnRegions {
  readonly sightings: readonly DrawnSighting[];
  readonly azimuth: Float64Array;
  readonly elevation: Float64Array;
  readonly before: Uint32Array;
  readonly after: Uint32Array;
  /** Share of `after`, 0 to 1. */
  readonly share: Float64Array;
  readonly edgeStart: Uint32Array;
  readonly edgeEnd: Uint32Array;
  /** From start to end by the shorter way, degrees, clockwise positive. */
  readonly edgeTurn: Float64Array;
  readonly edgeStraight: Uint8Array;
  /** Standard deviation of the middle of the edge, degrees. */
  readonly edgeStray: Float64Array;
  /** By how much the middle of a crown's edge is expected to bulge outward, degrees; up is positive. */
  readonly edgeBulge: Float64Array;
  readonly regions: readonly DrawnRegion[];
}

export interface DrawnSighting extends SightingError {
  azimuth: number;
  elevation: number;
}

/** `top` is the sign of the turn of edges that bound it from above; 0: all edges do. */
export interface DrawnRegion {
  obstruction: number;
  firstEdge: number;
  lastEdge: number;
  top: -1 | 0 | 1;
  /** Goes around the zenith: blocked from its edges up. */
  zenith: boolean;
}

interface Corner extends SkyPoint {
  before: number;
  after: number;
  share: number;
}

interface Edge {
  start: number;
  end: number;
  turn: number;
  straight: boolean;
  stray: number;
  bulge: number;
}

/** Takes the traces of a station apart. */
export function drawnRegions(obstructions: readonly UncertainObstruction[]): DrawnRegions {
  const sightings: DrawnSighting[] = [];
  const corners: Corner[] = [];
  const edges: Edge[] = [];
  const regions: DrawnRegion[] = [];
  obstructions.forEach(({ traces, isCrown }, obstruction) => {
    for (const trace of traces) {
      const first = sightings.length;
      trace.points.forEach((point, i) => sightings.push({ ...point, ...trace.errors[i] }));
      for (const ring of rings(trace, first)) {
        const firstEdge = edges.length;
        const way = sense(ring, trace.shape !== 'skyline');
        edges.push(...edgesAlong(ring, corners.length, trace, isCrown, way.top));
        corners.push(...ring);
        regions.push({ obstruction, firstEdge, lastEdge: edges.length, ...way });
      }
    }
  });
  return {
    sightings,
    azimuth: Float64Array.from(corners, ({ azimuth }) => azimuth),
    elevation: Float64Array.from(corners, ({ elevation }) => elevation),
    before: Uint32Array.from(corners, ({ before }) => before),
    after: Uint32Array.from(corners, ({ after }) => after),
    share: Float64Array.from(corners, ({ share }) => share),
    edgeStart: Uint32Array.from(edges, ({ start }) => start),
    edgeEnd: Uint32Array.from(edges, ({ end }) => end),
    edgeTurn: Float64Array.from(edges, ({ turn }) => turn),
    edgeStraight: Uint8Array.from(edges, ({ straight }) => Number(straight)),
    edgeStray: Float64Array.from(edges, ({ stray }) => stray),
    edgeBulge: Float64Array.from(edges, ({ bulge }) => bulge),
    regions,
  };
}

/** Corners of each part of the sky that a trace blocks. */
function rings({ shape, points, angularWidth, straight }: UncertainTrace, first: number): Corner[][] {
  if (shape !== 'line')
    return [points.map((point, i) => ({ ...point, before: first + i, after: first + i, share: 0 }))];
  const sides: Corner[][] = [];
  for (let i = 1; i < points.length; i++) {
    const strips = lineStrips([points[i - 1], points[i]], angularWidth, straight);
    strips.forEach((strip, k) =>
      sides.push(
        strip.map((corner, c) => ({
          ...corner,
          before: first + i - 1,
          after: first + i,
          share: (c === 1 || c === 2 ? k + 1 : k) / strips.length,
        })),
      ),
    );
  }
  return sides;
}

function edgesAlong(
  ring: readonly Corner[],
  first: number,
  trace: UncertainTrace,
  isCrown: boolean,
  top: DrawnRegion['top'],
): Edge[] {
  const closed = trace.shape !== 'skyline' || trace.fullCircle;
  const line = trace.shape === 'line';
  const straight = line || trace.straight;
  return ring.flatMap((corner, i) => {
    if (i === ring.length - 1 && !closed) return [];
    const next = ring[(i + 1) % ring.length];
    const turn = turnBetween(corner.azimuth, next.azimuth);
    const gap = Math.hypot(turn * cosine(corner, next), next.elevation - corner.elevation);
    const stray = line ? 0 : (straight ? STRAIGHT_STRAY : DRAWN_STRAY) * Math.sqrt(gap);
    const outward = top === 0 || top > 0 === turn > 0 ? 1 : -1;
    const bulge = isCrown && !straight ? outward * Math.min(BULGE.most, gap ** 2 / (8 * BULGE.radius)) : 0;
    return [{ start: first + i, end: first + ((i + 1) % ring.length), turn, straight, stray, bulge }];
  });
}

const cosine = (a: SkyPoint, b: SkyPoint) => Math.cos((((a.elevation + b.elevation) / 2) * Math.PI) / 180);

/** Which way round a ring goes, seen from inside with azimuth to the right. */
function sense(ring: readonly Corner[], closed: boolean): Pick<DrawnRegion, 'top' | 'zenith'> {
  if (!closed) return { top: 0, zenith: false };
  let [area, around] = [0, 0];
  ring.forEach((corner, i) => {
    const next = ring[(i + 1) % ring.length];
    const turn = turnBetween(corner.azimuth, next.azimuth);
    around += turn;
    area += (turn * (corner.elevation + next.elevation)) / 2;
  });
  return Math.abs(around) > 180 ? { top: 0, zenith: true } : { top: area > 0 ? 1 : -1, zenith: false };
}
