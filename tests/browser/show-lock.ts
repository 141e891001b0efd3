import type { Page } from "@playwright/test";
import { DATABASE_NAME, DATABASE_VERSION, LOCK, LOCK_KEY } from "../../src/storage/names.ts";

export const HOUR_MS = 3600 * 1000;

/** Writes the note of an open show as the journal does, `ageMs` old. */
export const lockShow = (page: Page, ageMs = 0): Promise<void> =>
  writeLock(page, { show: "show-1", at: Date.now() - ageMs });

/** The note as any value; undefined removes it. */
export async function writeLock(page: Page, lock: unknown): Promise<void> {
  const names = { DATABASE_NAME, DATABASE_VERSION, LOCK, LOCK_KEY };
  await page.evaluate(
    ({ names, lock }) =>
      new Promise<void>((resolve, reject) => {
        const open = indexedDB.open(names.DATABASE_NAME, names.DATABASE_VERSION);
        open.onupgradeneeded = () => open.result.createObjectStore(names.LOCK);
        open.onerror = () => reject(open.error);
        open.onsuccess = () => {
          const transaction = open.result.transaction(names.LOCK, "readwrite");
          const locks = transaction.objectStore(names.LOCK);
          if (lock === undefined) locks.delete(names.LOCK_KEY);
          else locks.put(lock, names.LOCK_KEY);
          transaction.oncomplete = () => {
            open.result.close();
            resolve();
          };
          transaction.onabort = () => reject(transaction.error);
        };
      }),
    { names, lock },
  );
}

export const unlockShow = (page: Page): Promise<void> => writeLock(page, undefined);

/** Makes the database, without the store of the lock. */
export async function makeStrangeDatabase(page: Page): Promise<void> {
  await page.evaluate(
    (name) =>
      new Promise<void>((resolve, reject) => {
        const open = indexedDB.open(name, 1);
        open.onupgradeneeded = () => open.result.createObjectStore("strange");
        open.onerror = () => reject(open.error);
        open.onsuccess = () => {
          open.result.close();
          resolve();
        };
      }),
    DATABASE_NAME,
  );
}

/** Keeps everybody else from opening the database for as long as the page lives. */
export async function occupyDatabase(page: Page): Promise<void> {
  await page.evaluate(
    (name) =>
      new Promise<void>((resolve, reject) => {
        const open = indexedDB.open(name, 2);
        open.onerror = () => reject(open.error);
        open.onupgradeneeded = () => {
          const store = open.result.createObjectStore("busy");
          // A transaction lives on while it is asked for something; an upgrade blocks all others.
          const ask = (): void => {
            store.count().onsuccess = ask;
          };
          ask();
          resolve();
        };
      }),
    DATABASE_NAME,
  );
}
