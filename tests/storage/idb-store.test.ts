import { describe, expect, it, vi } from "vitest";
import { nextClock } from "../../src/journal/clock.ts";
import type { JournalRecord } from "../../src/journal/records.ts";
import type { JournalStore, Loaded } from "../../src/journal/store.ts";
import { createIdbStore } from "../../src/storage/idb-store.ts";
import { CHANNEL_NAME, LOCK, LOCK_KEY, RECORDS, SET_ASIDE } from "../../src/storage/names.ts";
import { beside, freshPhone, storedIds } from "./database.ts";

freshPhone();

const START_MS = Date.UTC(2026, 11, 1, 10, 30);
function note(id: string, text = "t"): JournalRecord<"note.added"> {
  const clock = nextClock(null, START_MS, "phone-a");
  const envelope = { id, v: 1, show: "s1", at: START_MS, device: "phone-a", clock };
  return { ...envelope, type: "note.added", body: { text } };
}
async function loadedStore(): Promise<JournalStore> {
  const store = createIdbStore();
  expect((await store.load()).kind).toBe("ok");
  return store;
}
async function load(store = createIdbStore()): Promise<Extract<Loaded, { kind: "ok" }>> {
  const loaded = await store.load();
  if (loaded.kind !== "ok") throw new Error(`load failed: ${loaded.reason}`);
  return loaded;
}

describe("a store on an empty phone", () => {
  it("loads nothing, and then keeps what is appended, exactly", async () => {
    const store = createIdbStore();
    expect(await store.load()).toEqual({ kind: "ok", records: [], setAside: [], newerCount: 0 });
    expect(await store.append([note("n1"), note("n2")], null)).toEqual({ kind: "stored" });
    expect((await load()).records).toEqual([note("n1"), note("n2")]);
  });

  it("refuses an append before load has ended well, and stores nothing of it", async () => {
    const store = createIdbStore();
    await expect(store.append([note("n1")], null)).rejects.toThrow(RangeError);
    const loading = store.load();
    await expect(store.append([note("n1")], null)).rejects.toThrow(RangeError);
    await loading;
    expect(await storedIds()).toEqual([]);
  });

  it("writes with durability strict", async () => {
    const store = await loadedStore();
    const transaction = vi.spyOn(IDBDatabase.prototype, "transaction");
    await store.append([note("n1")], null);
    expect(transaction.mock.calls).toEqual([
      [[RECORDS, LOCK], "readwrite", { durability: "strict" }],
    ]);
  });
});

describe("append", () => {
  it("stores a record once that is appended twice, in one go and in two", async () => {
    const store = await loadedStore();
    expect(await store.append([note("n1"), note("n1")], null)).toEqual({ kind: "stored" });
    expect(await store.append([note("n1"), note("n2")], null)).toEqual({ kind: "stored" });
    expect(await storedIds()).toEqual(["n1", "n2"]);
  });

  it("never writes over a record that is stored", async () => {
    const store = await loadedStore();
    await store.append([note("n1", "first")], null);
    expect(await store.append([note("n1", "forged")], null)).toEqual({ kind: "stored" });
    expect((await load()).records).toEqual([note("n1", "first")]);
  });

  it("stores many appends that are made at once", async () => {
    const store = await loadedStore();
    const ids = Array.from({ length: 30 }, (_, index) => `n${String(index).padStart(2, "0")}`);
    const outcomes = await Promise.all(ids.map((id) => store.append([note(id)], null)));
    expect(outcomes.every(({ kind }) => kind === "stored")).toBe(true);
    expect(await storedIds()).toEqual(ids);
  });

  it("stores the lock with the records, replaces it, and lifts it when told null", async () => {
    const store = await loadedStore();
    const lock = () => beside((database) => database.get(LOCK, LOCK_KEY));
    await store.append([note("n1")], { show: "s1", at: 1 });
    expect(await lock()).toEqual({ show: "s1", at: 1 });
    await store.append([note("n2")], { show: "s1", at: 2 });
    expect(await lock()).toEqual({ show: "s1", at: 2 });
    await store.append([note("n3")], null);
    expect(await lock()).toBeUndefined();
  });
});

