/** What is wrong with data that came from outside, and where. */
export interface Problem {
  /** Path into the data, such as `stations[0].traces[1].sightings[0].elevation`, or a line such as `line 412`. */
  path: string;
  /** What is wrong and what to do, as a sentence. */
  message: string;
}

/** Outside data after reading: the value with what a person should know of it, or all that is wrong with it. */
export type Parsed<T> = { ok: true; value: T; warnings: Problem[] } | { ok: false; problems: Problem[] };
