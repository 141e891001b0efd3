import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { powerSumDb } from "../../src/radio/power-sum.ts";
import { SEEDED, within } from "./samples.ts";

const levels = fc.array(within({ min: -300, max: 300 }), { minLength: 1, maxLength: 20 });

describe("powerSumDb", () => {
  it("is the level itself for one, and 3.01 dB more for two alike", () => {
    expect(powerSumDb([-87.5])).toBe(-87.5);
    // 10·log10 2 = 3.0103, from any table of logarithms.
    expect(powerSumDb([-87.5, -87.5])).toBeCloseTo(-87.5 + 3.0103, 4);
  });

  it("adds floor and mixing noise as the powers say, not as a page prints it", () => {
    // −121 and −117 dBm: 7.943e-13 + 1.9953e-12 mW = 2.7896e-12 mW, −115.545 dBm, worked by hand. The
    // RF glossary (rfessentials.com, reciprocal mixing, read 2026-12-01) prints −115.8 dBm.
    expect(powerSumDb([-121, -117])).toBeCloseTo(-115.545, 3);
    expect(Math.abs(powerSumDb([-121, -117]) + 115.8)).toBeGreaterThan(0.2);
  });

  it("does not depend on the order, and shifts with a common change", () => {
    fc.assert(
      fc.property(levels, within({ min: -100, max: 100 }), (levelsDb, change) => {
        const sum = powerSumDb(levelsDb);
        expect(powerSumDb([...levelsDb].reverse())).toBeCloseTo(sum, 9);
        expect(powerSumDb(levelsDb.map((level) => level + change))).toBeCloseTo(sum + change, 9);
      }),
      SEEDED,
    );
  });

  it("lies between the strongest and that many of the strongest", () => {
    fc.assert(
      fc.property(levels, (levelsDb) => {
        const highest = Math.max(...levelsDb);
        expect(powerSumDb(levelsDb)).toBeGreaterThanOrEqual(highest);
        expect(powerSumDb(levelsDb)).toBeLessThanOrEqual(
          highest + 10 * Math.log10(levelsDb.length) + 1e-9,
        );
      }),
      SEEDED,
    );
  });

  it("does not overflow, however far apart and in whatever order", () => {
    expect(powerSumDb([15_000, -15_000])).toBe(15_000);
    expect(powerSumDb([-15_000, 15_000])).toBe(15_000);
  });

  it("takes 80 000 levels, which no call could spread as arguments", () => {
    // 80 000 times −100 dBm: 49.0309 dB more.
    expect(powerSumDb(Array.from({ length: 80_000 }, () => -100))).toBeCloseTo(-50.9691, 4);
  });

  it("refuses an empty list and a level that is none, and says which", () => {
    expect(() => powerSumDb([])).toThrow("powerSumDb: count must be from 1 to 1000000, got 0");
    expect(() => powerSumDb([-80, Number.NaN])).toThrow("powerSumDb: levelDb");
    expect(() => powerSumDb([Number.NEGATIVE_INFINITY])).toThrow(RangeError);
  });
});