describe("load", () => {
  const { body: _body, ...bodyless } = note("d1");
  const DAMAGED = [
    { what: "null", raw: null, reason: "not a record" },
    { what: "a string", raw: '{"id":"d1"}', reason: "not a record" },
    { what: "a list", raw: [note("d1")], reason: "not a record" },
    { what: "bytes", raw: new Uint8Array([7]), reason: "id is missing or not valid" },
    { what: "no body", raw: bodyless, reason: "body is missing or not valid" },
    {
      what: "a type nobody knows",
      raw: { ...note("d1"), type: "note.burnt" },
      reason: "type is missing or not valid",
    },
    {
      what: "a field of the wrong type",
      raw: { ...note("d1"), body: { text: 7 } },
      reason: "body.text is missing or not valid",
    },
    {
      what: "a version that is no number",
      raw: { ...note("d1"), v: "1" },
      reason: "v is missing or not valid",
    },
  ];

  it.each(DAMAGED)("sets a row aside that holds $what, and keeps all others", async (damage) => {
    await (await loadedStore()).append([note("n1"), note("n2")], null);
    await beside((database) => database.put(RECORDS, damage.raw, "d1"));
    const expected = {
      kind: "ok",
      records: [note("n1"), note("n2")],
      setAside: [{ key: "d1", raw: damage.raw, reason: damage.reason }],
      newerCount: 0,
    };
    expect(await load()).toEqual(expected);
    expect(await storedIds()).toEqual(["n1", "n2"]);
    // Moved once, raw as it was, and still there at the second start.
    expect(await load()).toEqual(expected);
    expect(await beside((database) => database.getAll(SET_ASIDE))).toEqual(expected.setAside);
  });

  it("counts rows of a newer version and leaves them where they are, untouched", async () => {
    const newer = { ...note("n9"), v: 2, type: "hologram.seen", body: { depth: 3 } };
    await (await loadedStore()).append([note("n1")], null);
    await beside((database) => database.put(RECORDS, newer, "n9"));
    for (const _start of [1, 2])
      expect(await load()).toMatchObject({ newerCount: 1, setAside: [], records: [{ id: "n1" }] });
    expect(await beside((database) => database.get(RECORDS, "n9"))).toEqual(newer);
  });

  it("sets a row aside once when two windows start together", async () => {
    await loadedStore();
    await beside((database) => database.put(RECORDS, null, "d1"));
    const [one, two] = await Promise.all([load(), load()]);
    expect(one.setAside).toHaveLength(1);
    expect(two.setAside).toHaveLength(1);
    expect((await load()).setAside).toHaveLength(1);
  });

  it("still gives the records when a damaged row cannot be moved", async () => {
    await (await loadedStore()).append([note("n1")], null);
    await beside((database) => database.put(RECORDS, null, "d1"));
    const full = vi.spyOn(IDBObjectStore.prototype, "add").mockImplementation(() => {
      throw new DOMException("full", "QuotaExceededError");
    });
    expect(await load()).toMatchObject({ records: [{ id: "n1" }], setAside: [{ key: "d1" }] });
    full.mockRestore();
    expect(await load()).toMatchObject({ records: [{ id: "n1" }], setAside: [{ key: "d1" }] });
  });

  it("takes a set-aside row that is damaged itself", async () => {
    await (await loadedStore()).append([note("n1")], null);
    await beside((database) => database.put(SET_ASIDE, null, 1));
    expect(await load()).toMatchObject({ records: [{ id: "n1" }], setAside: [{ raw: undefined }] });
  });
});

describe("two windows", () => {
  it("tell each other what they have stored, and not themselves", async () => {
    const [one, two] = [await loadedStore(), await loadedStore()];
    const self = vi.fn();
    one.onForeign(self);
    const heard = new Promise((resolve) => two.onForeign(resolve));
    await one.append([note("n1")], null);
    expect(await heard).toEqual([note("n1")]);
    const answered = new Promise((resolve) => one.onForeign(resolve));
    await two.append([note("n2")], null);
    expect(await answered).toEqual([note("n2")]);
    expect(self.mock.calls).toEqual([[[note("n2")]]]);
  });

  it("do not trust what they hear", async () => {
    const store = await loadedStore();
    const hear = vi.fn();
    const heard = new Promise<void>((resolve) =>
      store.onForeign((records) => {
        hear(records);
        resolve();
      }),
    );
    const stranger = new BroadcastChannel(CHANNEL_NAME);
    for (const message of [null, "n1", 7, note("n1"), [], [null, { ...note("n1"), v: 9 }]])
      stranger.postMessage(message);
    // Messages of one channel arrive in the order they were sent: this one comes after all the rest.
    stranger.postMessage([{ ...note("n2"), body: { text: 7 } }, { ...note("n3"), extra: 1 }, 5]);
    await heard;
    stranger.close();
    expect(hear.mock.calls).toEqual([[[note("n3")]]]);
  });

  it("hear nothing of what could not be stored", async () => {
    const [one, two] = [await loadedStore(), await loadedStore()];
    const hear = vi.fn();
    const heard = new Promise<void>((resolve) =>
      two.onForeign((records) => {
        hear(records);
        resolve();
      }),
    );
    const full = vi.spyOn(IDBObjectStore.prototype, "add").mockImplementation(() => {
      throw new DOMException("full", "QuotaExceededError");
    });
    expect((await one.append([note("n1")], null)).kind).toBe("failed");
    full.mockRestore();
    await one.append([note("n2")], null);
    await heard;
    expect(hear.mock.calls).toEqual([[[note("n2")]]]);
  });
});
