import fc from "fast-check";
import { jStat } from "jstat";
import { describe, expect, it } from "vitest";
import { combinedSpreadDb } from "../../src/radio/combined-spread.ts";
import { normalProbability, normalQuantile } from "../../src/radio/normal.ts";
import { placesProbability, shadowMarginDb } from "../../src/radio/shadow-margin.ts";
import { SEEDED, within } from "./samples.ts";
import { expectFinite, expectRefusals } from "./whole-range.ts";

const PROBABILITY = { min: 1e-12, max: 1 - 1e-12 };
const DEVIATIONS = { min: -1e6, max: 1e6 };
const SPREAD = { min: 0.01, max: 40 };
const CHANGE = { min: -300, max: 300 };

/** Chance of lying more than x deviations above the mean, by Simpson's rule on the bell curve itself. */
function integratedTail(x: number): number {
  const end = x + 40 / (x + 3);
  const strips = 40_000;
  const width = (end - x) / strips;
  const bell = (t: number) => Math.exp((-t * t) / 2) / Math.sqrt(2 * Math.PI);
  let sum = bell(x) + bell(end);
  for (let index = 1; index < strips; index += 1)
    sum += (index % 2 === 1 ? 4 : 2) * bell(x + index * width);
  return (sum * width) / 3;
}

describe("normalProbability", () => {
  it("agrees with a general library", () => {
    fc.assert(
      fc.property(within({ min: -8, max: 8 }), (deviations) => {
        expect(normalProbability(deviations)).toBeCloseTo(jStat.normal.cdf(deviations, 0, 1), 13);
      }),
      SEEDED,
    );
  });

  it.each([0, 0.5, 1.99, 2, 2.01, 3.5, 6, 10, 30])(
    "has all its digits in the tail too: integral over the bell curve beyond %s deviations",
    (deviations) => {
      expect(normalProbability(-deviations) / integratedTail(deviations)).toBeCloseTo(1, 11);
    },
  );

  it.each([
    // M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions (1964), Tables 26.1 and 26.2; from memory, to
    // be verified: −log10 of the tail for the last two.
    [1, 0.8413447461],
    [2, 0.9772498681],
    [3, 0.998650102],
  ])("is at %s deviations what a handbook prints: %s", (deviations, expected) => {
    expect(normalProbability(deviations)).toBeCloseTo(expected, 9);
    expect(normalProbability(-deviations)).toBeCloseTo(1 - expected, 9);
  });

  it.each([
    [10, 23.11805],
    [20, 88.5601],
  ])("is %s deviations below the mean 10 to the minus %s", (deviations, expected) => {
    expect(-Math.log10(normalProbability(-deviations))).toBeCloseTo(expected, 4);
  });

  it("rises, and is finite all over its range, at 0 and 1 far out", () => {
    expectFinite({ deviations: DEVIATIONS }, (it) => normalProbability(it.deviations));
    expect(normalProbability(-1e6)).toBe(0);
    expect(normalProbability(1e6)).toBe(1);
    const near = within({ min: -5, max: 5 });
    fc.assert(
      fc.property(near, near, (one, other) => {
        if (one < other - 1e-9)
          expect(normalProbability(one)).toBeLessThan(normalProbability(other));
      }),
      SEEDED,
    );
  });

  it("refuses what lies outside its range", () => {
    expectRefusals("normalProbability", { deviations: DEVIATIONS }, { deviations: 1 }, (it) =>
      normalProbability(it.deviations),
    );
  });
});

describe("normalQuantile", () => {
  it("agrees with a general library", () => {
    fc.assert(
      fc.property(within({ min: 0.0001, max: 0.9999 }), (probability) => {
        expect(normalQuantile(probability)).toBeCloseTo(jStat.normal.inv(probability, 0, 1), 9);
      }),
      SEEDED,
    );
  });

  it("is the inverse of normalProbability out to 7 deviations below and 5 above", () => {
    fc.assert(
      fc.property(within({ min: -7, max: 5 }), (deviations) => {
        const back = normalQuantile(normalProbability(deviations));
        // Above the mean the rounding of a probability near 1 costs digits: 10⁻¹⁶ over the density.
        expect(Math.abs(back - deviations)).toBeLessThan(deviations > 3 ? 1e-9 : 1e-12);
      }),
      SEEDED,
    );
  });

  it("is 0 for a half, and turns its sign with the other side", () => {
    expect(normalQuantile(0.5)).toBeCloseTo(0, 15);
    expect(normalQuantile(0.25)).toBeCloseTo(-normalQuantile(0.75), 14);
    expect(normalQuantile(0.25)).toBeLessThan(0);
  });

  it("is finite all over its range, and refuses certainty", () => {
    expectFinite({ probability: PROBABILITY }, (it) => normalQuantile(it.probability));
    expectRefusals("normalQuantile", { probability: PROBABILITY }, { probability: 0.9 }, (it) =>
      normalQuantile(it.probability),
    );
    for (const certain of [0, 1]) expect(() => normalQuantile(certain)).toThrow(RangeError);
  });
});

