import type { Assessment, PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { energy, listed, percent } from './figures.ts';
import type { Imagined } from './imagined.ts';

interface Props {
  shade: StationShade;
  imagined: readonly Imagined[];
  onPutBack: () => void;
}

/** The year's figure, large; beside it what it would be with a change imagined. */
export function Headline({ shade, imagined, onPutBack }: Props) {
  const { measured } = shade;
  return (
    <div class="shade-headline">
      <p class="shade-figure">
        <strong>{percent(measured.solarAccess.annual)}</strong>
        <span>of the year’s sunlight reaches {measured.name}</span>
      </p>
      <div role="status">
        {shade.imagined && imagined.length > 0 && (
          <div class="imagined">
            <p>
              <strong>{percent(shade.imagined.solarAccess.annual)}</strong> with{' '}
              {listed(imagined.map(({ words }) => words))}. Imagined, not measured.
            </p>
            <button type="button" onClick={onPutBack}>
              Back to what was measured
            </button>
          </div>
        )}
      </div>
    </div>
  );
}

interface FactsProps {
  assessment: Assessment;
  plane: PlaneAssessment;
  shade: StationShade;
}

/** What stands behind the figure. */
export function HeadlineFacts({ assessment, plane, shade }: FactsProps) {
  return (
    <dl class="facts shade-facts">
      {factsOf({ assessment, plane, shade }).map(([term, value]) => (
        <div key={term}>
          <dt>{term}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function factsOf({ assessment, plane, shade: { measured, unshaded } }: FactsProps): [string, string][] {
  const { solarAccess, orientationFactor, bestPlane } = plane;
  const facts: [string, string][] = [
    ['Light a year', `${energy(measured.irradiation.annual)} of ${energy(unshaded.annual)} kWh/m²`],
    [
      'Seen',
      `${percent(measured.coverage, 0)} of the light comes through parts of the sky that somebody looked at`,
    ],
  ];
  if (solarAccess && solarAccess.count > 1)
    facts.push([
      plane.name,
      `${percent(solarAccess.annual)} on average over ${solarAccess.count} stations, ${percent(solarAccess.lowest)} at the lowest`,
    ]);
  const lies = plane.surfaceTilt < 1 ? 'Flat' : lying(plane);
  facts.push([
    'How it lies',
    `${lies}: ${percent(orientationFactor, 0)} of the best here (${lying(bestPlane)})`,
  ]);
  const { climate, warnings } = assessment;
  const notes = climate.warnings.length + warnings.length;
  facts.push([
    'Climate',
    notes > 0 ? `${climate.name}. Read the ${notes > 1 ? `${notes} notes` : 'note'} below.` : climate.name,
  ]);
  return facts;
}

const lying = ({ surfaceTilt, surfaceAzimuth }: { surfaceTilt: number; surfaceAzimuth: number }): string =>
  `${surfaceTilt.toFixed(0)}° towards ${surfaceAzimuth.toFixed(0)}°`;
