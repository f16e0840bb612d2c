import type { Months, TraceShape } from '../survey/survey.ts';
import type { HorizonEdge, SkyPoint } from './horizon-edge.ts';
import { edgesBetween } from './horizon-edge.ts';
import { lineStrips } from './line-strip.ts';

/** What one station saw of one obstruction: its traces with their directions settled. */
export interface TracedObstruction {
  id: string;
  /** Share of light that passes, January to December. */
  transmittance: Months;
  traces: SettledTrace[];
}

export interface SettledTrace {
  shape: TraceShape;
  straight: boolean;
  fullCircle: boolean;
  /** Degrees; for shape `line`. */
  angularWidth: number;
  points: SkyPoint[];
}

/**
 * Edges that bound one blocked region. `skyline`: all below them is blocked. `closed`: they go around the region, and going
 * up from the ground each edge crossed goes in or out of it; one that goes around the zenith is left last at the zenith.
 */
export interface BlockedRegion {
  kind: 'skyline' | 'closed';
  edges: HorizonEdge[];
}

/** Throws RangeError for a trace with too few points or neighbours 180° or more apart. */
export function blockedRegions(trace: SettledTrace): BlockedRegion[] {
  const { points, straight } = trace;
  const least = trace.shape === 'outline' ? 3 : 2;
  if (points.length < least)
    throw new RangeError(`a ${trace.shape} needs ${least} sightings or more, got ${points.length}`);
  if (trace.shape === 'skyline')
    return [{ kind: 'skyline', edges: edgesAlong(points, straight, trace.fullCircle) }];
  if (trace.shape === 'outline') return [{ kind: 'closed', edges: edgesAlong(points, straight, true) }];
  return lineStrips(points, trace.angularWidth, straight).map((strip) => ({
    kind: 'closed',
    edges: edgesAlong(strip, true, true),
  }));
}

function edgesAlong(points: readonly SkyPoint[], straight: boolean, closed: boolean): HorizonEdge[] {
  const edges: HorizonEdge[] = [];
  for (let i = 1; i < points.length; i++) edges.push(...edgesBetween(points[i - 1], points[i], straight));
  if (closed) edges.push(...edgesBetween(points[points.length - 1], points[0], straight));
  return edges;
}
