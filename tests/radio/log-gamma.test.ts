import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { logGamma } from "../../src/radio/log-gamma.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = { z: { min: 0.5, max: 1e6 } };

describe("logGamma", () => {
  it("is the logarithm of the factorial for whole numbers", () => {
    let factorial = 1;
    for (let z = 1; z <= 20; z += 1) {
      expect(logGamma(z)).toBeCloseTo(Math.log(factorial), 13);
      factorial *= z;
    }
  });

  it("is half the logarithm of π at one half", () => {
    // Γ(½) = √π, the integral of the bell curve.
    expect(logGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 14);
  });

  it("obeys the reflection formula between 0.5 and 1.5, where the series was raised", () => {
    // Γ(1 + x)·Γ(1 − x) = π·x / sin πx (Euler).
    for (const x of [0.1, 0.25, 0.4])
      expect(logGamma(1 + x) + logGamma(1 - x)).toBeCloseTo(
        Math.log((Math.PI * x) / Math.sin(Math.PI * x)),
        13,
      );
  });

  it("agrees with an independent calculation", () => {
    // mpmath 1.3, 40 digits.
    expect(logGamma(100.5) / 361.4355404677776).toBeCloseTo(1, 14);
    expect(logGamma(1e6) / 12815504.569147611).toBeCloseTo(1, 14);
  });

  it("grows by the logarithm of its argument over each whole step", () => {
    fc.assert(
      fc.property(anyOf({ z: { min: 0.5, max: 1000 } }), ({ z }) => {
        expect(logGamma(z + 1) - logGamma(z)).toBeCloseTo(Math.log(z), 10);
      }),
      SEEDED,
    );
  });

  it("is finite over its range and refuses the rest", () => {
    expectWithin(({ z }) => logGamma(z), RANGES, { min: -0.13, max: 1.3e7 });
    expectRefusals(({ z }) => logGamma(z), RANGES);
  });
});
