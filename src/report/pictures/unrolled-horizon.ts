import { RADIANS, DEGREES } from '../../core/angles/angles.ts';
import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';
import { planeFacing, planeHorizon } from '../../core/horizon/sky-view.ts';
import type { StationShade } from '../../core/shading/station-shade.ts';
import type { Site } from '../../core/survey/survey.ts';
import type { Mark, Picture } from '../marks.ts';
import { halftone } from './halftone.ts';
import { elevationRules, horizonAxes } from './horizon-axes.ts';
import { horizonFrame } from './horizon-frame.ts';
import { isOutside, obstructionMarks, obstructionNames, obstructionShapes } from './horizon-obstructions.ts';
import type { Spot } from './horizon-sun.ts';
import { contourMarks, dayLabels, hourLabels, sunLineMarks } from './horizon-sun.ts';
import { LabelPlaces } from './label-places.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';
import type { SkyFrame } from './sky-frame.ts';
import { obstructionsAt } from './silhouettes.ts';
import { directionAt, linesOf } from './sky-frame.ts';
import type { SmoothDensity } from './smooth-density.ts';
import type { DayLine, HourLine } from './sun-lines.ts';
import { unseenMarks } from './unseen-sky.ts';

export interface HorizonInput {
  site: Site;
  shade: StationShade;
  density: SmoothDensity;
  days: readonly DayLine[];
  hours: readonly HourLine[];
  names: ReadonlyMap<string, string>;
  width: number;
  height: number;
  whole: boolean;
  /** Without contours and their numbers. */
  plain?: boolean;
  /** Of the words; by the width where it is left out. */
  textSize?: number;
}

export interface HorizonPicture extends Picture {
  frame: SkyFrame;
  /** Names of obstructions that stand in none of the azimuths shown. */
  outside: string[];
}

/**
 * The sky of one station unrolled: energy as printer's dots with numbered contours, the sun's ways by month and hour, and
 * what stands in front as hatched shapes.
 */
export function unrolledHorizon(input: HorizonInput, words: PictureWords = ENGLISH): HorizonPicture {
  const { site, shade, density, days, hours, width, height } = input;
  const { textSize: size = width < 560 ? 11 : 13 } = input;
  const paths = [...days, ...hours].flatMap(({ path }) => path);
  const frame = horizonFrame({
    latitude: site.latitude,
    profile: shade.profile,
    paths,
    width,
    height,
    whole: input.whole,
    textSize: size,
  });
  const shownHours = hours.filter(({ hour }) => width >= 560 || hour % 2 === 0);
  const places = new LabelPlaces({ left: frame.left, top: 0, right: width, bottom: frame.below });
  const shapes = obstructionShapes(shade.profile, input.names, shade.imaginedProfile);
  const names = obstructionNames(frame, shapes, places, size, words);
  const hidden = hiddenSpots(frame, shade.imaginedProfile ?? shade.profile);
  const contours = input.plain
    ? { lines: [], numbers: [] }
    : contourMarks(frame, density, places, size, hidden, words);
  const months = dayLabels(frame, days, places, size, hidden);
  const clock = hourLabels(frame, shownHours, places, size, hidden, words);
  const unseen = unseenMarks(frame, shade.observed, places, size, words);
  const sky: Mark[] = [
    ...elevationRules(frame),
    ...unseen.under,
    ...halftone(frame, density, width < 560 ? 3.6 : 4.4),
    ...contours.lines,
    ...sunLineMarks(frame, days, shownHours),
    ...behindPlane(frame, shade),
    ...obstructionMarks(frame, shapes),
  ];
  const box = { x: frame.left, y: 0, width: frame.right - frame.left, height: frame.below };
  const labels = [...unseen.words, ...clock, ...months, ...contours.numbers, ...names];
  return {
    width,
    height,
    frame,
    outside: shapes.filter((shape) => isOutside(frame, shape)).map(({ name }) => name),
    marks: [{ kind: 'clip', ...box, marks: sky }, ...horizonAxes(frame, size, words), ...labels],
  };
}

/** Whether a place on the sheet lies behind something that takes most of its light. */
function hiddenSpots(frame: SkyFrame, profile: HorizonProfile): (spot: Spot) => boolean {
  return ({ x, y }) => {
    const { azimuth, elevation } = directionAt(frame, x, y);
    return obstructionsAt(profile, azimuth, elevation).some(
      (place) => profile.transmittance[place * 12 + 5] < 0.5,
    );
  };
}

/** The line below which the sky lies behind the plane. */
function behindPlane(frame: SkyFrame, { surfaceTilt, surfaceAzimuth }: StationShade): Mark[] {
  if (surfaceTilt < 1) return [];
  const { east, north, upward } = planeFacing(surfaceTilt, surfaceAzimuth);
  const path = Array.from({ length: 181 }, (_, i) => {
    const azimuth = surfaceAzimuth + 90 + i;
    const toward = north * Math.cos(azimuth * RADIANS) + east * Math.sin(azimuth * RADIANS);
    return { azimuth, elevation: planeHorizon(toward, upward) * DEGREES };
  });
  return [
    { kind: 'path', lines: linesOf(frame, path), pen: { tone: 'ink', width: 1, dash: [8, 3, 1.5, 3] } },
  ];
}
