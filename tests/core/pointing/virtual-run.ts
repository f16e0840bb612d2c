import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import type {
  HeadingCheck,
  Reading,
  Run,
  Sighting,
  SightingAxis,
  Site,
  Station,
  Survey,
} from '../../../src/core/survey/survey.ts';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import { cameraAt, topEdgeAt } from './held-phone.ts';

/** 14 May 2026, mid-morning in New England. */
export const START_MS = Date.parse('2026-05-14T13:30:00Z');
export const SITE: Site = { latitude: 44, longitude: -72.4, timeZone: 'America/New_York' };

/** How a phone errs in one run, degrees. */
export interface PhoneErrors {
  /** Azimuth in the frame of a true azimuth of 0, at the start. */
  north?: number;
  /** Growth of that, a minute. */
  drift?: number;
  /** Lift of the elevation read when upright. */
  index?: number;
}

/** How one pointing was made. */
export interface Pointing {
  minutes: number;
  azimuth: number;
  elevation?: number;
  axis?: SightingAxis;
  roll?: number;
  extra?: Partial<Reading>;
}

/** A survey being made with a phone whose errors are known. */
export class VirtualSurvey {
  readonly survey: Survey;
  private readonly errors = new Map<string, PhoneErrors>();
  private count = 0;

  constructor(readonly site: Site = SITE) {
    this.survey = {
      format: 'noonmark-survey',
      version: 1,
      id: 'virtual',
      title: 'Virtual',
      site,
      climate: { source: 'world' },
      planes: [],
      obstructions: [{ id: 'wall', name: 'Wall', kind: 'building' }],
      runs: [],
      readings: [],
      stations: [],
    };
    this.station('A');
  }

  run(id: string, frame: Run['frame'], errors: PhoneErrors = {}, device?: string): this {
    const startedAt = new Date(START_MS).toISOString();
    this.survey.runs.push({ id, frame, startedAt, ...(device !== undefined && { device }) });
    this.errors.set(id, errors);
    return this;
  }

  station(id: string): Station {
    const found = this.survey.stations.find((station) => station.id === id);
    if (found) return found;
    const made: Station = { id, name: id, serves: [], traces: [] };
    this.survey.stations.push(made);
    return made;
  }

  /** Reads a direction that is truly so; gives the reading's id. */
  read(run: string, { minutes, azimuth, elevation = 0, axis, roll = 0, extra }: Pointing): string {
    const { north = 0, drift = 0, index = 0 } = this.errors.get(run)!;
    const hold = axis === 'top-edge' ? topEdgeAt : cameraAt;
    const lift = index * Math.cos((roll * Math.PI) / 180);
    const id = `q${++this.count}`;
    this.survey.readings.push({
      id,
      run,
      takenAt: new Date(START_MS + minutes * 60_000).toISOString(),
      ...hold(azimuth + north + drift * minutes, elevation + lift, roll),
      ...(axis && { axis }),
      ...extra,
    });
    return id;
  }

  /** Sights a mark of no trace; gives the sighting's id. */
  sight(run: string, pointing: Pointing, more: Partial<Sighting> & { at?: string } = {}): string {
    const { at = 'A', ...sighting } = more;
    const reading = this.read(run, pointing);
    const id = `s${reading}`;
    const station = this.station(at);
    station.markSightings = [...(station.markSightings ?? []), { id, reading, ...sighting }];
    return id;
  }

  check(check: Omit<HeadingCheck, 'id'>, at = 'A'): this {
    const station = this.station(at);
    station.headingChecks = [...(station.headingChecks ?? []), { id: `h${++this.count}`, ...check }];
    return this;
  }

  /** A check by shadow, with the clock right or `late` minutes fast. */
  shadow(run: string, minutes: number, late = 0, more: Partial<HeadingCheck> = {}, at = 'A'): this {
    const { latitude, longitude } = this.site;
    const sun = solarPosition(START_MS + (minutes - late) * 60_000, latitude, longitude);
    const reading = this.read(run, { minutes, azimuth: sun.solarAzimuth + 180, axis: 'top-edge' });
    return this.check({ method: 'sun-shadow', reading, ...more }, at);
  }

  /** The survey, once the parser has passed it. */
  made(): Survey {
    const parsed = surveyFromJson(JSON.parse(JSON.stringify(this.survey)));
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
    if (parsed.warnings.length > 0) throw new Error(JSON.stringify(parsed.warnings));
    return parsed.value;
  }
}
