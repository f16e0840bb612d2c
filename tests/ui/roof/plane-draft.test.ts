import { describe, expect, it } from 'vitest';
import { draftIn, draftOf, planeOfDraft, type PlaneDraft } from '../../../src/ui/screens/roof/plane-draft.ts';
import type { RoofPlane } from '../../../src/core/survey/survey.ts';

const TURNS = { true: 0, grid: 1.25, magnetic: -13.4 };
const typed = (
  change: Partial<PlaneDraft>,
  before: RoofPlane | null = null,
  unit: 'metres' | 'feet' = 'metres',
) =>
  planeOfDraft(
    { ...draftOf(before, unit), ...change },
    { before, id: 'new', order: 3, turns: TURNS, taken: [] },
  );

const KNOWN: RoofPlane = {
  id: 'south',
  name: 'South roof',
  surfaceTilt: 30.123456,
  surfaceAzimuth: 178.987654,
  width: 9.2001234,
  slopeLength: 4.8765432,
  tiltPlacings: [{ id: 'p', reading: 'r' }],
};

describe('a typed plane', () => {
  it('that nobody touched keeps every digit and every other field, in either unit', () => {
    for (const unit of ['metres', 'feet'] as const) expect(typed({}, KNOWN, unit).plane).toEqual(KNOWN);
  });

  // atan(rise / run); the other numbers by arithmetic.
  it.each<[Partial<PlaneDraft>, Partial<RoofPlane>]>([
    [
      { tilt: '30', bearing: '180' },
      { surfaceTilt: 30, surfaceAzimuth: 180, name: 'South roof' },
    ],
    [
      { tilt: '100 %', bearing: '360' },
      { surfaceTilt: 45, surfaceAzimuth: 0, name: 'North roof' },
    ],
    [
      { tilt: '1:1', bearing: '90', bearingOf: 'eave' },
      { surfaceTilt: 45, surfaceAzimuth: 0 },
    ],
    [{ tilt: '1:1', bearing: '90', bearingOf: 'eave', otherSide: true }, { surfaceAzimuth: 180 }],
    [{ tilt: '10', bearing: '180', north: 'grid' }, { surfaceAzimuth: 181.3 }],
    [{ tilt: '10', bearing: '5', north: 'magnetic' }, { surfaceAzimuth: 351.6 }],
    [
      { tilt: '0', bearing: '180', width: '9,5', slopeLength: '480 cm' },
      { width: 9.5, slopeLength: 4.8 },
    ],
  ])('%o becomes %o', (change, plane) => {
    expect(typed(change).plane).toMatchObject({ id: 'new', order: 3, ...plane });
  });

  it('keeps its outline and its place to the digit when the unit is changed and changed back', () => {
    const outlined: RoofPlane = {
      id: 'dormer',
      name: 'Dormer',
      surfaceTilt: 40,
      surfaceAzimuth: 90,
      outline: [
        { x: 0, y: 0 },
        { x: 3.21, y: 0 },
        { x: 1.605, y: 2.345678 },
      ],
      corner: { east: -4.2, north: 0, up: 3.1234567 },
    };
    const inFeet = draftIn(draftOf(outlined, 'metres'), 'feet', outlined);
    expect(inFeet.corners[1]).toMatchObject({ x: `10' 6 3/8"`, y: `0"` });
    expect(inFeet.east).toBe(`-13' 9 3/8"`);
    expect(typed(inFeet, outlined).plane).toEqual(outlined);
    expect(typed(draftIn(inFeet, 'metres', outlined), outlined).plane).toEqual(outlined);
  });

  it('takes corners and its place in feet and inches', () => {
    const corners = [
      [`0`, `0`],
      [`10'`, `0`],
      [`5' 6"`, `8 ft`],
    ].map(([x, y], key) => ({ key, x, y }));
    const place = { placed: true, east: `-3' 6"`, northward: '0', up: `10'` };
    const { plane } = typed(
      { tilt: '30', bearing: '180', shape: 'polygon', corners, ...place },
      null,
      'feet',
    );
    // The foot is 0.3048 m, the inch 0.0254 m (international yard and pound agreement, 1959).
    expect(plane?.outline?.[2]).toEqual({ x: 1.6764, y: 2.4384 });
    expect(plane?.corner).toEqual({ east: -1.0668, north: 0, up: 3.048 });
  });

  it('drops its width when it is given corners', () => {
    const corners = [
      [0, 0],
      [4, 0],
      [4, 3],
    ].map(([x, y], key) => ({ key, x: String(x), y: String(y) }));
    const { plane } = typed({ shape: 'polygon', corners }, KNOWN);
    expect(plane).not.toHaveProperty('width');
    expect(plane?.outline).toHaveLength(3);
  });

  it.each<[Partial<PlaneDraft>, string]>([
    [{ bearing: '180' }, 'tilt'],
    [{ tilt: 'steep', bearing: '180' }, 'tilt'],
    [{ tilt: '30', bearing: '400' }, 'bearing'],
    [{ tilt: '30', bearing: '180', width: 'wide' }, 'width'],
    [{ tilt: '30', bearing: '180', slopeLength: '-2' }, 'slopeLength'],
    [{ tilt: '30', bearing: '180', shape: 'polygon' }, 'outline'],
    [{ tilt: '30', bearing: '180', placed: true, east: '1' }, 'corner'],
  ])('%o is refused, with the fault at its field %s', (change, field) => {
    const { plane, faults } = typed(change);
    expect(plane).toBeNull();
    const at = Object.entries(faults).filter(([, fault]) => fault !== null);
    expect(at.map(([key]) => key)).toEqual([field]);
  });
});
