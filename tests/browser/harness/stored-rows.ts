/// <reference lib="dom" />
import type { Page } from 'playwright-core';

/** Puts a row into the phone's store behind the page's back, as a torn write or another program would. */
export const putRow = (page: Page, row: unknown): Promise<void> =>
  page.evaluate(
    (written) =>
      new Promise<void>((resolve, reject) => {
        const opening = indexedDB.open('chargewright-loose');
        opening.onerror = () => reject(new Error('the store did not open'));
        opening.onsuccess = () => {
          const database = opening.result;
          const writing = database.transaction('rows', 'readwrite');
          writing.objectStore('rows').put(written);
          writing.oncomplete = () => {
            database.close();
            resolve();
          };
          writing.onerror = () => reject(new Error('the row was not written'));
        };
      }),
    row,
  );

export const rowsOf = (page: Page, store: 'rows' | 'quarantine'): Promise<readonly { readonly kind?: string }[]> =>
  page.evaluate(
    (name) =>
      new Promise<{ kind?: string }[]>((resolve, reject) => {
        const opening = indexedDB.open('chargewright-loose');
        opening.onerror = () => reject(new Error('the store did not open'));
        opening.onsuccess = () => {
          const database = opening.result;
          const reading = database.transaction(name).objectStore(name).getAll();
          reading.onsuccess = () => {
            database.close();
            resolve(reading.result as { kind?: string }[]);
          };
        };
      }),
    store,
  );
