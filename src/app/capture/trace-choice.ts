import type { TraceEdge, TraceShape } from '../../core/survey/survey.ts';

/** What is being traced, and how. */
export interface TraceChoice {
  /** Null: it is asked for after. */
  obstruction: string | null;
  shape: TraceShape;
  /** `sweep`: follow the edge; `ridge`: both ends of a straight edge; `points`: one corner after the other. */
  way: 'sweep' | 'ridge' | 'points';
  /** Width of a line, degrees. */
  angularWidth: number;
}

/** Fewest sightings with which a trace of each shape can stand. */
export const FEWEST: Record<TraceShape, number> = { skyline: 2, outline: 3, line: 2 };

/** How neighbouring sightings are joined; left to the obstruction's kind for single points. */
export function edgeOf({ way }: Pick<TraceChoice, 'way'>): TraceEdge | undefined {
  if (way === 'sweep') return 'drawn';
  return way === 'ridge' ? 'straight' : undefined;
}

/** The fields of a trace that the choice settles. */
export function traceFields({ shape, way, angularWidth }: TraceChoice) {
  const edge = edgeOf({ way });
  return { shape, ...(edge && { edge }), ...(shape === 'line' && { angularWidth }) };
}
