import { forceCloseDatabase } from "fake-indexeddb";
import { openDB } from "idb";
import { describe, expect, it, vi } from "vitest";
import { nextClock } from "../../src/journal/clock.ts";
import type { JournalRecord } from "../../src/journal/records.ts";
import type { JournalStore } from "../../src/journal/store.ts";
import { createIdbStore } from "../../src/storage/idb-store.ts";
import { DATABASE_NAME, LOCK, LOCK_KEY } from "../../src/storage/names.ts";
import { beside, freshPhone, opened, storedIds } from "./database.ts";

freshPhone();

const START_MS = Date.UTC(2026, 11, 1, 10, 30);
function note(id: string): JournalRecord {
  const clock = nextClock(null, START_MS, "phone-a");
  const envelope = { id, v: 1, show: "s1", at: START_MS, device: "phone-a", clock };
  return { ...envelope, type: "note.added", body: { text: "t" } };
}
async function loadedStore(): Promise<JournalStore> {
  const store = createIdbStore();
  expect((await store.load()).kind).toBe("ok");
  return store;
}
const failed = (reason: string) => ({ kind: "failed", reason });
const stored = { kind: "stored" };

/** A closed connection refuses any transaction as an invalid state, an open one this as not found. */
function isClosed(database: IDBDatabase | undefined): boolean {
  try {
    database?.transaction("no such store");
  } catch (error) {
    return (error as DOMException).name === "InvalidStateError";
  }
  return false;
}

/** Parts of the simulated transaction that the browser's types do not show. */
interface SimulatedTransaction {
  _abort(errorName: string): void;
  _execRequestAsync(job: { source: unknown; operation: () => unknown }): IDBRequest;
}
const { add, put } = IDBObjectStore.prototype;
const simulated = (store: IDBObjectStore) => store.transaction as unknown as SimulatedTransaction;

describe("storage that is full", () => {
  // The ways in which browsers say so: an abort while requests wait, a request that fails, and an
  // abort at the commit when all requests have succeeded already.
  it.each([
    {
      how: "the transaction is aborted",
      fill: () =>
        vi.spyOn(IDBObjectStore.prototype, "add").mockImplementation(function (
          this: IDBObjectStore,
          ...args
        ) {
          const request = add.apply(this, args);
          if (args[1] === "n2") simulated(this)._abort("QuotaExceededError");
          return request;
        }),
    },
    {
      how: "a request fails",
      fill: () =>
        vi.spyOn(IDBObjectStore.prototype, "add").mockImplementation(function (
          this: IDBObjectStore,
          ...args
        ) {
          if (args[1] !== "n2") return add.apply(this, args);
          return simulated(this)._execRequestAsync({
            source: this,
            operation: () => {
              throw new DOMException("full", "QuotaExceededError");
            },
          });
        }),
    },
    {
      how: "the commit fails",
      fill: () =>
        vi.spyOn(IDBObjectStore.prototype, "put").mockImplementation(function (
          this: IDBObjectStore,
          ...args
        ) {
          const request = put.apply(this, args);
          request.addEventListener("success", () => simulated(this)._abort("QuotaExceededError"));
          return request;
        }),
    },
  ])("is told as quota when $how, and nothing of the append is stored", async ({ fill }) => {
    const store = await loadedStore();
    await store.append([note("n0")], { show: "s1", at: 1 });
    const full = fill();
    expect(await store.append([note("n1"), note("n2")], { show: "s1", at: 2 })).toEqual(
      failed("quota"),
    );
    expect(full).toHaveBeenCalled();
    full.mockRestore();
    expect(await storedIds()).toEqual(["n0"]);
    expect(await beside((database) => database.get(LOCK, LOCK_KEY))).toEqual({ show: "s1", at: 1 });
    expect(await store.append([note("n1"), note("n2")], { show: "s1", at: 2 })).toEqual(stored);
    expect(await storedIds()).toEqual(["n0", "n1", "n2"]);
  });
});

