import { useMemo, useState } from 'preact/hooks';
import { stationsOf } from '../../../core/shading/assess-survey.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { SectionProps } from '../../section.ts';
import { Choices } from './choices.tsx';
import { EmptyShade } from './empty-shade.tsx';
import { Fault } from './fault.tsx';
import { ShadeResults } from './shade-results.tsx';
import { LightChoice } from './light-choice.tsx';
import { Working } from './working.tsx';
import { useShade } from './use-shade.ts';
import './shade.css';

const NONE: ReadonlySet<string> = new Set();

/** Who is in the way of the sun, when, and what it costs: one plane seen from one station. */
export function ShadeSection({ survey, services }: SectionProps) {
  const planes = useMemo(() => ordered(survey.planes), [survey]);
  const [wish, setWish] = useState<{ plane?: string; station?: string }>({});
  const [gone, setGone] = useState(NONE);
  const plane =
    planes.find(({ id }) => id === wish.plane) ??
    planes.find((p) => stationsOf(survey, p).length > 0) ??
    planes[0];
  const stations = plane ? stationsOf(survey, plane) : [];
  const station = stations.find(({ id }) => id === wish.station) ?? stations[0];
  const traced = new Set(station?.traces.map(({ obstruction }) => obstruction));
  const standingGone = useMemo(() => new Set([...gone].filter((id) => traced.has(id))), [gone, station]);
  const state = useShade(services, {
    survey,
    plane: plane?.id ?? null,
    station: station?.id ?? null,
    gone: standingGone,
  });
  if (!plane) return <EmptyShade reason="no-plane" />;
  const assessed = state.assessment?.planes.find(({ id }) => id === plane.id);
  const toggle = (id: string) =>
    setGone((before) => (before.has(id) ? without(before, id) : new Set([...before, id])));
  return (
    <div class="shade">
      <h2 class="visually-hidden">Shade</h2>
      <div class="shade-top">
        <Choices
          planes={planes}
          stations={stations}
          plane={plane.id}
          station={station?.id ?? null}
          onPlane={(id) => setWish({ plane: id, station: wish.station })}
          onStation={(id) => setWish({ plane: plane.id, station: id })}
        />
        <Working working={state.working} onCancel={state.cancel} />
        {state.fault && <Fault fault={state.fault} onRetry={state.retry} />}
      </div>
      {!station && <EmptyShade reason="no-station" planeName={plane.name} />}
      {station && assessed && state.shade && (
        <ShadeResults
          survey={survey}
          year={new Date(services.now()).getUTCFullYear()}
          plane={assessed}
          shade={state.shade}
          gone={standingGone}
          onToggle={toggle}
          onPutBack={() => setGone(NONE)}
        />
      )}
      <LightChoice survey={survey} services={services} assessment={state.assessment} />
    </div>
  );
}

const without = (set: ReadonlySet<string>, id: string): ReadonlySet<string> =>
  new Set([...set].filter((other) => other !== id));
