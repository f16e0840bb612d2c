import type { LengthUnit } from '../../../core/pointing/tape-length.ts';
import { parseSlope } from '../../../core/pointing/tape.ts';
import { fullCircle } from '../../../core/angles/angles.ts';
import { polygonCrossing } from '../../../core/survey/outline-crossing.ts';
import { planeName, type PlaneSort } from '../../../core/survey/plane-name.ts';
import type { PlanePoint, RoofPlane } from '../../../core/survey/survey.ts';
import { inUnit, lengthInput, offsetInput, typedLength, typedOffset } from '../../length-text.ts';
import { faultOf, typedNumber, valueOf, type Typed } from '../../typed.ts';

export interface CornerDraft {
  key: number;
  x: string;
  y: string;
}

/** A plane as it is typed. */
export interface PlaneDraft {
  /** In which its lengths are typed. */
  unit: LengthUnit;
  sort: PlaneSort;
  name: string;
  tilt: string;
  bearing: string;
  /** Whether the bearing is the one the plane faces, or runs along its eave or ridge. */
  bearingOf: 'facing' | 'eave';
  /** The other of the two directions square to an eave. */
  otherSide: boolean;
  north: 'true' | 'grid' | 'magnetic';
  shape: 'rectangle' | 'polygon';
  width: string;
  slopeLength: string;
  corners: CornerDraft[];
  placed: boolean;
  east: string;
  northward: string;
  up: string;
}

const sortOf = ({ surfaceTilt }: RoofPlane): PlaneSort =>
  surfaceTilt === 0 ? 'flat' : surfaceTilt === 90 ? 'wall' : 'pitched';

const text = (value: number | undefined) =>
  value === undefined ? '' : String(Math.round(value * 1000) / 1000);

export const emptyCorners = (): CornerDraft[] => [0, 1, 2, 3].map((key) => ({ key, x: '', y: '' }));

/** The texts that show a plane; for a new one, empty. */
export function draftOf(plane: RoofPlane | null, unit: LengthUnit): PlaneDraft {
  const length = (metres: number | undefined) => lengthInput(metres, unit);
  const offset = (metres: number | undefined) => offsetInput(metres, unit);
  return {
    unit,
    sort: plane ? sortOf(plane) : 'pitched',
    name: plane?.name ?? '',
    tilt: text(plane?.surfaceTilt),
    bearing: text(plane?.surfaceAzimuth),
    bearingOf: 'facing',
    otherSide: false,
    north: 'true',
    shape: plane?.outline ? 'polygon' : 'rectangle',
    width: length(plane?.width),
    slopeLength: length(plane?.slopeLength),
    corners: plane?.outline
      ? plane.outline.map(({ x, y }, key) => ({ key, x: offset(x), y: offset(y) }))
      : emptyCorners(),
    placed: plane?.corner !== undefined,
    east: offset(plane?.corner?.east),
    northward: offset(plane?.corner?.north),
    up: offset(plane?.corner?.up),
  };
}

/** What a bearing must be turned by to be one from true north, by the north it is counted from. */
export type NorthTurns = Record<PlaneDraft['north'], number>;

export function typedTilt(typed: string): Typed<number> {
  if (typed.trim() === '') return { fault: 'The tilt is needed: 30, 6/12, 1:2 or 50 %.' };
  const parsed = parseSlope(typed);
  return parsed.ok ? { value: parsed.value } : { fault: parsed.problems[0].message };
}

const tenths = (value: number) => Math.round(value * 10) / 10;

/** The azimuth a plane faces, from true north. A bearing that was not touched keeps every digit it had. */
export function typedFacing(draft: PlaneDraft, turns: NorthTurns, stored?: number): Typed<number> {
  const { bearing, bearingOf, otherSide, north } = draft;
  const plain = bearingOf === 'facing' && north === 'true';
  if (plain && stored !== undefined && bearing === text(stored)) return { value: stored };
  const typed = typedNumber(bearing, { least: 0, most: 360, unit: '°' });
  const value = valueOf(typed);
  if (value === undefined) return { fault: faultOf(typed) ?? 'The azimuth is needed.' };
  const square = bearingOf === 'eave' ? (otherSide ? 90 : -90) : 0;
  const facing = value + turns[north] + square;
  return { value: plain ? value % 360 : tenths(fullCircle(facing)) % 360 };
}

/** The same plane with its lengths written in another unit. */
export function draftIn(draft: PlaneDraft, unit: LengthUnit, stored: RoofPlane | null): PlaneDraft {
  const again = (typed: string, metres?: number) => inUnit(typed, draft.unit, unit, metres);
  const { corner, outline } = stored ?? {};
  return {
    ...draft,
    unit,
    width: again(draft.width, stored?.width),
    slopeLength: again(draft.slopeLength, stored?.slopeLength),
    corners: draft.corners.map(({ key, x, y }) => ({
      key,
      x: again(x, outline?.[key]?.x),
      y: again(y, outline?.[key]?.y),
    })),
    east: again(draft.east, corner?.east),
    northward: again(draft.northward, corner?.north),
    up: again(draft.up, corner?.up),
  };
}

