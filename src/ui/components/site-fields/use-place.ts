import { useEffect, useRef, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import { zoneAt } from '../../../app/zone-at.ts';
import type { Coordinates } from '../../../core/angles/place.ts';
import { parseCoordinates } from '../../../core/pointing/coordinates.ts';
import { isTimeZone, utcOffsetMinutes } from '../../../core/solar-position/time-zone.ts';
import type { Site } from '../../../core/survey/survey.ts';
import { faultOf } from '../../typed.ts';
import { typedAltitude } from './altitude.ts';
import { accuracyText, LOCATION_FAULTS } from './location-messages.ts';

const deviceZone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;
const FOUND = {
  place: 'Found from the coordinates; near a border, check it.',
  device: 'Taken from this device.',
  hand: 'As typed.',
};

/** Clocks that far apart hint at a wrong place or a wrong sign. */
const CLOCKS_APART_MINUTES = 180;

/** What is typed or found of a place. */
export interface PlaceTexts {
  coordinates: string;
  altitude: string;
  zone: string;
  zoneFrom: keyof typeof FOUND;
  /** Metres, where the device found the place; null where it was typed. */
  accuracy: number | null;
}

/** The texts that show a site; for a new one, empty. */
export const placeTexts = (site?: Site): PlaceTexts => ({
  coordinates: site ? `${site.latitude}, ${site.longitude}` : '',
  altitude: site?.altitude === undefined ? '' : String(site.altitude),
  zone: site?.timeZone ?? '',
  // A zone that is stored was settled once and does not follow the coordinates.
  zoneFrom: site ? 'hand' : 'place',
  accuracy: null,
});

/** A place being typed or found: its texts, what they mean, and what is wrong with them. */
export interface PlaceDraft {
  coordinates: Coordinates | null;
  text: string;
  setText: (text: string) => void;
  fault: string | null;
  /** Where the coordinates come from, or what is odd about them. */
  told: string | null;
  altitude: string;
  setAltitude: (text: string) => void;
  altitudeFault: string | null;
  zone: string;
  setZone: (zone: string) => void;
  zoneFound: string;
  locate: () => void;
  locating: boolean;
  /** The site as drafted; null while a part of it is missing or wrong. */
  site: Pick<Site, 'latitude' | 'longitude' | 'altitude' | 'timeZone'> | null;
}

export function usePlace(
  { location }: Pick<AppServices, 'location'>,
  nowMs: number,
  texts: PlaceTexts,
  change: (part: Partial<PlaceTexts>) => void,
  before?: Site,
): PlaceDraft {
  const { zone, accuracy } = texts;
  const [refusal, setRefusal] = useState<string | null>(null);
  const [locating, setLocating] = useState(false);
  const byHand = useRef(false);
  byHand.current = texts.zoneFrom === 'hand';

  const parsed = parseCoordinates(texts.coordinates);
  const coordinates = parsed.ok ? parsed.value : null;
  const { latitude, longitude } = coordinates ?? {};

  useEffect(() => {
    if (latitude === undefined || longitude === undefined || byHand.current) return;
    let wanted = true;
    void zoneAt(latitude, longitude).then((found) => {
      if (!wanted || byHand.current) return;
      change({ zone: found ?? deviceZone(), zoneFrom: found === null ? 'device' : 'place' });
    });
    return () => {
      wanted = false;
    };
  }, [latitude, longitude]);

  const typed = (value: string) => {
    change({ coordinates: value, accuracy: null });
    setRefusal(null);
  };
  const locate = async () => {
    setLocating(true);
    setRefusal(null);
    const outcome = await location.locate();
    setLocating(false);
    if (!outcome.ok) return setRefusal(LOCATION_FAULTS[outcome.why]);
    const { position } = outcome;
    change({
      coordinates: `${position.latitude.toFixed(6)}, ${position.longitude.toFixed(6)}`,
      accuracy: position.accuracy,
      ...(position.altitude !== null && { altitude: String(Math.round(position.altitude)) }),
    });
  };

  const altitude = typedAltitude(texts.altitude);
  return {
    coordinates,
    text: texts.coordinates,
    setText: typed,
    fault: refusal ?? (texts.coordinates.trim() !== '' && !parsed.ok ? parsed.problems[0].message : null),
    told:
      oddity(zone, nowMs, before) ??
      (parsed.ok ? parsed.warnings[0]?.message : undefined) ??
      (accuracy === null ? null : accuracyText(accuracy)),
    altitude: texts.altitude,
    setAltitude: (text) => change({ altitude: text }),
    altitudeFault: faultOf(altitude),
    zone,
    setZone: (name) => change({ zone: name, zoneFrom: 'hand' }),
    zoneFound: FOUND[texts.zoneFrom],
    locate: () => void locate(),
    locating,
    site:
      coordinates && isTimeZone(zone) && 'value' in altitude
        ? {
            ...coordinates,
            ...(altitude.value !== undefined && { altitude: altitude.value }),
            timeZone: zone,
          }
        : null,
  };
}

/** A new place whose clocks are far from this device's is perhaps another one. */
function oddity(zone: string, nowMs: number, before: Site | undefined): string | null {
  if (before || !isTimeZone(zone)) return null;
  const apart = Math.abs(utcOffsetMinutes(nowMs, zone) - utcOffsetMinutes(nowMs, deviceZone()));
  return apart > CLOCKS_APART_MINUTES
    ? `Clocks there (${zone}) are ${Math.round(apart / 60)} hours from this device’s. Check the coordinates and their signs.`
    : null;
}
