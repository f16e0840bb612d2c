// Writes public/noonmark-survey-1.schema.json from the record's schema. Run it after a change of the record:
//   npx tsx tests/core/survey/publish-schema.ts
import { writeFileSync } from 'node:fs';
import { format } from 'prettier';
import { PUBLISHED, surveyJsonSchema } from './survey-json-schema.ts';

writeFileSync(
  PUBLISHED,
  await format(JSON.stringify(surveyJsonSchema()), { parser: 'json', printWidth: 110 }),
);
