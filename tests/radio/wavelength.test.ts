import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { NEVER, SEEDED, within } from "./samples.ts";

describe("wavelengthM", () => {
  it("halves when the frequency doubles", () => {
    expect(wavelengthM(1100)).toBeCloseTo(wavelengthM(550) / 2, 12);
  });

  it("is a finite length above 0 for every frequency that it takes", () => {
    fc.assert(
      fc.property(within(FREQUENCY_LIMITS_MHZ), (frequencyMhz) => {
        const lengthM = wavelengthM(frequencyMhz);
        expect(Number.isFinite(lengthM) && lengthM > 0).toBe(true);
      }),
      SEEDED,
    );
  });

  it.each(NEVER)("refuses a frequency of %s MHz and says so", (bad) => {
    expect(() => wavelengthM(bad)).toThrow(RangeError);
    expect(() => wavelengthM(bad)).toThrow(`got ${bad}`);
    expect(() => wavelengthM(bad)).toThrow("wavelengthM: frequencyMhz");
  });
});
