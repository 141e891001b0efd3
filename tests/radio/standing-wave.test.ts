import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { nullIntervalS, standingWavePeriodM } from "../../src/radio/standing-wave.ts";
import { twoPathPowerMw } from "../../src/radio/two-path-power.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const FREQUENCY = { min: 0.003, max: 3e6 };
const PLACES = { frequencyMhz: FREQUENCY };
const WALKS = { speedMPerS: { min: 0.01, max: 100 }, frequencyMhz: FREQUENCY };

describe("standingWavePeriodM", () => {
  it("is how far apart two waves against each other cancel", () => {
    // A wave and its reflection: over a way s the one falls back by 2π·s/λ, the other gains as much.
    const frequencyMhz = 550;
    const atWay = (wayM: number) =>
      twoPathPowerMw({
        firstDbm: -50,
        secondDbm: -50,
        phaseDeg: 180 + (2 * 360 * wayM) / wavelengthM(frequencyMhz),
      });
    const periodM = standingWavePeriodM(frequencyMhz);
    expect(atWay(0)).toBeCloseTo(0, 15);
    expect(atWay(periodM)).toBeCloseTo(0, 15);
    // Twice the amplitude halfway, four times the power: 4·10⁻⁵ mW.
    expect(atWay(periodM / 2) / 4e-5).toBeCloseTo(1, 9);
  });

  it("is a finite length over its whole range and refuses the rest", () => {
    const call = (inputs: { frequencyMhz: number }) => standingWavePeriodM(inputs.frequencyMhz);
    expectWithin(call, PLACES, { min: 4e-5, max: 6e4 });
    expectRefusals(call, PLACES);
  });
});

describe("nullIntervalS", () => {
  const call = (inputs: { speedMPerS: number; frequencyMhz: number }) =>
    nullIntervalS(inputs.speedMPerS, inputs.frequencyMhz);

  it("times the speed is the period", () => {
    fc.assert(
      fc.property(anyOf(WALKS), (walk) => {
        const wayM = call(walk) * walk.speedMPerS;
        expect(wayM / standingWavePeriodM(walk.frequencyMhz)).toBeCloseTo(1, 12);
      }),
      SEEDED,
    );
  });

  it("is a finite time over its whole range and refuses the rest", () => {
    expectWithin(call, WALKS, { min: 1e-7, max: 1e7 });
    expectRefusals(call, WALKS);
  });
});
