import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Polarization } from "../../src/radio/polarization-efficiency.ts";
import { polarizationLossDb } from "../../src/radio/polarization-loss.ts";
import { worstPolarizationLossDb, worstWaveTiltDeg } from "../../src/radio/worst-polarization.ts";
import { expectRefusals } from "./refusals.ts";
import { SEEDED, within } from "./samples.ts";

const PURE = { isolationDb: 100, crossRatioDb: 100 };
const whip = (tiltDeg: number): Polarization => ({ tiltDeg, axisRatio: 0 });
const CIRCULAR: Polarization = { tiltDeg: 0, axisRatio: 1 };

const worst = (antennas: readonly Polarization[], limits = PURE): number =>
  worstPolarizationLossDb({ waveAxisRatio: 0, antennas, ...limits });

const anyAntenna: fc.Arbitrary<Polarization> = fc.record({
  tiltDeg: within({ min: -360, max: 360 }),
  axisRatio: within({ min: -1, max: 1 }),
});

describe("worstPolarizationLossDb", () => {
  it("is everything that the limits allow for one whip, and no less for a parallel pair", () => {
    const limits = { isolationDb: 20, crossRatioDb: 10 };
    // As in polarizationLossDb, by hand: (0.1 + 0.01) / (1 + 0.001).
    expect(worst([whip(0)], limits)).toBeCloseTo(9.59, 2);
    expect(worst([whip(0), whip(0)], limits)).toBe(worst([whip(0)], limits));
    expect(worst([whip(0), whip(180)], limits)).toBeCloseTo(worst([whip(0)], limits), 12);
  });

  // A wave farthest from both of two whips lies across the middle between them: sin² of half the angle.
  it.each([
    [90, 3.01],
    [60, 6.02],
    [45, 8.34],
    [30, 11.74],
    [120, 6.02],
  ])("is what half the angle leaves for a pair crossed at %s degrees", (angle, lossDb) => {
    expect(worst([whip(10), whip(10 + angle)])).toBeCloseTo(lossDb, 2);
  });

  it("is 3 dB for a circular antenna, however the whip is held", () => {
    expect(worst([CIRCULAR])).toBeCloseTo(3.01, 2);
  });

  it("is 1.25 dB for three whips at 60 degrees: none is more than 30 off", () => {
    // cos² of 30 degrees is 0.75.
    expect(worst([whip(0), whip(60), whip(120)])).toBeCloseTo(1.25, 2);
  });

  it("is never less than the loss at any tilt, and is reached", () => {
    fc.assert(
      fc.property(
        fc.array(anyAntenna, { minLength: 1, maxLength: 8 }),
        within({ min: -1, max: 1 }),
        within({ min: 0, max: 30 }),
        within({ min: 0, max: 30 }),
        (antennas, waveAxisRatio, isolationDb, crossRatioDb) => {
          const limits = { isolationDb, crossRatioDb };
          const claimed = worstPolarizationLossDb({ waveAxisRatio, antennas, ...limits });
          const best = (tiltDeg: number) =>
            Math.min(
              ...antennas.map((antenna) =>
                polarizationLossDb({
                  wave: { tiltDeg, axisRatio: waveAxisRatio },
                  antenna,
                  ...limits,
                }),
              ),
            );
          let found = 0;
          for (let tiltDeg = 0; tiltDeg < 180; tiltDeg += 0.25)
            found = Math.max(found, best(tiltDeg));
          expect(claimed).toBeGreaterThanOrEqual(found - 1e-9);
          // Between two steps of the search the loss changes by less than this: 30 dB deep at most.
          expect(claimed).toBeLessThanOrEqual(found + 0.4);
          expect(best(worstWaveTiltDeg({ waveAxisRatio, antennas }))).toBeCloseTo(claimed, 9);
        },
      ),
      SEEDED,
    );
  });

  it("does not get worse by one more antenna", () => {
    fc.assert(
      fc.property(
        fc.array(anyAntenna, { minLength: 1, maxLength: 7 }),
        anyAntenna,
        (some, more) => {
          expect(worst([...some, more])).toBeLessThanOrEqual(worst(some) + 1e-6);
        },
      ),
      SEEDED,
    );
  });

  it("refuses what lies outside its ranges", () => {
    const ranges = {
      waveAxisRatio: { min: -1, max: 1 },
      tiltDeg: { min: -360, max: 360 },
      axisRatio: { min: -1, max: 1 },
      isolationDb: { min: 0, max: 100 },
      crossRatioDb: { min: 0, max: 100 },
    };
    for (const [name, limits] of Object.entries(ranges)) {
      expectRefusals(
        (inputs) => {
          const all = { waveAxisRatio: 0, tiltDeg: 0, axisRatio: 0, ...PURE, ...inputs };
          const { tiltDeg, axisRatio, ...rest } = all;
          return worstPolarizationLossDb({ ...rest, antennas: [{ tiltDeg, axisRatio }] });
        },
        { [name]: limits },
      );
    }
  });

  it.each([0, 9])("refuses %s antennas", (count) => {
    const antennas = Array.from({ length: count }, () => CIRCULAR);
    const call = () => worstWaveTiltDeg({ waveAxisRatio: 0, antennas });
    expect(call).toThrow(RangeError);
    expect(call).toThrow(`antennaCount must be from 1 to 8, got ${count}`);
  });
});

describe("worstWaveTiltDeg", () => {
  it("is across a whip", () => {
    expect(worstWaveTiltDeg({ waveAxisRatio: 0, antennas: [whip(20)] })).toBeCloseTo(110, 9);
  });

  it("is midway between two crossed whips, on the wider side", () => {
    const tiltDeg = worstWaveTiltDeg({ waveAxisRatio: 0, antennas: [whip(0), whip(60)] });
    expect(tiltDeg).toBeCloseTo(120, 6);
  });

  it("lies from 0 up to 180 degrees", () => {
    fc.assert(
      fc.property(
        fc.array(anyAntenna, { minLength: 1, maxLength: 8 }),
        within({ min: -1, max: 1 }),
        (antennas, waveAxisRatio) => {
          const tiltDeg = worstWaveTiltDeg({ waveAxisRatio, antennas });
          expect(tiltDeg >= 0 && tiltDeg <= 180).toBe(true);
        },
      ),
      SEEDED,
    );
  });
});
