import type { HorizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import { pointedDirections, stationHorizon } from '../../src/core/horizon/station-horizon.ts';
import { pointSurvey } from '../../src/core/pointing/point-survey.ts';
import type { AccessInterval } from '../../src/core/shading/assessment.ts';
import { leafShares } from '../../src/core/survey/leaf-months.ts';
import { obstructionKind } from '../../src/core/survey/obstruction-kinds.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../../src/core/uncertainty/access-interval.ts';
import { DIFFUSE_SPREAD } from '../../src/core/uncertainty/planning-values.ts';
import type { RandomSource } from '../../src/core/uncertainty/random-source.ts';
import { uncertainStation } from '../../src/core/uncertainty/uncertain-station.ts';
import type { SceneLight } from './true-light.ts';
import { annualAccess } from './true-light.ts';
import type { TrueScene } from './true-scene.ts';

/** What the pipeline makes of a survey: pointed, its horizon laid, its annual access; null where nothing is tied to north. */
export function measuredAccess({ map }: SceneLight, survey: Survey): number | null {
  const pointed = pointSurvey(survey);
  if (pointed.runs.some(({ heading, refused }) => heading === null || refused !== null)) return null;
  const { profile } = stationHorizon(survey, survey.stations[0], pointedDirections(pointed));
  return annualAccess(map, profile);
}

/** How sure the pipeline is of it. */
export function measuredInterval(
  { map, scene }: SceneLight,
  survey: Survey,
  draws: number,
): AccessInterval | null {
  const pointed = pointSurvey(survey);
  if (pointed.runs.some(({ heading, refused }) => heading === null || refused !== null)) return null;
  const horizon = stationHorizon(survey, survey.stations[0], pointedDirections(pointed));
  const options = { seed: survey.id, draws, sources: false };
  const drawn = drawnSurvey(pointed, scene.site.latitude, 'world', options);
  const station = uncertainStation(survey, survey.stations[0], pointed, horizon);
  return accessInterval([drawAccess(map, station, annualAccess(map, horizon.profile), drawn)], drawn);
}

/**
 * A truth the surveyor cannot see: each tree lets through what some tree of its kind does, and the year has some share of
 * diffuse light. Trees within the published range of their kind, most near its usual value; the year by the climate's spread.
 */
export function unseenTruth({ map, scene, profile }: SceneLight, random: RandomSource): number {
  const passing = treesDrawn(scene, profile, random);
  return annualAccess(map, { ...profile, transmittance: passing }, DIFFUSE_SPREAD.world * random.normal());
}

function treesDrawn(scene: TrueScene, { transmittance }: HorizonProfile, random: RandomSource): Float64Array {
  const leafy = leafShares(scene.site.latitude);
  const drawn = transmittance.slice();
  scene.features.forEach(({ kind }, o) => {
    const { leaves } = obstructionKind(kind);
    if (!leaves) return;
    const on = random.triangular(leaves.onRange[0], leaves.on, leaves.onRange[1]);
    const off =
      leaves.on === leaves.off ? on : random.triangular(leaves.offRange[0], leaves.off, leaves.offRange[1]);
    leafy.forEach((share, month) => (drawn[o * 12 + month] = off + share * (on - off)));
  });
  return drawn;
}
