import { describe, expect, it } from "vitest";
import { nextClock } from "../../src/journal/clock.ts";
import { foldJournal } from "../../src/journal/fold.ts";
import { readRow } from "../../src/journal/reading.ts";
import { type Entry, RECORD_TYPES, RECORD_VERSION } from "../../src/journal/records.ts";
import { lastClockAfter, lockFor, stampEntry } from "../../src/journal/stamp.ts";
import { BODY, START_MS, writeJournal } from "./samples.ts";

let count = 0;
const context = {
  show: "s1",
  device: "phone-a",
  nowMs: START_MS,
  newId: () => `id-${count++}`,
  lastClock: null,
};
const note: Entry = { type: "note.added", body: { text: "t" } };

describe("stampEntry", () => {
  it.each(RECORD_TYPES)("makes of %s a record that reads back the same", (type) => {
    const record = stampEntry({ type, body: BODY[type] } as Entry, context);
    expect(readRow(structuredClone(record))).toEqual({ kind: "record", record });
    expect(record).toMatchObject({ v: RECORD_VERSION, device: "phone-a", at: START_MS });
    expect(record.show).toBe(type === "show.opened" ? record.id : "s1");
  });

  it("refuses an entry that would be set aside at the next start", () => {
    const long: Entry = { type: "note.added", body: { text: "t".repeat(4001) } };
    expect(() => stampEntry(long, context)).toThrow(/^stampEntry: entry note\.added: body\.text/);
    expect(() => stampEntry(note, { ...context, show: "" })).toThrow(RangeError);
    expect(() => stampEntry(note, { ...context, newId: () => "" })).toThrow(RangeError);
  });
});

describe("the clock of a stamped entry", () => {
  it("goes on after the clock that was seen last, and from its own wall time when that is later", () => {
    const ahead = nextClock(null, START_MS + 1000, "phone-b");
    expect(stampEntry(note, { ...context, lastClock: ahead }).clock > ahead).toBe(true);
    const behind = nextClock(null, START_MS - 1000, "phone-b");
    expect(stampEntry(note, { ...context, lastClock: behind }).clock).toBe(
      nextClock(null, START_MS, "phone-a"),
    );
  });
});

describe("lastClockAfter", () => {
  const own = writeJournal("phone-a", START_MS).add("show.opened", BODY["show.opened"]);
  const dayAhead = START_MS + 86_400_000;

  it("follows another device, but not one whose date is wrong", () => {
    const near = writeJournal("phone-b", START_MS + 1000).add("show.opened", BODY["show.opened"]);
    const far = writeJournal("phone-c", dayAhead).add("show.opened", BODY["show.opened"]);
    const now = { device: "phone-a", nowMs: START_MS };
    expect(lastClockAfter(null, [own, near, far], now)).toBe(near.clock);
    expect(lastClockAfter(near.clock, [own], now)).toBe(near.clock);
    expect(lastClockAfter(null, [], now)).toBeNull();
  });

  it("goes on after own records that were made while the own date was wrong", () => {
    const ahead = writeJournal("phone-a", dayAhead).add("show.opened", BODY["show.opened"]);
    const last = lastClockAfter(null, [ahead, own], { device: "phone-a", nowMs: START_MS });
    expect(last).toBe(ahead.clock);
    expect(nextClock(last, START_MS, "phone-a") > ahead.clock).toBe(true);
  });
});

describe("lockFor", () => {
  it("names the open show and the time of its latest record, and is lifted when none is open", () => {
    const { add, records } = writeJournal();
    expect(lockFor(foldJournal(records).openShow, START_MS)).toBeNull();
    const show = add("show.opened", BODY["show.opened"]).id;
    expect(lockFor(foldJournal(records).openShow, START_MS)).toEqual({ show, at: START_MS });
    add("show.closed", {});
    const [closed] = foldJournal(records).shows;
    expect(closed && lockFor(closed, START_MS)).toBeNull();
  });
});
