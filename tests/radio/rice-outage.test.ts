import { besseli } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rayleighOutageProbability } from "../../src/radio/rayleigh-outage.ts";
import { riceMarginDb, riceOutageProbability } from "../../src/radio/rice-outage.ts";
import { complexGaussian, integral, seededChance } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = { marginDb: { min: -10, max: 100 }, kFactorDb: { min: -40, max: 25 } };
const WISHES = { outageProbability: { min: 1e-9, max: 0.999 }, kFactorDb: RANGES.kFactorDb };

describe("riceOutageProbability", () => {
  it("is the integral of the density of the power", () => {
    fc.assert(
      fc.property(
        anyOf({ marginDb: { min: -3, max: 30 }, kFactorDb: { min: -20, max: 10 } }),
        ({ marginDb, kFactorDb }) => {
          const k = 10 ** (kFactorDb / 10);
          // Of the power u over its mean, from the density of the amplitude.
          const density = (u: number) =>
            (1 + k) * Math.exp(-k - (1 + k) * u) * besseli(2 * Math.sqrt(k * (1 + k) * u), 0);
          const outage = riceOutageProbability({ marginDb, kFactorDb });
          expect(outage).toBeCloseTo(integral(density, 0, 10 ** (-marginDb / 10)), 6);
        },
      ),
      SEEDED,
    );
  });

  it("is the share of simulated fields that are too weak", () => {
    // 50 000 draws: the standard error is below 0.0023.
    const chance = seededChance(9);
    const k = 4;
    const powers = Array.from({ length: 50_000 }, () => {
      const { re, im } = complexGaussian(chance);
      return ((Math.sqrt(k) + re) ** 2 + im ** 2) / (1 + k);
    });
    for (const marginDb of [-2, 0, 3, 6]) {
      const share = powers.filter((power) => power < 10 ** (-marginDb / 10)).length / 50_000;
      const outage = riceOutageProbability({ marginDb, kFactorDb: 10 * Math.log10(k) });
      expect(Math.abs(outage - share)).toBeLessThan(0.009);
    }
  });

  it("becomes Rayleigh's without a direct wave", () => {
    for (const marginDb of [-5, 0, 10, 40]) {
      const rice = riceOutageProbability({ marginDb, kFactorDb: -40 });
      expect(rice / rayleighOutageProbability(marginDb)).toBeCloseTo(1, 4);
    }
  });

  it("tends to e^(-K)·(1 + K)·x where the margin is large", () => {
    // The density of the power at 0, from its formula: (1 + K)·e^(−K).
    const k = 10;
    const outage = riceOutageProbability({ marginDb: 70, kFactorDb: 10 });
    expect(outage / (Math.exp(-k) * (1 + k) * 1e-7)).toBeCloseTo(1, 4);
  });

  it("falls as the direct wave grows, given a margin of 3 dB or more", () => {
    fc.assert(
      fc.property(
        anyOf({ marginDb: { min: 3, max: 60 }, kFactorDb: { min: -40, max: 22 } }),
        ({ marginDb, kFactorDb }) => {
          const more = riceOutageProbability({ marginDb, kFactorDb: kFactorDb + 3 });
          expect(more).toBeLessThan(riceOutageProbability({ marginDb, kFactorDb }) * (1 + 1e-11));
        },
      ),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(riceOutageProbability, RANGES, { min: 0, max: 1 + 1e-11 });
    expectRefusals(riceOutageProbability, RANGES);
  });
});

describe("riceMarginDb", () => {
  it("is the inverse of riceOutageProbability", () => {
    fc.assert(
      fc.property(anyOf(WISHES), (wish) => {
        const marginDb = riceMarginDb(wish);
        const outage = riceOutageProbability({ marginDb, kFactorDb: wish.kFactorDb });
        expect(outage / wish.outageProbability).toBeCloseTo(1, 8);
      }),
      { ...SEEDED, numRuns: 100 },
    );
  });

  it("is less than Rayleigh's in sight of the antenna", () => {
    expect(riceMarginDb({ outageProbability: 0.01, kFactorDb: 7 })).toBeLessThan(
      riceMarginDb({ outageProbability: 0.01, kFactorDb: -40 }) - 7,
    );
  });

  it("refuses what lies outside its ranges", () => {
    expectRefusals(riceMarginDb, WISHES);
  });
});
