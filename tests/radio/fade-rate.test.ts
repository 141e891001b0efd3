import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fadeDurationS, fadeRateHz } from "../../src/radio/fade-rate.ts";
import { selectionOutageProbability } from "../../src/radio/selection-outage.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";
import { walked } from "./walk.ts";

const RANGES = {
  marginDb: { min: -10, max: 100 },
  shiftHz: { min: 1e-6, max: 1e6 },
  branchCount: { min: 1, max: 8 },
};

describe("fadeRateHz and fadeDurationS", () => {
  // One to three antennas; some hundreds to thousands of fades each, of which 10 % covers three
  // standard errors and what forty waves differ from infinitely many.
  it.each([
    [3, 1, 30],
    [10, 1, 60],
    [3, 2, 40],
    [6, 2, 60],
    [0, 3, 30],
  ])("are met on a simulated walk: %s dB, %s antennas", (marginDb, branchCount, runs) => {
    const seen = walked({ thresholdPower: 10 ** (-marginDb / 10), branchCount, k: 0, runs });
    // One wavelength a second.
    const walk = { marginDb, shiftHz: 1, branchCount };
    expect(seen.fadesPerWavelength / fadeRateHz(walk)).toBeGreaterThan(0.9);
    expect(seen.fadesPerWavelength / fadeRateHz(walk)).toBeLessThan(1.1);
    expect(seen.fadeLengthWavelengths / fadeDurationS(walk)).toBeGreaterThan(0.9);
    expect(seen.fadeLengthWavelengths / fadeDurationS(walk)).toBeLessThan(1.1);
  });

  it("make the outage when multiplied", () => {
    fc.assert(
      fc.property(anyOf(RANGES), (walk) => {
        const outage = selectionOutageProbability(walk.marginDb, walk.branchCount);
        expect((fadeRateHz(walk) * fadeDurationS(walk)) / outage).toBeCloseTo(1, 10);
      }),
      SEEDED,
    );
  });

  it("give half as long and much rarer fades with two antennas", () => {
    const one = { marginDb: 15, shiftHz: 2.5, branchCount: 1 };
    const two = { ...one, branchCount: 2 };
    expect(fadeDurationS(two) / fadeDurationS(one)).toBeCloseTo(0.5, 12);
    // Twice the single outage at 15 dB: 1 − e^(−0.0316228) is 0.0311281 by its series.
    expect(fadeRateHz(two) / fadeRateHz(one)).toBeCloseTo(0.06226, 5);
  });

  it("scale with the pace", () => {
    const walk = { marginDb: 12, shiftHz: 2, branchCount: 2 };
    const run = { ...walk, shiftHz: 6 };
    expect(fadeRateHz(run) / fadeRateHz(walk)).toBeCloseTo(3, 12);
    expect(fadeDurationS(walk) / fadeDurationS(run)).toBeCloseTo(3, 12);
  });

  it("are most frequent 3 dB below the mean: the derivative of r·e^(-r²) vanishes at r² = 1/2", () => {
    const rate = (marginDb: number) => fadeRateHz({ marginDb, shiftHz: 1, branchCount: 1 });
    expect(rate(3.01)).toBeGreaterThan(rate(2.5));
    expect(rate(3.01)).toBeGreaterThan(rate(3.5));
  });

  it("do not take the duration from e^(-r²), as one notebook does", () => {
    // TRAP: the companion of Garg, example 3.6, prints 0.0073 s; (e − 1) / (20·√(2π)) is 0.0343, by hand.
    const durationS = fadeDurationS({ marginDb: 0, shiftHz: 20, branchCount: 1 });
    expect(durationS).toBeCloseTo(0.0343, 4);
  });

  it("give 18 ms for r = 0.707 at 20 Hz, as Singal prints", () => {
    // Example 2.9, p. 54, second-hand: whole milliseconds, which is too coarse for a row.
    const marginDb = -20 * Math.log10(707 / 1000);
    const durationS = fadeDurationS({ marginDb, shiftHz: 20, branchCount: 1 });
    expect(Math.abs(durationS - 0.018)).toBeLessThanOrEqual(0.0005);
  });

  it("are finite over their whole range and refuse the rest", () => {
    expectWithin(fadeRateHz, RANGES, { min: 0, max: 1e8 });
    expectWithin(fadeDurationS, RANGES, { min: 0, max: 1e12 });
    expectRefusals(fadeRateHz, RANGES);
    expectRefusals(fadeDurationS, RANGES);
  });
});
