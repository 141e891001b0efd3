import { besseli } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  correlatedPairGainDb,
  correlatedPairMarginDb,
  correlatedPairOutageProbability,
} from "../../src/radio/correlated-pair.ts";
import { rayleighOutageProbability } from "../../src/radio/rayleigh-outage.ts";
import { selectionDiversityGainDb } from "../../src/radio/selection-gain.ts";
import { selectionOutageProbability } from "../../src/radio/selection-outage.ts";
import { complexGaussian, integral, seededChance } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = { marginDb: { min: -10, max: 100 }, correlationRatio: { min: 0, max: 0.999 } };
const WISHES = {
  outageProbability: { min: 1e-9, max: 0.999 },
  correlationRatio: { min: 0, max: 0.999 },
};

/** Marcum's Q of order 1 from its definition. */
function marcumQ(a: number, b: number): number {
  const density = (t: number) => t * Math.exp(-(t ** 2 + a ** 2) / 2) * besseli(a * t, 0);
  return integral(density, b, Math.max(a, b) + 10);
}

/** Schwartz, Bennett and Stein (1966), section 10-5; r is the correlation of the fields. */
function inMarcumForm(x: number, r: number, isSwapped = false): number {
  const b = Math.sqrt((2 * x) / (1 - r ** 2));
  const [one, two] = isSwapped ? [b, r * b] : [r * b, b];
  return 1 - Math.exp(-x) * (1 - marcumQ(one, two) + marcumQ(two, one));
}

describe("correlatedPairOutageProbability", () => {
  it("agrees with the form in Marcum's Q", () => {
    for (const r of [0, 0.3, 0.6, 0.9]) {
      for (const x of [0.05, 0.3, 1, 3]) {
        const outage = correlatedPairOutageProbability({
          marginDb: -10 * Math.log10(x),
          correlationRatio: r ** 2,
        });
        expect(outage).toBeCloseTo(inMarcumForm(x, r), 6);
      }
    }
  });

  it("is not the form with its two terms swapped, which errs even without correlation", () => {
    const x = 0.3;
    const outage = correlatedPairOutageProbability({
      marginDb: -10 * Math.log10(x),
      correlationRatio: 0,
    });
    // The trap gives 1 − e^(−2x) there.
    expect(inMarcumForm(x, 0, true)).toBeCloseTo(-Math.expm1(-2 * x), 6);
    expect(outage).toBeLessThan(0.2 * inMarcumForm(x, 0, true));
  });

  it("is that of two independent antennas without correlation", () => {
    fc.assert(
      fc.property(anyOf({ marginDb: RANGES.marginDb }), ({ marginDb }) => {
        const outage = correlatedPairOutageProbability({ marginDb, correlationRatio: 0 });
        expect(outage / selectionOutageProbability(marginDb, 2)).toBeCloseTo(1, 11);
      }),
      SEEDED,
    );
  });

  // mpmath 1.3: one antenna's exponential distribution times the other's chance given it, integrated.
  it.each([
    [10, 0.3, 0.01242315174248395],
    [40, 0.9, 9.990008077836546e-8],
    [0, 0.5, 0.4764640107298861],
    [15, 0.99, 0.021583312946023954],
    [-5, 0.6, 0.9312169030357681],
  ])("keeps its digits at %s dB and correlation %s", (marginDb, correlationRatio, expected) => {
    const outage = correlatedPairOutageProbability({ marginDb, correlationRatio });
    expect(Math.abs(outage / expected - 1)).toBeLessThan(1e-10);
  });

  it("is the share of simulated places where both antennas are too weak", () => {
    // 50 000 pairs of correlated complex Gaussians: the standard error is below 0.0023.
    const chance = seededChance(5);
    const r = 0.8;
    const stronger = Array.from({ length: 50_000 }, () => {
      const own = complexGaussian(chance);
      const other = complexGaussian(chance);
      const rest = Math.sqrt(1 - r ** 2);
      const second = (r * own.re + rest * other.re) ** 2 + (r * own.im + rest * other.im) ** 2;
      return Math.max(own.re ** 2 + own.im ** 2, second);
    });
    for (const marginDb of [-3, 0, 5]) {
      const share = stronger.filter((power) => power < 10 ** (-marginDb / 10)).length / 50_000;
      const outage = correlatedPairOutageProbability({ marginDb, correlationRatio: r ** 2 });
      expect(Math.abs(outage - share)).toBeLessThan(0.009);
    }
  });

  it("rises with correlation from two antennas to one", () => {
    fc.assert(
      fc.property(anyOf(RANGES), (pair) => {
        const outage = correlatedPairOutageProbability(pair);
        const rounding = 1 + 1e-10;
        expect(outage * rounding).toBeGreaterThanOrEqual(
          selectionOutageProbability(pair.marginDb, 2),
        );
        expect(outage).toBeLessThanOrEqual(rayleighOutageProbability(pair.marginDb) * rounding);
        const less = { ...pair, correlationRatio: pair.correlationRatio / 2 };
        expect(correlatedPairOutageProbability(less)).toBeLessThanOrEqual(outage * rounding);
      }),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(correlatedPairOutageProbability, RANGES, { min: 0, max: 1 + 1e-10 });
    expectRefusals(correlatedPairOutageProbability, RANGES);
  });
});

describe("correlatedPairMarginDb", () => {
  it("is the inverse of correlatedPairOutageProbability", () => {
    fc.assert(
      fc.property(anyOf(WISHES), (wish) => {
        const marginDb = correlatedPairMarginDb(wish);
        const { outageProbability, correlationRatio } = wish;
        const outage = correlatedPairOutageProbability({ marginDb, correlationRatio });
        expect(outage / outageProbability).toBeCloseTo(1, 8);
      }),
      { ...SEEDED, numRuns: 50 },
    );
  });

  it("refuses what lies outside its ranges", () => {
    expectRefusals(correlatedPairMarginDb, WISHES);
  });
});

describe("correlatedPairGainDb", () => {
  it("is that of independent antennas without correlation, and less with it", () => {
    const at = (correlationRatio: number) =>
      correlatedPairGainDb({ outageProbability: 0.01, correlationRatio });
    expect(at(0)).toBeCloseTo(selectionDiversityGainDb(0.01, 2), 8);
    expect(at(0.5)).toBeLessThan(at(0));
    expect(at(0.9)).toBeLessThan(at(0.5));
    expect(at(0.999)).toBeGreaterThan(0);
  });

  it("loses less than 2 dB up to a correlation of one half, as the rule of thumb has it", () => {
    // At small outages the loss is −5·log10(1 − ρ), 1.5 dB at one half: from the series' first term.
    const lost =
      selectionDiversityGainDb(1e-6, 2) -
      correlatedPairGainDb({ outageProbability: 1e-6, correlationRatio: 0.5 });
    expect(lost).toBeCloseTo(-5 * Math.log10(0.5), 2);
  });

  it("refuses what lies outside its ranges", () => {
    expectRefusals(correlatedPairGainDb, WISHES);
  });
});
