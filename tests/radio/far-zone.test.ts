import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { farZoneStartM } from "../../src/radio/far-zone.ts";
import { ANTENNA_LENGTH_LIMITS_M, FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { NEVER, SEEDED, within } from "./samples.ts";

const GOOD = { frequencyMhz: 550, antennaLengthM: 0.5 };

describe("farZoneStartM", () => {
  it("goes with the square of the length of a long antenna", () => {
    const start = (antennaLengthM: number) => farZoneStartM({ frequencyMhz: 600, antennaLengthM });
    expect(start(4) / start(1)).toBeCloseTo(16, 9);
  });

  it("is one wavelength for a half-wave antenna and every shorter one", () => {
    // At 299.792458 MHz the wavelength is 1 m by the definition of the metre.
    for (const antennaLengthM of [0.5, 0.25, 0.01])
      expect(farZoneStartM({ frequencyMhz: 299.792458, antennaLengthM })).toBeCloseTo(1, 12);
  });

  it("is two wavelengths for an antenna of one", () => {
    expect(farZoneStartM({ frequencyMhz: 299.792458, antennaLengthM: 1 })).toBeCloseTo(2, 12);
  });

  it("is finite, and never nearer than one wavelength or one antenna length", () => {
    fc.assert(
      fc.property(
        within(FREQUENCY_LIMITS_MHZ),
        within(ANTENNA_LENGTH_LIMITS_M),
        (frequencyMhz, antennaLengthM) => {
          const startM = farZoneStartM({ frequencyMhz, antennaLengthM });
          expect(Number.isFinite(startM)).toBe(true);
          expect(startM).toBeGreaterThanOrEqual(wavelengthM(frequencyMhz));
          expect(startM).toBeGreaterThanOrEqual(antennaLengthM);
        },
      ),
      SEEDED,
    );
  });

  it.each(NEVER)("refuses an antenna of %s m and says so", (antennaLengthM) => {
    const call = () => farZoneStartM({ ...GOOD, antennaLengthM });
    expect(call).toThrow(RangeError);
    expect(call).toThrow("farZoneStartM: antennaLengthM");
    expect(call).toThrow(`got ${antennaLengthM}`);
  });

  it.each(NEVER)("refuses a frequency of %s MHz", (frequencyMhz) => {
    expect(() => farZoneStartM({ ...GOOD, frequencyMhz })).toThrow(RangeError);
  });
});
