import type { WeatherFileSummary, WeatherStore } from '../app/weather-store.ts';
import type { Connection } from './connection.ts';
import type { Database } from './open-database.ts';
import { sha256Of } from './sha256-of.ts';
import { writingTo } from './transaction.ts';

const STORES: ('weather-files' | 'weather-bytes')[] = ['weather-files', 'weather-bytes'];

/** Weather files in the database, under the hash of their contents. */
export function weatherDatabase(connection: Connection, now: () => number): WeatherStore {
  return {
    list: () => connection.run((database) => database.getAll('weather-files')),

    bytes: async (sha256) => {
      const row = await connection.run((database) => database.get('weather-bytes', sha256));
      return row?.contents ?? null;
    },

    keep: async (name, contents) => {
      const sha256 = await sha256Of(contents);
      const summary: WeatherFileSummary = { sha256, name, bytes: contents.byteLength, keptAt: now() };
      const keep = (database: Database) =>
        writingTo(database, STORES, async (transaction) => {
          await transaction.objectStore('weather-bytes').put({ sha256, contents });
          await transaction.objectStore('weather-files').put(summary);
        });
      await connection.run(keep);
      return summary;
    },

    forget: (sha256) =>
      connection.run((database) =>
        writingTo(database, STORES, async (transaction) => {
          await transaction.objectStore('weather-bytes').delete(sha256);
          await transaction.objectStore('weather-files').delete(sha256);
        }),
      ),
  };
}
