import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { twoPathPowerMw } from "../../src/radio/two-path-power.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  firstDbm: { min: -200, max: 100 },
  secondDbm: { min: -200, max: 100 },
  phaseDeg: { min: -36_000, max: 36_000 },
};

describe("twoPathPowerMw", () => {
  it("is the sum of both powers on average: 150 pW for -70 and -73 dBm", () => {
    // Rappaport, example 5.3, p. 190, second-hand.
    let sum = 0;
    for (let phaseDeg = 0; phaseDeg < 360; phaseDeg += 10)
      sum += twoPathPowerMw({ firstDbm: -70, secondDbm: -73, phaseDeg });
    expect(Math.abs(sum / 36 - 1.5e-7)).toBeLessThanOrEqual(0.005e-7);
  });

  it("is four times as much in phase and nothing in antiphase, for equal paths", () => {
    const equal = { firstDbm: 0, secondDbm: 0 };
    expect(twoPathPowerMw({ ...equal, phaseDeg: 0 })).toBeCloseTo(4, 12);
    expect(twoPathPowerMw({ ...equal, phaseDeg: 180 })).toBeCloseTo(0, 12);
    expect(twoPathPowerMw({ ...equal, phaseDeg: 90 })).toBeCloseTo(2, 12);
  });

  it("does not care which path is first, nor for whole turns", () => {
    fc.assert(
      fc.property(
        anyOf({
          firstDbm: { min: -120, max: 30 },
          secondDbm: { min: -120, max: 30 },
          phaseDeg: { min: -720, max: 720 },
        }),
        ({ firstDbm, secondDbm, phaseDeg }) => {
          const powerMw = twoPathPowerMw({ firstDbm, secondDbm, phaseDeg });
          const swapped = twoPathPowerMw({ firstDbm: secondDbm, secondDbm: firstDbm, phaseDeg });
          const turned = twoPathPowerMw({ firstDbm, secondDbm, phaseDeg: phaseDeg + 360 });
          const scale = 10 ** (Math.max(firstDbm, secondDbm) / 10);
          expect(swapped / scale).toBeCloseTo(powerMw / scale, 11);
          expect(turned / scale).toBeCloseTo(powerMw / scale, 11);
        },
      ),
      SEEDED,
    );
  });

  it("is 0 or more over its whole range and refuses the rest", () => {
    expectWithin(twoPathPowerMw, RANGES, { min: 0, max: 4.1e10 });
    expectRefusals(twoPathPowerMw, RANGES);
  });
});
