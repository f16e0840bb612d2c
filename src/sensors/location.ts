import {
  plausiblePosition,
  type LocationFault,
  type LocationOutcome,
  type LocationSource,
} from '../app/location-source.ts';

/** A first fix under the open sky takes up to half a minute. */
const PATIENCE_MS = 30_000;
/** Heights less sure than this are left out. */
const UNSURE_HEIGHT = 50;

const FAULTS: Record<number, LocationFault> = { 1: 'refused', 2: 'off', 3: 'slow' };

function outcomeOf({ coords }: GeolocationPosition): LocationOutcome {
  const sure = coords.altitude !== null && (coords.altitudeAccuracy ?? Infinity) <= UNSURE_HEIGHT;
  const position = plausiblePosition({
    latitude: coords.latitude,
    longitude: coords.longitude,
    altitude: sure ? coords.altitude : null,
    accuracy: coords.accuracy,
  });
  return position ? { ok: true, position } : { ok: false, why: 'implausible' };
}

/** The device's own position. */
export const deviceLocation: LocationSource = {
  locate: () =>
    new Promise((resolve) => {
      // Missing on addresses without https, whatever the typings say.
      const offered = (navigator as { geolocation?: Geolocation }).geolocation;
      if (!offered) return resolve({ ok: false, why: 'not-offered' });
      offered.getCurrentPosition(
        (position) => resolve(outcomeOf(position)),
        ({ code }) => resolve({ ok: false, why: FAULTS[code] ?? 'off' }),
        { enableHighAccuracy: true, timeout: PATIENCE_MS, maximumAge: 0 },
      );
    }),
};
