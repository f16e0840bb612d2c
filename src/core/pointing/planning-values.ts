/**
 * What pointing with a phone is expected to err by, degrees, standard deviations unless said otherwise. Where no source
 * is named the value is common practice, no source: a planning value to be replaced by measurement.
 */
export const PLANNING = {
  /**
   * A compass carried on a roof, after calibration. Eleven phones and twelve observers: mean deviations of 1.9, 5.5 and
   * 6.9 by direction (abstract, Lviv Polytechnic, node 42954); single errors of 13 to 25.
   */
  compass: 5,
  /** Share of compass headings that are far off, and how far they reach (the same source). */
  compassOutlierShare: 0.1,
  compassOutlierReach: 20,
  /** More between two sessions of one phone's compass on one site. */
  compassBetweenRuns: 2.5,
  /** Inclination of a phone that was not tested by turning it (the interface itself rounds to 0.1). */
  elevationIndex: 0.7,
  /** What is left after the phone was turned about the viewing axis: the part that does not turn with it. */
  elevationIndexTurned: 0.2,
  /** Drift of azimuths without a compass, degrees a minute. */
  yawDriftPerMinute: 0.5,
  /** One held pointing, each way across the line of sight, when averaged for half a second. */
  pointing: 0.3,
  /** One point of a moving sweep. */
  sweepPointing: 0.6,
  /** One placing of the phone on a surface: boards, grit, tiles. */
  placing: 0.5,
  /** Laying an axis along the edge of a shadow. */
  shadowAlignment: 0.7,
  /** Lean of the edge that throws the shadow; it counts by the tangent of the sun's elevation. */
  shadowLean: 0.5,
  /** The device's clock, minutes. */
  clockMinutes: 0.25,
  /** A bearing of a known mark; one measured on a plan. */
  markBearing: 0.5,
  planBearing: 1,
  /** Typed sightings, by hand compass and clinometer: each one, and what all have in common. */
  typedAzimuth: 1,
  typedElevation: 0.5,
  typedHeading: 2,
  typedIndex: 0.3,
  /** A plane's angles where none of its own readings tells them: typed from a plan, a pitch gauge or a compass. */
  typedTilt: 1,
  typedFacing: 2,
} as const;
