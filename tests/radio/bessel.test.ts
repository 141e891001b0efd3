import { besseli, besselj } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { scaledI0 } from "../../src/radio/bessel-i0.ts";
import { besselJ0 } from "../../src/radio/bessel-j0.ts";
import { expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED, within } from "./samples.ts";

const J0_RANGES = { x: { min: 0, max: 6300 } };
const I0_RANGES = { x: { min: 0, max: 10_000 } };

describe("besselJ0", () => {
  // Abramowitz and Stegun, Table 9.1, from memory, to be verified; agrees with scipy 1.17.
  it.each([
    [1, 0.7651976865579666],
    [5, -0.1775967713143383],
    [10, -0.2459357644513483],
  ])("has the tabulated value at %s", (x, expected) => {
    expect(besselJ0(x)).toBeCloseTo(expected, 14);
  });

  // The same, Table 9.5: zeros of J0.
  it.each([2.4048255577, 5.5200781103, 8.6537279129])("is zero at %s", (x) => {
    expect(besselJ0(x)).toBeCloseTo(0, 10);
  });

  // mpmath 1.3, 40 digits.
  it.each([
    [314.159, 0.03180986317912901],
    [3141.59, 0.010038698995362442],
    [6283, 0.005684276545281408],
  ])("keeps thirteen digits behind the point at %s", (x, expected) => {
    expect(Math.abs(besselJ0(x) - expected)).toBeLessThan(1e-13);
  });

  it("agrees with a general library", () => {
    fc.assert(
      fc.property(within({ min: 0, max: 100 }), (x) => {
        // The library uses approximations of the order 1e-8.
        expect(besselJ0(x)).toBeCloseTo(besselj(x, 0), 7);
      }),
      SEEDED,
    );
  });

  it("swings between -0.403 and 1 and refuses what lies outside its range", () => {
    expectWithin(({ x }) => besselJ0(x), J0_RANGES, { min: -0.4028, max: 1 });
    expectRefusals(({ x }) => besselJ0(x), J0_RANGES);
    expect(besselJ0(0)).toBe(1);
  });
});

describe("scaledI0", () => {
  // mpmath 1.3, 40 digits.
  it.each([
    [0.01, 0.9900745851497075],
    [1, 0.46575960759364043],
    [10, 0.1278333371634286],
    [1000, 0.012617240455891257],
    [10_000, 0.003989472674604732],
  ])("keeps thirteen digits at %s", (x, expected) => {
    expect(Math.abs(scaledI0(x) / expected - 1)).toBeLessThan(1e-13);
  });

  it("agrees with a general library", () => {
    fc.assert(
      fc.property(within({ min: 0, max: 300 }), (x) => {
        expect(scaledI0(x) / (besseli(x, 0) * Math.exp(-x))).toBeCloseTo(1, 6);
      }),
      SEEDED,
    );
  });

  it("falls from 1 and stays above 0, and refuses what lies outside its range", () => {
    expectWithin(({ x }) => scaledI0(x), I0_RANGES, { min: 0.003, max: 1 });
    expectRefusals(({ x }) => scaledI0(x), I0_RANGES);
    expect(scaledI0(0)).toBe(1);
  });
});
