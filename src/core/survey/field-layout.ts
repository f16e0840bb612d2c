import type { JsonValue } from './json-value.ts';

/** How a list of the record is laid out as fields. */
export interface ListLayout {
  /** The key that sorts the list's rows; where it does, no places need be written. */
  sortedBy: 'order' | 'startedAt' | 'takenAt';
  /** The whole row is one value: it is never changed, or only as a whole. */
  whole?: boolean;
  /** The record has the list even where it is empty. */
  required?: boolean;
  row: ObjectLayout;
}

/** Which parts of an object are laid out further; every other field is one value. */
export interface ObjectLayout {
  lists?: Readonly<Record<string, ListLayout>>;
  objects?: Readonly<Record<string, ObjectLayout>>;
  /** Fields that change together, as one value. */
  together?: readonly string[];
}

/**
 * Which values of a survey change by themselves. What is not named here changes as a whole: the climate, a corner, an
 * outline, a position, twelve months, the open azimuths, the planes a station serves, the amendments of a sighting.
 */
export const surveyLayout: ObjectLayout = {
  objects: { site: { together: ['latitude', 'longitude'] } },
  lists: {
    planes: {
      sortedBy: 'order',
      required: true,
      row: {
        lists: {
          tiltPlacings: { sortedBy: 'order', row: {} },
          azimuthSightings: { sortedBy: 'order', row: {} },
        },
      },
    },
    obstructions: { sortedBy: 'order', required: true, row: {} },
    runs: { sortedBy: 'startedAt', required: true, row: {} },
    readings: { sortedBy: 'takenAt', required: true, whole: true, row: {} },
    facts: { sortedBy: 'order', row: {} },
    photos: { sortedBy: 'order', row: {} },
    stations: {
      sortedBy: 'order',
      required: true,
      row: {
        lists: {
          openLooks: { sortedBy: 'order', row: {} },
          headingChecks: { sortedBy: 'order', row: {} },
          markSightings: { sortedBy: 'order', row: {} },
          indexChecks: { sortedBy: 'order', row: {} },
          traces: {
            sortedBy: 'order',
            required: true,
            row: { lists: { sightings: { sortedBy: 'order', required: true, row: {} } } },
          },
        },
      },
    },
  },
};

/** One field of a survey: a flat path and its value; undefined where the field is taken away. */
export interface FieldChange {
  path: string;
  value: JsonValue | undefined;
}

/** The name under which a row's place in its list is written. */
export const PLACE = '#';

const ESCAPES: Record<string, string> = { '~': '~0', '/': '~1', '+': '~2', '#': '~3' };
const ESCAPED: Record<string, string> = { '~0': '~', '~1': '/', '~2': '+', '~3': '#' };

/** A key or id as one step of a path, so that any text is safe: `~` `/` `+` `#` become `~0` `~1` `~2` `~3`. */
export const pathStep = (key: string): string => key.replace(/[~/+#]/g, (sign) => ESCAPES[sign]);

/** The key or id that a step of a path stands for. */
export const keyOfStep = (step: string): string => step.replace(/~[0-3]/g, (escape) => ESCAPED[escape]);

/** The step of fields that change together: their names joined by `+`. */
export const togetherStep = (keys: readonly string[]): string => keys.map(pathStep).join('+');
