import * as v from 'valibot';
import * as f from './field-schemas.ts';
import { LIMITS } from './limits.ts';
import { obstructionKinds } from './obstruction-kinds.ts';
import { SURVEY_FORMAT, SURVEY_VERSION } from './survey.ts';

/**
 * The shape of the record, field by field, from which the published JSON Schema is made. Fields it does not name are
 * let through. What holds between fields (references, geometry) is checked beside it.
 */

const siteSchema = v.looseObject(
  {
    latitude: f.numberBetween(-90, 90, 'degrees, north positive'),
    longitude: f.numberBetween(-180, 180, 'degrees, east positive'),
    altitude: v.optional(f.numberBetween(-430, 9000, 'metres above sea level')),
    timeZone: f.timeZone,
    address: v.optional(f.name),
    country: v.optional(f.countryCode),
    albedo: v.optional(f.share),
  },
  'an object with latitude, longitude and timeZone',
);

const climateSchema = v.variant(
  'source',
  [
    v.looseObject({ source: v.literal('world') }),
    v.looseObject({ source: v.literal('weather-file'), name: f.name, sha256: v.optional(f.name) }),
    v.looseObject({
      source: v.literal('clear-sky'),
      model: f.oneOf(['ineichen', 'haurwitz-erbs']),
      linkeTurbidity: v.optional(f.monthsOf(f.numberBetween(1, 15))),
    }),
  ],
  'one of the climate sources "world", "weather-file" (with name) and "clear-sky" (with model)',
);

const localPointSchema = v.looseObject(
  { east: f.coordinate, north: f.coordinate, up: f.coordinate },
  'an object with east, north and up, in metres',
);

const planePointSchema = v.looseObject(
  { x: f.coordinate, y: f.coordinate },
  'an object with x and y, in metres',
);

const tiltPlacingSchema = v.looseObject(
  { id: f.identifier, order: f.orderKey, reading: f.identifier, held: v.optional(f.oneOf(['flat', 'edge'])) },
  'an object: one placing of the phone',
);

const azimuthSightingSchema = v.looseObject(
  { id: f.identifier, order: f.orderKey, reading: f.identifier, along: f.oneOf(['eave', 'fall']) },
  'an object: one sighting along an edge',
);

const planeSchema = v.looseObject(
  {
    id: f.identifier,
    name: f.name,
    order: f.orderKey,
    surfaceTilt: f.numberBetween(0, 90, 'degrees'),
    surfaceAzimuth: f.azimuth,
    width: v.optional(f.numberOver(0, 10_000, 'metres')),
    slopeLength: v.optional(f.numberOver(0, 10_000, 'metres')),
    corner: v.optional(localPointSchema),
    outline: v.optional(
      v.pipe(f.listOf(planePointSchema), v.minLength(3, 'a list of at least three corners')),
    ),
    tiltPlacings: v.optional(f.listOf(tiltPlacingSchema)),
    azimuthSightings: v.optional(f.listOf(azimuthSightingSchema)),
  },
  'an object: one roof plane',
);

const obstructionSchema = v.looseObject(
  {
    id: f.identifier,
    name: f.name,
    order: f.orderKey,
    kind: f.oneOf(obstructionKinds.map(({ kind }) => kind)),
    distance: v.optional(f.numberOver(0, 1_000_000, 'metres')),
    transmittance: v.optional(
      v.union([f.share, f.monthsOf(f.share)], 'a number from 0 to 1, or a list of twelve'),
    ),
  },
  'an object: one obstruction',
);

const runSchema = v.looseObject(
  {
    id: f.identifier,
    device: v.optional(f.name),
    frame: f.oneOf(['true', 'magnetic', 'relative']),
    startedAt: f.instant,
  },
  'an object: one run of the sensor',
);

const angle = f.numberBetween(-360, 360, 'degrees');
const angleAsRead = v.optional(angle);
const sampleTime = f.numberBetween(0, LIMITS.sampleMs, 'milliseconds');

const samplesPhrase = `a list of at most ${LIMITS.samples} rows [ms, alpha, beta, gamma]`;
const samplesSchema = v.pipe(
  v.array(
    v.strictTuple([sampleTime, angle, angle, angle], 'a row of four numbers: ms, alpha, beta, gamma'),
    samplesPhrase,
  ),
  v.maxLength(LIMITS.samples, samplesPhrase),
);

const readingSchema = v.looseObject(
  {
    id: f.identifier,
    run: f.identifier,
    takenAt: f.instant,
    alpha: angleAsRead,
    beta: angleAsRead,
    gamma: angleAsRead,
    axis: v.optional(f.oneOf(['camera', 'top-edge'])),
    samples: v.optional(samplesSchema),
    compassHeading: v.optional(f.azimuth),
    compassAccuracy: v.optional(f.numberBetween(-1, 360, 'degrees')),
    absolute: v.optional(f.yesOrNo),
    screenAngle: v.optional(angle),
  },
  'an object: one raw reading',
);

