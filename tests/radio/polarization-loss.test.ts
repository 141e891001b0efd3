import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { polarizationLossDb } from "../../src/radio/polarization-loss.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  waveTiltDeg: { min: -360, max: 360 },
  waveAxisRatio: { min: -1, max: 1 },
  antennaTiltDeg: { min: -360, max: 360 },
  antennaAxisRatio: { min: -1, max: 1 },
  isolationDb: { min: 0, max: 100 },
  crossRatioDb: { min: 0, max: 100 },
};
type Inputs = Readonly<Record<keyof typeof RANGES, number>>;

const loss = (inputs: Inputs): number =>
  polarizationLossDb({
    wave: { tiltDeg: inputs.waveTiltDeg, axisRatio: inputs.waveAxisRatio },
    antenna: { tiltDeg: inputs.antennaTiltDeg, axisRatio: inputs.antennaAxisRatio },
    isolationDb: inputs.isolationDb,
    crossRatioDb: inputs.crossRatioDb,
  });

const turned = (tiltDeg: number, isolationDb: number, crossRatioDb: number): number =>
  loss({
    waveTiltDeg: tiltDeg,
    waveAxisRatio: 0,
    antennaTiltDeg: 0,
    antennaAxisRatio: 0,
    isolationDb,
    crossRatioDb,
  });

const ratio = (db: number): number => 10 ** (-db / 20);

describe("polarizationLossDb", () => {
  // Cross-polar ratios, mean: 3GPP TR 38.901, Table 7.5-6, second-hand.
  it.each([
    ["indoor office in sight", 11],
    ["indoor office out of sight", 10],
    ["factory in sight", 12],
    ["outdoor to indoor", 9],
    ["rural out of sight", 7],
  ])("is the cross-polar ratio for crossed pure antennas: %s", (_place, crossRatioDb) => {
    expect(turned(90, 100, crossRatioDb)).toBeCloseTo(crossRatioDb, 6);
  });

  it("is the isolation of the antenna for crossed antennas where nothing scatters", () => {
    expect(turned(90, 25, 100)).toBeCloseTo(25, 6);
  });

  it("is smaller with both limits than with either, and only little so if one is weak", () => {
    // Powers of 1/10 and 1/100 beside each other: (0.1 + 0.01) / (1 + 0.001), 9.59 dB, by hand.
    expect(turned(90, 20, 10)).toBeCloseTo(9.59, 2);
  });

  it("is nothing where antenna or surroundings mix both polarizations fully", () => {
    expect(turned(90, 0, 40)).toBeCloseTo(0, 12);
    expect(turned(90, 40, 0)).toBeCloseTo(0, 12);
  });

  it("is plainly 0, not minus 0, for a full match", () => {
    expect(turned(0, 20, 10)).toBe(0);
  });

  it("is the mean over all phases of the turned and the wrongly taken parts", () => {
    // Sent along x; the surroundings add a part along y, the antenna takes a part along y; the phases
    // of both are gone through evenly. Against the same with a matched antenna.
    const meanPower = (tiltDeg: number, isolationDb: number, crossRatioDb: number): number => {
      const tilt = (tiltDeg * Math.PI) / 180;
      const [own, other] = [Math.cos(tilt), Math.sin(tilt)];
      const [s, a] = [ratio(crossRatioDb), ratio(isolationDb)];
      let sum = 0;
      for (let n = 0; n < 12; n += 1) {
        for (let m = 0; m < 12; m += 1) {
          const p = (2 * Math.PI * n) / 12;
          const q = (2 * Math.PI * m) / 12;
          // (1, s·e^(ip)) on (own − a·e^(iq)·other, other + a·e^(iq)·own), conjugated where it belongs.
          const re =
            own - a * Math.cos(q) * other + s * (other * Math.cos(p) + a * own * Math.cos(p - q));
          const im =
            a * Math.sin(q) * other + s * (other * Math.sin(p) + a * own * Math.sin(p - q));
          sum += re ** 2 + im ** 2;
        }
      }
      return sum;
    };
    fc.assert(
      fc.property(
        anyOf({
          tiltDeg: { min: 0, max: 90 },
          isolationDb: { min: 0, max: 40 },
          crossRatioDb: { min: 0, max: 40 },
        }),
        ({ tiltDeg, isolationDb, crossRatioDb }) => {
          const share =
            meanPower(tiltDeg, isolationDb, crossRatioDb) / meanPower(0, isolationDb, crossRatioDb);
          expect(turned(tiltDeg, isolationDb, crossRatioDb)).toBeCloseTo(
            -10 * Math.log10(share),
            9,
          );
        },
      ),
      SEEDED,
    );
  });

  it("grows with the turn, the isolation and the cross-polar ratio", () => {
    fc.assert(
      fc.property(
        anyOf({
          tiltDeg: { min: 0, max: 80 },
          isolationDb: { min: 0, max: 90 },
          crossRatioDb: { min: 0, max: 90 },
        }),
        ({ tiltDeg, isolationDb, crossRatioDb }) => {
          const here = turned(tiltDeg, isolationDb, crossRatioDb) - 1e-12;
          expect(turned(tiltDeg + 10, isolationDb, crossRatioDb)).toBeGreaterThan(here);
          expect(turned(tiltDeg, isolationDb + 10, crossRatioDb)).toBeGreaterThan(here);
          expect(turned(tiltDeg, isolationDb, crossRatioDb + 10)).toBeGreaterThan(here);
        },
      ),
      SEEDED,
    );
  });

  // Axial ratios in decibels, same sense: worst and best loss over all turns. Computed independently
  // with numpy from Jones vectors; rounded to hundredths, which is too coarse for rows.
  it.each([
    [1, 1, 0.06, 0],
    [3, 1, 0.23, 0.05],
    [3, 3, 0.51, 0],
    [6, 3, 1.09, 0.1],
    [6, 6, 1.93, 0],
  ])("between axial ratios of %s and %s dB is %s at worst, %s at best", (one, two, worst, best) => {
    const at = (tiltDeg: number) =>
      loss({
        waveTiltDeg: tiltDeg,
        waveAxisRatio: ratio(one),
        antennaTiltDeg: 0,
        antennaAxisRatio: ratio(two),
        isolationDb: 100,
        crossRatioDb: 100,
      });
    expect(Math.abs(at(90) - worst)).toBeLessThanOrEqual(0.005);
    expect(Math.abs(at(0) - best)).toBeLessThanOrEqual(0.005);
  });

  it("lies between 0 and 97 dB over its whole range and refuses the rest", () => {
    expectWithin(loss, RANGES, { min: 0, max: 97 });
    expectRefusals(loss, RANGES);
  });
});
