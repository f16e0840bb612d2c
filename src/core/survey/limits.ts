/** What a survey file may hold. Beyond, it is refused at once, with the limit named. */
export const LIMITS = {
  /** Characters of the file's text; 20 MB where all is plain ASCII. */
  textLength: 20_000_000,
  /** Values in the file, counted one by one. */
  values: 5_000_000,
  /** Lists and objects inside each other. */
  depth: 64,
  planes: 2_000,
  /** In all plane outlines together. */
  corners: 20_000,
  stations: 2_000,
  obstructions: 2_000,
  runs: 20_000,
  /** In all stations together. */
  traces: 2_000,
  /** Traced from one station. */
  obstructionsPerStation: 200,
  /** Planes served, over all stations. */
  served: 1_000,
  /** In all traces and of marks together. */
  sightings: 20_000,
  /** In one outline, where every edge is held against every other. */
  outlineSightings: 2_000,
  readings: 200_000,
  /** Rows of one reading, and the time of the last after its start [ms]. */
  samples: 1_000,
  sampleMs: 60_000,
  headingChecks: 2_000,
  facts: 2_000,
  photos: 5_000,
  /** Two-face checks in all stations together. */
  indexChecks: 2_000,
  /** In all stations together. */
  openLooks: 2_000,
  /** Placings and sightings along edges of all planes together. */
  placings: 20_000,
  /** Characters of an id, a name, and a longer text. */
  idLength: 200,
  nameLength: 10_000,
  notesLength: 200_000,
} as const;

/** Problems or warnings listed for one file; the rest is counted. */
export const MOST_PROBLEMS = 100;
