import fc from "fast-check";
import { jStat } from "jstat";
import { describe, expect, it } from "vitest";
import { gammaProbability, gammaQuantile } from "../../src/radio/incomplete-gamma.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = { shape: { min: 0.5, max: 20_000 }, x: { min: 0, max: 1e6 } };
const WISHES = {
  shape: { min: 0.5, max: 20_000 },
  wishedProbability: { min: 1e-12, max: 0.999_999 },
};

describe("gammaProbability", () => {
  it("is the exponential distribution for shape 1", () => {
    for (const x of [1e-9, 0.1, 1, 5, 30])
      expect(gammaProbability(1, x) / -Math.expm1(-x)).toBeCloseTo(1, 13);
  });

  it("is the chance of a Poisson count or more for whole shapes", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 60 }),
        fc.double({ min: 0.01, max: 90, noNaN: true }),
        (a, x) => {
          expect(gammaProbability(a, x)).toBeCloseTo(1 - jStat.poisson.cdf(a - 1, x), 9);
        },
      ),
      SEEDED,
    );
  });

  it("agrees with a general library for any shape", () => {
    fc.assert(
      fc.property(
        anyOf({ shape: { min: 0.5, max: 100 }, x: { min: 0, max: 200 } }),
        ({ shape, x }) => {
          expect(gammaProbability(shape, x)).toBeCloseTo(jStat.gamma.cdf(x, shape, 1), 9);
        },
      ),
      SEEDED,
    );
  });

  // mpmath 1.3, 40 digits.
  it.each([
    [0.5, 0.1, 0.345279153981423, 1e-13],
    [5, 0.01, 8.264185641806499e-13, 1e-13],
    [100, 80, 0.017108313035133115, 1e-13],
    [1000, 900, 5.499022657117829e-4, 1e-11],
    [20_000, 19_800, 0.07830049501217735, 1e-10],
    [20_000, 18_000, 7.719940948087348e-49, 1e-10],
  ])("keeps its digits in the lower tail: shape %s, value %s", (shape, x, expected, relative) => {
    expect(Math.abs(gammaProbability(shape, x) / expected - 1)).toBeLessThan(relative);
  });

  it("never falls, also where series and fraction meet", () => {
    fc.assert(
      fc.property(anyOf({ shape: { min: 0.5, max: 20_000 } }), ({ shape }) => {
        const meeting = shape + 1;
        const near = [0.999, 0.999_999, 1, 1.000_001, 1.001].map((part) =>
          gammaProbability(shape, meeting * part),
        );
        // Rounding may turn neighbours round by its own size.
        for (let n = 1; n < near.length; n += 1)
          expect((near[n] ?? 0) - (near[n - 1] ?? 1)).toBeGreaterThan(-1e-10);
      }),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(({ shape, x }) => gammaProbability(shape, x), RANGES, { min: 0, max: 1 });
    expectRefusals(({ shape, x }) => gammaProbability(shape, x), RANGES);
    expect(gammaProbability(3, 0)).toBe(0);
  });
});

describe("gammaQuantile", () => {
  it("agrees with the chi-squared quantiles of a general library", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 100 }),
        fc.double({ min: 0.001, max: 0.999, noNaN: true }),
        (degrees, p) => {
          const chi = jStat.chisquare.inv(p, degrees);
          expect((2 * gammaQuantile(degrees / 2, p)) / chi).toBeCloseTo(1, 6);
        },
      ),
      SEEDED,
    );
  });

  it("is the inverse of gammaProbability", () => {
    fc.assert(
      fc.property(anyOf(WISHES), ({ shape, wishedProbability }) => {
        const x = gammaQuantile(shape, wishedProbability);
        expect(gammaProbability(shape, x) / wishedProbability).toBeCloseTo(1, 8);
      }),
      { ...SEEDED, numRuns: 60 },
    );
  });

  it("refuses what lies outside its ranges", () => {
    expectRefusals(
      ({ shape, wishedProbability }) => gammaQuantile(shape, wishedProbability),
      WISHES,
    );
  });
});
