import { RADIANS } from '../../core/angles/angles.ts';
import { planeOutline, planePointAt } from '../../core/survey/plane-corners.ts';
import type { RoofPlane } from '../../core/survey/survey.ts';
import { textWidth, type Line, type Mark, type Picture } from '../marks.ts';

/** Metres drawn for a plane of unknown size, dashed. */
const ASSUMED = 4;
/** Between planes whose place is unknown, and around the drawing, as a share of its width. */
const GAP = 0.06;
const MARGIN = 26;

interface Footprint {
  name: string;
  azimuth: number;
  tilt: number;
  /** East and north, metres. */
  corners: [number, number][];
  sized: boolean;
}

function footprintOf(plane: RoofPlane): Footprint {
  const known = planeOutline(plane);
  const assumed = { ...plane, width: plane.width ?? ASSUMED, slopeLength: plane.slopeLength ?? ASSUMED };
  // A wall has no ground plan: it is drawn as a strip of half a metre.
  const tilt = Math.min(plane.surfaceTilt, 83);
  const corners = (known ?? planeOutline(assumed) ?? []).map((point): [number, number] => {
    const { east, north } = planePointAt({ ...plane, surfaceTilt: tilt }, point);
    return [east, north];
  });
  return {
    name: plane.name,
    azimuth: plane.surfaceAzimuth,
    tilt: plane.surfaceTilt,
    corners,
    sized: known !== null,
  };
}

const range = (values: number[]): [number, number] => [Math.min(...values), Math.max(...values)];

/** Planes without a place are set side by side to the east of those that have one. */
function laidOut(planes: readonly RoofPlane[]): Footprint[] {
  const placed = planes.filter(({ corner }) => corner).map(footprintOf);
  let edge = placed.length > 0 ? Math.max(...placed.flatMap(({ corners }) => corners.map(([e]) => e))) : 0;
  const loose = planes.filter(({ corner }) => !corner).map(footprintOf);
  for (const footprint of loose) {
    const [west, east] = range(footprint.corners.map(([e]) => e));
    const [south] = range(footprint.corners.map(([, n]) => n));
    const gap = edge === 0 && placed.length === 0 ? 0 : 1;
    footprint.corners = footprint.corners.map(([e, n]) => [e - west + edge + gap, n - south]);
    edge += east - west + gap;
  }
  return [...placed, ...loose];
}

/** Half an arrow's length, points of the sheet. */
const ARROW = 9;

function arrow(x: number, y: number, azimuth: number): Line[] {
  const along = (length: number, turn = 0): [number, number] => [
    length * Math.sin((azimuth + turn) * RADIANS),
    -length * Math.cos((azimuth + turn) * RADIANS),
  ];
  const [dx, dy] = along(ARROW);
  const tip: [number, number] = [x + dx, y + dy];
  const barb = (turn: number): Line => {
    const [bx, by] = along(6, turn);
    return [...tip, tip[0] + bx, tip[1] + by];
  };
  return [[x - dx, y - dy, ...tip], barb(150), barb(-150)];
}

/**
 * The planes from above, north up, each with its name and an arrow down its slope. Where places are unknown the planes
 * stand beside each other, true in size and direction.
 */
export function roofPlan(planes: readonly RoofPlane[], width: number): Picture {
  const footprints = laidOut(planes);
  const points = footprints.flatMap(({ corners }) => corners);
  const [west, east] = range(points.map(([e]) => e));
  const [south, north] = range(points.map(([, n]) => n));
  const scale = Math.min((width - 2 * MARGIN) / (east - west || 1), (width * 0.6) / (north - south || 1));
  const left = (width - (east - west) * scale) / 2;
  const at = ([e, n]: [number, number]): [number, number] => [
    left + (e - west) * scale,
    MARGIN + (north - n) * scale,
  ];
  const marks: Mark[] = [];
  for (const { name, azimuth, tilt, corners, sized } of footprints) {
    const line = corners.flatMap(at);
    const pen = { tone: 'ink', width: 1.4, ...(!sized && { dash: [4, 3] }) } as const;
    marks.push({ kind: 'path', lines: [line], closed: true, fill: { tone: 'sheet' }, pen });
    const x = corners.reduce((sum, corner) => sum + at(corner)[0], 0) / corners.length;
    const y = corners.reduce((sum, corner) => sum + at(corner)[1], 0) / corners.length;
    if (tilt > 0)
      marks.push({ kind: 'path', lines: arrow(x, y + 14, azimuth), pen: { tone: 'ink', width: 1.4 } });
    const room = Math.max(0, ...corners.map((corner) => 2 * Math.abs(at(corner)[0] - x))) + width * GAP;
    marks.push({
      kind: 'text',
      x,
      y: y - 4,
      text: shortened(name, room),
      size: 12,
      anchor: 'middle',
      bold: true,
      rim: true,
    });
  }
  const height = (north - south) * scale + 2 * MARGIN;
  const corner = width - 12;
  marks.push(
    { kind: 'path', lines: arrow(corner, 26, 0), pen: { tone: 'ink', width: 1.2 } },
    { kind: 'text', x: corner, y: 13, text: 'N', size: 11, anchor: 'middle', bold: true },
  );
  return { width, height: Math.max(height, 60), marks };
}

function shortened(name: string, room: number): string {
  let text = name;
  while (text.length > 3 && textWidth(text, 12, true) > room) text = `${text.slice(0, -2)}…`;
  return text;
}
