import { useMemo, useState } from 'preact/hooks';
import { changeSurvey } from '../../../app/actions/change-survey.ts';
import { attempt } from '../../../app/attempt.ts';
import { pointSurvey } from '../../../core/pointing/point-survey.ts';
import type { PointedSighting, PointedSurvey } from '../../../core/pointing/pointed-survey.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { SightingDirection } from '../../../core/survey/sighting-direction.ts';
import { withoutTrace, type SightingList } from '../../../core/survey/sighting-edits.ts';
import type { Sighting, Station, Survey, Trace } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { degreesText } from '../../value-text.ts';
import { PhotoStrip } from '../photos/photo-strip.tsx';
import { ColumnHeads } from '../column-heads.tsx';
import { WideTable } from '../wide-table.tsx';
import { BookDialog } from './book-dialog.tsx';
import type { BookEdit } from './book-edit.ts';
import { hasReading } from './sighting-form.tsx';
import { unmeasuredPlace } from './unmeasured-place.ts';
import './field-book.css';

const SHAPES: Record<Trace['shape'], string> = {
  skyline: 'skyline',
  outline: 'closed outline',
  line: 'line',
};

function remarks(sighting: Sighting): string {
  const amended = sighting.amendments?.at(-1);
  return [
    sighting.mark && `mark: ${sighting.mark}`,
    hasReading(sighting) && 'raw reading',
    amended && `amended: ${amended.reason}`,
  ]
    .filter(Boolean)
    .join('; ');
}

function SightingRow(props: {
  sighting: Sighting;
  number: number;
  pointed: PointedSighting | undefined;
  onEdit: (direction: SightingDirection | null) => void;
}) {
  const { sighting, number, pointed } = props;
  const direction = pointed?.direction ?? null;
  return (
    <tr>
      <th scope="row" class="number">
        <button
          type="button"
          aria-label={`Change sighting ${number}`}
          title={`Change sighting ${number}`}
          onClick={() => props.onEdit(direction)}
        >
          {number}
        </button>
      </th>
      <td class="number figure">{degreesText(direction?.azimuth)}</td>
      <td class="number figure">{degreesText(direction?.elevation)}</td>
      <td>{[remarks(sighting), pointed?.undirected?.message].filter(Boolean).join('; ')}</td>
    </tr>
  );
}

/** A sweep has thousands of sightings; at first so many of each trace are shown. */
const SHOWN_AT_FIRST = 100;

/** One block of the table: the sightings of a trace, or of a station's marks. */
function SightingRows(props: {
  name: string;
  about: string;
  sightings: readonly Sighting[];
  list: SightingList;
  pointed: PointedSurvey;
  onEdit: (edit: BookEdit) => void;
  onDelete?: () => void;
}) {
  const { name, list, pointed, onEdit, onDelete } = props;
  const [shown, setShown] = useState(SHOWN_AT_FIRST);
  const sightings = ordered(props.sightings);
  const hidden = sightings.length - Math.min(shown, sightings.length);
  return (
    <tbody>
      <tr class="trace-head">
        <th scope="rowgroup" colSpan={4}>
          {name} <span class="faint small">{props.about}</span>
        </th>
      </tr>
      {sightings.slice(0, shown).map((sighting, place) => (
        <SightingRow
          key={sighting.id}
          sighting={sighting}
          number={place + 1}
          pointed={pointed.sightings.get(sighting.id)}
          onEdit={(direction) => onEdit({ what: 'sighting', list, sighting, direction, number: place + 1 })}
        />
      ))}
      {hidden > 0 && (
        <tr>
          <td colSpan={4}>
            <button type="button" onClick={() => setShown(Infinity)}>
              Show {hidden} more {hidden === 1 ? 'sighting' : 'sightings'}
            </button>
          </td>
        </tr>
      )}
      <tr>
        <td colSpan={4}>
          <div class="row row-acts">
            <button
              type="button"
              aria-label={`Add a sighting of ${name}`}
              onClick={() => onEdit({ what: 'new-sighting', list, after: null, name })}
            >
              Add a sighting
            </button>
            {onDelete && (
              <button type="button" aria-label={`Delete the trace of ${name}`} onClick={onDelete}>
                Delete the trace
              </button>
            )}
          </div>
        </td>
      </tr>
    </tbody>
  );
}

