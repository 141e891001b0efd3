import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dopplerHz, speedForDopplerMPerS } from "../../src/radio/doppler.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const FREQUENCY = { min: 0.003, max: 3e6 };
const WALKS = { speedMPerS: { min: 0.01, max: 100 }, frequencyMhz: FREQUENCY };
const SHIFTS = { shiftHz: { min: 1e-6, max: 1e6 }, frequencyMhz: FREQUENCY };

describe("dopplerHz", () => {
  it("is one cycle for each wavelength walked", () => {
    // 1 m at 299.792458 MHz by the definition of the metre.
    expect(dopplerHz(1.5, 299.792458)).toBeCloseTo(1.5, 12);
  });

  it("is a finite shift over its whole range and refuses the rest", () => {
    const call = (inputs: { speedMPerS: number; frequencyMhz: number }) =>
      dopplerHz(inputs.speedMPerS, inputs.frequencyMhz);
    expectWithin(call, WALKS, { min: 1e-7, max: 1.1e6 });
    expectRefusals(call, WALKS);
  });
});

describe("speedForDopplerMPerS", () => {
  it("is the inverse of dopplerHz", () => {
    fc.assert(
      fc.property(
        anyOf({ speedMPerS: WALKS.speedMPerS, frequencyMhz: { min: 30, max: 10_000 } }),
        ({ speedMPerS, frequencyMhz }) => {
          const back = speedForDopplerMPerS(dopplerHz(speedMPerS, frequencyMhz), frequencyMhz);
          expect(back / speedMPerS).toBeCloseTo(1, 12);
        },
      ),
      SEEDED,
    );
  });

  it("is a finite speed over its whole range and refuses the rest", () => {
    const call = (inputs: { shiftHz: number; frequencyMhz: number }) =>
      speedForDopplerMPerS(inputs.shiftHz, inputs.frequencyMhz);
    expectWithin(call, SHIFTS, { min: 1e-12, max: 1e12 });
    expectRefusals(call, SHIFTS);
  });
});
