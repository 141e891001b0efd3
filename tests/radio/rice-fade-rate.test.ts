import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fadeDurationS, fadeRateHz } from "../../src/radio/fade-rate.ts";
import { riceFadeDurationS, riceFadeRateHz } from "../../src/radio/rice-fade-rate.ts";
import { riceOutageProbability } from "../../src/radio/rice-outage.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";
import { walked } from "./walk.ts";

const RATES = {
  marginDb: { min: -10, max: 100 },
  kFactorDb: { min: -40, max: 25 },
  shiftHz: { min: 1e-6, max: 1e6 },
  branchCount: { min: 1, max: 8 },
};
const DURATIONS = { ...RATES, marginDb: { min: -3, max: 100 } };

describe("riceFadeRateHz and riceFadeDurationS", () => {
  // Hundreds of fades each: 12 % covers three standard errors and what forty waves differ from
  // infinitely many.
  it.each([
    [3, 3, 1, 60],
    [6, 3, 1, 120],
    [3, 6, 1, 100],
    [2, 3, 2, 100],
  ])(
    "are met on a simulated walk: %s dB, K %s dB, %s antennas",
    (marginDb, kFactorDb, branchCount, runs) => {
      const k = 10 ** (kFactorDb / 10);
      const seen = walked({ thresholdPower: 10 ** (-marginDb / 10), branchCount, k, runs });
      const walk = { marginDb, kFactorDb, shiftHz: 1, branchCount };
      expect(Math.abs(seen.fadesPerWavelength / riceFadeRateHz(walk) - 1)).toBeLessThan(0.12);
      expect(Math.abs(seen.fadeLengthWavelengths / riceFadeDurationS(walk) - 1)).toBeLessThan(0.12);
    },
  );

  it("follow from the slope of the outage, by Rice's formula", () => {
    // The speed of the amplitude is Gaussian and independent of it: the rate is its density at the
    // bound times σ' / √(2π), where σ' = 2π·f_d·σ / √2 and 2σ² = 1 / (1 + K), the scattered share.
    fc.assert(
      fc.property(
        anyOf({ marginDb: { min: -3, max: 40 }, kFactorDb: { min: -30, max: 12 } }),
        ({ marginDb, kFactorDb }) => {
          const bound = 10 ** (-marginDb / 20);
          const step = 1e-4;
          const outage = (r: number) =>
            riceOutageProbability({ marginDb: -20 * Math.log10(r), kFactorDb });
          const density =
            (outage(bound * (1 + step)) - outage(bound * (1 - step))) / (2 * step * bound);
          const sigma = Math.sqrt(0.5 / (1 + 10 ** (kFactorDb / 10)));
          const expected = (density * Math.SQRT2 * Math.PI * sigma) / Math.sqrt(2 * Math.PI);
          const rate = riceFadeRateHz({ marginDb, kFactorDb, shiftHz: 1, branchCount: 1 });
          expect(rate / expected).toBeCloseTo(1, 4);
        },
      ),
      SEEDED,
    );
  });

  it("become Rayleigh's without a direct wave", () => {
    for (const branchCount of [1, 2, 4]) {
      const walk = { marginDb: 10, shiftHz: 2.57, branchCount };
      const rice = { ...walk, kFactorDb: -40 };
      expect(riceFadeRateHz(rice) / fadeRateHz(walk)).toBeCloseTo(1, 3);
      expect(riceFadeDurationS(rice) / fadeDurationS(walk)).toBeCloseTo(1, 3);
    }
  });

  it("make the outage of all antennas when multiplied", () => {
    fc.assert(
      fc.property(anyOf({ ...DURATIONS, branchCount: { min: 1, max: 2 } }), (walk) => {
        const outage = riceOutageProbability(walk) ** walk.branchCount;
        expect((riceFadeRateHz(walk) * riceFadeDurationS(walk)) / outage).toBeCloseTo(1, 9);
      }),
      SEEDED,
    );
  });

  it("give rarer fades as the direct wave grows", () => {
    const rate = (kFactorDb: number) =>
      riceFadeRateHz({ marginDb: 10, kFactorDb, shiftHz: 2.57, branchCount: 1 });
    expect(rate(6)).toBeLessThan(rate(0));
    expect(rate(12)).toBeLessThan(rate(6) / 10);
  });

  it("are finite over their whole range and refuse the rest", () => {
    expectWithin(riceFadeRateHz, RATES, { min: 0, max: 1e9 });
    expectWithin(riceFadeDurationS, DURATIONS, { min: 0, max: 1e40 });
    expectRefusals(riceFadeRateHz, RATES);
    expectRefusals(riceFadeDurationS, DURATIONS);
  });

  it("can give a duration for the strongest direct wave at the lowest margin", () => {
    const walk = { marginDb: -3, kFactorDb: 25, shiftHz: 1, branchCount: 1 };
    expect(riceFadeDurationS(walk)).toBeGreaterThan(1);
  });
});