describe("a record that cannot be cloned", () => {
  it("takes the records beside it along: all or none", async () => {
    const store = await loadedStore();
    const broken = { ...note("n2"), body: { text: () => "t" } } as unknown as JournalRecord;
    expect(await store.append([note("n1"), broken], null)).toEqual(failed("unavailable"));
    expect(await storedIds()).toEqual([]);
    expect(await store.append([note("n1")], null)).toEqual(stored);
  });
});

describe("a connection that is lost", () => {
  it.each([
    {
      how: "the browser closes it and says so",
      lose: (database: IDBDatabase) => forceCloseDatabase(database as never),
    },
    { how: "it is closing and nobody was told", lose: (database: IDBDatabase) => database.close() },
  ])("is opened again when $how, and the record is stored", async ({ lose }) => {
    const store = await loadedStore();
    const [first] = opened;
    lose(first as IDBDatabase);
    expect(await store.append([note("n1")], null)).toEqual(stored);
    expect(opened).toHaveLength(2);
    expect(await storedIds()).toEqual(["n1"]);
  });

  it("is opened again without a failed attempt when the browser has said so", async () => {
    const store = await loadedStore();
    forceCloseDatabase(opened[0] as never);
    const transaction = vi.spyOn(IDBDatabase.prototype, "transaction");
    expect(await store.append([note("n1")], null)).toEqual(stored);
    expect(transaction).toHaveBeenCalledTimes(1);
  });

  it.each(["UnknownError", "AbortError", "InvalidStateError"])(
    "is opened again after one %s",
    async (name) => {
      const store = await loadedStore();
      vi.spyOn(IDBDatabase.prototype, "transaction").mockImplementationOnce(() => {
        throw new DOMException("connection to the database server lost", name);
      });
      expect(await store.append([note("n1")], null)).toEqual(stored);
      expect(isClosed(opened[0])).toBe(true);
      expect(isClosed(opened[1])).toBe(false);
      expect(await storedIds()).toEqual(["n1"]);
    },
  );

  it("stores all of several appends that were on their way", async () => {
    const store = await loadedStore();
    opened[0]?.close();
    const ids = ["n1", "n2", "n3"];
    const outcomes = await Promise.all(ids.map((id) => store.append([note(id)], null)));
    expect(outcomes).toEqual([stored, stored, stored]);
    // One new connection for all of them.
    expect(opened).toHaveLength(2);
    expect(await storedIds()).toEqual(ids);
  });

  it("is opened once for two appends that fail one after the other", async () => {
    const store = await loadedStore();
    const { transaction } = IDBDatabase.prototype;
    vi.spyOn(IDBDatabase.prototype, "transaction")
      .mockImplementationOnce(function (this: IDBDatabase, ...args) {
        return transaction.apply(this, args);
      })
      .mockImplementationOnce(() => {
        throw new DOMException("connection to the database server lost", "UnknownError");
      });
    vi.spyOn(IDBObjectStore.prototype, "add").mockImplementationOnce(function (
      this: IDBObjectStore,
      ...args
    ) {
      const request = add.apply(this, args);
      simulated(this)._abort("UnknownError");
      return request;
    });
    const outcomes = [store.append([note("n1")], null), store.append([note("n2")], null)];
    expect(await Promise.all(outcomes)).toEqual([stored, stored]);
    expect(opened).toHaveLength(2);
    expect(await storedIds()).toEqual(["n1", "n2"]);
  });

  it("is given up as lost after the second time, and tried afresh by the next append", async () => {
    const store = await loadedStore();
    const broken = vi.spyOn(IDBDatabase.prototype, "transaction").mockImplementation(() => {
      throw new DOMException("connection to the database server lost", "UnknownError");
    });
    expect(await store.append([note("n1")], null)).toEqual(failed("lost"));
    expect(broken).toHaveBeenCalledTimes(2);
    broken.mockRestore();
    expect(await store.append([note("n1")], null)).toEqual(stored);
  });

  it("is not replaced by an empty database when the browser has cleared the old one", async () => {
    const store = await loadedStore();
    const replaced = vi.fn();
    store.onReplaced(replaced);
    await store.append([note("n1")], null);
    await new Promise((resolve) => {
      indexedDB.deleteDatabase(DATABASE_NAME).onsuccess = resolve;
    });
    expect(await store.append([note("n2")], null)).toEqual(failed("lost"));
    expect(replaced).not.toHaveBeenCalled();
    expect(await indexedDB.databases()).toEqual([]);
    expect(await store.load()).toMatchObject({ kind: "ok", records: [] });
    expect(await store.append([note("n2")], null)).toEqual(stored);
  });
});

