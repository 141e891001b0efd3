import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { compareRecords } from "../../src/journal/clock.ts";
import { groupBy, unionById } from "../../src/journal/order.ts";
import { anyJournal, RUNS } from "./arbitraries.ts";

describe("unionById", () => {
  // Laws of a join: what makes merging independent of who sends what to whom, how often, in which order.
  it("gives the same whichever journal is merged into which", () => {
    fc.assert(
      fc.property(anyJournal, anyJournal, (a, b) => {
        expect(unionById(a, b)).toEqual(unionById(b, a));
      }),
      RUNS,
    );
  });

  it("gives the same however three journals are paired", () => {
    fc.assert(
      fc.property(anyJournal, anyJournal, anyJournal, (a, b, c) => {
        expect(unionById(unionById(a, b), c)).toEqual(unionById(a, unionById(b, c)));
      }),
      RUNS,
    );
  });

  it("changes nothing when a journal is merged again", () => {
    fc.assert(
      fc.property(anyJournal, anyJournal, (a, b) => {
        const merged = unionById(a, b);
        expect(unionById(merged, b)).toEqual(merged);
        expect(unionById(merged, merged)).toEqual(merged);
      }),
      RUNS,
    );
  });

  it("holds every id of both, once, in journal order, and leaves both as they were", () => {
    fc.assert(
      fc.property(anyJournal, anyJournal, (a, b) => {
        const before = JSON.stringify([a, b]);
        const merged = unionById(a, b);
        const ids = merged.map(({ id }) => id);
        expect(new Set(ids)).toEqual(new Set([...a, ...b].map(({ id }) => id)));
        expect(new Set(ids).size).toBe(ids.length);
        for (const [index, record] of merged.slice(1).entries()) {
          const earlier = merged[index];
          expect(earlier && compareRecords(earlier, record)).toBe(-1);
        }
        expect(JSON.stringify([a, b])).toBe(before);
      }),
      RUNS,
    );
  });
});

describe("groupBy", () => {
  it("keeps the order within each group and leaves out what has no key", () => {
    const groups = groupBy([5, 2, 9, 4, 7], (n) => (n > 8 ? null : n % 2 === 0 ? "even" : "odd"));
    expect([...groups]).toEqual([
      ["odd", [5, 7]],
      ["even", [2, 4]],
    ]);
  });
});
