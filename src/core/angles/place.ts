/** A place on the earth, WGS 84. */
export interface Coordinates {
  /** Degrees, north positive. */
  latitude: number;
  /** Degrees, east positive. */
  longitude: number;
}

/** To 1e-7 degrees, a centimetre; no negative zero. */
export const toCentimetre = ({ latitude, longitude }: Coordinates): Coordinates => ({
  latitude: Math.round(latitude * 1e7) / 1e7 || 0,
  longitude: Math.round(longitude * 1e7) / 1e7 || 0,
});