function aboutTrace({ shape, fullCircle, angularWidth }: Trace): string {
  return [SHAPES[shape], fullCircle && 'full circle', angularWidth !== undefined && `${angularWidth}° wide`]
    .filter(Boolean)
    .join(', ');
}

function placeOf(station: Station, survey: Survey): string {
  const { position } = station;
  if (position === undefined) return unmeasuredPlace(station, survey);
  if (!('on' in position)) return `${position.east} m east, ${position.north} m north, ${position.up} m up`;
  const plane = survey.planes.find(({ id }) => id === position.on);
  return `On ${plane?.name ?? position.on}: ${position.x} m along the eave, ${position.y} m up the slope`;
}

function Book(props: { station: Station; survey: Survey; onEdit: (edit: BookEdit) => void }) {
  const services = useApp();
  const { station, survey, onEdit } = props;
  const pointed = useMemo(() => pointSurvey(survey), [survey]);
  const nameOf = (id: string) => survey.obstructions.find((obstruction) => obstruction.id === id)?.name ?? id;
  const marks = station.markSightings ?? [];
  const remove = (trace: Trace) =>
    attempt(services.state, () => {
      const after = withoutTrace(survey, station.id, trace.id);
      return changeSurvey(services, survey, after, 'entry-deleted', `Trace of ${nameOf(trace.obstruction)}`);
    });
  return (
    <WideTable label={`Sightings from ${station.name}`}>
      <ColumnHeads heads={[{ number: 'No.' }, { number: 'Azimuth' }, { number: 'Elevation' }, 'Remarks']} />
      {ordered(station.traces).map((trace) => (
        <SightingRows
          key={trace.id}
          name={nameOf(trace.obstruction)}
          about={aboutTrace(trace)}
          sightings={trace.sightings}
          list={{ station: station.id, trace: trace.id }}
          pointed={pointed}
          onEdit={onEdit}
          onDelete={() => void remove(trace)}
        />
      ))}
      {marks.length > 0 && (
        <SightingRows
          name="Marks and single sightings"
          about="in no trace"
          sightings={marks}
          list={{ station: station.id, trace: null }}
          pointed={pointed}
          onEdit={onEdit}
        />
      )}
    </WideTable>
  );
}

/** What one station saw: a ruled table of sightings, one block a trace; each can be changed, added and taken out. */
export function FieldBook({ station, survey, open }: { station: Station; survey: Survey; open: boolean }) {
  const [edit, setEdit] = useState<BookEdit | null>(null);
  const serves = survey.planes.filter(({ id }) => station.serves.includes(id)).map(({ name }) => name);
  const isEmpty = station.traces.length === 0 && !station.markSightings?.length;
  return (
    <details class="fold station" open={open}>
      <summary>
        <h3>{station.name}</h3>
      </summary>
      <p class="small">
        {placeOf(station, survey)}.{' '}
        {serves.length > 0 ? `Speaks for ${serves.join(', ')}.` : 'Speaks for no plane.'}
      </p>
      {isEmpty ? (
        <p>Nothing traced from here.</p>
      ) : (
        <Book station={station} survey={survey} onEdit={setEdit} />
      )}
      <div class="row row-acts">
        <button type="button" onClick={() => setEdit({ what: 'trace' })}>
          Type a trace
        </button>
      </div>
      <PhotoStrip survey={survey} subject={{ kind: 'station', id: station.id }} name={station.name} />
      {edit && <BookDialog station={station} survey={survey} edit={edit} onDone={() => setEdit(null)} />}
    </details>
  );
}
