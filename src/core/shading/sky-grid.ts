import { COLUMNS } from '../horizon/horizon-profile.ts';
import type { SunPaths } from './sun-paths.ts';
import { BIN } from './sun-paths.ts';

/** A strip is one column of azimuth in one month: column · 12 + month. */
export const STRIPS = 12 * COLUMNS;

/**
 * Where the bins of a sky map lie: each strip has bins only from the lowest to the highest elevation that the sun takes
 * there in that month. Shared by all planes of a site.
 */
export interface SkyGrid {
  readonly paths: SunPaths;
  /** First node of each strip, one more entry; a strip of n bins has n + 1 nodes, an empty strip none. */
  readonly first: Uint32Array;
  /** Bin number of the lowest node, elevation / BIN. */
  readonly bottom: Int16Array;
}

export function skyGrid(paths: SunPaths): SkyGrid {
  const lowest = new Int16Array(STRIPS).fill(32767);
  const highest = new Int16Array(STRIPS).fill(-1);
  const { pieceStrip, pieceLow, pieceHigh } = paths;
  for (let i = 0; i < pieceStrip.length; i++) {
    const strip = pieceStrip[i];
    const low = (pieceLow[i] / BIN) | 0;
    const high = (pieceHigh[i] / BIN) | 0;
    if (low < lowest[strip]) lowest[strip] = low;
    if (high > highest[strip]) highest[strip] = high;
  }
  const first = new Uint32Array(STRIPS + 1);
  for (let strip = 0; strip < STRIPS; strip++) {
    const nodes = highest[strip] < 0 ? 0 : highest[strip] - lowest[strip] + 2;
    first[strip + 1] = first[strip] + nodes;
  }
  return { paths, first, bottom: lowest };
}
