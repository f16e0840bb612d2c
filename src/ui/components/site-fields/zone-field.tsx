import { useMemo } from 'preact/hooks';
import { isTimeZone, utcOffsetMinutes } from '../../../core/solar-position/time-zone.ts';
import { TextField } from '../form/text-field.tsx';

function offsetText(minutes: number): string {
  const size = Math.abs(Math.round(minutes));
  const hours = `${Math.floor(size / 60)}`;
  return `UTC${minutes < 0 ? '−' : '+'}${hours}${size % 60 ? `:${String(size % 60).padStart(2, '0')}` : ''}`;
}

/** Names to choose from; older browsers have no list, there the name is typed. */
function knownZones(): string[] {
  const { supportedValuesOf } = Intl as Partial<typeof Intl>;
  return supportedValuesOf?.('timeZone') ?? [];
}

/** A time zone, found by typing a part of its name. */
export function ZoneField({
  value,
  onInput,
  found,
  nowMs,
}: {
  value: string;
  onInput: (zone: string) => void;
  /** Where the value comes from, as a sentence. */
  found: string;
  nowMs: number;
}) {
  const zones = useMemo(knownZones, []);
  const known = isTimeZone(value);
  return (
    <TextField
      label="Time zone"
      value={value}
      onInput={onInput}
      choices={zones}
      fault={known ? null : 'Type a part of the zone’s name, such as Lisbon, and choose from the list.'}
      hint={known ? `${offsetText(utcOffsetMinutes(nowMs, value))} today. ${found}` : undefined}
    />
  );
}
