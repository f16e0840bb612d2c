import { freeStationName, type StationFacts } from '../../../app/capture/edit-station.ts';
import { arrayPlacesOf } from '../../../core/survey/array-places.ts';
import type { LengthUnit } from '../../../core/pointing/tape-length.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { RoofPlane, Station, StationPosition, Survey } from '../../../core/survey/survey.ts';
import { inUnit, offsetInput, typedOffset } from '../../length-text.ts';
import { faultOf, valueOf, type Typed } from '../../typed.ts';

/** Stands for the site's own frame where a plane's id may stand. */
export const IN_FRAME = 'frame';

/** A station as it is typed. */
export interface StationDraft {
  unit: LengthUnit;
  name: string;
  /** Id of the plane it stands on, `IN_FRAME`, or empty where its place is not known. */
  on: string;
  x: string;
  y: string;
  east: string;
  northward: string;
  up: string;
  height: string;
  /** Null until somebody has said which planes it speaks for. */
  serves: string[] | null;
}

const onPlane = (station: Station | null) =>
  station?.position && 'on' in station.position ? station.position : undefined;
const inFrame = (station: Station | null) =>
  station?.position && !('on' in station.position) ? station.position : undefined;

/** The plane a new station is likely to stand on: the one somebody comes from, the last station's, or the only one. */
function likelyPlane(survey: Survey, plane: string | undefined): RoofPlane | undefined {
  const { planes } = survey;
  const last = onPlane(ordered(survey.stations).at(-1) ?? null)?.on;
  return (
    planes.find(({ id }) => id === plane) ??
    planes.find(({ id }) => id === last) ??
    (planes.length === 1 ? planes[0] : undefined)
  );
}

/** A name after the place, unless somebody has typed another one or a station has it already. */
export function proposedName(
  draft: StationDraft,
  survey: Survey,
  plane: RoofPlane,
  place: string,
): Pick<StationDraft, 'name'> {
  const { name } = draft;
  const isProposed =
    name === freeStationName(survey) ||
    survey.planes.some((one) =>
      arrayPlacesOf(survey, one).some((known) => name === `${one.name}, ${known.name}`),
    );
  const wanted = `${plane.name}, ${place}`;
  const isTaken = survey.stations.some((station) => station.name === wanted);
  return { name: !isProposed ? name : isTaken ? freeStationName(survey) : wanted };
}

/** The texts that show a station; a new one stands on its likely plane. */
export function stationDraft(
  station: Station | null,
  survey: Survey,
  unit: LengthUnit,
  plane?: string,
): StationDraft {
  const from = likelyPlane(survey, plane);
  const [place, frame] = [onPlane(station), inFrame(station)];
  const offset = (metres: number | undefined) => offsetInput(metres, unit);
  return {
    unit,
    name: station?.name ?? freeStationName(survey),
    on: station ? (place?.on ?? (frame ? IN_FRAME : '')) : (from?.id ?? ''),
    x: offset(place?.x),
    y: offset(place?.y),
    east: offset(frame?.east),
    northward: offset(frame?.north),
    up: offset(frame?.up),
    height: offset(station ? station.instrumentHeight : 0.1),
    serves: station?.serves ?? null,
  };
}

/** The same station with its lengths written in another unit. */
export function stationDraftIn(draft: StationDraft, unit: LengthUnit, station: Station | null): StationDraft {
  const [place, frame] = [onPlane(station), inFrame(station)];
  const again = (text: string, stored?: number) => inUnit(text, draft.unit, unit, stored);
  return {
    ...draft,
    unit,
    x: again(draft.x, place?.x),
    y: again(draft.y, place?.y),
    east: again(draft.east, frame?.east),
    northward: again(draft.northward, frame?.north),
    up: again(draft.up, frame?.up),
    height: again(draft.height, station?.instrumentHeight),
  };
}

/** Planes a new station speaks for where nobody has said: the one it stands on, else all. */
export const nearPlanes = (on: string, { planes }: Survey): string[] =>
  planes.map(({ id }) => id).filter((id) => on === '' || on === IN_FRAME || id === on);

export type StationFaults = Partial<
  Record<'name' | 'x' | 'y' | 'east' | 'northward' | 'up' | 'height', string | null>
>;

const MISSING = 'This length is needed too, or none of them.';
/** The phone is held this high at the most, metres. */
const HIGHEST = 100;

/** The station that a draft stands for; or what is wrong with it, field by field. */
export function typedStation(
  draft: StationDraft,
  station: Station | null,
  survey: Survey,
): { facts: StationFacts | null; faults: StationFaults } {
  const { unit } = draft;
  const { position, faults } = typedPosition(draft, station, survey.planes);
  const height = typedHeight(draft.height, unit, station?.instrumentHeight);
  const all: StationFaults = {
    name: draft.name.trim() ? null : 'A station needs a name.',
    ...faults,
    height: faultOf(height),
  };
  if (Object.values(all).some((fault) => fault !== null)) return { facts: null, faults: all };
  const known = (draft.serves ?? nearPlanes(draft.on, survey)).filter((id) =>
    survey.planes.some((plane) => plane.id === id),
  );
  const facts = { name: draft.name.trim(), position, instrumentHeight: valueOf(height), serves: known };
  return { facts, faults: all };
}

function typedHeight(text: string, unit: LengthUnit, stored?: number): Typed<number | undefined> {
  const typed = typedOffset(text, unit, stored);
  const metres = valueOf(typed);
  return metres !== undefined && !(metres >= 0 && metres <= HIGHEST)
    ? { fault: 'The height goes from 0 to 100 m. Correct it.' }
    : typed;
}

function typedPosition(
  draft: StationDraft,
  station: Station | null,
  planes: readonly RoofPlane[],
): { position: StationPosition | undefined; faults: StationFaults } {
  const { on, unit } = draft;
  const [place, frame] = [onPlane(station), inFrame(station)];
  if (on === IN_FRAME) {
    const [texts, stored] = [
      [draft.east, draft.northward, draft.up],
      [frame?.east, frame?.north, frame?.up],
    ];
    const { values, faults } = typedTogether(texts, stored, unit);
    const [east, northward, up] = faults;
    const position = values && { east: values[0], north: values[1], up: values[2] };
    return { position, faults: { east, northward, up } };
  }
  if (!planes.some(({ id }) => id === on)) return { position: undefined, faults: {} };
  const { values, faults } = typedTogether([draft.x, draft.y], [place?.x, place?.y], unit);
  return { position: values && { on, x: values[0], y: values[1] }, faults: { x: faults[0], y: faults[1] } };
}

/** Lengths that are only known together: all of them, or none. */
function typedTogether(texts: readonly string[], stored: readonly (number | undefined)[], unit: LengthUnit) {
  const typed = texts.map((text, i) => typedOffset(text, unit, stored[i]));
  const isAny = texts.some((text) => text.trim() !== '');
  const faults = typed.map((one) => faultOf(one) ?? (isAny && valueOf(one) === undefined ? MISSING : null));
  const values = typed.flatMap((one) => valueOf(one) ?? []);
  return { values: values.length === texts.length ? values : undefined, faults };
}
