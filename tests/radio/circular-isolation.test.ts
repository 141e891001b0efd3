import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { circularIsolationDb } from "../../src/radio/circular-isolation.ts";
import { polarizationEfficiencyRatio } from "../../src/radio/polarization-efficiency.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = { axialRatioDb: { min: 0.001, max: 100 } };

describe("circularIsolationDb", () => {
  it("is its own inverse", () => {
    fc.assert(
      fc.property(anyOf({ axialRatioDb: { min: 0.01, max: 60 } }), ({ axialRatioDb }) => {
        const back = circularIsolationDb(circularIsolationDb(axialRatioDb));
        expect(back / axialRatioDb).toBeCloseTo(1, 8);
      }),
      SEEDED,
    );
  });

  it("is what an elliptical antenna takes of the right over the wrong circular wave", () => {
    fc.assert(
      fc.property(anyOf({ axialRatioDb: { min: 0.1, max: 40 } }), ({ axialRatioDb }) => {
        const antenna = { tiltDeg: 0, axisRatio: 10 ** (-axialRatioDb / 20) };
        const taken = (axisRatio: number) =>
          polarizationEfficiencyRatio({ tiltDeg: 0, axisRatio }, antenna);
        const isolationDb = 10 * Math.log10(taken(1) / taken(-1));
        expect(circularIsolationDb(axialRatioDb)).toBeCloseTo(isolationDb, 8);
      }),
      SEEDED,
    );
  });

  it("falls as the ellipse grows longer, stays above 0 and refuses what lies outside its range", () => {
    expect(circularIsolationDb(3)).toBeLessThan(circularIsolationDb(1));
    expectWithin(({ axialRatioDb }) => circularIsolationDb(axialRatioDb), RANGES, {
      min: 1e-5,
      max: 85,
    });
    expectRefusals(({ axialRatioDb }) => circularIsolationDb(axialRatioDb), RANGES);
  });
});
