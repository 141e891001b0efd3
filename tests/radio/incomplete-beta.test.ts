import fc from "fast-check";
import { jStat } from "jstat";
import { describe, expect, it } from "vitest";
import { betaProbability, betaQuantile } from "../../src/radio/incomplete-beta.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  a: { min: 0.5, max: 20_000 },
  b: { min: 0.5, max: 20_000 },
  x: { min: 0, max: 1 },
};
const SMALL = { a: { min: 0.5, max: 80 }, b: { min: 0.5, max: 80 }, x: { min: 0, max: 1 } };
const WISHES = { a: RANGES.a, b: RANGES.b, wishedProbability: { min: 1e-12, max: 0.999_999 } };

describe("betaProbability", () => {
  it("agrees with a general library for any shapes", () => {
    fc.assert(
      fc.property(anyOf(SMALL), ({ a, b, x }) => {
        // The library stops its fraction at 3e-7.
        expect(betaProbability({ a, b, x })).toBeCloseTo(jStat.beta.cdf(x, a, b), 6);
      }),
      SEEDED,
    );
  });

  it("is the arcsine distribution for two shapes of one half", () => {
    // Integral of 1 / (π·√(x·(1 − x))), by hand.
    for (const x of [1e-6, 0.125, 0.5, 0.9])
      expect(betaProbability({ a: 0.5, b: 0.5, x })).toBeCloseTo(
        (2 / Math.PI) * Math.asin(Math.sqrt(x)),
        13,
      );
  });

  it("is the chance of so many hits or more in independent tries", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 40 }),
        fc.integer({ min: 0, max: 40 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (hits, misses, x) => {
          const tries = hits + misses;
          const orMore = 1 - jStat.binomial.cdf(hits - 1, tries, x);
          expect(betaProbability({ a: hits, b: misses + 1, x })).toBeCloseTo(orMore, 9);
        },
      ),
      SEEDED,
    );
  });

  // mpmath 1.3, 60 digits, as a sum of binomial chances.
  it.each([
    [2, 10, 1e-6, 5.4999670000989994e-11, 1e-12],
    [60, 31, 0.48, 2.7096241106310296e-4, 1e-12],
    [1, 5000, 1e-4, 0.3934845043752551, 1e-10],
    [5000, 1, 0.999, 0.006721111959865588, 1e-10],
    [5000, 5000, 0.45, 5.924818244475018e-24, 1e-9],
  ])("keeps its digits in the lower tail: %s, %s at %s", (a, b, x, expected, relative) => {
    expect(Math.abs(betaProbability({ a, b, x }) / expected - 1)).toBeLessThan(relative);
  });

  it("mirrors itself", () => {
    fc.assert(
      fc.property(anyOf(RANGES), ({ a, b, x }) => {
        const both = betaProbability({ a, b, x }) + betaProbability({ a: b, b: a, x: 1 - x });
        expect(both).toBeCloseTo(1, 8);
      }),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(betaProbability, RANGES, { min: 0, max: 1 });
    expectRefusals(betaProbability, RANGES);
    expect(betaProbability({ a: 2, b: 3, x: 0 })).toBe(0);
    expect(betaProbability({ a: 2, b: 3, x: 1 })).toBe(1);
  });
});

describe("betaQuantile", () => {
  it("agrees with a general library", () => {
    fc.assert(
      fc.property(
        anyOf({ a: SMALL.a, b: SMALL.b, p: { min: 0.001, max: 0.999 } }),
        ({ a, b, p }) => {
          const library = jStat.beta.inv(p, a, b);
          expect(betaQuantile({ a, b, wishedProbability: p })).toBeCloseTo(library, 6);
        },
      ),
      SEEDED,
    );
  });

  it("is the inverse of betaProbability", () => {
    fc.assert(
      fc.property(
        anyOf({ a: SMALL.a, b: SMALL.b, wishedProbability: { min: 1e-12, max: 0.99 } }),
        (wish) => {
          const x = betaQuantile(wish);
          // Beside 1 the numbers stand too coarse to give the probability back.
          if (x > 0.999) return;
          const back = betaProbability({ ...wish, x });
          expect(back / wish.wishedProbability).toBeCloseTo(1, 8);
        },
      ),
      SEEDED,
    );
  });

  it("is a share over its whole range and refuses the rest", () => {
    fc.assert(
      fc.property(anyOf(WISHES), (wish) => {
        const share = betaQuantile(wish);
        expect(share >= 0 && share <= 1).toBe(true);
      }),
      { ...SEEDED, numRuns: 60 },
    );
    expectRefusals(betaQuantile, WISHES);
  });
});
