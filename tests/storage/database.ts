import "fake-indexeddb/auto";
import { IDBFactory } from "fake-indexeddb";
import { type IDBPDatabase, openDB } from "idb";
import { afterEach, beforeEach, vi } from "vitest";
import { DATABASE_NAME, LOCK, RECORDS, SET_ASIDE } from "../../src/storage/names.ts";

/** Every raw connection that the code under test has opened, in order. */
export const opened: IDBDatabase[] = [];

/** Gives each test of a file an empty phone. */
export function freshPhone(): void {
  beforeEach(() => {
    opened.length = 0;
    globalThis.indexedDB = new IDBFactory();
    const open = indexedDB.open.bind(indexedDB);
    vi.spyOn(indexedDB, "open").mockImplementation((name, version) => {
      const request = open(name, version);
      request.addEventListener("success", () => opened.push(request.result));
      return request;
    });
  });
  afterEach(() => {
    vi.unstubAllGlobals();
    // One by one: the spies of the test set-up on the console must stay.
    const { add, put } = IDBObjectStore.prototype;
    for (const spied of [add, put, IDBDatabase.prototype.transaction])
      if (vi.isMockFunction(spied)) spied.mockRestore();
  });
}

/** Works on the database beside the store, as another program would, and closes it again. */
export async function beside<T>(work: (database: IDBPDatabase) => Promise<T>): Promise<T> {
  const database = await openDB(DATABASE_NAME, undefined, {
    upgrade(fresh) {
      fresh.createObjectStore(RECORDS);
      fresh.createObjectStore(SET_ASIDE, { autoIncrement: true });
      fresh.createObjectStore(LOCK);
    },
  });
  try {
    return await work(database);
  } finally {
    database.close();
  }
}

export const storedIds = () => beside((database) => database.getAllKeys(RECORDS));
