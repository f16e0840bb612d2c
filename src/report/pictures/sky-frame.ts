import { fullCircle, turnBetween } from '../../core/angles/angles.ts';
import type { Line } from '../marks.ts';

/** A window of the unrolled sky on a sheet: azimuth to the right, elevation up, each with a scale of its own. */
export interface SkyFrame {
  /** Azimuth in the middle, degrees. */
  readonly centre: number;
  /** Azimuths shown, degrees, up to 360. */
  readonly span: number;
  /** Highest elevation shown, degrees. */
  readonly top: number;
  readonly left: number;
  readonly right: number;
  readonly above: number;
  /** y of the horizon. */
  readonly below: number;
}

/** Place of an azimuth by its turn from the middle, degrees from -span/2 to span/2 inside the window. */
export const xOfTurn = ({ left, right, span }: SkyFrame, turn: number): number =>
  left + ((turn + span / 2) / span) * (right - left);

export const xOf = (frame: SkyFrame, azimuth: number): number =>
  xOfTurn(frame, turnBetween(frame.centre, azimuth));

export const yOf = ({ above, below, top }: SkyFrame, elevation: number): number =>
  below - (elevation / top) * (below - above);

/** The direction at a place on the sheet, held inside the window. */
export function directionAt(frame: SkyFrame, x: number, y: number): { azimuth: number; elevation: number } {
  const across = clamp((x - frame.left) / (frame.right - frame.left), 0, 1);
  const up = clamp((frame.below - y) / (frame.below - frame.above), 0, 1);
  return { azimuth: fullCircle(frame.centre + (across - 0.5) * frame.span), elevation: up * frame.top };
}

export const clamp = (value: number, least: number, most: number): number =>
  Math.min(most, Math.max(least, value));

export interface SkyPlace {
  azimuth: number;
  elevation: number;
}

/**
 * A path over the sky as lines on the sheet. Where it leaves the window on one side and comes in on the other (the far
 * side from the middle) it is cut, with both ends drawn to the edge.
 */
export function linesOf(frame: SkyFrame, path: readonly SkyPlace[]): Line[] {
  const lines: Line[] = [];
  let line: Line = [];
  let last = NaN;
  for (const { azimuth, elevation } of path) {
    const turn = turnBetween(frame.centre, azimuth);
    const y = yOf(frame, elevation);
    if (Math.abs(turn - last) > 180) {
      const beyond = turn < last ? turn + 360 : turn - 360;
      line.push(xOfTurn(frame, beyond), y);
      lines.push(line);
      line = [xOfTurn(frame, turn < last ? last - 360 : last + 360), line[line.length - 3]];
    }
    line.push(xOfTurn(frame, turn), y);
    last = turn;
  }
  lines.push(line);
  return lines.filter(({ length }) => length >= 4);
}
