import { useEffect, useRef, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import { zoneAt } from '../../../app/zone-at.ts';
import type { Coordinates } from '../../../core/angles/place.ts';
import { parseCoordinates } from '../../../core/pointing/coordinates.ts';
import { isTimeZone, utcOffsetMinutes } from '../../../core/solar-position/time-zone.ts';
import type { Site } from '../../../core/survey/survey.ts';
import { numberOf } from '../../typed.ts';
import { accuracyText, LOCATION_FAULTS } from './location-messages.ts';

const deviceZone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;
const FOUND = {
  place: 'Found from the coordinates; near a border, check it.',
  device: 'Taken from this device.',
  hand: 'As typed.',
};

/** Clocks that far apart hint at a wrong place or a wrong sign. */
const CLOCKS_APART_MINUTES = 180;

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
  before?: Site,
): PlaceDraft {
  const [text, setText] = useState(before ? `${before.latitude}, ${before.longitude}` : '');
  const [altitude, setAltitude] = useState(before?.altitude === undefined ? '' : String(before.altitude));
  const [zone, setZone] = useState(before?.timeZone ?? '');
  const [zoneFrom, setZoneFrom] = useState<keyof typeof FOUND>('hand');
  const [accuracy, setAccuracy] = useState<number | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [locating, setLocating] = useState(false);
  const byHand = useRef(before !== undefined);

  const parsed = parseCoordinates(text);
  const coordinates = parsed.ok ? parsed.value : null;
  const { latitude, longitude } = coordinates ?? {};

  useEffect(() => {
    if (latitude === undefined || longitude === undefined || byHand.current) return;
    let wanted = true;
    void zoneAt(latitude, longitude).then((found) => {
      if (!wanted || byHand.current) return;
      setZone(found ?? deviceZone());
      setZoneFrom(found === null ? 'device' : 'place');
    });
    return () => {
      wanted = false;
    };
  }, [latitude, longitude]);

  const typed = (value: string) => {
    setText(value);
    setAccuracy(null);
    setRefusal(null);
  };
  const locate = async () => {
    setLocating(true);
    setRefusal(null);
    const outcome = await location.locate();
    setLocating(false);
    if (!outcome.ok) return setRefusal(LOCATION_FAULTS[outcome.why]);
    const { position } = outcome;
    setText(`${position.latitude.toFixed(6)}, ${position.longitude.toFixed(6)}`);
    setAccuracy(position.accuracy);
    if (position.altitude !== null) setAltitude(String(Math.round(position.altitude)));
  };

  const height = altitude.trim() === '' ? undefined : numberOf(altitude);
  const heightIsRight = height === undefined || (height !== null && height >= -430 && height <= 9000);
  const zoneIsRight = isTimeZone(zone);
  return {
    coordinates,
    text,
    setText: typed,
    fault: refusal ?? (text.trim() !== '' && !parsed.ok ? parsed.problems[0].message : null),
    told:
      oddity(zone, nowMs, before) ??
      (parsed.ok ? parsed.warnings[0]?.message : undefined) ??
      (accuracy === null ? null : accuracyText(accuracy)),
    altitude,
    setAltitude,
    zone,
    setZone: (name) => {
      byHand.current = true;
      setZoneFrom('hand');
      setZone(name);
    },
    zoneFound: FOUND[zoneFrom],
    locate: () => void locate(),
    locating,
    site:
      coordinates && zoneIsRight && heightIsRight
        ? { ...coordinates, ...(height !== undefined && { altitude: height }), timeZone: zone }
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
