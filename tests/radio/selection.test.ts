import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { selectionDiversityGainDb, selectionMeanGainDb } from "../../src/radio/selection-gain.ts";
import { selectionMarginDb, selectionOutageProbability } from "../../src/radio/selection-outage.ts";
import { complexGaussian, integral, seededChance } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const BRANCHES = { branchCount: { min: 1, max: 8 } };
const MARGINS = { marginDb: { min: -10, max: 100 }, ...BRANCHES };
const OUTAGES = { outageProbability: { min: 1e-9, max: 0.999 }, ...BRANCHES };

describe("selectionOutageProbability", () => {
  // Printed to one figure, which is too coarse for a row: half of that figure.
  it.each([
    ["Garg, example 10.6, p. 305 (second-hand)", 20, 3, 1e-6, 0.05e-6],
    ["Goldsmith, example 7.1 (from memory, to be verified)", 8, 3, 0.0031, 0.00006],
  ])("agrees with %s", (_source, marginDb, branchCount, expected, tolerance) => {
    const outage = selectionOutageProbability(marginDb, branchCount);
    expect(Math.abs(outage - expected)).toBeLessThanOrEqual(tolerance);
  });

  it("is the share of simulated places where all antennas are too weak", () => {
    // 40 000 draws: the standard error is below 0.0025.
    const chance = seededChance(11);
    const best = Array.from({ length: 40_000 }, () =>
      Math.max(
        ...[0, 0, 0].map(() => {
          const { re, im } = complexGaussian(chance);
          return re ** 2 + im ** 2;
        }),
      ),
    );
    for (const marginDb of [-3, 0, 3]) {
      const share = best.filter((power) => power < 10 ** (-marginDb / 10)).length / best.length;
      expect(Math.abs(selectionOutageProbability(marginDb, 3) - share)).toBeLessThan(0.01);
    }
  });

  it("falls with each antenna and with the margin", () => {
    fc.assert(
      fc.property(
        anyOf({ marginDb: { min: 0, max: 90 }, branchCount: { min: 1, max: 7 } }),
        ({ marginDb, branchCount }) => {
          const here = selectionOutageProbability(marginDb, branchCount);
          expect(selectionOutageProbability(marginDb, branchCount + 1)).toBeLessThan(here);
          expect(selectionOutageProbability(marginDb + 1, branchCount)).toBeLessThan(here);
        },
      ),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    const call = (inputs: { marginDb: number; branchCount: number }) =>
      selectionOutageProbability(inputs.marginDb, inputs.branchCount);
    expectWithin(call, MARGINS, { min: 0, max: 1 });
    expectRefusals(call, MARGINS);
  });
});

describe("selectionMarginDb", () => {
  const call = (inputs: { outageProbability: number; branchCount: number }) =>
    selectionMarginDb(inputs.outageProbability, inputs.branchCount);

  it("is the inverse of selectionOutageProbability", () => {
    fc.assert(
      fc.property(anyOf(OUTAGES), (wish) => {
        const outage = selectionOutageProbability(call(wish), wish.branchCount);
        expect(outage / wish.outageProbability).toBeCloseTo(1, 9);
      }),
      SEEDED,
    );
  });

  it("is a finite margin over its whole range and refuses the rest", () => {
    expectWithin(call, OUTAGES, { min: -10, max: 90.1 });
    expectRefusals(call, OUTAGES);
  });
});

describe("selectionMeanGainDb", () => {
  it("is 0, 1.76, 2.63 and 3.19 dB for one to four antennas", () => {
    // 1, 3/2, 11/6 and 25/12 as decibels, by hand.
    const gains = [1, 2, 3, 4].map(selectionMeanGainDb);
    for (const [n, gainDb] of [0, 1.761, 2.632, 3.188].entries())
      expect(gains[n]).toBeCloseTo(gainDb, 3);
  });

  it("is the mean of the strongest power, integrated from the outage", () => {
    for (const branchCount of [2, 5, 8]) {
      const mean = integral((x) => 1 - (1 - Math.exp(-x)) ** branchCount, 0, 60);
      expect(selectionMeanGainDb(branchCount)).toBeCloseTo(10 * Math.log10(mean), 6);
    }
  });

  it("refuses what lies outside its range", () => {
    expectRefusals(({ branchCount }) => selectionMeanGainDb(branchCount), BRANCHES);
  });
});

describe("selectionDiversityGainDb", () => {
  const call = (inputs: { outageProbability: number; branchCount: number }) =>
    selectionDiversityGainDb(inputs.outageProbability, inputs.branchCount);

  it("is nothing for one antenna, and more for each further one", () => {
    expect(selectionDiversityGainDb(0.01, 1)).toBe(0);
    fc.assert(
      fc.property(
        anyOf({ outageProbability: OUTAGES.outageProbability, branchCount: { min: 1, max: 7 } }),
        ({ outageProbability, branchCount }) => {
          expect(selectionDiversityGainDb(outageProbability, branchCount + 1)).toBeGreaterThan(
            selectionDiversityGainDb(outageProbability, branchCount),
          );
        },
      ),
      SEEDED,
    );
  });

  it("grows as the outage is to be smaller", () => {
    expect(selectionDiversityGainDb(0.001, 2)).toBeGreaterThan(selectionDiversityGainDb(0.1, 2));
  });

  it("is a finite gain over its whole range and refuses the rest", () => {
    expectWithin(call, OUTAGES, { min: 0, max: 90 });
    expectRefusals(call, OUTAGES);
  });
});
