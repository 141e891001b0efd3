import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { lessOneDb, onePlusDb } from "../../src/radio/one-plus-ratio.ts";
import { SEEDED, within } from "./samples.ts";

describe("onePlusDb", () => {
  it("is 3.01 dB for equal powers and 10.41 dB for ten times the power", () => {
    // 10·log10 of 2 and of 11, from any table of logarithms: 0.30103 and 1.04139.
    expect(onePlusDb(0)).toBeCloseTo(3.0103, 4);
    expect(onePlusDb(10)).toBeCloseTo(10.4139, 4);
  });

  it("adds nothing for nothing", () => {
    expect(onePlusDb(Number.NEGATIVE_INFINITY)).toBe(0);
  });

  it("keeps the digits of a power far below the other", () => {
    // ln(1 + x) is x for tiny x; 10 / ln 10 = 4.342945.
    expect(onePlusDb(-200) / 1e-20).toBeCloseTo(4.342945, 6);
  });

  it("does not overflow for a power far above the other", () => {
    expect(onePlusDb(15_000)).toBe(15_000);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 20_001])("refuses %s dB", (bad) => {
    expect(() => onePlusDb(bad)).toThrow(`onePlusDb: ratioDb must be from`);
    expect(() => onePlusDb(bad)).toThrow(RangeError);
  });
});

describe("lessOneDb", () => {
  it("is the inverse of onePlusDb, for tiny and huge ratios too", () => {
    fc.assert(
      fc.property(within({ min: -3000, max: 15_000 }), (ratioDb) => {
        expect(lessOneDb(onePlusDb(ratioDb))).toBeCloseTo(ratioDb, 7);
      }),
      SEEDED,
    );
  });

  it("is finite for everything that it takes", () => {
    for (const sumDb of [1e-300, 1e-9, 1, 20_000])
      expect(Number.isFinite(lessOneDb(sumDb))).toBe(true);
  });

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY, 20_001])("refuses %s dB", (bad) => {
    expect(() => lessOneDb(bad)).toThrow(`lessOneDb: sumDb must be from`);
    expect(() => lessOneDb(bad)).toThrow(RangeError);
  });
});
