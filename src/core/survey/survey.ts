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
  /** Who took the sightings. */
  surveyor?: string;
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
  /** What the office needs to know of the house, in the surveyor's words. */
  facts?: SiteFact[];
  photos?: Photo[];
}

/** One thing to know of the site: of a list of such things, or of the surveyor's own. */
export interface SiteFact {
  /** The row of the list it answers, such as `roof-covering`; any other id for one of the surveyor's own. */
  id: string;
  order?: number;
  /** What is told, where no list says so. */
  label?: string;
  /** In words; several where several hold. */
  value: string | string[];
}

/** A photo; its picture is kept under its hash, apart from the record. */
export interface Photo {
  id: string;
  order?: number;
  of: PhotoSubject;
  takenAt: string;
  /** Where the camera looked, clockwise from true north, as somebody typed it; it stands over the reading. */
  azimuth?: number;
  /** Raw reading of where the camera looked. */
  reading?: string;
  /** Of the picture, in its own dots. */
  width: number;
  height: number;
  bytes: number;
  /** Of the picture's bytes, hexadecimal. */
  sha256: string;
}

/** What a photo shows: the site as a whole, or one thing of the record. */
export interface PhotoSubject {
  kind: 'site' | 'station' | 'plane' | 'obstruction' | 'fact';
  /** Absent for the site. */
  id?: string;
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
  /** Country whose lists the site's facts are taken from, two letters of ISO 3166-1. */
  country?: string;
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
  /** Readings that tell the tilt; `surfaceTilt` stays what the surveyor settled on. */
  tiltPlacings?: TiltPlacing[];
  /** Sightings along an edge that tell the azimuth; `surfaceAzimuth` stays what the surveyor settled on. */
  azimuthSightings?: AzimuthSighting[];
}

/** The phone put to a plane once. Turned end for end and put again, the sensor's own tilt cancels. */
export interface TiltPlacing {
  id: string;
  order?: number;
  reading: string;
  /**
   * `flat`: the phone's back on the surface, or on a straight board laid on it, screen up; `edge`: the phone's long
   * edge along a gable verge or a rafter. Absent means flat.
   */
  held?: 'flat' | 'edge';
}

/** The phone's sighting axis along a line of a plane once. */
export interface AzimuthSighting {
  id: string;
  order?: number;
  reading: string;
  /** `eave`: along an eave or a ridge, either way, square to which the plane faces; `fall`: down the slope. */
  along: 'eave' | 'fall';
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

/**
 * A raw reading, as the device gave it; never changed after it is stored. Angles are those of the W3C Device
 * Orientation events (intrinsic Z-X'-Y''), in the frame of the run.
 */
export interface Reading {
  id: string;
  run: string;
  /** Instant of `alpha`, `beta` and `gamma`, and zero of the times of `samples`. */
  takenAt: string;
  alpha?: number;
  beta?: number;
  gamma?: number;
  /** What was pointed: the rear camera, or the phone's top edge. Absent means the camera. */
  axis?: SightingAxis;
  /** Rows of a hold, or of a chunk of a sweep of at most half a second; in order of time. */
  samples?: ReadingSample[];
  /** Heading of the phone's top edge by the device's compass, clockwise from magnetic north, where it gives one. */
  compassHeading?: number;
  /** Greatest deviation of that heading by the device's own account; negative where it has none. */
  compassAccuracy?: number;
  /** Whether the event said that its angles are tied to the earth. */
  absolute?: boolean;
  /** Turn of the screen against its natural orientation when read; the angles do not depend on it. */
  screenAngle?: number;
}

/** The rear camera (device -z) or the phone's top edge (device +y). */
export type SightingAxis = 'camera' | 'top-edge';

/** Milliseconds after the reading's `takenAt`, then alpha, beta and gamma. */
export type ReadingSample = [ms: number, alpha: number, beta: number, gamma: number];

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
  /** True azimuth ranges [from, to], clockwise, looked at and found open. */
  observedOpen?: [number, number][];
  /** The same as the phone read them; they turn with the heading of their run. */
  openLooks?: OpenLook[];
  headingChecks?: HeadingCheck[];
  /**
   * Sightings of marks that belong to no trace. A mark sighted twice in one run closes the horizon; a mark sighted in
   * two runs ties them.
   */
  markSightings?: Sighting[];
  /** Two-face checks of the inclination. */
  indexChecks?: IndexCheck[];
  traces: Trace[];
}

/** Azimuths that somebody looked along with the phone and found open. */
export interface OpenLook {
  id: string;
  order?: number;
  run: string;
  /** [from, to], clockwise, as read in the frame of the run; 0 to 360 for all around. */
  azimuths: [number, number];
  /** Instant whose heading turns them. */
  lookedAt: string;
  /** Raw readings of the look, where the phone was turned along. */
  readings?: string[];
}

export type StationPosition = ({ on: string } & PlanePoint) | LocalPoint;

/**
 * One comparison of a run's azimuths with a direction known otherwise. What was read stands in the reading, the
 * instant too; the offset is computed.
 */
export interface HeadingCheck {
  id: string;
  order?: number;
  /**
   * `sun-shadow`: the axis pointed along a shadow, away from the sun; `known-mark`: at a mark whose bearing is known;
   * `plan-bearing`: at a mark, or (naming none) along an eave, whose bearing was read from a plan; of an eave either
   * way along it, which a compass tells apart.
   */
  method: HeadingMethodId;
  /** Absent: every sighting of `mark` at this station. */
  reading?: string;
  /** Name of the mark that was sighted. */
  mark?: string;
  /** Bearing of the reference, clockwise from the north of `frame`, for the methods that have one. */
  bearing?: number;
  /** North of the bearing; absent means true. */
  frame?: 'true' | 'magnetic' | 'grid';
  /** Standard deviation of the bearing; absent means the method's planning value. */
  bearingDeviation?: number;
  /** Grid convergence: true bearing = grid bearing + convergence. */
  convergence?: number;
  /** UTM zone of the grid, such as `33N`, from which the convergence is computed where it is not given. */
  gridZone?: string;
  /** Height of an upright object over level ground, metres, and the length of its shadow: they test the clock. */
  shadowHeight?: number;
  shadowLength?: number;
}

export type HeadingMethodId = 'sun-shadow' | 'known-mark' | 'plan-bearing';

/** Two readings of one mark, the phone turned 180° about the viewing axis between them. */
export interface IndexCheck {
  id: string;
  order?: number;
  /** Reading with the phone as it is held for sighting. */
  upright: string;
  /** Reading with the phone upside down. */
  turned: string;
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
  /** Readings that one pointing took: all are averaged, together with `reading`. */
  readings?: string[];
  /**
   * For a point of a sweep: when the phone pointed there, milliseconds after `takenAt` of `reading`. Absent means the
   * mean of the samples.
   */
  sampleAt?: number;
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
