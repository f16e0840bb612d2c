import type { ReportSettingsStore } from '../app/report-settings.ts';
import type { Connection } from './connection.ts';
import { writingTo } from './transaction.ts';

/** The report's settings, kept among what belongs to this device. */
export function reportSettingsDatabase(connection: Connection): ReportSettingsStore {
  return {
    load: async () => {
      const row = await connection.run((database) => database.get('device', 'report-settings'));
      return row?.name === 'report-settings' ? row.settings : null;
    },

    save: (settings) =>
      connection.run((database) =>
        writingTo(database, ['device'], async (transaction) => {
          await transaction.objectStore('device').put({ name: 'report-settings', settings });
        }),
      ),
  };
}
