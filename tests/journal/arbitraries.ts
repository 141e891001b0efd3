import fc from "fast-check";
import { nextClock } from "../../src/journal/clock.ts";
import type { JournalRecord, RecordType } from "../../src/journal/records.ts";
import { RECORD_TYPES } from "../../src/journal/records.ts";
import { BODY, START_MS } from "./samples.ts";

/** So few ids that records name each other, themselves, records of another type, and nothing. */
const someId = fc.constantFrom("a", "b", "c", "d", "e", "f", "g", "h");

/** Any valid record. Clocks are few too, so that ties are met. */
const anyRecord: fc.Arbitrary<JournalRecord> = fc
  .record({
    id: someId,
    names: someId,
    show: fc.constantFrom("a", "b"),
    type: fc.constantFrom<RecordType>(...RECORD_TYPES, "show.opened", "record.withdrawn"),
    tick: fc.nat({ max: 5 }),
    device: fc.constantFrom("phone-a", "phone-b"),
  })
  .map(({ id, names, show, type, tick, device }) => {
    const body: Record<string, unknown> = { ...BODY[type] };
    for (const field of ["fault", "mark", "record", "check", "link"])
      if (field in body) body[field] = names;
    const at = START_MS + tick;
    return {
      ...{ id, v: 1, show: type === "show.opened" ? id : show, at, device },
      ...{ clock: nextClock(null, at, device), type, body },
    } as JournalRecord;
  });

export const anyJournal = fc.array(anyRecord, { maxLength: 40 });

/** As one device or several make them: no id twice. */
export const anySoundJournal = fc.uniqueArray(
  fc.tuple(anyRecord, fc.uuid()).map(([record, id]) => {
    const own = record.type === "show.opened" || record.id < "d" ? record.id : id;
    return { ...record, id: own, show: record.type === "show.opened" ? own : record.show };
  }),
  { selector: ({ id }) => id, maxLength: 60 },
) as fc.Arbitrary<JournalRecord[]>;

export const RUNS = { seed: 20261201, numRuns: 200 };
