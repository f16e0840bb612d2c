import { leafShares } from '../survey/leaf-months.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import type { AnnualLight } from './annual-light.ts';
import { annualLight } from './annual-light.ts';
import type { Deviations } from './blocked-annual.ts';
import { BlockedAnnual } from './blocked-annual.ts';
import type { DrawnRegions } from './drawn-regions.ts';
import { drawnRegions } from './drawn-regions.ts';
import type { IntervalSourceId } from './interval-source.ts';
import { LEFT_AFTER } from './planning-values.ts';
import type { RandomSource } from './random-source.ts';
import { randomSource } from './random-source.ts';
import type { SurveyDraws } from './survey-draws.ts';
import type { Spread, UncertainObstruction, UncertainStation } from './uncertain-station.ts';
import type { UnseenPatch } from './unseen-sky.ts';
import { takeUnseen, unseenPatches } from './unseen-sky.ts';

/** What a plane loses at one station, draw by draw, kWh/m2 a year: to what was traced, and to what was not looked at. */
export interface DrawnLosses {
  direct: Float64Array;
  even: Float64Array;
  unseenDirect: Float64Array;
  unseenEven: Float64Array;
}

/** One station before one plane, made ready to be drawn many times. */
export class StationDraws {
  readonly light: AnnualLight;
  readonly patches: readonly UnseenPatch[];
  /** Whether anything that was traced lets light through by a share that is not sure. */
  readonly spreads: boolean;
  private readonly regions: DrawnRegions;
  private readonly blocked: BlockedAnnual;
  private readonly leaf: number[];
  private readonly deviations: Deviations;

  constructor(
    map: SkyMap,
    private readonly station: UncertainStation,
    latitude: number,
  ) {
    const { obstructions } = station;
    const keys = Array.from({ length: 12 }, (_, month) =>
      obstructions.map(({ transmittance }) => transmittance[month]).join(),
    );
    this.light = annualLight(map, keys);
    this.leaf = leafOfClasses(this.light, latitude);
    this.regions = drawnRegions(obstructions);
    this.blocked = new BlockedAnnual(this.light, this.regions, obstructions.length);
    this.patches = unseenPatches(this.light, station.observed, station.profile);
    this.spreads = obstructions.some(({ leafOn, leafOff }) => leafOn[1] + leafOff[1] > 0);
    const count = this.regions.sightings.length;
    this.deviations = {
      azimuth: new Float64Array(count),
      elevation: new Float64Array(count),
      stray: new Float64Array(this.regions.edgeStray.length),
      lost: new Float64Array(obstructions.length * this.light.classes),
    };
  }

  /** Losses with everything as the survey has it. */
  nominal(): { direct: number; even: number } {
    const { deviations } = this;
    deviations.azimuth.fill(0);
    deviations.elevation.fill(0);
    deviations.stray.fill(0);
    this.station.obstructions.forEach((obstruction, o) => this.setLost(obstruction, o, null, 1));
    return { ...this.blocked.take(deviations) };
  }

  /** `count` draws; with `cured`, that source at what is left of it, the same random numbers otherwise. */
  draw(survey: SurveyDraws, count: number, cured?: IntervalSourceId): DrawnLosses {
    const room = () => new Float64Array(count);
    const losses = { direct: room(), even: room(), unseenDirect: room(), unseenEven: room() };
    const random = randomSource(survey.seed, 'station', this.station.id);
    const unseen = randomSource(survey.seed, 'unseen', this.station.id);
    const sighting = cured === 'pointing' ? LEFT_AFTER.sightedAgain : 1;
    const gap = cured === 'gaps' ? LEFT_AFTER.moreSightings : 1;
    const passing = cured === 'transmittance' ? LEFT_AFTER.measuredPassing : 1;
    const u = this.station.obstructions.map(({ id }) => survey.passing(id));
    for (let i = 0; i < count; i++) {
      this.moveSightings(survey, i, random.normal.bind(random), sighting);
      this.strayEdges(random, gap);
      this.station.obstructions.forEach((one, o) => this.setLost(one, o, u[o][i], passing));
      const { direct, even } = this.blocked.take(this.deviations);
      losses.direct[i] = direct;
      losses.even[i] = even;
      const hidden = { direct: 0, even: 0 };
      takeUnseen(this.patches, unseen, hidden);
      losses.unseenDirect[i] = hidden.direct;
      losses.unseenEven[i] = hidden.even;
    }
    return losses;
  }

