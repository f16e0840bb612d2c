import type { Sighting, Trace, TraceShape } from '../../../core/survey/survey.ts';
import { faultOf, typedNumber, type Typed } from '../../typed.ts';

export interface PointDraft {
  key: number;
  azimuth: string;
  elevation: string;
}

/** A trace as it is typed. */
export interface TraceDraft {
  shape: TraceShape;
  edge: 'kind' | 'straight' | 'drawn';
  fullCircle: boolean;
  angularWidth: string;
  points: PointDraft[];
}

export const emptyTrace = (): TraceDraft => ({
  shape: 'skyline',
  edge: 'kind',
  fullCircle: false,
  angularWidth: '0.5',
  points: [0, 1, 2].map((key) => ({ key, azimuth: '', elevation: '' })),
});

const FEWEST: Record<TraceShape, number> = { skyline: 2, outline: 3, line: 2 };

function typedPoints({ points, shape }: TraceDraft, newId: () => string): Typed<Sighting[]> {
  const used = points.filter(({ azimuth, elevation }) => azimuth.trim() !== '' || elevation.trim() !== '');
  if (used.length < FEWEST[shape])
    return { fault: `A trace of this shape needs at least ${FEWEST[shape]} sightings.` };
  const sightings: Sighting[] = [];
  for (const [order, point] of used.entries()) {
    const azimuth = typedNumber(point.azimuth, { least: 0, most: 360, unit: '°' });
    const elevation = typedNumber(point.elevation, { least: -90, most: 90, unit: '°' });
    const fault = faultOf(azimuth) ?? faultOf(elevation);
    if (fault !== null || 'fault' in azimuth || 'fault' in elevation)
      return { fault: `Sighting ${order + 1}: ${fault}` };
    sightings.push({ id: newId(), order, azimuth: azimuth.value! % 360, elevation: elevation.value });
  }
  return { value: sightings };
}

/** The trace that a draft stands for, or what is wrong with it. */
export function traceOfDraft(
  draft: TraceDraft,
  given: { obstruction: string; order: number; newId: () => string },
): Typed<Trace> {
  const isLine = draft.shape === 'line';
  const width = typedNumber(draft.angularWidth, { least: 0.01, most: 20, unit: '°' });
  if (isLine && 'fault' in width) return { fault: `Its width: ${width.fault}` };
  const points = typedPoints(draft, given.newId);
  if ('fault' in points) return points;
  return {
    value: {
      id: given.newId(),
      order: given.order,
      obstruction: given.obstruction,
      shape: draft.shape,
      ...(draft.edge !== 'kind' && { edge: draft.edge }),
      ...(draft.shape === 'skyline' && draft.fullCircle && { fullCircle: true }),
      ...(isLine && 'value' in width && { angularWidth: width.value }),
      sightings: points.value,
    },
  };
}
