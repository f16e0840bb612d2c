import type { WeatherFileSummary, WeatherStore } from '../app/weather-store.ts';
import type { Connection } from './connection.ts';

async function sha256Of(contents: ArrayBuffer): Promise<string> {
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', contents));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, '0')).join('');
}

const STRICT = { durability: 'strict' } as const;

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
      await connection.run(async (database) => {
        const transaction = database.transaction(['weather-files', 'weather-bytes'], 'readwrite', STRICT);
        await Promise.all([
          transaction.objectStore('weather-files').put(summary),
          transaction.objectStore('weather-bytes').put({ sha256, contents }),
          transaction.done,
        ]);
      });
      return summary;
    },

    forget: (sha256) =>
      connection.run(async (database) => {
        const transaction = database.transaction(['weather-files', 'weather-bytes'], 'readwrite', STRICT);
        await Promise.all([
          transaction.objectStore('weather-files').delete(sha256),
          transaction.objectStore('weather-bytes').delete(sha256),
          transaction.done,
        ]);
      }),
  };
}
