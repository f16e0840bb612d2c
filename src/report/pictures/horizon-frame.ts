import { turnBetween } from '../../core/angles/angles.ts';
import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';
import { hasDegrees } from './horizon-axes.ts';
import type { SkyFrame, SkyPlace } from './sky-frame.ts';

export interface FrameWish {
  latitude: number;
  profile: HorizonProfile;
  /** Where the sun goes. */
  paths: readonly SkyPlace[][];
  width: number;
  height: number;
  /** The whole circle instead of the azimuths that matter. */
  whole: boolean;
  textSize: number;
}

/** Room beside the sun's azimuths, degrees. */
const MARGIN = 8;
/** A window wider than this may as well be the whole circle. */
const NEARLY_ALL = 300;

/** The window of the sky to draw: the equator's side in the middle, cut to where the sun goes unless that is all around. */
export function horizonFrame({
  latitude,
  profile,
  paths,
  width,
  height,
  whole,
  textSize,
}: FrameWish): SkyFrame {
  const equatorward = latitude >= 0 ? 180 : 0;
  const turns = paths.flatMap((path) => path.map(({ azimuth }) => turnBetween(equatorward, azimuth)));
  const [west, east] = [Math.min(0, ...turns) - MARGIN, Math.max(0, ...turns) + MARGIN];
  const all = whole || turns.length === 0 || east - west > NEARLY_ALL;
  const window = all
    ? { centre: equatorward, span: 360 }
    : { centre: (equatorward + (west + east) / 2 + 360) % 360, span: east - west };
  const sides = { left: textSize * 2.4, right: width - 4 };
  const lines = hasDegrees({ ...sides, span: window.span }) ? 3 : 2;
  return {
    ...window,
    ...sides,
    top: topOf(profile, paths, window),
    above: textSize * 0.6,
    below: height - textSize * lines,
  };
}

function topOf(
  profile: HorizonProfile,
  paths: readonly SkyPlace[][],
  { centre, span }: { centre: number; span: number },
): number {
  let top = 25;
  for (const path of paths) for (const { elevation } of path) top = Math.max(top, elevation + 4);
  for (let slice = 0; slice < profile.sliceColumn.length; slice++)
    if (Math.abs(turnBetween(centre, profile.sliceFrom[slice])) <= span / 2)
      for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
        top = Math.max(top, profile.high[k] + 4);
  return Math.min(90, Math.ceil(top / 10) * 10);
}
