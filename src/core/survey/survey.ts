/**
 * The record of one survey: one visit to one site, format `noonmark-survey` version 1.
 *
 * Units unless said otherwise: degrees, metres, UTC instants as ISO 8601 text. Azimuths run clockwise from true
 * north, 0 to 360; elevations run up from the horizontal and are apparent (as seen). Every entity has a stable `id`;
 * an `order` key sorts a list where it is given, else the order of the list stands.
 */

export const SURVEY_FORMAT = 'noonmark-survey';
export const SURVEY_VERSION = 1;

/** Twelve values, January to December. */
export type Months = [
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
];

export interface Survey {
  format: typeof SURVEY_FORMAT;
  version: typeof SURVEY_VERSION;
  id: string;
  title: string;
  /** Calendar day of the visit, YYYY-MM-DD. */
  surveyedOn?: string;
  notes?: string;
  site: Site;
  climate: ClimateChoice;
  /** Way of laying sky light on a plane; absent means `hay-davies`. */
  transposition?: TranspositionId;
  planes: RoofPlane[];
  obstructions: Obstruction[];
  runs: Run[];
  readings: Reading[];
  stations: Station[];
}

export interface Site {
  /** -90 to 90, north positive. */
  latitude: number;
  /** -180 to 180, east positive. */
  longitude: number;
  /** Metres above sea level, -430 to 9000; absent means 0. */
  altitude?: number;
  /** IANA name such as `Europe/Lisbon`. */
  timeZone: string;
  address?: string;
  /** Share of light the ground reflects, 0 to 1; absent means 0.2. */
  albedo?: number;
}

export type TranspositionId = 'hay-davies' | 'perez' | 'isotropic';

export type ClimateChoice =
  | { source: 'world' }
  | { source: 'weather-file'; name: string; sha256?: string }
  | { source: 'clear-sky'; model: ClearSkyModel; linkeTurbidity?: Months };

export type ClearSkyModel = 'ineichen' | 'haurwitz-erbs';

export interface RoofPlane {
  id: string;
  name: string;
  order?: number;
  /** Tilt from the horizontal, 0 (flat) to 90 (a wall). */
  surfaceTilt: number;
  /** Azimuth the plane faces down its slope; kept at tilt 0 to fix the axes. */
  surfaceAzimuth: number;
  /** Metres along the eave. */
  width?: number;
  /** Metres up the slope. */
  slopeLength?: number;
  /** Lower-left corner, looking up the slope, in the site's local frame. */
  corner?: LocalPoint;
  /** Corners in the plane instead of width by slope length, metres. */
  outline?: PlanePoint[];
}

/** Metres in the site's local frame. */
export interface LocalPoint {
  east: number;
  north: number;
  up: number;
}

/** Metres in a plane: x along the eave to the right, y up the slope, from the lower-left corner. */
export interface PlanePoint {
  x: number;
  y: number;
}

export type ObstructionKind =
  | 'deciduous-tree'
  | 'evergreen-tree'
  | 'building'
  | 'roof-part'
  | 'chimney'
  | 'mast'
  | 'wire'
  | 'terrain'
  | 'other';

export interface Obstruction {
  id: string;
  name: string;
  order?: number;
  kind: ObstructionKind;
  /** Horizontal distance from the stations, metres; absent means unknown, counted as far. */
  distance?: number;
  /** Share of the light that passes, one value or twelve, 0 (opaque) to 1; absent means the kind's own. */
  transmittance?: number | Months;
}

/** One unbroken session of the orientation sensor. */
export interface Run {
  id: string;
  device?: string;
  frame: 'true' | 'magnetic' | 'relative';
  startedAt: string;
}

/** A raw reading, as the device gave it; never changed after it is stored. */
export interface Reading {
  id: string;
  run: string;
  takenAt: string;
  alpha?: number;
  beta?: number;
  gamma?: number;
}

export interface Station {
  id: string;
  name: string;
  order?: number;
  /** Absent means unknown. */
  position?: StationPosition;
  /** Height of the instrument above the surface, metres. */
  instrumentHeight?: number;
  /** Ids of the planes this station speaks for. */
  serves: string[];
  /** Azimuth ranges [from, to], clockwise, looked at and found open. */
  observedOpen?: [number, number][];
  headingChecks?: HeadingCheck[];
  traces: Trace[];
}

export type StationPosition = ({ on: string } & PlanePoint) | LocalPoint;

export interface HeadingCheck {
  id: string;
  method: 'sun-shadow' | 'known-mark' | 'plan-bearing';
  reading?: string;
  /** Bearing of the reference, for the methods that have one. */
  bearing?: number;
  frame?: 'true' | 'magnetic' | 'grid';
}

export type TraceShape = 'skyline' | 'outline' | 'line';
export type TraceEdge = 'straight' | 'drawn';

/** Ordered sightings along the edge of one obstruction. */
export interface Trace {
  id: string;
  order?: number;
  obstruction: string;
  shape: TraceShape;
  /** Absent means the obstruction kind's own. */
  edge?: TraceEdge;
  /** The last sighting joins the first around the whole horizon; for a skyline. */
  fullCircle?: boolean;
  /** Angular width of a line, degrees, over 0 to 20; needed by shape `line`. */
  angularWidth?: number;
  sightings: Sighting[];
}

/** One pointing: typed values, or a raw reading, or both; amendments stand over either. */
export interface Sighting {
  id: string;
  order?: number;
  azimuth?: number;
  elevation?: number;
  reading?: string;
  /** Name of a recognisable point, sighted from other stations too. */
  mark?: string;
  amendments?: Amendment[];
}

/** A correction by hand; the last one counts. */
export interface Amendment {
  azimuth: number;
  elevation: number;
  reason: string;
  madeAt: string;
}
