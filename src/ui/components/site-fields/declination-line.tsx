import { magneticDeclination } from '../../../core/pointing/declination.ts';
import { dayText } from '../../value-text.ts';

/** Below this a compass is unsure, nT. */
const WEAK_FIELD = 6000;

/** East or west in words; a compass shows magnetic north. */
function turnText(declination: number): string {
  const size = Math.abs(declination).toFixed(1);
  return size === '0.0' ? '0.0°' : `${size}° ${declination < 0 ? 'west' : 'east'}`;
}

/** Magnetic declination of a place and day, with how far the model behind it can be trusted. */
export function DeclinationLine(props: {
  latitude: number;
  longitude: number;
  altitude?: number;
  timeMs: number;
}) {
  const found = magneticDeclination(props);
  return (
    <div class="small">
      <p>
        Magnetic declination <strong>{turnText(found.declination)}</strong> ±{' '}
        {found.standardDeviation.toFixed(1)}
        °, World Magnetic Model 2025 (epoch {found.epoch.toFixed(1)}, valid until {dayText(found.validUntil)}
        ).
      </p>
      {!found.withinValidity && (
        <p class="field-fault">
          The day lies outside the model’s years: the declination is carried on from them. Check headings by
          the sun or a known mark, and update Noonmark.
        </p>
      )}
      {found.horizontalIntensity < WEAK_FIELD && (
        <p class="field-fault">
          A compass is unsure this near to the magnetic pole. Check headings by the sun.
        </p>
      )}
    </div>
  );
}
