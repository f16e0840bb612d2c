import { describe, expect, it } from 'vitest';
import { withoutObstruction, withoutPlane } from '../../../src/core/survey/removed-entries.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { merge, stateOf, type SurveyState } from '../../../src/core/sync-protocol/merge.ts';
import { needsALook } from '../../../src/core/sync-protocol/needs-a-look.ts';
import { nextStamp } from '../../../src/core/sync-protocol/stamp.ts';
import { inventedSurvey, rawReading } from '../../app/invented-survey.ts';
import { acted, created, edited, shown } from './two-copies.ts';

const start = created(inventedSurvey());
const quiet = { replaced: [], broughtBack: [], readingConflicts: [], isEditedSinceDeletion: false };
const titled = (title: string) => (survey: Survey) => ({ ...survey, title });

function both(a: SurveyState, b: SurveyState): SurveyState {
  const joined = merge(a, b);
  expect(merge(b, a)).toEqual(joined);
  return joined;
}

describe('phone and office edit one field, neither seeing the other', () => {
  const phone = edited(start, 'phone', '10:00', titled('By the phone'));
  const office = edited(start, 'office', '10:01', titled('By the office'));
  const joined = both(phone, office);

  it('the later counts, and the other is shown as replaced', () => {
    expect(shown(joined).title).toBe('By the office');
    expect(needsALook(joined)).toEqual({
      ...quiet,
      replaced: [
        {
          path: 'title',
          value: 'By the phone',
          stamp: '2026-05-14T10:00:00.000Z-0000-phone',
          replacedBy: '2026-05-14T10:01:00.000Z-0000-office',
        },
      ],
    });
  });

  it('a further edit of what counts leaves the replaced value to be seen', () => {
    const later = edited(
      edited(joined, 'phone', '10:05', titled('Again')),
      'phone',
      '10:06',
      titled('And again'),
    );
    expect(needsALook(later).replaced).toMatchObject([{ value: 'By the phone' }]);
  });

  it('restoring it is an edit, after which nothing is to be seen', () => {
    const restored = acted(joined, 'office', '11:00', [{ path: 'title', value: 'By the phone' }], true);
    expect(shown(both(restored, phone)).title).toBe('By the phone');
    expect(needsALook(both(restored, phone))).toEqual(quiet);
  });

  it('an edit that saw the value it replaces is nothing to be seen', () => {
    expect(needsALook(both(edited(office, 'phone', '10:30', titled('Knowingly')), office))).toEqual(quiet);
  });

  it('different fields both stand', () => {
    const notes = edited(start, 'office', '10:01', (survey) => ({ ...survey, notes: 'Two dogs' }));
    expect(shown(both(phone, notes))).toMatchObject({ title: 'By the phone', notes: 'Two dogs' });
    expect(needsALook(both(phone, notes))).toEqual(quiet);
  });
});

describe('a station is deleted on one device while another works in it', () => {
  const deleted = edited(start, 'office', '11:00', (survey) => ({ ...survey, stations: [] }));
  const trace = inventedSurvey().stations[0].traces[0];
  const measuring = (time: string) =>
    edited(start, 'phone', time, (survey) => ({
      ...survey,
      readings: [...survey.readings, rawReading('raw-22')],
      stations: survey.stations.map((station) => ({
        ...station,
        traces: [
          {
            ...trace,
            sightings: [...trace.sightings, { id: 's4', azimuth: 160, elevation: 20, reading: 'raw-22' }],
          },
        ],
      })),
    }));

  it.each(['10:00', '12:00'])('what was measured in it (at %s) brings it back, whole', (time) => {
    const measured = measuring(time);
    const joined = both(deleted, measured);
    expect(shown(joined)).toEqual(shown(measured));
    expect(needsALook(joined).broughtBack).toContain('stations/A');
  });

  it('a later edit of a field in it brings it back; an earlier one is among the replaced values', () => {
    const renamed = (time: string) =>
      edited(start, 'phone', time, (survey) => ({
        ...survey,
        stations: survey.stations.map((station) => ({ ...station, name: 'Ridge' })),
      }));
    expect(shown(both(deleted, renamed('12:00'))).stations).toMatchObject([
      { name: 'Ridge', traces: [trace] },
    ]);
    const stays = both(deleted, renamed('10:00'));
    expect(shown(stays).stations).toEqual([]);
    expect(needsALook(stays).replaced).toMatchObject([{ path: 'stations/A/name', value: 'Ridge' }]);
  });

  it('deleted once more, having been seen, it is gone', () => {
    const joined = both(deleted, measuring('12:00'));
    const again = edited(joined, 'office', '13:00', (survey) => ({ ...survey, stations: [] }));
    expect(shown(both(again, joined)).stations).toEqual([]);
    expect(needsALook(both(again, joined)).broughtBack).toEqual([]);
  });

  it('after the last edit in it was cleared, it is still there', () => {
    const noted = edited(start, 'phone', '12:00', (survey) => ({
      ...survey,
      stations: survey.stations.map((station) => ({ ...station, notes: 'Wet' })),
    }));
    const joined = both(deleted, noted);
    const cleared = acted(joined, 'office', '13:00', [{ path: 'stations/A/notes', value: undefined }]);
    expect(shown(cleared).stations).toEqual(inventedSurvey().stations);
  });
});

