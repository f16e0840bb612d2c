import type { PhotoStore } from '../app/photo-store.ts';
import type { Connection } from './connection.ts';
import type { Database } from './open-database.ts';
import { sha256Of } from './sha256-of.ts';
import { writingTo } from './transaction.ts';

const PHOTO_HASH = /^photos\/[^/]+\/sha256$/;

/** Hashes that some survey on this device shows, deleted surveys too. */
async function usedHashes(database: Database): Promise<Set<string>> {
  const used = new Set<string>();
  for (let cursor = await database.transaction('fields').store.openCursor(); cursor;) {
    const { path, value } = cursor.value;
    if (typeof value === 'string' && PHOTO_HASH.test(path)) used.add(value);
    cursor = await cursor.continue();
  }
  return used;
}

/** A picture is kept before the survey shows it; for so long it is not taken for unused. */
const GRACE_MS = 60_000;

/** Hash and size of what is unused. Read one by one: all at once would fill the memory of a phone. */
async function unusedPictures(
  database: Database,
  nowMs: number,
): Promise<{ sha256: string; bytes: number }[]> {
  const [used, kept] = await Promise.all([usedHashes(database), database.getAllKeys('photos')]);
  const unused: { sha256: string; bytes: number }[] = [];
  for (const sha256 of kept.filter((hash) => !used.has(hash))) {
    const row = await database.get('photos', sha256);
    if (row && row.keptAt + GRACE_MS <= nowMs) unused.push({ sha256, bytes: row.contents.byteLength });
  }
  return unused;
}

/** Pictures in the database, in a store of their own that is only read by its key. */
export function photoDatabase(connection: Connection, now: () => number): PhotoStore {
  return {
    keep: async ({ type, contents }) => {
      const sha256 = await sha256Of(contents);
      await connection.run((database) =>
        writingTo(database, ['photos'], async (transaction) => {
          const store = transaction.objectStore('photos');
          const isThere = (await store.getKey(sha256)) !== undefined;
          if (!isThere) await store.put({ sha256, type, contents, keptAt: now() });
        }),
      );
      return sha256;
    },

    picture: (sha256) =>
      connection.run(async (database) => {
        const row = await database.get('photos', sha256);
        return row ? { sha256, type: row.type, contents: row.contents } : null;
      }),

    unused: () =>
      connection.run(async (database) => {
        const pictures = await unusedPictures(database, now());
        return { count: pictures.length, bytes: pictures.reduce((sum, { bytes }) => sum + bytes, 0) };
      }),

    eraseUnused: () =>
      connection.run(async (database) => {
        const pictures = await unusedPictures(database, now());
        await writingTo(database, ['photos'], async (transaction) => {
          const store = transaction.objectStore('photos');
          await Promise.all(pictures.map(({ sha256 }) => store.delete(sha256)));
        });
      }),
  };
}
