import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rayleighMarginDb, rayleighOutageProbability } from "../../src/radio/rayleigh-outage.ts";
import { complexGaussian, seededChance } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const MARGINS = { marginDb: { min: -10, max: 100 } };
const OUTAGES = { outageProbability: { min: 1e-9, max: 0.9999 } };

describe("rayleighOutageProbability", () => {
  it("is the share of simulated fields that are too weak", () => {
    // A field of many parts is a complex Gaussian. 50 000 draws: the standard error is below 0.0023.
    const chance = seededChance(3);
    const powers = Array.from({ length: 50_000 }, () => {
      const { re, im } = complexGaussian(chance);
      return re ** 2 + im ** 2;
    });
    for (const marginDb of [-3, 0, 3, 10]) {
      const share = powers.filter((power) => power < 10 ** (-marginDb / 10)).length / powers.length;
      expect(Math.abs(rayleighOutageProbability(marginDb) - share)).toBeLessThan(0.009);
    }
  });

  it("is 63 % without a margin, and a tenth less for each 10 dB of a large one", () => {
    // 1 − 1/e, from any table.
    expect(rayleighOutageProbability(0)).toBeCloseTo(0.63212, 5);
    expect(rayleighOutageProbability(40) / rayleighOutageProbability(50)).toBeCloseTo(10, 3);
  });

  it("keeps its digits where the outage is tiny", () => {
    expect(rayleighOutageProbability(100) / 1e-10).toBeCloseTo(1, 9);
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(({ marginDb }) => rayleighOutageProbability(marginDb), MARGINS, {
      min: 0,
      max: 1,
    });
    expectRefusals(({ marginDb }) => rayleighOutageProbability(marginDb), MARGINS);
  });
});

describe("rayleighMarginDb", () => {
  it("is the inverse of rayleighOutageProbability", () => {
    fc.assert(
      fc.property(anyOf({ marginDb: { min: -9.6, max: 89 } }), ({ marginDb }) => {
        expect(rayleighMarginDb(rayleighOutageProbability(marginDb))).toBeCloseTo(marginDb, 9);
      }),
      SEEDED,
    );
  });

  it("is a finite margin over its whole range and refuses the rest", () => {
    expectWithin(({ outageProbability }) => rayleighMarginDb(outageProbability), OUTAGES, {
      min: -10,
      max: 90.1,
    });
    expectRefusals(({ outageProbability }) => rayleighMarginDb(outageProbability), OUTAGES);
  });
});
