import { canonicalText } from '../survey/canonical-text.ts';
import type { JsonValue } from '../survey/json-value.ts';
import { sameJson } from '../survey/same-json.ts';
import { compareStamps, stampDevice, type Stamp } from './stamp.ts';

/** One value that a field was given; without `value` where the field was cleared. */
export interface Version {
  stamp: Stamp;
  value?: JsonValue;
  /** The run of writes this one carries on, by its first stamp; absent where it is the first itself. */
  since?: Stamp;
  /** Versions that this one took the place of knowingly. */
  over?: Stamp[];
  /** The stamp it had by the device's own clock, where that clock was wrong. */
  made?: Stamp;
}

/** A field as it is kept: the version that counts, and below it others that it did not carry on. */
export interface FieldVersions extends Version {
  replaced?: Version[];
}

/** Versions kept of one field; the earliest go first. */
export const MOST_VERSIONS = 12;

const runOf = ({ since, stamp }: Version): Stamp => since ?? stamp;

/** Newest first; of equal stamps the greater content, so that every device decides alike. */
function newestFirst(a: Version, b: Version): number {
  const byStamp = compareStamps(b.stamp, a.stamp);
  if (byStamp !== 0) return byStamp;
  const [textA, textB] = [canonicalText(a), canonicalText(b)];
  return textA > textB ? -1 : textA < textB ? 1 : 0;
}

/** All versions of a field, the one that counts first. */
export function versionsOf({ replaced = [], ...version }: FieldVersions): Version[] {
  return [version, ...replaced];
}

/**
 * A field of two copies as one: the latest version of each run of writes, and of these the latest `MOST_VERSIONS`. It
 * is commutative, associative and idempotent for any versions whatever: the latest of a run is a maximum, and whatever
 * was cut off stays behind the same many later runs for good, since a run only ever moves later.
 */
export const joinVersions = (a: FieldVersions, b: FieldVersions): FieldVersions =>
  asField([...versionsOf(a), ...versionsOf(b)]);

function asField(versions: Version[]): FieldVersions {
  const runs = new Map<Stamp, Version>();
  for (const version of versions.sort(newestFirst))
    if (!runs.has(runOf(version))) runs.set(runOf(version), version);
  const [newest, ...replaced] = [...runs.values()].slice(0, MOST_VERSIONS);
  return { ...newest, ...(replaced.length > 0 && { replaced }) };
}

/**
 * The field after a person wrote `value` (undefined clears it), seeing the version that counts. A device's writes of
 * one field are one run, so that typing pushes nothing out; a clearing is a run apart, so that what it cleared stays.
 * A version that lost unseen is never carried on: it stays until someone settles the field (`settles`: all versions
 * were looked at, as when a replaced value is restored or dismissed). `stamp` must be later than those in the field.
 */
export function written(
  field: FieldVersions | undefined,
  value: JsonValue | undefined,
  stamp: Stamp,
  settles = false,
): FieldVersions {
  const version: Version = { stamp, ...(value !== undefined && { value }) };
  if (!field) return version;
  const versions = versionsOf(field);
  const isOwnRun = (other: Version) =>
    stampDevice(other.stamp) === stampDevice(stamp) &&
    (other.value === undefined) === (value === undefined) &&
    (other === versions[0] || isKnownReplaced(other, versions));
  const carriedOn = versions.find(isOwnRun);
  if (carriedOn) version.since = runOf(carriedOn);
  const seen = settles ? versions : versions.slice(0, 1);
  const over = new Set([...(carriedOn?.over ?? []), ...seen.map((other) => other.stamp)]);
  const left = versions.filter((other) => other !== carriedOn && over.has(other.stamp));
  if (left.length > 0) version.over = left.map((other) => other.stamp);
  return asField([version, ...versions]);
}

const isKnownReplaced = ({ stamp }: Version, versions: readonly Version[]): boolean =>
  versions.some(({ over }) => over?.includes(stamp));

/**
 * Values that lost against one whose writer had not seen them, the latest first: to be shown, and restored by writing
 * them again (`settles`).
 */
export function lostVersions(field: FieldVersions): Version[] {
  const [counts, ...others] = versionsOf(field);
  return others.filter(
    (version) =>
      version.value !== undefined &&
      !sameJson(version.value, counts.value) &&
      !isKnownReplaced(version, [counts, ...others]),
  );
}
