import { useState } from 'preact/hooks';
import { ordered } from '../../../core/survey/order.ts';
import { sightingDirection } from '../../../core/survey/sighting-direction.ts';
import type { Sighting, Station, Survey, Trace } from '../../../core/survey/survey.ts';
import { degreesText } from '../../value-text.ts';
import { WideTable } from '../wide-table.tsx';

const SHAPES: Record<Trace['shape'], string> = {
  skyline: 'skyline',
  outline: 'closed outline',
  line: 'line',
};

function remarks(sighting: Sighting): string {
  const amended = sighting.amendments?.at(-1);
  return [
    sighting.mark && `mark: ${sighting.mark}`,
    sighting.reading !== undefined && 'raw reading',
    amended && `amended: ${amended.reason}`,
  ]
    .filter(Boolean)
    .join('; ');
}

function SightingRow({ sighting, number }: { sighting: Sighting; number: number }) {
  const direction = sightingDirection(sighting);
  return (
    <tr>
      <th scope="row" class="number">
        {number}
      </th>
      <td class="number figure">{degreesText(direction?.azimuth)}</td>
      <td class="number figure">{degreesText(direction?.elevation)}</td>
      <td>{remarks(sighting)}</td>
    </tr>
  );
}

/** A sweep has thousands of sightings; at first so many of each trace are shown. */
const SHOWN_AT_FIRST = 100;

function TraceRows({ trace, name }: { trace: Trace; name: string }) {
  const [shown, setShown] = useState(SHOWN_AT_FIRST);
  const sightings = ordered(trace.sightings);
  const hidden = sightings.length - Math.min(shown, sightings.length);
  const about = [
    SHAPES[trace.shape],
    trace.fullCircle && 'full circle',
    trace.angularWidth !== undefined && `${trace.angularWidth}° wide`,
  ];
  return (
    <tbody>
      <tr class="trace-head">
        <th scope="rowgroup" colSpan={4}>
          {name} <span class="faint small">{about.filter(Boolean).join(', ')}</span>
        </th>
      </tr>
      {sightings.slice(0, shown).map((sighting, place) => (
        <SightingRow key={sighting.id} sighting={sighting} number={place + 1} />
      ))}
      {hidden > 0 && (
        <tr>
          <td colSpan={4}>
            <button type="button" onClick={() => setShown(Infinity)}>
              Show {hidden} more sightings
            </button>
          </td>
        </tr>
      )}
    </tbody>
  );
}

function placeOf({ position }: Station, survey: Survey): string {
  if (position === undefined) return 'Place unknown';
  if (!('on' in position)) return `${position.east} m east, ${position.north} m north, ${position.up} m up`;
  const plane = survey.planes.find(({ id }) => id === position.on);
  return `On ${plane?.name ?? position.on}: ${position.x} m along the eave, ${position.y} m up the slope`;
}

/** What one station saw: a ruled table of sightings, one block a trace. */
export function FieldBook({ station, survey, open }: { station: Station; survey: Survey; open: boolean }) {
  const nameOf = (id: string) => survey.obstructions.find((obstruction) => obstruction.id === id)?.name ?? id;
  const serves = survey.planes.filter(({ id }) => station.serves.includes(id)).map(({ name }) => name);
  return (
    <details class="fold station" open={open}>
      <summary>
        <h3>{station.name}</h3>
      </summary>
      <p class="small">
        {placeOf(station, survey)}.{' '}
        {serves.length > 0 ? `Speaks for ${serves.join(', ')}.` : 'Speaks for no plane.'}
      </p>
      {station.traces.length === 0 ? (
        <p>Nothing traced from here.</p>
      ) : (
        <WideTable label={`Sightings from ${station.name}`}>
          <thead>
            <tr>
              <th scope="col" class="number">
                No.
              </th>
              <th scope="col" class="number">
                Azimuth
              </th>
              <th scope="col" class="number">
                Elevation
              </th>
              <th scope="col">Remarks</th>
            </tr>
          </thead>
          {ordered(station.traces).map((trace) => (
            <TraceRows key={trace.id} trace={trace} name={nameOf(trace.obstruction)} />
          ))}
        </WideTable>
      )}
    </details>
  );
}
