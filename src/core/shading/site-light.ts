import type { Climate } from '../irradiance/climate.ts';
import { sunTrack } from '../solar-position/sun-track.ts';
import { standardOffsetMinutes } from '../solar-position/time-zone.ts';
import type { Site, TranspositionId } from '../survey/survey.ts';
import { transpositionOf } from '../transposition/transposition-models.ts';
import type { Orientation } from './orientation-factor.ts';
import { orientation } from './orientation-factor.ts';
import type { SkyGrid } from './sky-grid.ts';
import { skyGrid } from './sky-grid.ts';
import type { SkyYear } from './sky-year.ts';
import { skyYear } from './sky-year.ts';
import { sunPaths } from './sun-paths.ts';

/** Minutes of a step where nothing else is asked for; the exactness of the results is measured at it. */
export const DEFAULT_STEP_MINUTES = 5;
export const DEFAULT_ALBEDO = 0.2;

export interface LightOptions {
  /** Absent: Hay and Davies. */
  transposition?: TranspositionId;
  /** A divisor of 60, 1 to 15. */
  stepMinutes?: number;
}

/** One site's light, ready to be laid on any plane. */
export interface SiteLight {
  year: SkyYear;
  grid: SkyGrid;
  orientation: Orientation;
}

/** A year of light over a site. Throws RangeError for a step or a site out of range. */
export function siteLight(site: Site, climate: Climate, options: LightOptions = {}): SiteLight {
  const track = sunTrack(
    { ...site, utcOffset: standardOffsetMinutes(site.timeZone) },
    options.stepMinutes ?? DEFAULT_STEP_MINUTES,
  );
  const paths = sunPaths(track);
  const year = skyYear(
    paths,
    climate,
    transpositionOf(options.transposition ?? 'hay-davies'),
    site.albedo ?? DEFAULT_ALBEDO,
  );
  return { year, grid: skyGrid(paths), orientation: orientation(year) };
}
