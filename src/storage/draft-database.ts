import type { DraftStore } from '../app/draft-store.ts';
import type { Connection } from './connection.ts';
import { keysOf } from './survey-rows.ts';
import { writingTo } from './transaction.ts';

const STORES: 'drafts'[] = ['drafts'];

/** Half-typed forms in the database; one that is kept is durable. */
export function draftDatabase(connection: Connection): DraftStore {
  return {
    read: async (survey, form) =>
      (await connection.run((database) => database.get('drafts', [survey, form]))) ?? null,

    list: async (survey) => {
      const rows = await connection.run((database) => database.getAll('drafts', keysOf(survey)));
      return rows.map(({ form, label }) => ({ form, label }));
    },

    keep: (draft) =>
      connection.run((database) =>
        writingTo(database, STORES, async (transaction) => {
          await transaction.objectStore('drafts').put(draft);
        }),
      ),

    drop: (survey, form) =>
      connection.run((database) =>
        writingTo(database, STORES, (transaction) =>
          transaction.objectStore('drafts').delete([survey, form]),
        ),
      ),
  };
}