const twoSightings = [
  { id: 's8', azimuth: 1, elevation: 2, reading: 'raw-1' },
  { id: 's9', azimuth: 9, elevation: 2 },
];

describe('something is deleted that another device came to refer to', () => {
  const deleted = edited(start, 'office', '11:00', (survey) => withoutPlane(survey, 'south'));
  const station = { id: 'B', name: 'New', serves: ['south'], traces: [] };
  const served = edited(start, 'phone', '10:00', (survey) => ({
    ...survey,
    stations: [...survey.stations, station],
  }));

  it('a plane that a new station serves is there again', () => {
    const joined = both(deleted, served);
    expect(shown(joined).planes).toEqual(inventedSurvey().planes);
    expect(needsALook(joined).broughtBack).toEqual(['planes/south']);
  });

  it('an obstruction traced anew is there again', () => {
    const traced = edited(start, 'phone', '10:00', (survey) => ({
      ...survey,
      stations: [
        {
          ...survey.stations[0],
          traces: [
            ...survey.stations[0].traces,
            { ...survey.stations[0].traces[0], id: 't2', sightings: twoSightings },
          ],
        },
      ],
    }));
    const felled = edited(start, 'office', '11:00', (survey) => withoutObstruction(survey, 'maple'));
    expect(shown(both(felled, traced)).obstructions).toEqual(inventedSurvey().obstructions);
  });

  it('a raw reading that a sighting uses stands', () => {
    const taken = edited(start, 'office', '11:00', (survey) => ({
      ...survey,
      readings: [],
      stations: survey.stations.map((one) => ({ ...one, traces: [] })),
    }));
    const used = edited(start, 'phone', '10:00', (survey) => ({
      ...survey,
      stations: [
        ...survey.stations,
        {
          ...station,
          traces: [
            {
              ...survey.stations[0].traces[0],
              sightings: twoSightings,
            },
          ],
        },
      ],
    }));
    expect(shown(both(taken, used)).readings).toEqual(inventedSurvey().readings);
  });
});

describe('a phone is a week without signal', () => {
  it('brings its readings, and the office’s later edits count', () => {
    let office = start;
    for (const hour of ['10', '11', '12', '13'])
      office = edited(office, 'office', `${hour}:00`, titled(`At ${hour}`));
    let phone = edited(start, 'phone', '10:30', titled('On the roof'));
    for (const id of ['raw-22', 'raw-333'])
      phone = edited(phone, 'phone', '10:40', (survey) => ({
        ...survey,
        readings: [...survey.readings, rawReading(id)],
      }));
    const joined = both(office, phone);
    expect(shown(joined).title).toBe('At 13');
    expect(
      shown(joined)
        .readings.map(({ id }) => id)
        .sort(),
    ).toEqual(['raw-1', 'raw-22', 'raw-333']);
    expect(needsALook(joined).replaced).toMatchObject([{ value: 'On the roof' }]);
  });
});

describe('a raw reading', () => {
  it('taken out and put back stands, whatever comes late', () => {
    const out = acted(start, 'phone', '10:00', [{ path: 'readings/raw-1', value: undefined }]);
    const back = acted(out, 'phone', '10:01', [
      { path: 'readings/raw-1', value: rawReading('raw-1') as never },
    ]);
    expect(both(back, out).get('reading readings/raw-1')).toEqual(back.get('reading readings/raw-1'));
    expect(shown(both(back, out)).readings).toHaveLength(1);
  });

  it('with other contents under its id is told, and both are kept', () => {
    const other = created(
      inventedSurvey('invented-1', { readings: [rawReading('raw-1', 99)] }),
      'tablet',
      '09:30',
    );
    const joined = both(start, other);
    expect(needsALook(joined).readingConflicts).toEqual(['readings/raw-1']);
    const row = joined.get('reading readings/raw-1');
    expect(row).toMatchObject({ reading: rawReading('raw-1'), others: [rawReading('raw-1', 99)] });
  });
});

describe('a survey', () => {
  const stampAt = (time: string) => nextStamp(null, Date.parse(`2026-05-14T${time}:00Z`), 'office');
  const deletion = (time: string, at: number | null) =>
    stateOf([{ kind: 'deletion', key: '', stamp: stampAt(time), at }]);

  it('deleted stays deleted, with all that is written in it, and says that it was edited since', () => {
    const gone = merge(start, deletion('11:00', 5));
    expect(needsALook(gone).isEditedSinceDeletion).toBe(false);
    const joined = both(gone, edited(start, 'phone', '12:00', titled('Still working')));
    expect(joined.get('deletion ')).toMatchObject({ at: 5 });
    expect(needsALook(joined).isEditedSinceDeletion).toBe(true);
    expect(shown(joined).title).toBe('Still working');
    expect(needsALook(both(joined, deletion('13:00', null))).isEditedSinceDeletion).toBe(false);
  });

  it('erased for good is nothing but its erasure, also for what comes later', () => {
    const erased = merge(start, stateOf([{ kind: 'erasure', key: '', stamp: stampAt('11:00') }]));
    const joined = both(erased, edited(start, 'phone', '12:00', titled('Too late')));
    expect([...joined.values()]).toEqual([{ kind: 'erasure', key: '', stamp: stampAt('11:00') }]);
  });
});
