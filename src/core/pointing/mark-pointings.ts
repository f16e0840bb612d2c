import type { Reading, Survey } from '../survey/survey.ts';
import type { AxisIndex, FramePointing } from './reading-direction.ts';
import { pointingOfSighting } from './reading-direction.ts';

/** A mark as one run saw it from one station. */
export interface MarkPointing {
  station: string;
  mark: string;
  pointing: FramePointing;
}

/** Every sighting of a named mark that was read by the phone, in the order it was taken. */
export function markPointings(
  survey: Survey,
  readings: ReadonlyMap<string, Reading>,
  indexOf: (run: string) => AxisIndex,
): MarkPointing[] {
  const found = survey.stations.flatMap((station) =>
    [...station.traces.flatMap((trace) => trace.sightings), ...(station.markSightings ?? [])].flatMap(
      (sighting) => {
        if (sighting.mark === undefined) return [];
        const pointing = pointingOfSighting(sighting, readings, indexOf);
        return pointing ? [{ station: station.id, mark: sighting.mark, pointing }] : [];
      },
    ),
  );
  return found.sort((a, b) => a.pointing.takenAtMs - b.pointing.takenAtMs);
}
