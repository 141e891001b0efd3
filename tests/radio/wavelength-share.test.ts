import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { frequencyForShareMhz, waveShareM } from "../../src/radio/wavelength-share.ts";
import { SEEDED, within } from "./samples.ts";
import { expectFinite, expectRefusals } from "./whole-range.ts";

const LIMITS = { share: { min: 0.001, max: 1000 }, velocityFactor: { min: 0.01, max: 1 } };
const GOOD = { frequencyMhz: 550, share: 0.25, velocityFactor: 0.66 };
const LENGTH = { lengthM: { min: 1e-9, max: 1e9 } };
const GOOD_LENGTH = { lengthM: 0.1, share: 0.25, velocityFactor: 0.66 };

describe("waveShareM", () => {
  it("is one metre for a whole wave at the frequency that the metre is defined by", () => {
    // SI Brochure: light goes 299 792 458 m in a second.
    const wave = { frequencyMhz: 299.792458, share: 1, velocityFactor: 1 };
    expect(waveShareM(wave)).toBeCloseTo(1, 12);
    expect(waveShareM({ ...wave, share: 0.5 })).toBeCloseTo(0.5, 12);
    expect(waveShareM({ ...wave, velocityFactor: 0.66 })).toBeCloseTo(0.66, 12);
  });

  it("shrinks with the velocity, never below the share of it", () => {
    fc.assert(
      fc.property(within({ min: 0.01, max: 1 }), (velocityFactor) => {
        const open = waveShareM({ ...GOOD, velocityFactor: 1 });
        expect(waveShareM({ ...GOOD, velocityFactor }) / open).toBeCloseTo(velocityFactor, 12);
      }),
      SEEDED,
    );
  });

  it("is finite all over its range, and refuses the rest", () => {
    expectFinite({ ...LIMITS, frequencyMhz: FREQUENCY_LIMITS_MHZ }, waveShareM);
    expectRefusals("waveShareM", LIMITS, GOOD, (it) => waveShareM({ ...GOOD, ...it }));
    const frequency = { frequencyMhz: FREQUENCY_LIMITS_MHZ };
    expectRefusals("wavelengthM", frequency, GOOD, (it) => waveShareM({ ...GOOD, ...it }));
  });
});

describe("frequencyForShareMhz", () => {
  it("is the inverse of waveShareM", () => {
    const frequencies = within({ min: 0.1, max: 10_000 });
    fc.assert(
      fc.property(frequencies, within({ min: 0.01, max: 100 }), (frequencyMhz, share) => {
        const lengthM = waveShareM({ frequencyMhz, share, velocityFactor: 0.8 });
        const back = frequencyForShareMhz({ lengthM, share, velocityFactor: 0.8 });
        expect(back / frequencyMhz).toBeCloseTo(1, 12);
      }),
      SEEDED,
    );
  });

  it("is finite all over its range, and refuses the rest", () => {
    expectFinite({ ...LIMITS, ...LENGTH }, frequencyForShareMhz);
    const limits = { ...LIMITS, ...LENGTH };
    expectRefusals("frequencyForShareMhz", limits, GOOD_LENGTH, frequencyForShareMhz);
  });
});
