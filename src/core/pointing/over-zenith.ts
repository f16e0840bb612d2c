import { turnBetween } from '../angles/angles.ts';

interface SkyPlace {
  azimuth: number;
  elevation: number;
}

/** Above this, neighbours in opposite azimuths are joined over the zenith, degrees. */
const NEAR_ZENITH = 60;

/**
 * The places of an edge with the zenith between neighbours that face each other across it: whoever followed the edge
 * went straight over. Degrees.
 */
export function overZenith<P extends SkyPlace>(places: readonly P[]): P[] {
  return places.flatMap((place, i) => {
    const before = places[i - 1];
    const isAcross =
      i > 0 &&
      Math.min(before.elevation, place.elevation) > NEAR_ZENITH &&
      180 - Math.abs(turnBetween(before.azimuth, place.azimuth)) < 1e-6;
    return isAcross ? [{ ...place, azimuth: (before.azimuth + 90) % 360, elevation: 90 }, place] : [place];
  });
}
