import { toJsonSchema } from '@valibot/to-json-schema';
import { surveySchema } from '../../../src/core/survey/survey-schema.ts';

/** Where the JSON Schema is published with the app. */
export const PUBLISHED = new URL('../../../public/noonmark-survey-1.schema.json', import.meta.url);

/**
 * The record's shape as JSON Schema, draft 7. What holds between fields (ids, references, geometry, calendar days, time
 * zones) is not in it; the parser checks that.
 */
export function surveyJsonSchema(): Record<string, unknown> {
  const { $schema, ...schema } = toJsonSchema(surveySchema, { errorMode: 'ignore' });
  return {
    $schema,
    title: 'Noonmark survey, version 1',
    description:
      'One visit to one site: roof planes, stations, and the sightings of what stands between them and the sun. Degrees, metres, UTC instants; azimuths clockwise from true north. Fields not named here are allowed and kept.',
    ...schema,
  };
}
