import { isRecord, type JsonRecord } from './json-value.ts';
import { ordered } from './order.ts';
import type { Problem } from './problem.ts';

/** Entries of the record's lists, as a surveyor calls them. Those with names of their own are called by those. */
const ENTRIES: Partial<Record<string, string>> = {
  planes: 'plane',
  obstructions: 'obstruction',
  stations: 'station',
  traces: 'trace',
  sightings: 'sighting',
  markSightings: 'mark',
  headingChecks: 'heading check',
  indexChecks: 'two-face check',
  observedOpen: 'open range',
  openLooks: 'look at open sky',
  runs: 'sitting',
  readings: 'raw reading',
  photos: 'photo',
  facts: 'fact',
  outline: 'corner',
  tiltPlacings: 'placing',
  azimuthSightings: 'sighting along an edge',
  amendments: 'change by hand',
};

/** Fields whose names in the record are not the words for them. */
const FIELDS: Partial<Record<string, string>> = {
  surfaceTilt: 'tilt',
  surfaceAzimuth: 'azimuth of the plane',
  slopeLength: 'length up the slope',
  instrumentHeight: 'height of the phone',
  angularWidth: 'width as seen',
  fullCircle: 'once around the horizon',
  transmittance: 'light that passes',
  observedOpen: 'open ranges',
  headingChecks: 'heading checks',
  bearingDeviation: 'deviation of the bearing',
  gridZone: 'zone of the map grid',
  shadowHeight: 'height of what throws the shadow',
  shadowLength: 'length of the shadow',
  timeZone: 'time zone',
  surveyedOn: 'day of the visit',
  albedo: 'light the ground reflects',
  serves: 'planes it speaks for',
  x: 'place along the eave',
  y: 'place up the slope',
  outline: 'corners',
};

const STEP = /([A-Za-z]+)(?:\[(\d+)\])?/g;
const PATH =
  /\b(?:stations|planes|obstructions|runs|readings|photos|facts)\[\d+\](?:\.[A-Za-z]+(?:\[\d+\])?)*/g;
/** The message of a trace may name its sightings from the trace on. */
const SHORT_PATH = /\bsightings\[(\d+)\]/g;

interface Entry {
  list: string;
  words: string;
  /** The path as far as this entry. */
  path: string;
}

/** The entries that a path goes through, the outermost first. */
function entriesOn(path: string, document: unknown): Entry[] {
  const entries: Entry[] = [];
  let value: unknown = document;
  for (const step of path.matchAll(STEP)) {
    const [whole, list, index] = step;
    const below = isRecord(value) ? value[list] : undefined;
    value =
      index === undefined ? below : Array.isArray(below) ? (below as unknown[])[Number(index)] : undefined;
    if (index === undefined || !ENTRIES[list]) continue;
    const number = numberIn(below, Number(index));
    entries.push({
      list,
      words: entryWords(list, number, value, document),
      path: path.slice(0, step.index + whole.length),
    });
  }
  return entries;
}

/** The number of an entry as tables show it, from 1: lists are shown by the order of their entries. */
function numberIn(list: unknown, index: number): number {
  if (!Array.isArray(list) || !list.every(isRecord)) return index + 1;
  const place = ordered(list as { order?: number }[]).indexOf(list[index]);
  return (place < 0 ? index : place) + 1;
}

const nameOf = (entry: unknown): string | null => {
  if (!isRecord(entry)) return null;
  const name = entry.name ?? entry.label;
  return typeof name === 'string' && name !== '' ? `“${name}”` : null;
};

function entryWords(list: string, number: number, entry: unknown, document: unknown): string {
  const kind = ENTRIES[list]!;
  if (list === 'traces') return tracedName(entry, document) ?? `trace ${number}`;
  return nameOf(entry) ?? `${kind} ${number}`;
}

/** The name of what a trace is of. */
function tracedName(trace: unknown, document: unknown): string | null {
  if (!isRecord(trace) || !isRecord(document) || !Array.isArray(document.obstructions)) return null;
  const known = (document.obstructions as unknown[]).filter(isRecord);
  return nameOf(known.find((one: JsonRecord) => one.id === trace.obstruction));
}

/** What a path into a survey leads to, such as `sighting 3 of “Maple” from “Eave, left”`; empty for the survey itself. */
export function pathWords(path: string, document: unknown): string {
  const entries = entriesOn(path, document);
  if (entries.length === 0) return /^site\b/.test(path) ? 'the site' : '';
  const [inmost, ...outer] = entries.reverse();
  const first =
    inmost.list === 'traces' && inmost.words.startsWith('“') ? `the trace of ${inmost.words}` : inmost.words;
  return outer.reduce(
    (words, { list, words: by }) => `${words} ${list === 'stations' ? 'from' : 'of'} ${by}`,
    first,
  );
}

/**
 * A problem of a survey in the words of its field book, for a person who has no file before them: where it is and what
 * is wrong, as one sentence or more, without paths. `document` is the survey that has the problem.
 */
export function problemInWords({ path, message }: Problem, document: unknown): string {
  const subject = pathWords(path, document);
  const trace = /^.*?traces\[\d+\]/.exec(path)?.[0];
  const field = /([A-Za-z]+)$/.exec(path)?.[1];
  const named =
    field && FIELDS[field] && message.startsWith(`${field} `)
      ? `${FIELDS[field]}${message.slice(field.length)}`
      : message;
  const plain = named
    .replace(PATH, (other) => {
      const near =
        trace !== undefined && other.startsWith(`${trace}.`)
          ? entriesOn(other, document).at(-1)?.words
          : undefined;
      return near ?? pathWords(other, document);
    })
    .replace(SHORT_PATH, (short) => entriesOn(`${trace ?? ''}.${short}`, document).at(-1)?.words ?? short);
  return subject === '' ? capital(plain) : `${capital(subject)}: ${plain}`;
}

const capital = (text: string) => text.slice(0, 1).toUpperCase() + text.slice(1);
