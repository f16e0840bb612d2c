import type { HorizonProfile } from '../../../../core/horizon/horizon-profile.ts';
import type { AzimuthRange } from '../../../../core/angles/azimuth-ranges.ts';
import { isBetween, rangesBetween } from '../../../../core/angles/azimuth-ranges.ts';
import type { Line, Mark, Picture } from '../../../../report/marks.ts';
import { obstructionMarks, obstructionShapes } from '../../../../report/pictures/horizon-obstructions.ts';
import type { SkyFrame } from '../../../../report/pictures/sky-frame.ts';
import { xOfTurn, yOf } from '../../../../report/pictures/sky-frame.ts';
import { turnBetween } from '../../../../core/angles/angles.ts';
import { COLUMN, type BandColumn } from './sun-band.ts';

export interface StripInput {
  latitude: number;
  band: readonly BandColumn[];
  profile: HorizonProfile | null;
  observed: readonly AzimuthRange[];
  width: number;
  height: number;
}

const TEXT = 12;

/** The whole circle, the equator's side in the middle, as high as the sun and what is traced need. */
export function stripFrame({ latitude, band, profile, width, height }: StripInput): SkyFrame {
  const highest = Math.max(30, ...band.map(({ high }) => high), ...(profile ? [...profile.high] : []));
  return {
    centre: latitude >= 0 ? 180 : 0,
    span: 360,
    top: Math.min(90, highest + 4),
    left: 2,
    right: width - 2,
    above: 4,
    below: height - TEXT - 6,
  };
}

/** The sun's band, with rings where nobody looked yet, and what is traced. */
export function stripPicture(input: StripInput): Picture & { frame: SkyFrame } {
  const { band, profile, observed, width, height } = input;
  const frame = stripFrame(input);
  const unseen = rangesBetween(observed);
  const isUnseen = (azimuth: number) => unseen.some((gap) => isBetween(azimuth, gap));
  const boxes = (columns: readonly BandColumn[]): Line[] => columns.map((column) => boxOf(frame, column));
  const open = band.filter(({ azimuth }) => isUnseen(azimuth + COLUMN / 2));
  const marks: Mark[] = [
    { kind: 'path', lines: boxes(band), closed: true, fill: { tone: 'rule', opacity: 0.5 } },
    {
      kind: 'path',
      lines: boxes(open),
      closed: true,
      fill: { hatch: { angle: 45, spacing: 7, width: 3.4, ringed: true, tone: 'ink' } },
    },
    ...(profile ? obstructionMarks(frame, obstructionShapes(profile, new Map(), null)) : []),
  ];
  return { width, height, frame, marks: [...marks, ...axis(frame)] };
}

function boxOf(frame: SkyFrame, { azimuth, low, high }: BandColumn): Line {
  const left = xOfTurn(frame, turnBetween(frame.centre, azimuth + COLUMN / 2) - COLUMN / 2);
  const right = left + (COLUMN / frame.span) * (frame.right - frame.left);
  const [bottom, top] = [yOf(frame, low), yOf(frame, high)];
  return [left, bottom, right, bottom, right, top, left, top];
}

const NAMES = ['N', 'NE', 'E', 'SE', 'S', 'SW', 'W', 'NW'];

function axis(frame: SkyFrame): Mark[] {
  const { left, right, below } = frame;
  const names = NAMES.map((text, i): Mark => {
    const turn = turnBetween(frame.centre, i * 45);
    const x = Math.min(right - TEXT, Math.max(left + TEXT, xOfTurn(frame, turn)));
    return { kind: 'text', x, y: below + TEXT + 2, text, size: TEXT, anchor: 'middle', bold: i % 2 === 0 };
  });
  return [{ kind: 'path', lines: [[left, below, right, below]], pen: { tone: 'ink', width: 1.6 } }, ...names];
}
