import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { solveRising } from "../../src/radio/solve-rising.ts";
import { SEEDED, within } from "./samples.ts";

describe("solveRising", () => {
  it("finds the square root of 2 to the last digit", () => {
    expect(solveRising((x) => x ** 2, 2, { min: 0, max: 2 })).toBeCloseTo(Math.SQRT2, 15);
  });

  it("finds answers that are tiny beside the interval", () => {
    const root = solveRising((x) => x ** 3, 1e-90, { min: 0, max: 1000 });
    expect(root / 1e-30).toBeCloseTo(1, 12);
  });

  it("undoes any rising function, at the ends of the interval too", () => {
    fc.assert(
      fc.property(within({ min: -5, max: 5 }), (x) => {
        const rising = (at: number) => Math.sinh(at) + at;
        expect(solveRising(rising, rising(x), { min: -5, max: 5 })).toBeCloseTo(x, 12);
      }),
      SEEDED,
    );
  });

  it.each([-1, 5, Number.NaN])(
    "refuses to look for %s where the function runs from 0 to 4",
    (y) => {
      const call = () => solveRising((x) => x ** 2, y, { min: 0, max: 2 });
      expect(call).toThrow(RangeError);
      expect(call).toThrow(`solveRising: wished must be reached from 0 to 2, got ${y}`);
    },
  );
});
