import { isTimeZone } from '../core/solar-position/time-zone.ts';

/**
 * IANA time zone of a place, found without a network; null where the table has none that this device knows, or did not
 * load. The table is simplified: near borders it can be wrong, so it is a proposal.
 */
export async function zoneAt(latitude: number, longitude: number): Promise<string | null> {
  try {
    const { default: lookUp } = await import('@photostructure/tz-lookup');
    const zone = lookUp(latitude, longitude);
    return isTimeZone(zone) ? zone : null;
  } catch {
    return null;
  }
}