describe("shadowMarginDb and placesProbability", () => {
  it("make a step of 2.92 dB from 90 % to 95 % of places at 450 MHz", () => {
    // A. Ghasemi, Propagation Engineering in Wireless Communications, example 6.5, p. 239; second-hand in a textbook
    // companion. Deviation 3.8 + 1.6·log10 450 = 8.045 dB; printed to 0.01 dB from factors of three decimals.
    const step = shadowMarginDb(0.95, 8.045) - shadowMarginDb(0.9, 8.045);
    expect(Math.abs(step - 2.92)).toBeLessThan(0.01);
  });

  it("ask for 15 W instead of 5 W from 90 % to 97 % of places with 8 dB", () => {
    // Same book, example 6.6, p. 240; printed in whole watts.
    const step = shadowMarginDb(0.97, 8) - shadowMarginDb(0.9, 8);
    expect(Math.round(5 * 10 ** (step / 10))).toBe(15);
  });

  it("leave half of the places without any margin, and undo each other", () => {
    expect(placesProbability(0, 8)).toBe(0.5);
    expect(shadowMarginDb(0.4, 8)).toBeLessThan(0);
    const shares = within({ min: 0.001, max: 0.999 });
    fc.assert(
      fc.property(shares, within({ min: 1, max: 20 }), (share, spreadDb) => {
        expect(placesProbability(shadowMarginDb(share, spreadDb), spreadDb)).toBeCloseTo(share, 12);
      }),
      SEEDED,
    );
  });

  it("hold for levels drawn at random", () => {
    // Normal numbers by the method of Box and Muller from fast-check's seeded uniform ones.
    const marginDb = shadowMarginDb(0.9, 7);
    let draws = 0;
    let enough = 0;
    const uniform = fc.integer({ min: 1, max: 999_983 });
    fc.assert(
      fc.property(uniform, uniform, (one, other) => {
        const radius = Math.sqrt(-2 * Math.log(one / 999_984));
        const level = 7 * radius * Math.cos((2 * Math.PI * other) / 999_984);
        draws += 1;
        if (level > -marginDb) enough += 1;
      }),
      { seed: 20261201, numRuns: 4000 },
    );
    expect(draws).toBe(4000);
    expect(Math.abs(enough / draws - 0.9)).toBeLessThan(0.05);
  });

  it("are finite all over their range, and refuse the rest", () => {
    const toMargin = { placesProbability: PROBABILITY, spreadDb: SPREAD };
    expectFinite(toMargin, (it) => shadowMarginDb(it.placesProbability, it.spreadDb));
    const good = { placesProbability: 0.9, spreadDb: 8, marginDb: 10 };
    expectRefusals("shadowMarginDb", { spreadDb: SPREAD }, good, (it) =>
      shadowMarginDb(0.9, it.spreadDb),
    );
    for (const share of [0, 1, Number.NaN])
      expect(() => shadowMarginDb(share, 8)).toThrow(RangeError);
    const toShare = { marginDb: CHANGE, spreadDb: SPREAD };
    expectFinite(toShare, (it) => placesProbability(it.marginDb, it.spreadDb));
    expectRefusals("placesProbability", toShare, good, (it) =>
      placesProbability(it.marginDb, it.spreadDb),
    );
  });
});

describe("combinedSpreadDb", () => {
  const LIMITS = { firstDb: { min: 0, max: 300 }, secondDb: { min: 0, max: 300 } };

  it("is 5 for 3 and 4, and the other one where one is 0", () => {
    expect(combinedSpreadDb(3, 4)).toBeCloseTo(5, 12);
    expect(combinedSpreadDb(0, 8)).toBe(8);
  });

  it("is finite all over its range, and refuses the rest", () => {
    expectFinite(LIMITS, (it) => combinedSpreadDb(it.firstDb, it.secondDb));
    expectRefusals("combinedSpreadDb", LIMITS, { firstDb: 3, secondDb: 4 }, (it) =>
      combinedSpreadDb(it.firstDb, it.secondDb),
    );
  });
});
