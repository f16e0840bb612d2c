import type { SkyMap } from '../shading/sky-map.ts';
import { monthsOf } from '../shading/sky-year.ts';
import { BIAS_PAIRS } from './planning-values.ts';
import type { DrawnLosses, StationDraws } from './station-draws.ts';
import type { SurveyDraws } from './survey-draws.ts';

/**
 * Turns losses into solar access, with the split between direct and even light drawn too. The survey has erred once already
 * and the draws err again from there, so the mean error of pointing stands in them twice too much and is taken off: the
 * draws then lie about the truth. Ref: Davison and Hinkley (1997), Bootstrap Methods and their Application, section 2.4.
 */
export class AccessAccount {
  private readonly shift: number;
  private readonly diffuseOverDirect: number;
  private readonly bias: { direct: number; even: number };

  constructor(
    map: SkyMap,
    private readonly drawn: StationDraws,
    annual: number,
    private readonly draws: SurveyDraws,
    /** Standard deviation of the diffuse light, as a share of it. */
    private readonly spread: number,
    anything: boolean,
  ) {
    this.diffuseOverDirect = diffuseOverDirect(map);
    const { direct, even } = drawn.nominal();
    this.shift = annual - this.left(direct, even, 0);
    this.bias = anything ? drawn.pointingBias(draws, BIAS_PAIRS) : { direct: 0, even: 0 };
  }

  access(
    losses: DrawnLosses,
    count: number,
    scale: { unseen?: number; diffuse?: number } = {},
  ): Float64Array {
    const { unseen = 1, diffuse = 1 } = scale;
    const access = new Float64Array(count);
    for (let i = 0; i < count; i++) {
      const direct = losses.direct[i] + unseen * losses.unseenDirect[i] - 2 * this.bias.direct;
      const even = losses.even[i] + unseen * losses.unseenEven[i] - 2 * this.bias.even;
      const share = this.left(direct, even, diffuse * this.spread * this.draws.diffuse[i]);
      access[i] = Math.max(0, Math.min(1, share + this.shift));
    }
    return access;
  }

  /** Share of the light that is left, with `more` diffuse light (a share of it) and as much less direct light. */
  private left(lostDirect: number, lostEven: number, more: number): number {
    const { direct, even, ground } = this.drawn.light;
    const evenScale = Math.max(0.1, 1 + more);
    const directScale = Math.max(0.1, 1 - more * this.diffuseOverDirect);
    const whole = directScale * direct + evenScale * even + ground;
    return whole > 0 ? 1 - (directScale * lostDirect + evenScale * lostEven) / whole : 1;
  }
}

/** Diffuse over direct light on the horizontal in a year, without what comes from the sun's place. */
function diffuseOverDirect(map: SkyMap): number {
  const sum = (values: readonly number[]) => values.reduce((all, value) => all + value, 0);
  const diffuse = sum(monthsOf(map.year.dome));
  const direct = sum(monthsOf(map.year.ghi)) - diffuse;
  return direct > 0 ? diffuse / direct : 0;
}
