/** Angles of an event, once they are known to be numbers. */
export interface EventAngles {
  alpha: number;
  beta: number;
  gamma: number;
  absolute: boolean;
  compassHeading: number | null;
  compassAccuracy: number | null;
}

/** What some platforms add to the event. */
interface WithCompass {
  webkitCompassHeading?: unknown;
  webkitCompassAccuracy?: unknown;
}

const finite = (value: unknown): number | null =>
  typeof value === 'number' && Number.isFinite(value) ? value : null;

/** The angles of an event; null where one of them is missing or no number, as on a device without the sensor. */
export function anglesOf(event: DeviceOrientationEvent): EventAngles | null {
  const [alpha, beta, gamma] = [finite(event.alpha), finite(event.beta), finite(event.gamma)];
  if (alpha === null || beta === null || gamma === null) return null;
  const { webkitCompassHeading, webkitCompassAccuracy } = event as WithCompass;
  const heading = finite(webkitCompassHeading);
  return {
    alpha,
    beta,
    gamma,
    absolute: event.absolute || event.type === 'deviceorientationabsolute',
    compassHeading: heading !== null && heading >= 0 && heading <= 360 ? heading : null,
    compassAccuracy: finite(webkitCompassAccuracy),
  };
}

interface MayAsk {
  requestPermission?: (absolute?: boolean) => Promise<string>;
}

/** Asks the platform for its angles where it wants to be asked; to be called inside a tap. */
export async function mayUseOrientation(): Promise<boolean> {
  if (typeof DeviceOrientationEvent === 'undefined') return true; // told as a missing sensor, by the watchdog
  const { requestPermission } = DeviceOrientationEvent as unknown as MayAsk;
  if (typeof requestPermission !== 'function') return true;
  try {
    return (await requestPermission.call(DeviceOrientationEvent, true)) === 'granted';
  } catch {
    return false;
  }
}
