import type { Entry, JournalRecord, RecordType } from "../../src/journal/records.ts";
import { stampEntry } from "../../src/journal/stamp.ts";

/** 2026-12-01 10:30:00 UTC. */
export const START_MS = Date.UTC(2026, 11, 1, 10, 30);

type Bodies = { [T in RecordType]: Entry<T>["body"] };

/** One valid body of every type. Invented. */
export const BODY: Bodies = {
  "show.opened": { name: "Evening show", place: "Hall by the river", timeZone: "Pacific/Auckland" },
  "show.edited": { name: "Late show", place: "Hall by the river" },
  "show.closed": {},
  "moment.set": { moment: "live" },
  "link.set": { link: "l1", name: "Lead vocal", kind: "handheld", frequencyMhz: 614.4 },
  "link.removed": { link: "l1" },
  "fault.opened": { moment: "live" },
  "dropout.marked": { fault: "f1" },
  "dropout.detailed": { mark: "m1", links: ["l1"], place: "up-left" },
  "check.answered": { fault: "f1", check: "c1", outcome: "yes" },
  "step.skipped": { fault: "f1", step: "c2" },
  "remedy.tried": { fault: "f1", remedy: "r1", result: "better" },
  "fault.closed": { fault: "f1", causes: ["k1"], ending: "cured", remedy: "r1", note: "Swapped." },
  "sum.kept": { calculator: "distance", query: "d=30", sentence: "30 m costs 57.7 dB." },
  "note.added": { text: "Second line array is new." },
  "record.withdrawn": { record: "x1" },
};

/** A journal being written on one device, one minute between entries. */
export function writeJournal(device = "phone-a", startMs = START_MS) {
  const records: JournalRecord[] = [];
  let show = "";
  let count = 0;
  return {
    records,
    add<T extends RecordType>(type: T, body: Entry<T>["body"]): JournalRecord<T> {
      const record = stampEntry({ type, body } as Entry, {
        show,
        device,
        nowMs: startMs + count * 60_000,
        newId: () => `${device}-${count}`,
        lastClock: records.at(-1)?.clock ?? null,
      }) as JournalRecord<T>;
      count += 1;
      show = record.show;
      records.push(record as JournalRecord);
      return record;
    },
  };
}