const amendmentSchema = v.looseObject(
  { azimuth: f.azimuth, elevation: f.elevation, reason: f.name, madeAt: f.instant },
  'an object: one amendment',
);

const sightingSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    azimuth: v.optional(f.azimuth),
    elevation: v.optional(f.elevation),
    reading: v.optional(f.identifier),
    readings: v.optional(f.listOf(f.identifier)),
    sampleAt: v.optional(sampleTime),
    mark: v.optional(f.name),
    amendments: v.optional(f.listOf(amendmentSchema)),
  },
  'an object: one sighting',
);

const traceSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    obstruction: f.identifier,
    shape: f.oneOf(['skyline', 'outline', 'line']),
    edge: v.optional(f.oneOf(['straight', 'drawn'])),
    fullCircle: v.optional(f.yesOrNo),
    angularWidth: v.optional(f.numberOver(0, 20, 'degrees')),
    sightings: f.listOf(sightingSchema),
  },
  'an object: one trace',
);

const headingCheckSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    method: f.oneOf(['sun-shadow', 'known-mark', 'plan-bearing']),
    reading: v.optional(f.identifier),
    mark: v.optional(f.name),
    bearing: v.optional(f.azimuth),
    frame: v.optional(f.oneOf(['true', 'magnetic', 'grid'])),
    bearingDeviation: v.optional(f.numberOver(0, 90, 'degrees')),
    convergence: v.optional(f.numberBetween(-180, 180, 'degrees')),
    gridZone: v.optional(f.utmZone),
    shadowHeight: v.optional(f.numberOver(0, 1000, 'metres')),
    shadowLength: v.optional(f.numberOver(0, 10_000, 'metres')),
  },
  'an object: one heading check',
);

const indexCheckSchema = v.looseObject(
  { id: f.identifier, order: f.orderKey, upright: f.identifier, turned: f.identifier },
  'an object: one two-face check',
);

const positionSchema = v.union(
  [v.looseObject({ on: f.identifier, x: f.coordinate, y: f.coordinate }), localPointSchema],
  'a place on a plane (on, x, y) or in the site’s frame (east, north, up), in metres',
);

const openLookSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    run: f.identifier,
    azimuths: v.strictTuple([f.azimuth, f.azimuth], 'a pair of azimuths, from and to'),
    lookedAt: f.instant,
    readings: v.optional(f.listOf(f.identifier)),
  },
  'an object: one look that found it open',
);

const stationSchema = v.looseObject(
  {
    id: f.identifier,
    name: f.name,
    order: f.orderKey,
    position: v.optional(positionSchema),
    instrumentHeight: v.optional(f.numberBetween(0, 100, 'metres')),
    serves: f.listOf(f.identifier),
    observedOpen: v.optional(
      f.listOf(v.strictTuple([f.azimuth, f.azimuth], 'a pair of azimuths, from and to')),
    ),
    openLooks: v.optional(f.listOf(openLookSchema)),
    headingChecks: v.optional(f.listOf(headingCheckSchema)),
    markSightings: v.optional(f.listOf(sightingSchema)),
    indexChecks: v.optional(f.listOf(indexCheckSchema)),
    traces: f.listOf(traceSchema),
  },
  'an object: one station',
);

const factSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    label: v.optional(f.name),
    value: v.union([f.name, f.listOf(f.name)], 'a text, or a list of texts'),
  },
  'an object: one fact of the site',
);

const photoSubjectSchema = v.looseObject(
  {
    kind: f.oneOf(['site', 'station', 'plane', 'obstruction', 'fact']),
    id: v.optional(f.identifier),
  },
  'an object with kind and id: what the photo shows',
);

const photoSchema = v.looseObject(
  {
    id: f.identifier,
    order: f.orderKey,
    of: photoSubjectSchema,
    takenAt: f.instant,
    azimuth: v.optional(f.azimuth),
    reading: v.optional(f.identifier),
    width: f.numberOver(0, 100_000, 'dots'),
    height: f.numberOver(0, 100_000, 'dots'),
    bytes: f.numberOver(0, 1e9, 'bytes'),
    sha256: f.sha256,
  },
  'an object: one photo',
);

export const surveySchema = v.looseObject(
  {
    format: v.literal(SURVEY_FORMAT, `"${SURVEY_FORMAT}"`),
    version: v.literal(SURVEY_VERSION, String(SURVEY_VERSION)),
    id: f.identifier,
    title: f.name,
    surveyedOn: v.optional(f.calendarDay),
    surveyor: v.optional(f.name),
    notes: v.optional(f.textUpTo(LIMITS.notesLength)),
    site: siteSchema,
    climate: climateSchema,
    transposition: v.optional(f.oneOf(['hay-davies', 'perez', 'isotropic'])),
    planes: f.listOf(planeSchema),
    obstructions: f.listOf(obstructionSchema),
    runs: f.listOf(runSchema),
    readings: f.listOf(readingSchema),
    stations: f.listOf(stationSchema),
    facts: v.optional(f.listOf(factSchema)),
    photos: v.optional(f.listOf(photoSchema)),
  },
  'an object: one survey',
);
