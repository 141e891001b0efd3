import { describe, expect, it } from "vitest";
import { createJournalModel } from "../../src/models/journal-model.ts";
import { pretendStore, pretendSurroundings } from "./pretend.ts";

function start(kept = new Map<string, string>()) {
  const store = pretendStore();
  const surroundings = pretendSurroundings(kept);
  return { store, surroundings, journal: createJournalModel(store, surroundings) };
}
const note = (text: string) => ({ type: "note.added", body: { text } }) as const;

describe("the journal model", () => {
  it("opens an unnamed show for an entry that comes before any show", async () => {
    const { store, journal } = start();
    expect(await journal.record((make) => make(note("squeal")))).toBe(true);
    expect(store.rows.map(({ type }) => type)).toEqual(["show.opened", "note.added"]);
    expect(journal.openShow.value?.timeline).toHaveLength(2);
    expect(store.lock).toMatchObject({ show: journal.openShow.value?.id });
  });

  it("opens one show only when two taps come before the first is stored", async () => {
    const { store, journal } = start();
    await Promise.all([
      journal.record((make) => make(note("one"))),
      journal.record((make) => make(note("two"))),
    ]);
    expect(store.rows.filter(({ type }) => type === "show.opened")).toHaveLength(1);
  });

  it("gives an entry the time of the tap, not of the end of loading", async () => {
    const { store, surroundings, journal } = start();
    const tappedAt = surroundings.clock.nowMs;
    const recorded = journal.record((make) => make(note("early")));
    surroundings.clock.nowMs += 5000;
    await recorded;
    expect(store.rows.map(({ at }) => at)).toEqual([tappedAt, tappedAt]);
  });

  it("keeps what could not be stored, says why, and stores it on retry, once", async () => {
    const { store, surroundings, journal } = start();
    store.answer = { kind: "failed", reason: "quota" };
    expect(await journal.record((make) => make(note("held")))).toBe(false);
    expect(journal.failure.value).toBe("quota");
    expect(journal.unsaved.value).toHaveLength(2);
    expect(surroundings.kept.get("unsaved")).toContain("held");
    store.answer = { kind: "stored" };
    expect(await journal.retry()).toBe(true);
    expect(journal.unsaved.value).toEqual([]);
    expect(journal.failure.value).toBeNull();
    expect(surroundings.kept.has("unsaved")).toBe(false);
    expect(store.rows).toHaveLength(2);
  });

  it("stores after a restart what the killed app had held", async () => {
    const first = start();
    first.store.answer = { kind: "failed", reason: "lost" };
    await first.journal.record((make) => make(note("held over the kill")));
    const second = start(first.surroundings.kept);
    await second.journal.load();
    expect(second.store.rows.map(({ type }) => type)).toEqual(["show.opened", "note.added"]);
    expect(second.journal.unsaved.value).toEqual([]);
  });

  it("sets a damaged held text aside instead of losing it", async () => {
    const { journal } = start(new Map([["unsaved", "{half a reco"]]));
    await journal.load();
    expect(journal.setAside.value).toMatchObject([{ raw: "{half a reco" }]);
  });

  it("holds everything in memory when the log can't be read, and writes nothing", async () => {
    const { store, journal } = start();
    store.loaded = { kind: "failed", reason: "no-answer" };
    expect(await journal.record((make) => make(note("in memory")))).toBe(false);
    expect(store.rows).toEqual([]);
    expect(journal.openShow.value?.timeline).toHaveLength(2);
    store.loaded = { kind: "ok", records: [], setAside: [], newerCount: 0 };
    expect(await journal.retry()).toBe(true);
    expect(store.rows).toHaveLength(2);
  });

  it("lifts the lock with the record that closes the show", async () => {
    const { store, journal } = start();
    await journal.record((make) => make(note("in the show")));
    expect(store.lock).not.toBeNull();
    await journal.record((make) => make({ type: "show.closed", body: {} }));
    expect(store.lock).toBeNull();
  });

  it("shows what another window has stored", async () => {
    const other = start();
    await other.journal.record((make) => make(note("from the other window")));
    const { store, journal } = start();
    await journal.load();
    store.arrive(other.store.rows);
    expect(journal.openShow.value?.timeline).toHaveLength(2);
  });
});
