import { useMemo, useState } from 'preact/hooks';
import { stationsOf } from '../../../core/survey/served-planes.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { SectionProps } from '../../section.ts';
import { Choices } from './choices.tsx';
import { EmptyShade } from './empty-shade.tsx';
import { Fault } from './fault.tsx';
import { ShadeResults } from './shade-results.tsx';
import type { Imagined } from './imagined.ts';
import { LightChoice } from './light-choice.tsx';
import { Working } from './working.tsx';
import { useShade } from './use-shade.ts';
import './shade.css';

const NONE: ReadonlyMap<string, Imagined> = new Map();

/** Who is in the way of the sun, when, and what it costs: one plane seen from one station. */
export function ShadeSection({ survey, services }: SectionProps) {
  const planes = useMemo(() => ordered(survey.planes), [survey]);
  const [wish, setWish] = useState<{ plane?: string; station?: string }>({});
  const [wished, setWished] = useState(NONE);
  const plane =
    planes.find(({ id }) => id === wish.plane) ??
    planes.find((p) => stationsOf(survey, p).length > 0) ??
    planes[0];
  const stations = plane ? stationsOf(survey, plane) : [];
  const station = stations.find(({ id }) => id === wish.station) ?? stations[0];
  // what this station did not trace cannot be changed in its sky
  const imagined = useMemo(() => {
    const traced = new Set(station?.traces.map(({ obstruction }) => obstruction));
    return new Map([...wished].filter(([id]) => traced.has(id)));
  }, [wished, station]);
  const changes = useMemo(() => [...imagined.values()].map(({ change }) => change), [imagined]);
  const state = useShade(services, {
    survey,
    plane: plane?.id ?? null,
    station: station?.id ?? null,
    changes,
  });
  if (!plane) return <EmptyShade reason="no-plane" />;
  const assessed = state.assessment?.planes.find(({ id }) => id === plane.id);
  const imagine = (id: string, change: Imagined | null) =>
    setWished((before) => {
      const after = new Map(before);
      if (change) after.set(id, change);
      else after.delete(id);
      return after;
    });
  const go = (to: { plane: string; station?: string }) => {
    setWish(to);
    // a height is over the instrument, so a cut means something else from another station
    setWished((before) => new Map([...before].filter(([, { change }]) => change.kind === 'gone')));
  };
  return (
    <div class="shade">
      <h2 class="visually-hidden">Shade</h2>
      <div class="shade-top">
        <Choices
          planes={planes}
          stations={stations}
          plane={plane.id}
          station={station?.id ?? null}
          onPlane={(id) => go({ plane: id, station: wish.station })}
          onStation={(id) => go({ plane: plane.id, station: id })}
        />
        <Working working={state.working} onCancel={state.cancel} />
        {state.fault && <Fault fault={state.fault} onRetry={state.retry} />}
      </div>
      {!station && <EmptyShade reason="no-station" planeName={plane.name} />}
      {station && assessed && state.shade && (
        <ShadeResults
          survey={survey}
          year={new Date(services.now()).getUTCFullYear()}
          assessment={state.assessment!}
          plane={assessed}
          shade={state.shade}
          imagined={imagined}
          settled={state.settled}
          onImagine={imagine}
          onPutBack={() => setWished(NONE)}
        />
      )}
      <LightChoice survey={survey} services={services} assessment={state.assessment} />
    </div>
  );
}
