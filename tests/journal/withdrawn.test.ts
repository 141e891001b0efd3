import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { JournalRecord } from "../../src/journal/records.ts";
import { withdrawnIds } from "../../src/journal/withdrawn.ts";
import { anySoundJournal, RUNS } from "./arbitraries.ts";
import { BODY, writeJournal } from "./samples.ts";

/** A note, and withdrawals w1, w2 … of what is named. */
function withdrawals(...targets: string[]): JournalRecord[] {
  const { add } = writeJournal();
  add("show.opened", BODY["show.opened"]);
  return [
    { ...add("note.added", { text: "t" }), id: "note" },
    ...targets.map((record, index) => ({
      ...add("record.withdrawn", { record }),
      id: `w${index + 1}`,
    })),
  ];
}
const gone = (records: readonly JournalRecord[]) => [...withdrawnIds(records)].sort();

describe("withdrawnIds", () => {
  it.each([
    { what: "nothing without a withdrawal", targets: [], expected: [] },
    { what: "the record that is named", targets: ["note"], expected: ["note"] },
    { what: "the withdrawal that is withdrawn", targets: ["note", "w1"], expected: ["w1"] },
    { what: "it again after the third", targets: ["note", "w1", "w2"], expected: ["note", "w2"] },
    {
      what: "it while one of two stands",
      targets: ["note", "note", "w1"],
      expected: ["note", "w1"],
    },
    {
      what: "no note whose withdrawal is withdrawn by one of two, the other being undone",
      targets: ["note", "w1", "w1", "w2", "w3", "w5"],
      expected: ["w1", "w2", "w5"],
    },
    { what: "neither of two that name each other", targets: ["w2", "w1"], expected: [] },
    { what: "none that names itself", targets: ["w1"], expected: [] },
    { what: "a record that has not arrived", targets: ["later"], expected: ["later"] },
  ])("holds $what", ({ targets, expected }) => {
    expect(gone(withdrawals(...targets))).toEqual(expected);
  });

  it("does not depend on order: a phone with a slow clock withdraws what sorts after it", () => {
    const records = withdrawals("note", "w1", "w2");
    expect(gone([...records].reverse())).toEqual(gone(records));
    fc.assert(
      fc.property(anySoundJournal, (journal) => {
        expect(gone([...journal].reverse())).toEqual(gone(journal));
      }),
      RUNS,
    );
  });

  it("copes with a chain of 20,000 withdrawals", () => {
    const chain = Array.from({ length: 20_000 }, (_, index) => (index ? `w${index}` : "note"));
    const [note, ...rest] = withdrawals("note");
    const records = chain.map((record, index) => ({
      ...(rest[0] as JournalRecord<"record.withdrawn">),
      id: `w${index + 1}`,
      body: { record },
    }));
    // An even number of them: each even one undoes the odd one before it, and the note stands.
    expect(withdrawnIds([note as JournalRecord, ...records]).has("note")).toBe(false);
    expect(withdrawnIds([note as JournalRecord, ...records.slice(0, -1)]).has("note")).toBe(true);
  });
});
