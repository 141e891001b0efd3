import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { freeSpaceLossDb } from "../../src/radio/free-space-loss.ts";
import { DISTANCE_LIMITS_M, FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { NEVER, SEEDED, within } from "./samples.ts";

/** 20·log10 2, from any table of logarithms: log10 2 = 0.30103. */
const TWICE_DB = 6.0206;

describe("freeSpaceLossDb", () => {
  it("adds 6.02 dB each time the distance doubles", () => {
    expect(freeSpaceLossDb(40, 600) - freeSpaceLossDb(20, 600)).toBeCloseTo(TWICE_DB, 4);
  });

  it("adds 6.02 dB each time the frequency doubles", () => {
    expect(freeSpaceLossDb(20, 1200) - freeSpaceLossDb(20, 600)).toBeCloseTo(TWICE_DB, 4);
  });

  it("is 21.98 dB at one wavelength whatever the frequency", () => {
    // 20·log10(4π) worked by hand: 4π = 12.566, log10 of it 1.09921.
    for (const frequencyMhz of [30, 550, 5800])
      expect(freeSpaceLossDb(wavelengthM(frequencyMhz), frequencyMhz)).toBeCloseTo(21.984, 3);
  });

  it("is finite and never a gain wherever it answers, and refuses the rest", () => {
    let answers = 0;
    fc.assert(
      fc.property(
        within(DISTANCE_LIMITS_M),
        within(FREQUENCY_LIMITS_MHZ),
        (distanceM, frequencyMhz) => {
          // λ/4π: 0.0796 of a wavelength; below it the formula would give a gain.
          if (distanceM < 0.0795 * wavelengthM(frequencyMhz)) {
            expect(() => freeSpaceLossDb(distanceM, frequencyMhz)).toThrow(RangeError);
          } else if (distanceM > 0.0796 * wavelengthM(frequencyMhz)) {
            const lossDb = freeSpaceLossDb(distanceM, frequencyMhz);
            expect(Number.isFinite(lossDb) && lossDb >= 0).toBe(true);
            answers += 1;
          }
        },
      ),
      SEEDED,
    );
    expect(answers).toBeGreaterThan(50);
  });

  it.each(NEVER)("refuses a distance of %s m and says so", (bad) => {
    expect(() => freeSpaceLossDb(bad, 600)).toThrow(RangeError);
    expect(() => freeSpaceLossDb(bad, 600)).toThrow("freeSpaceLossDb: distanceM");
    expect(() => freeSpaceLossDb(bad, 600)).toThrow(`got ${bad}`);
  });

  it.each(NEVER)("refuses a frequency of %s MHz", (bad) => {
    expect(() => freeSpaceLossDb(30, bad)).toThrow(RangeError);
  });

  it("refuses a distance so short that the formula would turn into a gain", () => {
    expect(() => freeSpaceLossDb(0.04, 550)).toThrow(RangeError);
  });
});
