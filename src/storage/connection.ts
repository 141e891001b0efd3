import { type DBSchema, type IDBPDatabase, type IDBPTransaction, openDB } from "idb";
import type { ShowLock, StoreFailure } from "../journal/store.ts";
import { givenUp, reasonOf } from "./failure.ts";
import { DATABASE_NAME, DATABASE_VERSION, KEPT, LOCK, RECORDS, SET_ASIDE } from "./names.ts";

interface JournalDatabase extends DBSchema {
  [RECORDS]: { key: string; value: unknown };
  [SET_ASIDE]: { key: number; value: unknown };
  [LOCK]: { key: string; value: ShowLock };
  [KEPT]: { key: string; value: string };
}
type Store = typeof RECORDS | typeof SET_ASIDE | typeof LOCK | typeof KEPT;
type Transaction<S extends Store> = IDBPTransaction<JournalDatabase, S[], "readwrite">;

export interface ConnectionOptions {
  /** How long to wait for the database to open. [ms], > 0 */
  readonly openTimeoutMs: number;
  /** Whether a database that does not exist may be made: not once records have been read from it. */
  readonly mayCreate: () => boolean;
  /** A newer version of the app wants the database. */
  readonly onReplaced: () => void;
}

export interface Connection {
  /**
   * Runs `work` in one readwrite transaction of durability strict, and ends well only after the
   * transaction is complete. `work` may wait for nothing but its own requests. A lost connection is
   * opened again once, so `work` may run twice.
   */
  transact<S extends Store, T>(
    stores: S[],
    work: (transaction: Transaction<S>) => Promise<T>,
  ): Promise<Done<T>>;
}
type Done<T> =
  | { readonly kind: "ok"; readonly value: T }
  | { readonly kind: "failed"; readonly reason: StoreFailure };

type Database = IDBPDatabase<JournalDatabase>;

export function createConnection(options: ConnectionOptions): Connection {
  let current: Promise<Database> | null = null;

  const open = (): Promise<Database> => {
    const opening = new Promise<Database>((resolve, reject) => {
      let isGivenUp = false;
      const giveUp = (reason: "blocked" | "no-answer"): void => {
        isGivenUp = true;
        reject(givenUp(reason));
      };
      const timer = setTimeout(giveUp, options.openTimeoutMs, "no-answer");
      const forget = (): void => {
        if (current === opening) current = null;
      };
      openDB<JournalDatabase>(DATABASE_NAME, DATABASE_VERSION, {
        upgrade(database, oldVersion, _newVersion, transaction) {
          // An upgrade that is aborted rejects here too, beside the opening itself.
          transaction.done.catch(reject);
          if (!options.mayCreate()) return transaction.abort();
          // Names as they were in that version, whatever they are called later.
          if (oldVersion < 1) {
            database.createObjectStore("records");
            database.createObjectStore("set-aside", { autoIncrement: true });
            database.createObjectStore("lock");
            database.createObjectStore("kept");
          }
        },
        blocked: () => giveUp("blocked"),
        // Closed at once, or the newer window could not start. A null version means a deletion.
        blocking(_oldVersion, newVersion, event) {
          (event.target as IDBDatabase).close();
          forget();
          if (newVersion !== null) options.onReplaced();
        },
        terminated: forget,
      })
        .then((database) => (isGivenUp ? database.close() : resolve(database)), reject)
        .finally(() => clearTimeout(timer));
    });
    return opening;
  };

  const attempt = async <S extends Store, T>(
    stores: S[],
    work: (transaction: Transaction<S>) => Promise<T>,
  ): Promise<T> => {
    current ??= open();
    const opening = current;
    let database: Database | undefined;
    try {
      database = await opening;
      return await transactOn(database, stores, work);
    } catch (error) {
      database?.close();
      if (current === opening) current = null;
      throw error;
    }
  };

  return {
    async transact(stores, work) {
      const retried = attempt(stores, work).catch((error) => {
        if (reasonOf(error) !== "lost") throw error;
        return attempt(stores, work);
      });
      return retried.then(
        (value) => ({ kind: "ok", value }),
        (error) => ({ kind: "failed", reason: reasonOf(error) }),
      );
    },
  };
}

async function transactOn<S extends Store, T>(
  database: Database,
  stores: S[],
  work: (transaction: Transaction<S>) => Promise<T>,
): Promise<T> {
  const transaction = database.transaction(stores, "readwrite", { durability: "strict" });
  const working = work(transaction);
  // All or none, also where `work` itself has failed. Rejects if the transaction has ended already.
  const aborting = working.catch(() => transaction.abort());
  const [worked, , done] = await Promise.allSettled([working, aborting, transaction.done]);
  if (worked.status === "fulfilled" && done.status === "fulfilled") return worked.value;
  const errors = [done, worked].flatMap((end) => (end.status === "rejected" ? [end.reason] : []));
  // Storage that is full shows itself in either place; else the failed request says more than the
  // abort that follows it.
  throw errors.find((error) => reasonOf(error) === "quota") ?? errors.at(-1);
}
