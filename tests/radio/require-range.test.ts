import { describe, expect, it } from "vitest";
import { requireRange } from "../../src/radio/require-range.ts";

const LIMITS = { min: 1, max: 6 };

describe("requireRange", () => {
  it.each([1, 3.79, 6])("lets %s through where 1 to 6 is allowed", (exponent) => {
    expect(() => requireRange("levelChangeDb", LIMITS, { exponent })).not.toThrow();
  });

  it.each([0.999, 6.001, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    "stops %s where 1 to 6 is allowed",
    (exponent) => {
      expect(() => requireRange("levelChangeDb", LIMITS, { exponent })).toThrow(RangeError);
    },
  );

  it("names the function, the argument and the value", () => {
    expect(() => requireRange("levelChangeDb", LIMITS, { exponent: Number.NaN })).toThrow(
      "levelChangeDb: exponent must be from 1 to 6, got NaN",
    );
  });

  it("looks at every argument", () => {
    expect(() => requireRange("levelChangeDb", LIMITS, { fromM: 2, toM: 7 })).toThrow(/toM.*got 7/);
  });
});
