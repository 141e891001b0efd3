import { besseli } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { marcumProbability } from "../../src/radio/marcum.ts";
import { integral } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  steadyRatio: { min: 0.01, max: 26 },
  boundRatio: { min: 1e-6, max: 90 },
};

describe("marcumProbability", () => {
  // mpmath 1.3, 40 digits, by integrating the density of Rice.
  it.each([
    [0.0141, 1e-3, 4.999501749951269e-7],
    [0.5, 0.5, 0.10449141893014031],
    [1, 3, 0.9562840284213643],
    [5, 0.01, 1.8638623344559571e-10],
    [10, 7, 0.001108185381935643],
    [20, 14, 8.211114821432023e-10],
    [25, 26, 0.8365518545703744],
    [25, 0.001, 9.59352540155526e-143],
  ])("keeps eleven digits for a = %s, b = %s", (a, b, expected) => {
    expect(Math.abs(marcumProbability(a, b) / expected - 1)).toBeLessThan(1e-11);
  });

  it("is the integral of Rice's density", () => {
    fc.assert(
      fc.property(anyOf({ a: { min: 0.01, max: 6 }, b: { min: 0.1, max: 8 } }), ({ a, b }) => {
        const density = (t: number) => t * Math.exp(-(t ** 2 + a ** 2) / 2) * besseli(a * t, 0);
        expect(marcumProbability(a, b)).toBeCloseTo(integral(density, 0, b), 6);
      }),
      SEEDED,
    );
  });

  it("is one half of what equal arguments share: (1 + e^(-a²)·I0(a²)) / 2 above", () => {
    // Q1(a, a) = ½·(1 + e^(−a²)·I0(a²)), a known special value (from memory, to be verified).
    for (const a of [0.5, 1, 2, 4]) {
      const below = (1 - Math.exp(-(a ** 2)) * besseli(a ** 2, 0)) / 2;
      expect(marcumProbability(a, a)).toBeCloseTo(below, 7);
    }
  });

  it("becomes Rayleigh's 1 - e^(-b²/2) where the steady part vanishes", () => {
    for (const b of [1e-3, 0.1, 1, 3])
      expect(marcumProbability(0.01, b) / -Math.expm1(-(b ** 2) / 2)).toBeCloseTo(1, 4);
  });

  it("rises with the bound and falls with the steady part", () => {
    fc.assert(
      fc.property(anyOf({ a: { min: 0.01, max: 20 }, b: { min: 0.001, max: 25 } }), ({ a, b }) => {
        const rounding = 1 + 1e-11;
        expect(marcumProbability(a, b * 1.1) * rounding).toBeGreaterThanOrEqual(
          marcumProbability(a, b),
        );
        expect(marcumProbability(a * 1.1, b)).toBeLessThanOrEqual(
          marcumProbability(a, b) * rounding,
        );
      }),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    const call = (inputs: Readonly<Record<keyof typeof RANGES, number>>) =>
      marcumProbability(inputs.steadyRatio, inputs.boundRatio);
    // The sum of up to seven hundred terms may pass 1 by its rounding.
    expectWithin(call, RANGES, { min: 0, max: 1 + 1e-11 });
    expectRefusals(call, RANGES);
  });
});
