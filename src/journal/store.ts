import type { JournalRecord } from "./records.ts";

/** One stored row that could not be read as a record, kept in its raw form. */
export interface SetAside {
  readonly key: string;
  readonly raw: unknown;
  readonly reason: string;
}

/** Result of the one load at the start. Nothing is written before it has ended well. */
export type Loaded =
  | {
      readonly kind: "ok";
      readonly records: readonly JournalRecord[];
      /** Rows that did not parse, now and at earlier starts. */
      readonly setAside: readonly SetAside[];
      /** Rows written by a newer version of the app, left untouched. */
      readonly newerCount: number;
    }
  | { readonly kind: "failed"; readonly reason: StoreFailure };

/** Why the phone would not read or write; each has a sentence in ui/text. */
export type StoreFailure =
  /** Another window holds an older form of the database open. */
  | "blocked"
  /** The database was made by a newer version of the app. */
  | "newer"
  /** The phone's storage is full. */
  | "quota"
  /** No answer from the database in time. */
  | "no-answer"
  /** The browser closed or lost the database, and opening it again did not help. */
  | "lost"
  /** No usable storage: switched off, private window, or anything not named above. */
  | "unavailable";

export type Appended =
  | { readonly kind: "stored" }
  | { readonly kind: "failed"; readonly reason: StoreFailure };

/** What the worker reads to know that a show is open; null lifts the lock. */
export interface ShowLock {
  readonly show: string;
  /** Time of the latest record of the show. [ms since 1970-01-01 UTC] */
  readonly at: number;
}

/** Where the journal lives. src/storage keeps it on IndexedDB. */
export interface JournalStore {
  load(): Promise<Loaded>;
  /**
   * Stores all or none, and the lock with them. "stored" is said only after the transaction has
   * completed with durability strict. The same record twice is stored once.
   */
  append(records: readonly JournalRecord[], lock: ShowLock | null): Promise<Appended>;
  /** Calls back with records that another window of the app has stored. */
  onForeign(hear: (records: readonly JournalRecord[]) => void): void;
  /** Calls back when the connection ends because a newer version of the app opens the database. */
  onReplaced(hear: () => void): void;
}
