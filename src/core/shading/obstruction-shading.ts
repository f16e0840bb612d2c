import type { Standing } from '../horizon/blocked-spans.ts';
import { blockedSpans } from '../horizon/blocked-spans.ts';
import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import { obstructionKind } from '../survey/obstruction-kinds.ts';
import type { Obstruction } from '../survey/survey.ts';
import type { ObstructionGroup, ObstructionShading } from './assessment.ts';
import { blockedLight, shadedMonths } from './blocked-light.ts';
import { DARK_MONTH } from './monthly-shares.ts';
import type { SkyMap } from './sky-map.ts';
import { unshadedMonths } from './sky-map.ts';

/**
 * Two obstructions hide each other where removing both gives this much more access than removing each, and this share of
 * what both give: less is not worth a sentence.
 */
const LEAST_SHARED_GAIN = 0.002;
const LEAST_SHARED_PART = 0.1;
/** Pairs are compared among this many obstructions, those that would cost most alone. */
const MOST_COMPARED = 12;

/** What is known of each obstruction, by id. */
export type KnownObstructions = ReadonlyMap<string, Pick<Obstruction, 'name' | 'kind'>>;

export interface ObstructionCosts {
  obstructions: ObstructionShading[];
  groups: ObstructionGroup[];
}

/** What each obstruction of a station costs a plane, most gain first, and which of them hide each other. */
export function obstructionCosts(
  map: SkyMap,
  profile: HorizonProfile,
  obstructions: KnownObstructions,
): ObstructionCosts {
  const count = profile.obstructionIds.length;
  const whole = unshadedMonths(map);
  const lost = (standing: Standing | undefined, around?: ReadonlySet<number>): number[] => {
    const light = shadedMonths(map, blockedLight(map, blockedSpans(profile, standing, around)));
    return whole.map((all, m) => all - light[m]);
  };
  const standingWithout = (gone: readonly number[]) =>
    Array.from({ length: count }, (_, i) => !gone.includes(i));
  const gained = (gone: readonly number[]): number[] => {
    const around = new Set(gone);
    const cleared = lost(standingWithout(gone), around);
    return lost(undefined, around).map((all, m) => all - cleared[m]);
  };
  const share = (light: readonly number[]) => notBelowZero(sum(light) / sum(whole));
  const rows = profile.obstructionIds.map((id, i): ObstructionShading => {
    const gain = gained([i]);
    const alone = Array.from({ length: count }, (_, other) => other === i);
    return {
      id,
      name: obstructions.get(id)?.name ?? id,
      gainIfRemoved: share(gain),
      lossIfAlone: share(lost(alone, new Set([i]))),
      monthly: whole.map((light, m) => (light > DARK_MONTH ? notBelowZero(gain[m] / light) : null)),
    };
  });
  const removable = rows.map(({ id }) => obstructionKind(obstructions.get(id)?.kind ?? 'other').removable);
  const groups = hiddenBehindEachOther(rows, removable, (gone) => share(gained(gone)));
  return { obstructions: [...rows].sort((a, b) => b.gainIfRemoved - a.gainIfRemoved), groups };
}

/** Joins obstructions whose pairs give more together than singly; `gainOf` takes indexes. */
function hiddenBehindEachOther(
  rows: readonly ObstructionShading[],
  removable: readonly boolean[],
  gainOf: (gone: readonly number[]) => number,
): ObstructionGroup[] {
  const compared = rows
    .map((_, i) => i)
    .filter((i) => removable[i] && rows[i].lossIfAlone - rows[i].gainIfRemoved > LEAST_SHARED_GAIN)
    .sort((a, b) => rows[b].lossIfAlone - rows[a].lossIfAlone)
    .slice(0, MOST_COMPARED);
  const groupOf = rows.map((_, i) => i);
  for (const [place, i] of compared.entries())
    for (const j of compared.slice(place + 1)) {
      if (groupOf[i] === groupOf[j]) continue;
      const both = gainOf([i, j]);
      const shared = both - rows[i].gainIfRemoved - rows[j].gainIfRemoved;
      if (shared <= LEAST_SHARED_GAIN || shared < LEAST_SHARED_PART * both) continue;
      const [kept, joined] = [groupOf[i], groupOf[j]];
      groupOf.forEach((group, k) => group === joined && (groupOf[k] = kept));
    }
  return [...new Set(groupOf)]
    .map((group) => rows.map((_, i) => i).filter((i) => groupOf[i] === group))
    .filter((members) => members.length > 1)
    .map((members) => ({
      obstructions: members.map((i) => rows[i].id),
      gainIfAllRemoved: notBelowZero(gainOf(members)),
      sumOfSingleGains: sum(members.map((i) => rows[i].gainIfRemoved)),
    }))
    .sort((a, b) => b.gainIfAllRemoved - a.gainIfAllRemoved);
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
/** Rounding may leave -1e-17. */
const notBelowZero = (share: number) => (share > 0 ? share : 0);
