import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { attenuatorNoiseFigureDb } from "../../src/radio/attenuator-noise.ts";
import { LOSS_LIMITS_DB } from "../../src/radio/level-limits.ts";
import { noiseFactor, noiseFigureDb } from "../../src/radio/noise-factor.ts";
import { NOISE_FIGURE_LIMITS_DB, TEMPERATURE_LIMITS_K } from "../../src/radio/noise-limits.ts";
import {
  noiseFigureFromTemperatureDb,
  noiseTemperatureK,
} from "../../src/radio/noise-temperature.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const figures = within(NOISE_FIGURE_LIMITS_DB);

describe("noise figure, factor and temperature", () => {
  it("of a stage without noise are 0 dB, 1 and 0 K", () => {
    expect(noiseFactor(0)).toBe(1);
    expect(noiseFigureDb(1)).toBe(0);
    expect(noiseTemperatureK(0)).toBe(0);
    expect(noiseFigureFromTemperatureDb(0)).toBe(0);
  });

  it("of a stage that adds as much as comes in are 3.01 dB, 2 and 290 K", () => {
    // By definition of the noise figure; 10·log10 2 = 3.0103.
    expect(noiseFigureDb(2)).toBeCloseTo(3.0103, 4);
    expect(noiseFigureFromTemperatureDb(290)).toBeCloseTo(3.0103, 4);
    expect(noiseTemperatureK(noiseFigureDb(2))).toBeCloseTo(290, 9);
  });

  it("lead back to where they came from", () => {
    fc.assert(
      fc.property(figures, (figureDb) => {
        expect(noiseFigureDb(noiseFactor(figureDb))).toBeCloseTo(figureDb, 9);
        const temperatureK = noiseTemperatureK(figureDb);
        expect(noiseFigureFromTemperatureDb(temperatureK)).toBeCloseTo(figureDb, 9);
        expect(noiseFactor(figureDb)).toBeGreaterThanOrEqual(1);
        expect(Number.isFinite(temperatureK) && temperatureK >= 0).toBe(true);
      }),
      SEEDED,
    );
  });

  it("keep the digits of a very quiet stage", () => {
    // 0.001 dB: 290·ln(10)/10·0.001 = 0.066775 K to first order, 0.066783 K with the second.
    expect(noiseTemperatureK(0.001)).toBeCloseTo(0.066783, 6);
  });

  it.each([
    ["noiseFactor", "noiseFigureDb", noiseFactor, 4, [-0.1, 401]],
    ["noiseFigureDb", "factor", noiseFigureDb, 2, [0, 0.99, 1e41]],
    ["noiseTemperatureK", "noiseFigureDb", noiseTemperatureK, 4, [-0.1, 401]],
    ["noiseFigureFromTemperatureDb", "temperatureK", noiseFigureFromTemperatureDb, 1, [-1, 1e44]],
  ] as const)("%s refuses what is no %s", (functionName, name, call, good, outside) => {
    expectRefused(
      functionName,
      (inputs) => call(inputs[name] ?? 0),
      { [name]: good },
      {
        [name]: outside,
      },
    );
  });
});

describe("attenuatorNoiseFigureDb", () => {
  it("equals the loss at 290 K, as for any cable at room temperature", () => {
    // T. S. Rappaport, example B.2 (p. 613), second-hand: a cable of 3 dB counts 3 dB.
    expect(attenuatorNoiseFigureDb(3, 290)).toBeCloseTo(3, 9);
    fc.assert(
      fc.property(within(LOSS_LIMITS_DB), (lossDb) => {
        expect(attenuatorNoiseFigureDb(lossDb, 290)).toBeCloseTo(lossDb, 8);
      }),
      SEEDED,
    );
  });

  it("gives the noise temperature (L − 1)·T for a lossy line at T", () => {
    // D. K. Mishra, example 2.11 (p. 42), second-hand: 2 dB at 300 K. L = 10^0.2 = 1.5848932, so 175.468 K.
    expect(noiseTemperatureK(attenuatorNoiseFigureDb(2, 300))).toBeCloseTo(175.468, 3);
  });

  it("adds nothing without loss, less when cold and more when hot", () => {
    expect(attenuatorNoiseFigureDb(0, 500)).toBe(0);
    expect(attenuatorNoiseFigureDb(6, 77)).toBeLessThan(6);
    expect(attenuatorNoiseFigureDb(6, 320)).toBeGreaterThan(6);
  });

  it("is finite and 0 or more for everything that it takes", () => {
    fc.assert(
      fc.property(within(LOSS_LIMITS_DB), within(TEMPERATURE_LIMITS_K), (lossDb, temperatureK) => {
        const figureDb = attenuatorNoiseFigureDb(lossDb, temperatureK);
        expect(Number.isFinite(figureDb) && figureDb >= 0).toBe(true);
      }),
      SEEDED,
    );
  });

  it("refuses a gain and a temperature of 0", () => {
    expectRefused(
      "attenuatorNoiseFigureDb",
      ({ lossDb, temperatureK }) => attenuatorNoiseFigureDb(lossDb, temperatureK),
      { lossDb: 3, temperatureK: 290 },
      { lossDb: [-0.1, 301], temperatureK: [0, -1, 1e7] },
    );
  });
});
