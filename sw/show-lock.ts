import { DATABASE_NAME, LOCK, LOCK_KEY } from "../src/storage/names.ts";

/** A lock that was forgotten must not keep updates away for ever. [ms] */
const LOCK_LIMIT_MS = 18 * 3600 * 1000;
const READ_LIMIT_MS = 2000;

/**
 * Whether a show is open, as the journal has noted it in the database.
 *
 * @returns  Null if the database can't be read or does not answer in time.
 */
export function isShowOpen(): Promise<boolean | null> {
  return new Promise((resolve) => {
    setTimeout(resolve, READ_LIMIT_MS, null);
    const open = indexedDB.open(DATABASE_NAME);
    open.onerror = () => resolve(null);
    // Asked for without a version, a database that does not exist would be made, empty, and the
    // app could not set it up any more. Ending the transaction takes that back.
    open.onupgradeneeded = () => {
      resolve(false);
      open.transaction?.abort();
    };
    open.onsuccess = () => {
      const database = open.result;
      // An open connection would keep the page from upgrading the database.
      database.onversionchange = () => database.close();
      if (!database.objectStoreNames.contains(LOCK)) {
        resolve(false);
      } else {
        const read = database.transaction(LOCK).objectStore(LOCK).get(LOCK_KEY);
        read.onerror = () => resolve(null);
        read.onsuccess = () => resolve(isFresh(read.result));
      }
      database.close();
    };
  });
}

/** A time as far in the future comes from a clock that was wrong, and counts as little. */
function isFresh(lock: unknown): boolean {
  const { at } = Object(lock) as { readonly at?: unknown };
  return typeof at === "number" && Math.abs(Date.now() - at) < LOCK_LIMIT_MS;
}
