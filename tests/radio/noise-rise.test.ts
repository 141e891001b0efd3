import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { combinedCarrierToNoiseDb } from "../../src/radio/combined-carrier-to-noise.ts";
import {
  INTERFERENCE_LIMITS_DB,
  interferenceToNoiseDb,
  NOISE_RISE_LIMITS_DB,
  noiseRiseDb,
} from "../../src/radio/noise-rise.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

describe("noiseRiseDb and interferenceToNoiseDb", () => {
  it("make 5.5 dB of the glossary's mixing noise, not the printed 5.2 dB", () => {
    // rfessentials.com, reciprocal mixing: −117 dBm on a floor of −121 dBm. 1 + 2.5119 = 3.5119, 5.455 dB.
    expect(noiseRiseDb(4)).toBeCloseTo(5.455, 3);
    expect(Math.abs(noiseRiseDb(4) - 5.2)).toBeGreaterThan(0.2);
  });

  it("ask for a source just below the floor for 3 dB", () => {
    // CEPT handbook, page 505674: 10·log10(10^0.3 − 1) = −0.02, printed as 0.
    expect(interferenceToNoiseDb(3)).toBeCloseTo(-0.02, 2);
  });

  it("undo each other", () => {
    fc.assert(
      fc.property(within(INTERFERENCE_LIMITS_DB), (ratioDb) => {
        const riseDb = noiseRiseDb(ratioDb);
        expect(Number.isFinite(riseDb) && riseDb >= 0).toBe(true);
        if (riseDb < NOISE_RISE_LIMITS_DB.min || riseDb > NOISE_RISE_LIMITS_DB.max) return;
        expect(interferenceToNoiseDb(riseDb)).toBeCloseTo(ratioDb, 8);
      }),
      SEEDED,
    );
    expect(Number.isFinite(interferenceToNoiseDb(NOISE_RISE_LIMITS_DB.min))).toBe(true);
  });

  it("refuse a rise of 0 and what is out of range", () => {
    expectRefused(
      "noiseRiseDb",
      ({ interferenceToNoiseDb: ratioDb }) => noiseRiseDb(ratioDb),
      { interferenceToNoiseDb: -6 },
      { interferenceToNoiseDb: [-401, 401] },
    );
    expectRefused(
      "interferenceToNoiseDb",
      ({ riseDb }) => interferenceToNoiseDb(riseDb),
      { riseDb: 1 },
      { riseDb: [0, -1, 401] },
    );
  });
});

describe("combinedCarrierToNoiseDb", () => {
  const ratios = fc.array(within({ min: -400, max: 400 }), { minLength: 1, maxLength: 12 });

  it("is the ratio itself for one, and 3.01 dB less for two alike", () => {
    expect(combinedCarrierToNoiseDb([20])).toBe(20);
    expect(combinedCarrierToNoiseDb([20, 20])).toBeCloseTo(20 - 3.0103, 4);
  });

  it("is never above the lowest, and finite", () => {
    fc.assert(
      fc.property(ratios, (ratiosDb) => {
        const combined = combinedCarrierToNoiseDb(ratiosDb);
        expect(combined).toBeLessThanOrEqual(Math.min(...ratiosDb) + 1e-9);
        expect(Number.isFinite(combined)).toBe(true);
      }),
      SEEDED,
    );
  });

  it("agrees with the rise of the floor", () => {
    // A floor alone gives 30 dB; a source 2 dB below it lifts it and lowers the ratio by as much.
    expect(combinedCarrierToNoiseDb([30, 32])).toBeCloseTo(30 - noiseRiseDb(-2), 9);
  });

  it("refuses an empty list and a ratio that is none", () => {
    expect(() => combinedCarrierToNoiseDb([])).toThrow(RangeError);
    expectRefused(
      "combinedCarrierToNoiseDb",
      ({ carrierToNoiseDb }) => combinedCarrierToNoiseDb([20, carrierToNoiseDb]),
      { carrierToNoiseDb: 20 },
      { carrierToNoiseDb: [-401, 401] },
    );
  });
});