/** The corners of an outline. Those of a stored one have its places as keys. */
export function typedOutline(
  corners: readonly CornerDraft[],
  unit: LengthUnit,
  stored: readonly PlanePoint[] = [],
): Typed<PlanePoint[]> {
  const used = corners.filter(({ x, y }) => x.trim() !== '' || y.trim() !== '');
  if (used.length < 3) return { fault: 'An outline needs at least three corners.' };
  const points: PlanePoint[] = [];
  for (const [place, { key, x, y }] of used.entries()) {
    const typed = [typedOffset(x, unit, stored[key]?.x), typedOffset(y, unit, stored[key]?.y)];
    const fault = typed.map(faultOf).find((one) => one !== null);
    if (fault) return { fault: `Corner ${place + 1}: ${fault}` };
    const [along, up] = typed.map(valueOf);
    if (along === undefined || up === undefined)
      return { fault: `Corner ${place + 1} needs two lengths: along the eave and up the slope.` };
    points.push({ x: along, y: up });
  }
  const crossing = polygonCrossing(points);
  if (crossing)
    return {
      fault: `The edge after corner ${crossing[0] + 1} meets the one after corner ${crossing[1] + 1}. Put the corners in order around the edge.`,
    };
  return { value: points };
}

function typedCorner(
  { placed, unit, east, northward, up }: PlaneDraft,
  stored: RoofPlane['corner'],
): Typed<RoofPlane['corner']> {
  if (!placed) return { value: undefined };
  const typed = [
    typedOffset(east, unit, stored?.east),
    typedOffset(northward, unit, stored?.north),
    typedOffset(up, unit, stored?.up),
  ];
  const fault = typed.map(faultOf).find((one) => one !== null);
  if (fault) return { fault };
  const [e, n, u] = typed.map(valueOf);
  if (e === undefined || n === undefined || u === undefined)
    return { fault: 'All three are needed: how far east, north and up.' };
  return { value: { east: e, north: n, up: u } };
}

export interface PlaneFaults {
  tilt: string | null;
  bearing: string | null;
  width: string | null;
  slopeLength: string | null;
  outline: string | null;
  corner: string | null;
}

/** The plane that a draft stands for, over the one that was there; or what is wrong with it, field by field. */
export function planeOfDraft(
  draft: PlaneDraft,
  given: {
    before: RoofPlane | null;
    id: string;
    order?: number;
    turns: NorthTurns;
    taken: string[];
  },
): { plane: RoofPlane | null; faults: PlaneFaults } {
  const { before } = given;
  const { unit } = draft;
  const isPolygon = draft.shape === 'polygon';
  const tilt = typedTilt(draft.tilt);
  const facing = typedFacing(draft, given.turns, before?.surfaceAzimuth);
  const none: Typed<undefined> = { value: undefined };
  const width = isPolygon ? none : typedLength(draft.width, unit, before?.width);
  const slopeLength = isPolygon ? none : typedLength(draft.slopeLength, unit, before?.slopeLength);
  const outline = isPolygon ? typedOutline(draft.corners, unit, before?.outline) : none;
  const corner = typedCorner(draft, before?.corner);
  const faults: PlaneFaults = {
    tilt: faultOf(tilt),
    bearing: faultOf(facing),
    width: faultOf(width),
    slopeLength: faultOf(slopeLength),
    outline: faultOf(outline),
    corner: faultOf(corner),
  };
  const [surfaceTilt, surfaceAzimuth] = [valueOf(tilt), valueOf(facing)];
  const isRight = Object.values(faults).every((fault) => fault === null);
  if (!isRight || surfaceTilt === undefined || surfaceAzimuth === undefined) return { plane: null, faults };
  const keepsTilt = before && draft.tilt === text(before.surfaceTilt);
  const plane: RoofPlane = {
    ...(before ?? { id: given.id, ...(given.order !== undefined && { order: given.order }) }),
    name: draft.name.trim() || planeName(draft.sort, surfaceAzimuth, given.taken),
    surfaceTilt: keepsTilt ? before.surfaceTilt : surfaceTilt,
    surfaceAzimuth,
    width: valueOf(width),
    slopeLength: valueOf(slopeLength),
    outline: valueOf(outline),
    corner: valueOf(corner),
  };
  // What is not there is left out, as in a file.
  for (const key of ['width', 'slopeLength', 'outline', 'corner'] as const)
    if (plane[key] === undefined) delete plane[key];
  return { plane, faults };
}
