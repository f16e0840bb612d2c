import { RADIANS } from '../../../core/angles/angles.ts';
import type { HorizonProfile } from '../../../core/horizon/horizon-profile.ts';
import type { ObstructionChange } from '../../../core/shading/what-if.ts';
import type { Months } from '../../../core/survey/survey.ts';

/** One change imagined, and how it is told: "Sugar maple 2 m lower". */
export interface Imagined {
  change: ObstructionChange;
  words: string;
}

export const imaginedGone = ({ id, name }: { id: string; name: string }): Imagined => ({
  change: { obstruction: id, kind: 'gone' },
  words: `${name} gone`,
});

/** An obstruction cut by some metres, as the station sees it at its distance. */
export function imaginedLower(
  { id, name }: { id: string; name: string },
  { height, distance }: { height: number; distance: number },
  by: number,
): Imagined {
  return {
    change: { obstruction: id, kind: 'cut-to-height', height: height - by, distance },
    words: `${name} ${by} m lower`,
  };
}

/** A tree grown by some metres. */
export const imaginedGrown = (
  { id, name }: { id: string; name: string },
  distance: number,
  by: number,
): Imagined => ({
  change: { obstruction: id, kind: 'grown', by, distance },
  words: `${name} ${by} m higher`,
});

/** A tree without its leaves all year: the most light its crown lets through. */
export const imaginedBare = ({ id, name }: { id: string; name: string }, bare: number): Imagined => ({
  change: { obstruction: id, kind: 'transmittance', transmittance: Array<number>(12).fill(bare) as Months },
  words: `${name} bare all year`,
});

/** How far an obstruction rises above the instrument, metres, taking it to stand at one distance. */
export function heightOver(profile: HorizonProfile, id: string, distance: number): number {
  const place = profile.obstructionIds.indexOf(id);
  let top = 0;
  profile.intervalObstruction.forEach((obstruction, k) => {
    if (obstruction === place) top = Math.max(top, profile.high[k]);
  });
  return distance * Math.tan(Math.min(top, 89) * RADIANS);
}

const CUTS = [1, 2, 3, 5, 8, 12];

/** Growth worth asking about, metres. */
export const GROWTHS = [1, 2, 4];

/** Cuts worth offering for something so high. */
export const cutsBelow = (height: number): number[] => CUTS.filter((by) => by < height);
