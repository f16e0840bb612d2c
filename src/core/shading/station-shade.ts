import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import type { StationHorizon } from '../horizon/station-horizon.ts';
import { assessStation } from './assess-station.ts';
import type { StationAssessment } from './assessment.ts';
import type { AzimuthRange } from '../angles/azimuth-ranges.ts';
import { hourLight, monthHourTable } from './hour-light.ts';
import type { SkyDensity } from './sky-density.ts';
import type { KnownObstructions } from './obstruction-shading.ts';
import type { SkyMap } from './sky-map.ts';
import { unshadedMonths } from './sky-map.ts';
import type { ObstructionChange } from './what-if.ts';
import { changedProfile } from './what-if.ts';

/** What one station saw laid over what one plane gets: figures and all that a picture of them is drawn from. */
export interface StationShade {
  readonly surfaceTilt: number;
  readonly surfaceAzimuth: number;
  readonly measured: StationAssessment;
  /** The same with changes imagined; null where none are. */
  readonly imagined: StationAssessment | null;
  /** What would stand around then. */
  readonly imaginedProfile: HorizonProfile | null;
  /** Irradiation with nothing in the way, kWh/m2. */
  readonly unshaded: { annual: number; monthly: number[]; /** [month][hour]. */ hourly: number[][] };
  /** As measured. */
  readonly profile: HorizonProfile;
  readonly observed: readonly AzimuthRange[];
  /** Where the plane's direct light comes from, with nothing in the way. */
  readonly density: SkyDensity;
}

/** Joins a plane's map, its density and a station's horizon; throws RangeError as `changedProfile` does. */
export function stationShade(
  map: SkyMap,
  density: SkyDensity,
  horizon: StationHorizon,
  station: { id: string; name: string },
  obstructions: KnownObstructions,
  changes: readonly ObstructionChange[] = [],
): StationShade {
  const assess = (profile: HorizonProfile) =>
    assessStation(map, { ...horizon, profile }, station, obstructions);
  const imaginedProfile = changes.length > 0 ? changedProfile(horizon.profile, changes) : null;
  return {
    ...measuredShade(map, density, horizon, assess(horizon.profile)),
    imagined: imaginedProfile && assess(imaginedProfile),
    imaginedProfile,
  };
}

/** The same where the station has been assessed and nothing is imagined. */
export function measuredShade(
  map: SkyMap,
  density: SkyDensity,
  horizon: StationHorizon,
  measured: StationAssessment,
): StationShade {
  const monthly = unshadedMonths(map);
  return {
    surfaceTilt: map.surfaceTilt,
    surfaceAzimuth: map.surfaceAzimuth,
    measured,
    imagined: null,
    imaginedProfile: null,
    unshaded: {
      annual: monthly.reduce((sum, light) => sum + light, 0),
      monthly,
      hourly: unshadedHours(map),
    },
    profile: horizon.profile,
    observed: horizon.observed,
    density,
  };
}

/** Irradiation on a plane with nothing in the way by month and hour of local standard time, kWh/m2. */
export function unshadedHours(map: SkyMap): number[][] {
  const light = hourLight(map);
  return monthHourTable((cell) => light(cell).whole);
}
