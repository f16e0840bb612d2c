import type { LocationFault } from '../../../app/location-source.ts';

/** Why the device does not tell where it is, and what to do. */
export const LOCATION_FAULTS: Record<LocationFault, string> = {
  refused:
    'This browser may not tell Noonmark where it is. Allow location for this address in the browser’s settings, or type the coordinates.',
  off: 'The device cannot tell where it is. Switch location on, step out under the open sky, or type the coordinates.',
  slow: 'No fix within half a minute. Try again under the open sky, or type the coordinates.',
  'not-offered':
    'This browser has no position to give here; it needs a secure address (https). Type the coordinates.',
  implausible: 'The device gave a position that cannot be. Try again in a minute, or type the coordinates.',
};

/** The sun moves by less than a hundredth of a degree over a kilometre; a wrong town is another matter. */
const ROUGH_METRES = 1000;

/** How far a position can be trusted. */
export function accuracyText(metres: number): string {
  const within = metres < 1000 ? `${Math.round(metres)} m` : `${(metres / 1000).toFixed(1)} km`;
  return metres <= ROUGH_METRES
    ? `From this device, to within ${within}.`
    : `From this device, but only to within ${within}: check it against a map, or type the coordinates.`;
}
