import { blockedSpans } from '../horizon/blocked-spans.ts';
import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import { pointedDirections, stationHorizon } from '../horizon/station-horizon.ts';
import type { Climate } from '../irradiance/climate.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { AccessInterval, UnseenRange } from '../shading/assessment.ts';
import { blockedLight, shadedMonths } from '../shading/blocked-light.ts';
import type { AzimuthRange } from '../angles/azimuth-ranges.ts';
import { observedLight } from '../shading/coverage.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import { unshadedMonths } from '../shading/sky-map.ts';
import type { Station, Survey } from '../survey/survey.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../uncertainty/access-interval.ts';
import { uncertainStation } from '../uncertainty/uncertain-station.ts';

/** What a station has so far, for the person who traces there: the figures of a year, and what they come from. */
export interface StationSoFar {
  /** Annual solar access, 0 to 1. */
  access: number;
  /** How sure that is, without the list of its sources. */
  interval: AccessInterval;
  /** Share of the plane's light that comes through azimuths somebody observed, 0 to 1. */
  coverage: number;
  /** What nobody observed, clockwise: the shares and `coverage` sum to 1. */
  unseen: UnseenRange[];
  profile: HorizonProfile;
  observed: readonly AzimuthRange[];
}

/**
 * The year's figures of one station before the plane of a sky map: the same that the whole assessment gives, without its
 * months, hours and costs, so that they can follow a trace as it grows. `pointed` is the survey's.
 */
export function stationSoFar(
  map: SkyMap,
  climate: Climate['source'],
  survey: Survey,
  station: Station,
  pointed: PointedSurvey,
): StationSoFar {
  const horizon = stationHorizon(survey, station, pointedDirections(pointed));
  const whole = sum(unshadedMonths(map));
  const light = sum(shadedMonths(map, blockedLight(map, blockedSpans(horizon.profile))));
  const access = whole > 0 ? Math.min(1, light / whole) : 1;
  const drawn = drawnSurvey(pointed, survey.site.latitude, climate, { seed: survey.id, sources: false });
  const uncertain = uncertainStation(survey, station, pointed, horizon);
  return {
    access,
    interval: accessInterval([drawAccess(map, uncertain, access, drawn)], drawn),
    ...observedLight(map, horizon.observed),
    ...horizon,
  };
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
