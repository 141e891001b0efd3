import "fake-indexeddb/auto";
import { IDBFactory } from "fake-indexeddb";
import { beforeEach, describe, expect, it } from "vitest";
import { createIdbStore } from "../../src/storage/idb-store.ts";

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory();
});

/** The texts as a later start of the app finds them, once all writes are through. */
async function atNextStart(): Promise<ReadonlyMap<string, string> | null> {
  return createIdbStore().kept.readAll();
}

describe("kept texts", () => {
  it("are there at the next start, the latest of each key", async () => {
    const store = createIdbStore().kept;
    await store.readAll();
    for (const text of ["a", "ab", "abc"]) store.write("note", text);
    store.write("place", "#/rig");
    // The reading waits in line behind the writing of the same database.
    await expect.poll(atNextStart).toEqual(
      new Map([
        ["note", "abc"],
        ["place", "#/rig"],
      ]),
    );
  });

  it("are gone when they have been removed", async () => {
    const store = createIdbStore().kept;
    store.write("note", "a");
    await expect.poll(async () => (await atNextStart())?.size).toBe(1);
    store.write("note", null);
    await expect.poll(async () => (await atNextStart())?.size).toBe(0);
  });

  it("live beside the journal in one database, whichever of the two makes it", async () => {
    const store = createIdbStore();
    const [texts, journal] = await Promise.all([store.kept.readAll(), store.load()]);
    expect(texts?.size).toBe(0);
    expect(journal).toMatchObject({ kind: "ok", records: [] });
  });

  it("answer null where there is no database", async () => {
    Object.defineProperty(globalThis, "indexedDB", { value: undefined, configurable: true });
    expect(await createIdbStore().kept.readAll()).toBeNull();
    Object.defineProperty(globalThis, "indexedDB", {
      value: new IDBFactory(),
      configurable: true,
      writable: true,
    });
  });
});
