import { effect } from "@preact/signals";
import { describe, expect, it } from "vitest";
import { createKeptTexts } from "../../src/app/kept-texts.ts";
import type { Keep } from "../../src/models/surroundings.ts";
import type { KeptStore } from "../../src/storage/kept-store.ts";

function start(
  inDatabase: ReadonlyMap<string, string> | null,
  inLocal = new Map<string, string>(),
) {
  const written: [string, string | null][] = [];
  const local: Keep = {
    read: (key) => inLocal.get(key) ?? null,
    write: (key, text) => {
      if (text === null) inLocal.delete(key);
      else inLocal.set(key, text);
      return true;
    },
  };
  const store: KeptStore = {
    readAll: async () => inDatabase,
    write: (key, text) => written.push([key, text]),
  };
  return { keep: createKeptTexts(local, store), inLocal, written };
}

describe("kept texts with the database behind them", () => {
  it("answer at once with what localStorage has", () => {
    expect(start(null, new Map([["place", "#/rig"]])).keep.read("place")).toBe("#/rig");
  });

  it("follow the database, which a kill has not set back, as soon as it has been read", async () => {
    const { keep } = start(new Map([["place", "#/log"]]), new Map([["place", "#/rig"]]));
    const seen: (string | null)[] = [];
    effect(() => {
      seen.push(keep.read("place"));
    });
    await keep.load();
    expect(seen).toEqual(["#/rig", "#/log"]);
  });

  it("never give way to the database where this window has written since its start", async () => {
    const { keep, inLocal, written } = start(new Map([["note", "older"]]));
    keep.write("note", "newer");
    await keep.load();
    expect(keep.read("note")).toBe("newer");
    keep.write("note", null);
    expect(keep.read("note")).toBeNull();
    expect(inLocal.has("note")).toBe(false);
    expect(written).toEqual([
      ["note", "newer"],
      ["note", null],
    ]);
  });

  it("do with localStorage alone where the database can't be read", async () => {
    const { keep } = start(null, new Map([["theme", "daylight"]]));
    await keep.load();
    expect(keep.read("theme")).toBe("daylight");
  });
});
