/** Where the device says it is. */
export interface DevicePosition {
  latitude: number;
  longitude: number;
  /** Metres above sea level as far as the device tells; null where it does not, or is unsure by over 50 m. */
  altitude: number | null;
  /** Metres within which it lies with 95 % confidence, by the device's own account. */
  accuracy: number;
}

/**
 * `refused`: permission denied; `off`: the device cannot tell (location switched off, no fix); `slow`: no answer in
 * time; `not-offered`: the browser has no such thing here; `implausible`: what it gave cannot be.
 */
export type LocationFault = 'refused' | 'off' | 'slow' | 'not-offered' | 'implausible';

export type LocationOutcome = { ok: true; position: DevicePosition } | { ok: false; why: LocationFault };

/** Asks the device where it is; called inside a tap, since it may ask for permission. Never rejects. */
export interface LocationSource {
  locate(): Promise<LocationOutcome>;
}

/** What an answer is worth: null where it is no place on earth, or the zero that a broken receiver gives. */
export function plausiblePosition(position: DevicePosition): DevicePosition | null {
  const { latitude, longitude, altitude, accuracy } = position;
  const isPlace = Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180 && accuracy >= 0;
  if (!isPlace || !Number.isFinite(accuracy) || (latitude === 0 && longitude === 0)) return null;
  const isHeight = altitude !== null && altitude >= -430 && altitude <= 9000;
  return { ...position, altitude: isHeight ? altitude : null };
}
