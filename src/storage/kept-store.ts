import type { Connection } from "./connection.ts";
import { KEPT } from "./names.ts";

/** Short texts (the place on the screen, drafts, settings) beside the journal. */
export interface KeptStore {
  /** Null if the database can't be read. */
  readAll(): Promise<ReadonlyMap<string, string> | null>;
  /** Keeps the latest text of a key; null removes it. Texts that come faster than the phone writes are passed by. */
  write(key: string, text: string | null): void;
}

/**
 * Kept texts in the journal's database. localStorage alone would not do: a browser writes it to the
 * phone only some seconds later, and a killed app has no such seconds.
 */
export function createKeptStore(connection: Connection): KeptStore {
  const waiting = new Map<string, string | null>();
  let isWriting = false;

  const writeWaiting = async (): Promise<void> => {
    isWriting = true;
    while (waiting.size > 0) {
      const texts = [...waiting];
      waiting.clear();
      // A text that is refused here is in localStorage still; the journal tells the user of a
      // database that does not work.
      await connection.transact([KEPT], async (transaction) => {
        const store = transaction.objectStore(KEPT);
        for (const [key, text] of texts)
          await (text === null ? store.delete(key) : store.put(text, key));
      });
    }
    isWriting = false;
  };

  return {
    async readAll() {
      const read = await connection.transact([KEPT], async (transaction) => {
        const store = transaction.objectStore(KEPT);
        const [keys, texts] = await Promise.all([store.getAllKeys(), store.getAll()]);
        return new Map(keys.map((key, index) => [key, String(texts[index])]));
      });
      return read.kind === "failed" ? null : read.value;
    },
    write(key, text) {
      waiting.set(key, text);
      if (!isWriting) void writeWaiting();
    },
  };
}
