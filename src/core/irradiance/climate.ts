import type { SunTrack } from '../solar-position/sun-track.ts';

/**
 * The one interface of all climate sources. A source answers, for each step of a sun track, with one or more sky
 * states and their weights: a weather file knows one state, a world climate several (a month has clear and dull days).
 * Sums over states stand for the mean sky of that step in a typical year.
 */
export interface Climate {
  readonly source: 'world' | 'weather-file' | 'clear-sky';
  /** What a person calls it: the station of a weather file, "World climate, 2° grid". */
  readonly name: string;
  /** Where the data come from, for the foot of a table. */
  readonly reference: string;
  /** What a person should know before trusting it (a far-away weather station). */
  readonly warnings: readonly string[];
  /** Number of sky states it fills, the same at every step. */
  readonly stateCount: number;
  /** Lays the climate over a sun track. */
  over(track: SunTrack): SkyReader;
}

/**
 * Fills `sky` for a step of the track. Must set all `stateCount` entries. Returns false where there is no light at all,
 * and `sky` is then left alone.
 */
export type SkyReader = (step: number, sky: SkyStates) => boolean;

/** Sky states of one step; weights sum to 1. Irradiance in W/m2; `ghi` is not made to equal dni·cosZ + dhi. */
export interface SkyStates {
  readonly weight: Float64Array;
  readonly ghi: Float64Array;
  readonly dni: Float64Array;
  readonly dhi: Float64Array;
}

export function skyStates(count: number): SkyStates {
  return {
    weight: new Float64Array(count),
    ghi: new Float64Array(count),
    dni: new Float64Array(count),
    dhi: new Float64Array(count),
  };
}