describe("a database that does not open", () => {
  const openAs = (version: number) =>
    vi
      .spyOn(indexedDB, "open")
      .mockImplementation((name) => IDBFactory.prototype.open.call(indexedDB, name, version));

  it("is told as blocked while another window holds an older form of it open", async () => {
    const old = await openDB(DATABASE_NAME, 1);
    const store = createIdbStore();
    const opening = openAs(2);
    expect(await store.load()).toEqual(failed("blocked"));
    await expect(store.append([note("n1")], null)).rejects.toThrow(RangeError);
    // Once the other window lets go, the late opening succeeds: nobody waits for it, so it must not
    // hold the database in its turn.
    const late = opening.mock.results.at(-1)?.value as IDBOpenDBRequest;
    const settled = new Promise((resolve) => late.addEventListener("success", resolve));
    old.close();
    await settled;
    await vi.waitFor(() => expect(isClosed(late.result)).toBe(true));
  });

  it("is told as no answer when the opening never settles", async () => {
    vi.spyOn(indexedDB, "open").mockImplementation(() => new IDBOpenDBRequest());
    expect(await createIdbStore({ openTimeoutMs: 20 }).load()).toEqual(failed("no-answer"));
  });

  it("opens when asked again after no answer", async () => {
    const store = createIdbStore({ openTimeoutMs: 200 });
    vi.spyOn(indexedDB, "open").mockImplementationOnce(() => new IDBOpenDBRequest());
    expect(await store.load()).toEqual(failed("no-answer"));
    expect((await store.load()).kind).toBe("ok");
  });

  it("is told as newer when a newer version of the app has made it, and left as it is", async () => {
    (await openDB(DATABASE_NAME, 7)).close();
    expect(await createIdbStore().load()).toEqual(failed("newer"));
    expect(await indexedDB.databases()).toEqual([{ name: DATABASE_NAME, version: 7 }]);
  });

  it("is told as unavailable where there is none", async () => {
    vi.stubGlobal("indexedDB", undefined);
    expect(await createIdbStore().load()).toEqual(failed("unavailable"));
  });

  it("is told as unavailable where the browser forbids it", async () => {
    vi.spyOn(indexedDB, "open").mockImplementation(() => {
      throw new DOMException("storage is switched off", "SecurityError");
    });
    expect(await createIdbStore().load()).toEqual(failed("unavailable"));
  });
});

describe("a newer version of the app", () => {
  it("is let in at once; the old window is told, and can write no more", async () => {
    const store = await loadedStore();
    await store.append([note("n1")], null);
    const replaced = vi.fn();
    store.onReplaced(replaced);
    const blocked = vi.fn();
    const newer = await openDB(DATABASE_NAME, 2, { blocked });
    expect(blocked).not.toHaveBeenCalled();
    expect(replaced).toHaveBeenCalledTimes(1);
    const transaction = vi.spyOn(IDBDatabase.prototype, "transaction");
    expect(await store.append([note("n2")], null)).toEqual(failed("newer"));
    expect(transaction).not.toHaveBeenCalled();
    newer.close();
    expect(await storedIds()).toEqual(["n1"]);
  });
});
