import { besselj } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { carsonBandwidthHz, carsonDeviationHz } from "../../src/radio/carson-bandwidth.ts";
import { fmDetectionGainDb } from "../../src/radio/fm-detection-gain.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const deviations = within({ min: 0, max: 1e9 });
const audio = within({ min: 1, max: 1e9 });

describe("carsonBandwidthHz", () => {
  it("is twice the audio frequency without deviation", () => {
    expect(carsonBandwidthHz(0, 15_000)).toBe(30_000);
  });

  it.each([1, 2, 3, 5, 10])("holds 98 %% of the power of a tone at index %s", (index) => {
    // Line n of a sine-modulated carrier has the power Jn(β)², at n times the audio frequency.
    const bandwidthHz = carsonBandwidthHz(index * 1000, 1000);
    const lines = Math.floor(bandwidthHz / 2 / 1000);
    let inside = besselj(index, 0) ** 2;
    for (let n = 1; n <= lines; n += 1) inside += 2 * besselj(index, n) ** 2;
    expect(inside).toBeGreaterThan(0.98);
    expect(inside).toBeLessThan(1);
  });

  it("is undone by carsonDeviationHz, and finite", () => {
    fc.assert(
      fc.property(deviations, audio, (deviationHz, audioHz) => {
        const bandwidthHz = carsonBandwidthHz(deviationHz, audioHz);
        expect(Number.isFinite(bandwidthHz)).toBe(true);
        expect(carsonDeviationHz(bandwidthHz, audioHz)).toBeCloseTo(deviationHz, 5);
      }),
      SEEDED,
    );
  });

  it("and its inverse refuse what is out of range", () => {
    expectRefused(
      "carsonBandwidthHz",
      ({ deviationHz, audioHz }) => carsonBandwidthHz(deviationHz, audioHz),
      { deviationHz: 50_000, audioHz: 15_000 },
      { deviationHz: [-1, 1.1e9], audioHz: [0, -1, 1.1e9] },
    );
    expectRefused(
      "carsonDeviationHz",
      ({ bandwidthHz, audioHz }) => carsonDeviationHz(bandwidthHz, audioHz),
      { bandwidthHz: 200_000, audioHz: 15_000 },
      { bandwidthHz: [29_999, 4.1e9], audioHz: [0, -1, 1.1e9] },
    );
  });
});

describe("fmDetectionGainDb", () => {
  it("is 6.2 dB better at index 5 than at index 3", () => {
    // T. S. Rappaport, Wireless Communications, example 6.5, read second-hand: printed as 6.2 dB.
    expect(Math.abs(fmDetectionGainDb(5) - fmDetectionGainDb(3) - 6.2)).toBeLessThan(0.05);
  });

  it("is 7.8 dB at index 1", () => {
    // 3·1·2 = 6, 7.78 dB, worked by hand.
    expect(fmDetectionGainDb(1)).toBeCloseTo(7.7815, 4);
  });

  it("grows with the index and is finite for all that it takes", () => {
    const indices = within({ min: 0.001, max: 1e6 });
    fc.assert(
      fc.property(indices, indices, (a, b) => {
        expect(Number.isFinite(fmDetectionGainDb(a))).toBe(true);
        const rising = [a, b].sort((x, y) => x - y).map(fmDetectionGainDb);
        expect(rising[1]).toBeGreaterThanOrEqual(rising[0] ?? Number.NaN);
      }),
      SEEDED,
    );
  });

  it("refuses an index that is none", () => {
    expectRefused(
      "fmDetectionGainDb",
      ({ modulationIndexRatio }) => fmDetectionGainDb(modulationIndexRatio),
      { modulationIndexRatio: 3 },
      { modulationIndexRatio: [0, -1, 1e7] },
    );
  });
});
