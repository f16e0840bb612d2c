import type { AccessInterval, IntervalSource, PlaneAssessment } from '../../shading/assessment.ts';
import type { CureId, IntervalSourceId } from '../../uncertainty/interval-source.ts';
import { sourceEffect, stationEffects, width } from '../interval-effect.ts';
import { listed } from '../names.ts';
import type { Cure, OpenPoint, OpenPointKind } from '../open-point.ts';
import { CURE_WORDS, SOURCE_WORDS } from '../source-words.ts';

/** An interval wider than this is worth more work, percentage points; and a source that makes so much. */
const WIDE = 4;
const LEAST = 0.5;

/** What has a kind of point of its own. */
const OWN_KIND: readonly (CureId | null)[] = ['look', 'heading-check', 'two-face-check', null];

export const wideInterval: OpenPointKind = {
  id: 'wide-interval',
  title: 'The figure is not sure',
  isGrave: false,
  find: ({ assessment }) => {
    const bySource = new Map<IntervalSourceId, Wide>();
    for (const plane of assessment?.planes ?? [])
      for (const one of wideSources(plane)) {
        const known = bySource.get(one.source.source);
        const worse = !known || one.effect > known.effect ? one : known;
        bySource.set(one.source.source, { ...worse, planes: [...(known?.planes ?? []), plane.name] });
      }
    return [...bySource.values()].map(pointOf);
  },
};

interface Wide {
  plane: PlaneAssessment;
  interval: AccessInterval;
  source: IntervalSource;
  effect: number;
  /** Names of all planes that this source makes unsure. */
  planes: string[];
}

/** What makes a plane's interval wide and can be cured. */
function wideSources(plane: PlaneAssessment): Wide[] {
  const interval = plane.solarAccess?.interval;
  if (!interval || width(interval) < WIDE) return [];
  return interval.sources
    .filter(({ cure }) => !OWN_KIND.includes(cure))
    .map((source) => ({
      plane,
      interval,
      source,
      effect: sourceEffect(interval, source.source),
      planes: [],
    }))
    .filter(({ effect }) => effect >= LEAST);
}

function pointOf({ plane, interval, source, effect, planes }: Wide): Omit<OpenPoint, 'kind'> {
  const others = planes.filter((name) => name !== plane.name);
  const also = others.length > 0 ? ` So it is with ${listed(others)}.` : '';
  const shrunkBy = source.cure!;
  return {
    subject: plane.name,
    sentence: `Its yearly access is known to a range of ${width(interval).toFixed(1)} points, in part for ${SOURCE_WORDS[source.source]}. ${capital(CURE_WORDS[shrunkBy])} would shrink it.${also}`,
    effect,
    cure: cureOf(source, plane),
    shrunkBy,
  };
}

function cureOf({ cure, source }: IntervalSource, plane: PlaneAssessment): Cure {
  if (cure === 'measure-transmittance') return { at: 'site', words: 'Open the obstructions' };
  if (cure === 'weather-file') return { at: 'light', words: 'Choose a weather file' };
  const [worst] = stationEffects(plane, source).sort((a, b) => b.effect - a.effect);
  if (!worst) return { at: 'plane', plane: plane.id, words: 'Open the roof' };
  return {
    at: 'station',
    station: worst.station,
    act: 'sight',
    words: 'Sight more from the least sure station',
  };
}

const capital = (text: string) => text[0].toUpperCase() + text.slice(1);
