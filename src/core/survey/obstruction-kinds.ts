import { leafShares } from './leaf-months.ts';
import type { Months, Obstruction, ObstructionKind, Trace, TraceEdge } from './survey.ts';

/** What a tree's crown lets through, as a share of the light, 0 to 1. */
export interface Leaves {
  /** In full leaf. */
  on: number;
  /** Bare. */
  off: number;
  /** Spread from one tree to the next, lowest and highest. */
  onRange: readonly [number, number];
  offRange: readonly [number, number];
  source: string;
}

export interface ObstructionKindRow {
  kind: ObstructionKind;
  name: string;
  /** How neighbouring sightings are joined where the trace does not say. */
  defaultEdge: TraceEdge;
  /** False for what no one can take away. */
  removable: boolean;
  leaves?: Leaves;
}

/**
 * The kinds of obstruction, one row each. A built edge is straight in space; a crown, a hill or a dense sweep is drawn.
 */
export const obstructionKinds: readonly ObstructionKindRow[] = [
  {
    kind: 'deciduous-tree',
    name: 'Deciduous tree',
    defaultEdge: 'drawn',
    removable: true,
    leaves: {
      on: 0.15,
      off: 0.55,
      onRange: [0.02, 0.3],
      offRange: [0.4, 0.75],
      source:
        'Between Heisler (1986), Urban Ecology 9, 337-359 (single street trees: about 0.2 in leaf, 0.6 bare), and Konarska et al. (2014), Theoretical and Applied Climatology 117, 363-376 (0.01 to 0.05 in leaf, 0.40 to 0.52 bare); both from memory',
    },
  },
  {
    kind: 'evergreen-tree',
    name: 'Evergreen tree',
    defaultEdge: 'drawn',
    removable: true,
    leaves: {
      on: 0.1,
      off: 0.1,
      onRange: [0.02, 0.25],
      offRange: [0.02, 0.25],
      source: 'Common practice, no source',
    },
  },
  { kind: 'building', name: 'Building', defaultEdge: 'straight', removable: true },
  { kind: 'roof-part', name: 'Part of a roof', defaultEdge: 'straight', removable: true },
  { kind: 'chimney', name: 'Chimney', defaultEdge: 'straight', removable: true },
  { kind: 'mast', name: 'Mast or pole', defaultEdge: 'straight', removable: true },
  { kind: 'wire', name: 'Wire', defaultEdge: 'straight', removable: true },
  { kind: 'terrain', name: 'Hill or terrain', defaultEdge: 'drawn', removable: false },
  { kind: 'other', name: 'Something else', defaultEdge: 'straight', removable: true },
];

const rows = new Map(obstructionKinds.map((row) => [row.kind, row]));

/** The row of a kind. Throws RangeError for a kind that has none. */
export function obstructionKind(kind: ObstructionKind): ObstructionKindRow {
  const row = rows.get(kind);
  if (!row) throw new RangeError(`kind must be a kind of obstruction, got ${String(kind)}`);
  return row;
}

/** How sightings along an obstruction of this kind are joined where the trace does not say; straight for any other. */
export const defaultEdge = (kind: ObstructionKind): TraceEdge => rows.get(kind)?.defaultEdge ?? 'straight';

/** How a trace's neighbouring sightings are joined: as the trace says, else as its obstruction's kind has it. */
export const traceEdge = (trace: Pick<Trace, 'edge'>, obstruction: Pick<Obstruction, 'kind'>): TraceEdge =>
  trace.edge ?? defaultEdge(obstruction.kind);

/**
 * Share of the light an obstruction lets through, January to December, 0 (opaque) to 1: its own one or twelve values,
 * else what its kind has in leaf and bare in the months of this latitude [degrees, north positive], else 0.
 */
export function monthlyTransmittance(obstruction: Obstruction, latitude: number): Months {
  const { transmittance, kind } = obstruction;
  if (Array.isArray(transmittance)) return [...transmittance];
  if (typeof transmittance === 'number') return allYear(transmittance);
  const { leaves } = obstructionKind(kind);
  if (!leaves) return allYear(0);
  return leafShares(latitude).map((share) =>
    hundredths(leaves.off + share * (leaves.on - leaves.off)),
  ) as Months;
}

const allYear = (value: number) => Array<number>(12).fill(value) as Months;
const hundredths = (value: number) => Math.round(value * 100) / 100;
