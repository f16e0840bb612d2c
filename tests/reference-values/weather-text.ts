import { readFileSync } from 'node:fs';
import { gunzipSync } from 'node:zlib';

/** Text of a weather file kept gzipped beside the tables; its source stands in the notes of that folder. */
export const weatherText = (name: string): string =>
  gunzipSync(readFileSync(new URL(`weather/${name}.gz`, import.meta.url))).toString('latin1');
