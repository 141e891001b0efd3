import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readRow } from "../../src/journal/reading.ts";
import { RECORD_TYPES, RECORD_VERSION, type RecordType } from "../../src/journal/records.ts";
import { BODY } from "./samples.ts";

const envelope = {
  id: "i1",
  v: RECORD_VERSION,
  show: "s1",
  at: 1_764_585_000_000,
  device: "phone-a",
  clock: "0mimfsi80-0000-phone-a",
};
const row = (type: string, body: unknown) => ({ ...envelope, type, body });
const nested = (depth: number): unknown => JSON.parse("[".repeat(depth) + "]".repeat(depth));

/** Bodies that must not be read, with the field that has to be named. */
const DAMAGED: Record<RecordType, readonly (readonly [path: string, body: unknown])[]> = {
  "show.opened": [
    ["body", undefined],
    ["body.timeZone", { name: "n", place: "p" }],
    ["body.name", { ...BODY["show.opened"], name: "n".repeat(121) }],
    ["body.place", { ...BODY["show.opened"], place: 7 }],
  ],
  "show.edited": [
    ["body.place", { name: "n" }],
    ["body.name", { name: null, place: "p" }],
  ],
  "show.closed": [
    ["body", null],
    ["body", "closed"],
  ],
  "moment.set": [
    ["body.moment", {}],
    ["body.moment", { moment: "LIVE" }],
  ],
  "link.set": [
    ["body.link", { ...BODY["link.set"], link: "" }],
    ["body.kind", { ...BODY["link.set"], kind: "camera" }],
    ["body.frequencyMhz", { ...BODY["link.set"], frequencyMhz: "614.4" }],
    ["body.frequencyMhz", { ...BODY["link.set"], frequencyMhz: 24.9 }],
    ["body.frequencyMhz", { ...BODY["link.set"], frequencyMhz: Number.NaN }],
    ["body.frequencyMhz", { ...BODY["link.set"], frequencyMhz: undefined }],
  ],
  "link.removed": [
    ["body.link", {}],
    ["body.link", { link: "l".repeat(65) }],
  ],
  "fault.opened": [
    ["body.moment", { moment: null }],
    ["body", []],
  ],
  "dropout.marked": [
    ["body.fault", {}],
    ["body.fault", { fault: ["f1"] }],
  ],
  "dropout.detailed": [
    ["body.place", { mark: "m1", links: [], place: "balcony" }],
    ["body.links", { mark: "m1", links: ["l1", 2], place: null }],
    ["body.links", { mark: "m1", links: Array(201).fill("l"), place: null }],
    ["body.mark", { links: [], place: null }],
  ],
  "check.answered": [
    ["body.outcome", { fault: "f1", check: "c1" }],
    ["body.check", { fault: "f1", check: 1, outcome: "yes" }],
  ],
  "step.skipped": [
    ["body.step", { fault: "f1" }],
    ["body.fault", { step: "c1" }],
  ],
  "remedy.tried": [
    ["body.result", { fault: "f1", remedy: "r1", result: "fine" }],
    ["body.remedy", { fault: "f1", result: "better" }],
  ],
  "fault.closed": [
    ["body.causes", { ...BODY["fault.closed"], causes: ["1", "2", "3", "4", "5"] }],
    ["body.ending", { ...BODY["fault.closed"], ending: "" }],
    ["body.remedy", { ...BODY["fault.closed"], remedy: "" }],
    ["body.note", { ...BODY["fault.closed"], note: "n".repeat(4001) }],
  ],
  "sum.kept": [
    ["body.query", { ...BODY["sum.kept"], query: "q".repeat(1001) }],
    ["body.sentence", { calculator: "c", query: "q" }],
  ],
  "note.added": [
    ["body.text", { text: 1 }],
    ["body.text", { text: "t".repeat(4001) }],
  ],
  "record.withdrawn": [
    ["body.record", {}],
    ["body.record", { record: {} }],
  ],
};

