import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { distanceOutcome } from "../../../src/calculators/distance/outcome.ts";
import { type DistanceCurve, distanceCurve } from "../../../src/calculators/distance/picture.ts";
import { SEEDED } from "../../radio/samples.ts";
import { anyInputs, INITIAL } from "./samples.ts";

function curve(inputs: Partial<typeof INITIAL> = {}, pointCount = 25): DistanceCurve {
  const drawn = distanceCurve({ ...INITIAL, ...inputs }, pointCount);
  if (drawn === null) throw new Error("nothing drawn");
  return drawn;
}

describe("distanceCurve", () => {
  it("marks the old place at 0 dB and the new one at its change", () => {
    const { from, to } = curve({ fromM: 30, toM: 15, exponent: 2 });
    expect(from).toEqual({ distanceM: 30, changeDb: 0 });
    expect(to).toEqual({ distanceM: 15, changeDb: expect.closeTo(6.02, 2) });
  });

  it("reaches from half the nearer distance to twice the farther one", () => {
    const { points } = curve({ fromM: 30, toM: 15 });
    expect(points).toHaveLength(25);
    expect(points[0]?.distanceM).toBeCloseTo(7.5, 9);
    expect(points.at(-1)?.distanceM).toBeCloseTo(60, 9);
  });

  it("falls by the same amount from point to point", () => {
    // From 7.5 to 60 m in three ratios of 2: 6.02 dB each.
    const { points } = curve({ fromM: 30, toM: 15, exponent: 2 }, 4);
    expect(points.map(({ changeDb }) => Number(changeDb.toFixed(2)))).toEqual([
      12.04, 6.02, 0, -6.02,
    ]);
  });

  it("never enters the near zone", () => {
    // The wavelength is 1 m at this frequency.
    const { points } = curve({ fromM: 1.5, toM: 3, frequencyMhz: 299.792458 });
    expect(points[0]?.distanceM).toBeCloseTo(1, 9);
  });

  it("draws nothing where there is no answer, and always where there is one", () => {
    fc.assert(
      fc.property(anyInputs, (inputs) => {
        const drawn = distanceCurve(inputs, 9);
        expect(drawn === null).toBe(distanceOutcome(inputs).kind === "no-answer");
      }),
      SEEDED,
    );
  });

  it("rises in distance, falls in level, holds both marks and stays finite", () => {
    let drawnCount = 0;
    fc.assert(
      fc.property(anyInputs, (inputs) => {
        const drawn = distanceCurve(inputs, 9);
        if (drawn === null) return;
        drawnCount += 1;
        for (const { distanceM, changeDb } of drawn.points)
          expect(Number.isFinite(distanceM) && Number.isFinite(changeDb)).toBe(true);
        drawn.points.slice(1).forEach((point, index) => {
          expect(point.distanceM).toBeGreaterThan(drawn.points[index]?.distanceM ?? Number.NaN);
          expect(point.changeDb).toBeLessThan(drawn.points[index]?.changeDb ?? Number.NaN);
        });
        for (const mark of [drawn.from, drawn.to]) {
          expect(mark.distanceM).toBeGreaterThanOrEqual((drawn.points[0]?.distanceM ?? 0) - 1e-9);
          expect(mark.distanceM).toBeLessThan(drawn.points.at(-1)?.distanceM ?? 0);
        }
      }),
      SEEDED,
    );
    expect(drawnCount).toBeGreaterThan(50);
  });

  it.each([1, 0, -1, 2.5, 1001, Number.NaN])("refuses %s points", (pointCount) => {
    expect(() => distanceCurve(INITIAL, pointCount)).toThrow(RangeError);
    expect(() => distanceCurve(INITIAL, pointCount)).toThrow(`got ${pointCount}`);
  });
});
