import type { LengthUnit } from '../../../core/pointing/tape-length.ts';
import { parseSlope } from '../../../core/pointing/tape.ts';
import { fullCircle } from '../../../core/angles/angles.ts';
import { polygonCrossing } from '../../../core/survey/outline-crossing.ts';
import { planeName, type PlaneSort } from '../../../core/survey/plane-name.ts';
import type { PlanePoint, RoofPlane } from '../../../core/survey/survey.ts';
import { lengthInput, typedLength } from '../../length-text.ts';
import { faultOf, numberOf, typedNumber, valueOf, type Typed } from '../../typed.ts';

export interface CornerDraft {
  key: number;
  x: string;
  y: string;
}

/** A plane as it is typed. */
export interface PlaneDraft {
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
  return {
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
      ? plane.outline.map(({ x, y }, key) => ({ key, x: text(x), y: text(y) }))
      : emptyCorners(),
    placed: plane?.corner !== undefined,
    east: text(plane?.corner?.east),
    northward: text(plane?.corner?.north),
    up: text(plane?.corner?.up),
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

/** A place in a plane or in the site's frame, metres. */
function typedMetres(typed: string): Typed<number> {
  const value = numberOf(typed);
  return value !== null && Math.abs(value) <= 1000
    ? { value }
    : { fault: 'Metres from -1000 to 1000 are needed.' };
}

export function typedOutline(corners: readonly CornerDraft[]): Typed<PlanePoint[]> {
  const used = corners.filter(({ x, y }) => x.trim() !== '' || y.trim() !== '');
  if (used.length < 3) return { fault: 'An outline needs at least three corners.' };
  const points: PlanePoint[] = [];
  for (const [place, corner] of used.entries()) {
    const [x, y] = [typedMetres(corner.x), typedMetres(corner.y)];
    if ('fault' in x || 'fault' in y)
      return { fault: `Corner ${place + 1} needs two numbers: metres along the eave and up the slope.` };
    points.push({ x: x.value, y: y.value });
  }
  const crossing = polygonCrossing(points);
  if (crossing)
    return {
      fault: `The edge after corner ${crossing[0] + 1} meets the one after corner ${crossing[1] + 1}. Put the corners in order around the edge.`,
    };
  return { value: points };
}

function typedCorner({ placed, east, northward, up }: PlaneDraft): Typed<RoofPlane['corner']> {
  if (!placed) return { value: undefined };
  const typed = [east, northward, up].map(typedMetres);
  const fault = typed.map(faultOf).find((one) => one !== null);
  if (fault) return { fault };
  const [e, n, u] = typed.map((one) => valueOf(one) ?? 0);
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
    unit: LengthUnit;
    turns: NorthTurns;
    taken: string[];
  },
): { plane: RoofPlane | null; faults: PlaneFaults } {
  const { before, unit } = given;
  const isPolygon = draft.shape === 'polygon';
  const tilt = typedTilt(draft.tilt);
  const facing = typedFacing(draft, given.turns, before?.surfaceAzimuth);
  const none: Typed<undefined> = { value: undefined };
  const width = isPolygon ? none : typedLength(draft.width, unit, before?.width);
  const slopeLength = isPolygon ? none : typedLength(draft.slopeLength, unit, before?.slopeLength);
  const outline = isPolygon ? typedOutline(draft.corners) : none;
  const corner = typedCorner(draft);
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
