import type { Page } from 'playwright-core';

/** Raw readings in the database, past the app. */
export const readingsStored = (page: Page): Promise<number> =>
  page.evaluate(
    () =>
      new Promise<number>((resolve, reject) => {
        const opening = indexedDB.open('noonmark');
        opening.onerror = () => reject(new Error('not opened'));
        opening.onsuccess = () => {
          const asked = opening.result.transaction('readings').objectStore('readings').count();
          asked.onsuccess = () => {
            opening.result.close();
            resolve(asked.result);
          };
        };
      }),
  );
