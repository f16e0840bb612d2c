import { groupedBy } from '../pointing/grouped-by.ts';
import type { PointedRun, PointedSurvey } from '../pointing/pointed-survey.ts';

/** A run that carries sightings of traces. */
export interface RunInUse {
  run: string;
  pointed: PointedRun;
  /** Stations whose traces it carries, in the order of the sightings. */
  stations: ReadonlySet<string>;
  sightings: number;
  /** Time from its first to its last sighting, minutes. */
  minutes: number;
}

/** The runs whose readings the traces stand on, in the order of the record. */
export function runsInUse({ runs, sightings }: PointedSurvey): RunInUse[] {
  const traced = [...sightings.values()].filter(({ trace, run }) => trace !== null && run !== null);
  const byRun = groupedBy(traced, ({ run }) => run!);
  return runs.flatMap((pointed) => {
    const own = byRun.get(pointed.id);
    if (!own) return [];
    const times = own.flatMap(({ takenAtMs }) => takenAtMs ?? []);
    const span = times.length > 1 ? times.reduce(later) - times.reduce(earlier) : 0;
    return [
      {
        run: pointed.id,
        pointed,
        stations: new Set(own.map(({ station }) => station)),
        sightings: own.length,
        minutes: span / 60_000,
      },
    ];
  });
}

const later = (a: number, b: number) => Math.max(a, b);
const earlier = (a: number, b: number) => Math.min(a, b);
