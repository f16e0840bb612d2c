import { describe, expect, test } from 'vitest';
import {
  defaultEdge,
  monthlyTransmittance,
  obstructionKind,
  obstructionKinds,
  traceEdge,
} from '../../../src/core/survey/obstruction-kinds.ts';
import { leafShares } from '../../../src/core/survey/leaf-months.ts';
import type { Months, Obstruction, ObstructionKind } from '../../../src/core/survey/survey.ts';

const tree: Obstruction = { id: 'o', name: 'Tree', kind: 'deciduous-tree' };
const wall: Obstruction = { id: 'o', name: 'Wall', kind: 'building' };
const twelve: Months = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 0, 0.5];

test('each kind has one row', () => {
  expect(new Set(obstructionKinds.map(({ kind }) => kind)).size).toBe(obstructionKinds.length);
});

test('built things are straight; trees and terrain are drawn', () => {
  const drawn = obstructionKinds.filter((row) => row.defaultEdge === 'drawn').map(({ kind }) => kind);
  expect(drawn).toEqual(['deciduous-tree', 'evergreen-tree', 'terrain']);
  expect(defaultEdge('wire')).toBe('straight');
});

test('a trace’s own edge stands before its kind’s', () => {
  expect(traceEdge({ edge: 'straight' }, tree)).toBe('straight');
  expect(traceEdge({}, tree)).toBe('drawn');
  expect(traceEdge({}, wall)).toBe('straight');
});

test('a kind that has no row is refused by name', () => {
  expect(() => obstructionKind('cloud' as ObstructionKind)).toThrow(/kind must be .* got cloud/);
});

test('every kind with leaves lets more through bare than in leaf, within its own spread, and names its source', () => {
  for (const { leaves } of obstructionKinds) {
    if (!leaves) continue;
    const { on, off, onRange, offRange, source } = leaves;
    expect(on).toBeLessThanOrEqual(off);
    expect(onRange[0] <= on && on <= onRange[1] && offRange[0] <= off && off <= offRange[1]).toBe(true);
    expect(source).not.toBe('');
  }
});

describe('monthly transmittance', () => {
  test('is the obstruction’s own, one value or twelve', () => {
    expect(monthlyTransmittance({ ...tree, transmittance: 0.3 }, 44)).toEqual(Array(12).fill(0.3));
    expect(monthlyTransmittance({ ...wall, transmittance: twelve }, 44)).toEqual(twelve);
  });

  test('is 0 all year for what has no leaves', () => {
    expect(monthlyTransmittance(wall, 44)).toEqual(Array(12).fill(0));
  });

  test('of a tree at 44° north is bare in January and in leaf in July, at 44° south the other way round', () => {
    const { on, off } = obstructionKind('deciduous-tree').leaves!;
    const north = monthlyTransmittance(tree, 44);
    const south = monthlyTransmittance(tree, -44);
    expect([north[0], north[6]]).toEqual([off, on]);
    expect([south[0], south[6]]).toEqual([on, off]);
    expect(south).toEqual([...north.slice(6), ...north.slice(0, 6)]);
  });

  test('of a tree between the tropics is in leaf all year', () => {
    const { on } = obstructionKind('deciduous-tree').leaves!;
    for (const latitude of [0, 23, -23])
      expect(monthlyTransmittance(tree, latitude)).toEqual(Array(12).fill(on));
  });

  test('does not hand out its own twelve values to be changed', () => {
    const own = { ...tree, transmittance: [...twelve] as Months };
    monthlyTransmittance(own, 44)[0] = 9;
    expect(own.transmittance).toEqual(twelve);
  });
});

test('leaves come later and go earlier toward the pole', () => {
  const total = (latitude: number) => leafShares(latitude).reduce((sum, share) => sum + share, 0);
  const totals = [10, 30, 45, 55, 70].map(total);
  expect(totals).toEqual([...totals].sort((a, b) => b - a));
  expect(() => leafShares(91)).toThrow(/latitude must be -90 to 90, got 91/);
});
