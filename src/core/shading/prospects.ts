import { RADIANS } from '../angles/angles.ts';
import { blockedSpans } from '../horizon/blocked-spans.ts';
import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import { obstructionKind } from '../survey/obstruction-kinds.ts';
import type { Obstruction } from '../survey/survey.ts';
import type { StationAssessment } from './assessment.ts';
import { blockedLight, shadedMonths } from './blocked-light.ts';
import type { SkyMap } from './sky-map.ts';
import { unshadedMonths } from './sky-map.ts';
import type { ObstructionChange } from './what-if.ts';
import { changedProfile } from './what-if.ts';

/** Metres off the top that are asked about, and metres of growth. */
export const CUTS = [1, 2, 3] as const;
export const GROWTHS = [1, 3] as const;
/** Shade is gone where all but this share of the year's light is back. */
const AS_GOOD_AS_GONE = 0.001;
/** Height above which nobody asks what a cut would give, as an elevation, degrees: its tangent runs away. */
const STEEPEST = 89;

/** What would change on a plane if one obstruction did; shares of the year's light with nothing in the way, 0 to 1. */
export interface ObstructionProspects {
  id: string;
  /** Means over the plane's stations. */
  gainIfRemoved: number;
  lossIfAlone: number;
  /** With some metres off its top; none where the distance is not known, or where it is not so high. */
  lower: { by: number; gain: number }[];
  /** The least cut, in steps of half a metre, that takes as good as all of its shade away. */
  clear: { by: number; gain: number } | null;
  /** With some metres of growth: for trees whose distance is known. */
  grown: { by: number; loss: number }[];
}

export interface PlaneProspects {
  /** Every obstruction that some station of the plane saw, most gain first. */
  obstructions: ObstructionProspects[];
  /** Obstructions that hide each other before some station, with what all of them going gives the plane. */
  groups: { obstructions: string[]; gainIfAllRemoved: number; sumOfSingleGains: number }[];
}

/** One station laid over the plane. */
export interface Scene {
  map: SkyMap;
  profile: HorizonProfile;
  result: Pick<StationAssessment, 'obstructions' | 'groups'>;
}

/**
 * What removing, cutting and growing each obstruction would change for a plane, as the mean of its stations; heights are
 * taken over each station's instrument at the obstruction's one distance, as `changedProfile` does.
 */
export function planeProspects(
  scenes: readonly Scene[],
  known: ReadonlyMap<string, Pick<Obstruction, 'kind' | 'distance'>>,
): PlaneProspects {
  const ids = [...new Set(scenes.flatMap(({ profile }) => profile.obstructionIds))];
  const obstructions = ids.map((id) => prospectsOf(id, scenes, known.get(id)));
  const single = new Map(obstructions.map(({ id, gainIfRemoved }) => [id, gainIfRemoved]));
  return {
    obstructions: obstructions.sort((a, b) => b.gainIfRemoved - a.gainIfRemoved),
    groups: joinedGroups(scenes).map((members) => ({
      obstructions: members,
      gainIfAllRemoved: Math.max(
        0,
        accessChange(scenes, () => members.map((obstruction) => ({ obstruction, kind: 'gone' }))),
      ),
      sumOfSingleGains: members.reduce((sum, id) => sum + (single.get(id) ?? 0), 0),
    })),
  };
}

function prospectsOf(
  id: string,
  scenes: readonly Scene[],
  obstruction: Pick<Obstruction, 'kind' | 'distance'> | undefined,
): ObstructionProspects {
  const rows = scenes.map(({ result }) => result.obstructions.find((row) => row.id === id));
  const gainIfRemoved = mean(rows.map((row) => row?.gainIfRemoved ?? 0));
  const lossIfAlone = mean(rows.map((row) => row?.lossIfAlone ?? 0));
  const { distance, kind = 'other' } = obstruction ?? {};
  const none = { id, gainIfRemoved, lossIfAlone, lower: [], clear: null, grown: [] };
  if (distance === undefined) return none;
  const highest = Math.max(...scenes.map(({ profile }) => heightOver(profile, id, distance)));
  const gainOfCut = (by: number) =>
    Math.max(
      0,
      accessChange(scenes, ({ profile }) => {
        const height = heightOver(profile, id, distance) - by;
        return [{ obstruction: id, kind: 'cut-to-height', height, distance }];
      }),
    );
  const lossOfGrowth = (by: number) =>
    -accessChange(scenes, () => [{ obstruction: id, kind: 'grown', by, distance }]);
  return {
    ...none,
    lower: CUTS.filter((by) => by < highest).map((by) => ({ by, gain: gainOfCut(by) })),
    clear:
      gainIfRemoved > AS_GOOD_AS_GONE ? leastCut(gainOfCut, gainIfRemoved - AS_GOOD_AS_GONE, highest) : null,
    grown: obstructionKind(kind).leaves
      ? GROWTHS.map((by) => ({ by, loss: Math.max(0, lossOfGrowth(by)) }))
      : [],
  };
}

const STEP = 0.5;

/** The least cut in steps that gives so much, sought by halving: more off never gives less. */
function leastCut(
  gainOf: (by: number) => number,
  wanted: number,
  highest: number,
): { by: number; gain: number } | null {
  let [low, high] = [0, Math.ceil(highest / STEP)];
  if (!(gainOf(high * STEP) >= wanted)) return null;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (gainOf(middle * STEP) >= wanted) high = middle;
    else low = middle;
  }
  return { by: high * STEP, gain: gainOf(high * STEP) };
}

/** How far an obstruction rises over the instrument, metres, taking it to stand at one distance; 0 where it is not seen. */
function heightOver(
  { obstructionIds, intervalObstruction, high }: HorizonProfile,
  id: string,
  distance: number,
) {
  const place = obstructionIds.indexOf(id);
  let top = 0;
  intervalObstruction.forEach((obstruction, k) => obstruction === place && (top = Math.max(top, high[k])));
  return distance * Math.tan(Math.min(top, STEEPEST) * RADIANS);
}

/** Change of the plane's access, the mean over its stations, if what each of them sees changed. */
function accessChange(
  scenes: readonly Scene[],
  changesAt: (scene: Scene) => readonly ObstructionChange[],
): number {
  return mean(
    scenes.map((scene) => {
      const { map, profile } = scene;
      const changes = changesAt(scene).filter(({ obstruction }) =>
        profile.obstructionIds.includes(obstruction),
      );
      const whole = sum(unshadedMonths(map));
      if (changes.length === 0 || !(whole > 0)) return 0;
      return (lightBehind(map, changedProfile(profile, changes)) - lightBehind(map, profile)) / whole;
    }),
  );
}

const lightBehind = (map: SkyMap, profile: HorizonProfile) =>
  sum(shadedMonths(map, blockedLight(map, blockedSpans(profile))));

/** The stations' groups, those that share an obstruction joined. */
function joinedGroups(scenes: readonly Scene[]): string[][] {
  let joined: string[][] = [];
  for (const { obstructions } of scenes.flatMap(({ result }) => result.groups)) {
    const touching = joined.filter((group) => group.some((id) => obstructions.includes(id)));
    joined = [
      ...joined.filter((group) => !touching.includes(group)),
      [...new Set([...touching.flat(), ...obstructions])],
    ];
  }
  return joined;
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
const mean = (values: readonly number[]) => (values.length > 0 ? sum(values) / values.length : 0);
