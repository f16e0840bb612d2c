import { blockedSpans } from '../horizon/blocked-spans.ts';
import type { StationHorizon } from '../horizon/station-horizon.ts';
import type { StationAssessment } from './assessment.ts';
import { blockedLight, shadedMonths } from './blocked-light.ts';
import { observedLight } from './coverage.ts';
import { hourlyAccess } from './hourly-access.ts';
import type { KnownObstructions } from './obstruction-shading.ts';
import { monthlyShares } from './monthly-shares.ts';
import { obstructionCosts } from './obstruction-shading.ts';
import type { SkyMap } from './sky-map.ts';
import { unshadedMonths } from './sky-map.ts';

/** What one station saw costs one plane. */
export function assessStation(
  map: SkyMap,
  { profile, observed }: StationHorizon,
  station: { id: string; name: string },
  obstructions: KnownObstructions,
): StationAssessment {
  const spans = blockedSpans(profile);
  const blocked = blockedLight(map, spans);
  const whole = unshadedMonths(map);
  const light = shadedMonths(map, blocked);
  const [annual, annualWhole] = [sum(light), sum(whole)];
  return {
    id: station.id,
    name: station.name,
    solarAccess: {
      annual: annualWhole > 0 ? Math.min(1, annual / annualWhole) : 1,
      monthly: monthlyShares(light, whole),
      hourly: hourlyAccess(map, spans, blocked),
    },
    ...observedLight(map, observed),
    irradiation: { annual, monthly: light },
    ...obstructionCosts(map, profile, obstructions),
  };
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