  /**
   * What the pointing's errors take from the plane in the mean, beyond what no error takes: thin and upright things are
   * seen wider, for one. Each draw is held against its opposite, so that a few are enough.
   */
  pointingBias(survey: SurveyDraws, pairs: number): { direct: number; even: number } {
    const without = this.nominal();
    const { azimuth, elevation } = this.deviations;
    const random = randomSource(survey.seed, 'station', this.station.id);
    const normal = random.normal.bind(random);
    const bias = { direct: 0, even: 0 };
    const count = Math.min(pairs, survey.count);
    for (let i = 0; i < count; i++) {
      this.moveSightings(survey, i, normal, 1);
      for (const sign of [1, -1]) {
        const { direct, even } = this.blocked.take(this.deviations);
        bias.direct += (direct - without.direct) / (2 * count);
        bias.even += (even - without.even) / (2 * count);
        for (let k = 0; sign > 0 && k < azimuth.length; k++) {
          azimuth[k] = -azimuth[k];
          elevation[k] = -elevation[k];
        }
      }
    }
    return bias;
  }

  private strayEdges(random: RandomSource, scale: number): void {
    const { edgeStray, edgeBulge } = this.regions;
    const { stray } = this.deviations;
    for (let edge = 0; edge < stray.length; edge++) {
      stray[edge] = scale * edgeStray[edge] * random.normal();
      if (edgeBulge[edge] !== 0) stray[edge] += scale ** 2 * edgeBulge[edge] * 2 * random.uniform();
    }
  }

  private moveSightings(survey: SurveyDraws, i: number, normal: () => number, scale: number): void {
    const { azimuth, elevation } = this.deviations;
    const { sightings } = this.regions;
    for (let k = 0; k < sightings.length; k++) {
      const { run, axis, minutes, across, upward } = sightings[k];
      const drawn = run === null ? undefined : survey.runs.get(run);
      azimuth[k] = drawn ? drawn.heading[i] + drawn.rate[i] * minutes : survey.typed.heading[i];
      elevation[k] = drawn ? drawn.index[axis][i] : survey.typed.index[i];
      const own = drawn ? scale * survey.noise[i] : scale;
      azimuth[k] += own * across * normal();
      elevation[k] += own * upward * normal();
    }
  }

  /** Share lost in each class of months; `u` tells where in its spread the transmittance lies, null: at its value. */
  private setLost(
    { transmittance, leafOn, leafOff }: UncertainObstruction,
    o: number,
    u: number | null,
    scale: number,
  ): void {
    const { classes, classOfMonth } = this.light;
    const [on, off] = u === null ? [0, 0] : [scale * triangular(leafOn, u), scale * triangular(leafOff, u)];
    for (let k = 0; k < classes; k++) {
      const passes = transmittance[classOfMonth.indexOf(k)];
      const moved = passes + on * this.leaf[k] + off * (1 - this.leaf[k]);
      this.deviations.lost[o * classes + k] = 1 - Math.max(0, Math.min(1, moved));
    }
  }
}

function leafOfClasses({ classes, classOfMonth }: AnnualLight, latitude: number): number[] {
  const shares = leafShares(latitude);
  return Array.from({ length: classes }, (_, k) => shares[classOfMonth.indexOf(k)]);
}

/** The value at `u` [0 to 1] of a triangle with its mode at 0. */
function triangular([below, above]: Spread, u: number): number {
  const width = below + above;
  if (width <= 0) return 0;
  return u < below / width
    ? -below + Math.sqrt(u * width * below)
    : above - Math.sqrt((1 - u) * width * above);
}
