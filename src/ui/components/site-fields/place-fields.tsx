import { placeText } from '../../value-text.ts';
import { TextField } from '../form/text-field.tsx';
import { altitudeHint } from './altitude.ts';
import { DeclinationLine } from './declination-line.tsx';
import type { PlaceDraft } from './use-place.ts';
import { ZoneField } from './zone-field.tsx';

/** Where the site is: from the device or typed, with its time zone and the declination there. */
export function PlaceFields({ place, nowMs, asked }: { place: PlaceDraft; nowMs: number; asked: boolean }) {
  const { coordinates, altitude } = place;
  const missing =
    asked && place.text.trim() === '' ? 'The place is needed: from this device, or typed.' : null;
  return (
    <>
      <div class="form-actions">
        <button type="button" class="main" disabled={place.locating} onClick={place.locate}>
          {place.locating ? 'Finding the position…' : 'Use this device’s position'}
        </button>
      </div>
      <TextField
        label="Coordinates"
        value={place.text}
        onInput={place.setText}
        fault={place.fault ?? missing}
        hint={
          coordinates
            ? [placeText(coordinates.latitude, coordinates.longitude), place.told].filter(Boolean).join('. ')
            : "Typed or pasted: 44.91, -72.20 or 44° 54' 36\" N, 72° 12' W or 18T 721028 4976767."
        }
      />
      {coordinates && (
        <>
          <ZoneField value={place.zone} onInput={place.setZone} found={place.zoneFound} nowMs={nowMs} />
          <TextField
            label="Altitude"
            unit="metres above the sea"
            keys="numbers"
            value={altitude}
            onInput={place.setAltitude}
            fault={place.altitudeFault}
            hint={altitudeHint(altitude) ?? 'Optional; within 100 m is enough. Feet with ft behind them.'}
          />
          <DeclinationLine {...coordinates} timeMs={nowMs} />
        </>
      )}
    </>
  );
}