describe("readRow", () => {
  it.each(RECORD_TYPES)("reads a stored %s back as it was written", (type) => {
    const stored = row(type, BODY[type]);
    const read = readRow(JSON.parse(JSON.stringify(stored)));
    expect(read).toEqual({ kind: "record", record: stored });
  });

  it.each(
    RECORD_TYPES.flatMap((type) => DAMAGED[type].map(([path, body]) => ({ type, path, body }))),
  )("finds a $type damaged at $path", ({ type, path, body }) => {
    expect(readRow(row(type, body))).toEqual({
      kind: "damaged",
      reason: `${path} is missing or not valid`,
    });
  });

  it("has at least two kinds of damage for every type", () => {
    for (const type of RECORD_TYPES) expect(DAMAGED[type].length).toBeGreaterThanOrEqual(2);
  });

  const note = row("note.added", BODY["note.added"]);
  it.each([
    ["id", { ...note, id: "" }],
    ["id", { ...note, id: "i".repeat(65) }],
    ["v", { ...note, v: "1" }],
    ["v", { ...note, v: 0 }],
    ["v", { ...note, v: 0.5 }],
    ["v", { ...note, v: Number.POSITIVE_INFINITY }],
    ["v", { ...note, v: undefined }],
    ["show", { ...note, show: null }],
    ["at", { ...note, at: -1 }],
    ["at", { ...note, at: 1.5 }],
    ["at", { ...note, at: Number.NaN }],
    ["device", { ...note, device: 7 }],
    ["clock", { ...note, clock: "noon" }],
    ["clock", { ...note, clock: "zzzzzzzzz-0000-phone-a" }],
    ["type", { ...note, type: "note.burnt" }],
    ["type", { ...note, type: "toString" }],
    ["type", { ...note, type: "__proto__" }],
  ])("names the field %s of an envelope that is not valid", (path, raw) => {
    expect(readRow(raw)).toEqual({
      kind: "damaged",
      reason: `${path} is missing or not valid`,
    });
  });

  it.each([null, undefined, "text", 7, true, [note], Symbol("s")])(
    "takes %s for no record",
    (raw) => {
      expect(readRow(raw)).toEqual({ kind: "damaged", reason: "not a record" });
    },
  );

  it("takes 100,000 lists inside each other for damage, in place of a row and of a body", () => {
    expect(readRow(nested(100_000))).toEqual({ kind: "damaged", reason: "not a record" });
    const bodies = RECORD_TYPES.map((type) => readRow(row(type, nested(100_000))));
    expect(bodies.map(({ kind }) => kind)).toEqual(RECORD_TYPES.map(() => "damaged"));
  });

  it("leaves a record of a newer version alone, whatever else it holds", () => {
    expect(readRow({ v: RECORD_VERSION + 1 })).toEqual({ kind: "newer" });
    expect(readRow({ ...note, v: 99, type: "hologram.seen", body: 3 })).toEqual({ kind: "newer" });
  });

  it("drops fields it does not know, and keys that would reach for the prototype", () => {
    const raw = JSON.parse(
      `{"__proto__":{"isAdmin":true},"extra":1,${JSON.stringify({
        ...note,
        body: {},
      }).slice(1, -3)}{"text":"t","__proto__":{"fault":"f1"},"constructor":{"prototype":{"x":1}}}}`,
    );
    const read = readRow(raw);
    expect(read).toEqual({ kind: "record", record: { ...note, body: { text: "t" } } });
    if (read.kind !== "record") return;
    expect(Object.keys(read.record).sort()).toEqual(Object.keys(note).sort());
    expect("fault" in read.record.body).toBe(false);
    expect("isAdmin" in {}).toBe(false);
  });

  it("does not throw for an object whose properties do", () => {
    const trap = {
      get v(): number {
        throw new TypeError("no");
      },
    };
    expect(readRow(trap)).toEqual({ kind: "damaged", reason: "cannot be read: no" });
  });

  it("never throws and never changes what it reads", () => {
    fc.assert(
      fc.property(
        fc.anything({ withNullPrototype: true }),
        fc.constantFrom(...RECORD_TYPES),
        (anything, type) => {
          for (const raw of [anything, row(type, anything), { ...note, v: anything }]) {
            const before = fc.stringify(raw);
            expect(["record", "newer", "damaged"]).toContain(readRow(raw).kind);
            expect(fc.stringify(raw)).toBe(before);
          }
        },
      ),
      { seed: 20261201, numRuns: 200 },
    );
  });
});
