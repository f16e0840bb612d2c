import type { PhotoSubject, Station, Survey } from './survey.ts';

/** The survey without a plane and all that stands on it: its photos, what stations say of it, places on it. */
export function withoutPlane(survey: Survey, id: string): Survey {
  return {
    ...withoutPhotosOf(survey, { kind: 'plane', id }),
    planes: survey.planes.filter((plane) => plane.id !== id),
    stations: survey.stations.map((station) => stationWithoutPlane(station, id)),
  };
}

function stationWithoutPlane(station: Station, id: string): Station {
  const { position, ...rest } = station;
  const serves = station.serves.filter((plane) => plane !== id);
  const isOnIt = position !== undefined && 'on' in position && position.on === id;
  return isOnIt || position === undefined ? { ...rest, serves } : { ...rest, position, serves };
}

/** The survey without an obstruction, its traces and its photos. Raw readings stay. */
export function withoutObstruction(survey: Survey, id: string): Survey {
  return {
    ...withoutPhotosOf(survey, { kind: 'obstruction', id }),
    obstructions: survey.obstructions.filter((obstruction) => obstruction.id !== id),
    stations: survey.stations.map((station) => ({
      ...station,
      traces: station.traces.filter(({ obstruction }) => obstruction !== id),
    })),
  };
}

/** The survey without the photos of one thing; without the list where none is left. */
function withoutPhotosOf(survey: Survey, { kind, id }: PhotoSubject): Survey {
  const { photos, ...rest } = survey;
  const left = photos?.filter(({ of }) => of.kind !== kind || of.id !== id) ?? [];
  return left.length > 0 ? { ...rest, photos: left } : rest;
}
