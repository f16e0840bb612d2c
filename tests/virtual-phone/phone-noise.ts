import type { RandomSource } from '../../src/core/uncertainty/random-source.ts';

/** What a phone and its holder add to the truth; standard deviations in degrees unless said otherwise. */
export interface PhoneNoise {
  /** Offset of the compass, the same through a run. */
  compass: number;
  /** So many compasses are beside steel, and off by 10° to this. */
  outlierShare: number;
  outlierReach: number;
  /** Offset of the inclination, the same through a run: what turns with the phone about its axis, and what does not. */
  index: number;
  indexFixed: number;
  /** Each pointing, up and across. */
  tremor: number;
  /** Of a run without a compass, degrees a minute, the same through a run. */
  drift: number;
  /** Laying the phone along a shadow; lean of the edge that throws it; the clock, minutes. */
  shadow: number;
  lean: number;
  clockMinutes: number;
  /** Share of surveys in which sightings of 10° to 20° of an edge were left out. */
  skipShare: number;
  /** Share of surveys in which 5° to 12° of the horizon were not looked at. */
  gapShare: number;
  draw: (random: RandomSource) => number;
}

const normal = (random: RandomSource) => random.normal();

/** Student's t with three degrees of freedom, its spread not scaled down: far values are common. */
function heavyTailed(random: RandomSource): number {
  const chiSquare = random.normal() ** 2 + random.normal() ** 2 + random.normal() ** 2;
  return random.normal() / Math.sqrt(chiSquare / 3);
}

/** Planning values: those of the pointing folder; the two parts of the index are 0.7° together. Gaps: common practice, no source. */
export const PLANNED: PhoneNoise = {
  compass: 5,
  outlierShare: 0.1,
  outlierReach: 20,
  index: 0.67,
  indexFixed: 0.2,
  tremor: 0.3,
  drift: 0.5,
  shadow: 0.7,
  lean: 0.5,
  clockMinutes: 0.25,
  skipShare: 0.3,
  gapShare: 0.2,
  draw: normal,
};

export const DOUBLED: PhoneNoise = {
  ...PLANNED,
  compass: 10,
  outlierShare: 0.2,
  index: 1.34,
  indexFixed: 0.4,
  tremor: 0.6,
  drift: 1,
  shadow: 1.4,
  lean: 1,
  clockMinutes: 0.5,
  skipShare: 0.6,
  gapShare: 0.4,
};

export const HEAVY_TAILED: PhoneNoise = { ...PLANNED, draw: heavyTailed };
