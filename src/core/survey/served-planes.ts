import { ordered } from './order.ts';
import type { Obstruction, RoofPlane, Station, Survey } from './survey.ts';

/** The stations that speak for a plane, in their order. */
export const stationsOf = (survey: Survey, plane: RoofPlane): Station[] =>
  ordered(survey.stations).filter(({ serves }) => serves.includes(plane.id));

/** A survey's obstructions by id. */
export const obstructionsById = (survey: Survey): Map<string, Obstruction> =>
  new Map(survey.obstructions.map((obstruction) => [obstruction.id, obstruction]));
