import { readRow } from "../journal/reading.ts";
import type { JournalRecord } from "../journal/records.ts";
import type { JournalStore, SetAside } from "../journal/store.ts";
import { createConnection } from "./connection.ts";
import { createKeptStore, type KeptStore } from "./kept-store.ts";
import { CHANNEL_NAME, LOCK, LOCK_KEY, RECORDS, SET_ASIDE } from "./names.ts";

/**
 * The journal on IndexedDB. One for each window; `onForeign` must be called before `load`, or a
 * record stored by another window in between is seen only at the next start.
 *
 * @param openTimeoutMs  How long the database may take to open. [ms], > 0
 */
export function createIdbStore({ openTimeoutMs = 4000 } = {}): JournalStore & {
  readonly kept: KeptStore;
} {
  let isLoaded = false;
  const replacedHearers: (() => void)[] = [];
  const channel = new BroadcastChannel(CHANNEL_NAME);
  const connection = createConnection({
    openTimeoutMs,
    mayCreate: () => !isLoaded,
    onReplaced: () => {
      for (const hear of replacedHearers) hear();
    },
  });

  /** Rows that cannot be moved (storage full) stay where they are and are found again next time. */
  const moveAside = (keys: readonly string[]) =>
    connection.transact([RECORDS, SET_ASIDE], async (transaction) => {
      const records = transaction.objectStore(RECORDS);
      for (const key of keys) {
        const raw = await records.get(key);
        const row = readRow(raw);
        // Another window may have been quicker.
        if (raw === undefined || row.kind !== "damaged") continue;
        await transaction
          .objectStore(SET_ASIDE)
          .add({ key: String(key), raw, reason: row.reason } satisfies SetAside);
        await records.delete(key);
      }
    });

  return {
    kept: createKeptStore(connection),

    async load() {
      isLoaded = false;
      const read = await connection.transact([RECORDS, SET_ASIDE], async (transaction) => {
        const records = transaction.objectStore(RECORDS);
        const [keys, rows, kept] = await Promise.all([
          records.getAllKeys(),
          records.getAll(),
          transaction.objectStore(SET_ASIDE).getAll(),
        ]);
        return { keys, rows, kept };
      });
      if (read.kind === "failed") return read;
      const records: JournalRecord[] = [];
      const setAside = read.value.kept.map(readSetAside);
      const damagedKeys: string[] = [];
      let newerCount = 0;
      for (const [index, key] of read.value.keys.entries()) {
        const raw = read.value.rows[index];
        const row = readRow(raw);
        if (row.kind === "record") records.push(row.record);
        else if (row.kind === "newer") newerCount += 1;
        else {
          damagedKeys.push(key);
          setAside.push({ key: String(key), raw, reason: row.reason });
        }
      }
      if (damagedKeys.length > 0) await moveAside(damagedKeys);
      isLoaded = true;
      return { kind: "ok", records, setAside, newerCount };
    },

    async append(records, lock) {
      if (!isLoaded) throw new RangeError("append: load must have ended well before it");
      const done = await connection.transact([RECORDS, LOCK], async (transaction) => {
        const stored = transaction.objectStore(RECORDS);
        // What is stored is never written over: a second copy of it is passed by.
        for (const record of records)
          if ((await stored.getKey(record.id)) === undefined) await stored.add(record, record.id);
        const locks = transaction.objectStore(LOCK);
        await (lock === null ? locks.delete(LOCK_KEY) : locks.put(lock, LOCK_KEY));
      });
      if (done.kind === "failed") return done;
      channel.postMessage(records);
      return { kind: "stored" };
    },

    onForeign(hear) {
      channel.addEventListener("message", ({ data }: MessageEvent<unknown>) => {
        const rows = Array.isArray(data) ? data.map(readRow) : [];
        const records = rows.flatMap((row) => (row.kind === "record" ? [row.record] : []));
        if (records.length > 0) hear(records);
      });
    },

    onReplaced(hear) {
      replacedHearers.push(hear);
    },
  };
}

function readSetAside(stored: unknown): SetAside {
  const { key, raw, reason } = Object(stored) as Partial<SetAside>;
  return { key: String(key), raw, reason: String(reason) };
}
