import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { noiseFloorDbm } from "../../src/radio/noise-floor.ts";
import {
  BANDWIDTH_LIMITS_HZ,
  NOISE_FIGURE_LIMITS_DB,
  TEMPERATURE_LIMITS_K,
} from "../../src/radio/noise-limits.ts";
import { thermalNoiseDbm } from "../../src/radio/thermal-noise.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const temperatures = within(TEMPERATURE_LIMITS_K);
const bandwidths = within(BANDWIDTH_LIMITS_HZ);

describe("thermalNoiseDbm", () => {
  it("grows by 10 dB with ten times the bandwidth or ten times the temperature", () => {
    expect(thermalNoiseDbm(290, 2e6) - thermalNoiseDbm(290, 2e5)).toBeCloseTo(10, 9);
    expect(thermalNoiseDbm(2900, 2e5) - thermalNoiseDbm(290, 2e5)).toBeCloseTo(10, 9);
  });

  it("is finite for everything that it takes", () => {
    fc.assert(
      fc.property(temperatures, bandwidths, (temperatureK, bandwidthHz) => {
        expect(Number.isFinite(thermalNoiseDbm(temperatureK, bandwidthHz))).toBe(true);
      }),
      SEEDED,
    );
  });

  it("refuses what is no temperature or bandwidth, and says which", () => {
    expectRefused(
      "thermalNoiseDbm",
      ({ temperatureK, bandwidthHz }) => thermalNoiseDbm(temperatureK, bandwidthHz),
      { temperatureK: 290, bandwidthHz: 2e5 },
      { temperatureK: [0, -1, 1e7], bandwidthHz: [0, -1, 1e13] },
    );
  });
});

describe("noiseFloorDbm", () => {
  it("lies above the thermal noise at 290 K by the noise figure", () => {
    fc.assert(
      fc.property(bandwidths, within(NOISE_FIGURE_LIMITS_DB), (bandwidthHz, noiseFigureDb) => {
        const floorDbm = noiseFloorDbm(bandwidthHz, noiseFigureDb);
        expect(floorDbm - thermalNoiseDbm(290, bandwidthHz)).toBeCloseTo(noiseFigureDb, 9);
      }),
      SEEDED,
    );
  });

  it("refuses a noise figure below 0 and says so", () => {
    expectRefused(
      "noiseFloorDbm",
      ({ noiseFigureDb }) => noiseFloorDbm(2e5, noiseFigureDb),
      { noiseFigureDb: 4 },
      { noiseFigureDb: [-0.1, 401] },
    );
    expect(() => noiseFloorDbm(0, 4)).toThrow(RangeError);
  });
});
