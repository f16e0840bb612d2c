import { sourceEffect, width } from '../../../core/completeness/interval-effect.ts';
import { CURE_WORDS, SOURCE_WORDS } from '../../../core/completeness/source-words.ts';
import type { AccessInterval, Assessment, PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { energy, listed, percent } from './figures.ts';
import type { Imagined } from './imagined.ts';

interface Props {
  plane: PlaneAssessment;
  shade: StationShade;
  imagined: readonly Imagined[];
  onPutBack: () => void;
}

/** The year's figure, large; beside it what it would be with a change imagined. */
export function Headline({ plane, shade, imagined, onPutBack }: Props) {
  const { measured } = shade;
  const interval = intervalOf(plane, shade);
  return (
    <div class="shade-headline">
      <p class="shade-figure">
        <strong>{percent(measured.solarAccess.annual)}</strong>
        <span>of the year’s sunlight reaches {measured.name}</span>
      </p>
      {interval && (
        <p class="shade-interval">
          <b>{rangeText(interval)}</b>, 95 times in 100
        </p>
      )}
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

/** How sure the figure of the station on screen is; the shade itself is drawn without intervals. */
const intervalOf = ({ stations }: PlaneAssessment, { measured }: StationShade): AccessInterval | undefined =>
  stations.find(({ id }) => id === measured.id)?.solarAccess.interval;

/** Such as `92.9 to 95.3 %`. */
const rangeText = ({ low, high }: AccessInterval): string => `${(low * 100).toFixed(1)} to ${percent(high)}`;

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

function factsOf({ assessment, plane, shade }: FactsProps): [string, string][] {
  const { measured, unshaded } = shade;
  const { solarAccess, orientationFactor, bestPlane } = plane;
  const facts: [string, string][] = [
    ['Light a year', `${energy(measured.irradiation.annual)} of ${energy(unshaded.annual)} kWh/m²`],
    [
      'Seen',
      `${percent(measured.coverage, 0)} of the light comes through parts of the sky that somebody looked at`,
    ],
  ];
  const interval = intervalOf(plane, shade);
  if (interval) facts.push(['How sure', sureText(interval)]);
  if (solarAccess && solarAccess.count > 1)
    facts.push([
      plane.name,
      `${percent(solarAccess.annual)} on average over ${solarAccess.count} stations${meanRange(solarAccess.interval)}, ${percent(solarAccess.lowest)} at the lowest`,
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

const meanRange = (interval?: AccessInterval) => (interval ? ` (${rangeText(interval)})` : '');

/** What makes the figure unsure most of all, and what would shrink that. */
function sureText(interval: AccessInterval): string {
  const [main] = interval.sources;
  const wide = `${width(interval).toFixed(1)} points from end to end`;
  if (!main || sourceEffect(interval, main.source) < 0.05) return `${wide}.`;
  const most = `${wide}, mostly for ${SOURCE_WORDS[main.source]} (${percent(main.share, 0)} of the spread)`;
  if (main.cure === null || main.standardDeviationAfter === null) return `${most}.`;
  const left = main.standardDeviationAfter / interval.standardDeviation;
  const after = (left * width(interval)).toFixed(1);
  return `${most}. ${capital(CURE_WORDS[main.cure])} would bring it to ${after} points.`;
}

const capital = (text: string) => text[0].toUpperCase() + text.slice(1);

const lying = ({ surfaceTilt, surfaceAzimuth }: { surfaceTilt: number; surfaceAzimuth: number }): string =>
  `${surfaceTilt.toFixed(0)}° towards ${surfaceAzimuth.toFixed(0)}°`;
