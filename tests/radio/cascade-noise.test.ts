import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { attenuatorNoiseFigureDb } from "../../src/radio/attenuator-noise.ts";
import { cascadeNoiseFigureDb, type NoiseStage } from "../../src/radio/cascade-noise.ts";
import { noiseFactor } from "../../src/radio/noise-factor.ts";
import { NOISE_FIGURE_LIMITS_DB } from "../../src/radio/noise-limits.ts";
import { noiseFigureFromTemperatureDb } from "../../src/radio/noise-temperature.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const stage = fc.record({
  gainDb: within({ min: -300, max: 300 }),
  noiseFigureDb: within(NOISE_FIGURE_LIMITS_DB),
});
const chains = fc.array(stage, { minLength: 1, maxLength: 40 });

describe("cascadeNoiseFigureDb", () => {
  // D. K. Mishra, example 2.11 (p. 42), read second-hand: line of 2 dB at 300 K, amplifier of 15 dB and
  // 150 K. Printed: 2.4248 = 3.8468 dB with the line first, 1.5364 = 1.8650 dB with the amplifier first.
  const line = { gainDb: -2, noiseFigureDb: attenuatorNoiseFigureDb(2, 300) };
  const amplifier = { gainDb: 15, noiseFigureDb: noiseFigureFromTemperatureDb(150) };

  it("agrees with a printed line before an amplifier, and behind it", () => {
    expect(cascadeNoiseFigureDb([line, amplifier])).toBeCloseTo(3.8468, 4);
    expect(noiseFactor(cascadeNoiseFigureDb([line, amplifier]))).toBeCloseTo(2.4248, 4);
    expect(cascadeNoiseFigureDb([amplifier, line])).toBeCloseTo(1.865, 4);
    expect(noiseFactor(cascadeNoiseFigureDb([amplifier, line]))).toBeCloseTo(1.5364, 4);
  });

  it("adds a cable to the receiver in dB, not with its gain taken for 0.5", () => {
    // T. S. Rappaport, example B.6: a companion takes 0.5 for the gain of a 5 dB cable and prints 11 dB;
    // cable and 8 dB receiver make 13 dB.
    const receiver = { gainDb: 0, noiseFigureDb: 8 };
    expect(cascadeNoiseFigureDb([{ gainDb: -5, noiseFigureDb: 5 }, receiver])).toBeCloseTo(13, 9);
  });

  it("is that of the stage itself for one, and 0 for stages without noise", () => {
    expect(cascadeNoiseFigureDb([{ gainDb: 20, noiseFigureDb: 4 }])).toBeCloseTo(4, 12);
    const silent = { gainDb: -30, noiseFigureDb: 0 };
    expect(cascadeNoiseFigureDb([silent, silent])).toBe(0);
  });

  it("does not change when two stages are taken as one", () => {
    const modest = fc.record({
      gainDb: within({ min: -60, max: 60 }),
      noiseFigureDb: within({ min: 0, max: 60 }),
    });
    fc.assert(
      fc.property(modest, modest, modest, (a, b, c) => {
        const ab: NoiseStage = {
          gainDb: a.gainDb + b.gainDb,
          noiseFigureDb: cascadeNoiseFigureDb([a, b]),
        };
        expect(cascadeNoiseFigureDb([ab, c])).toBeCloseTo(cascadeNoiseFigureDb([a, b, c]), 8);
      }),
      SEEDED,
    );
  });

  it("is finite, and never below that of the first stage", () => {
    fc.assert(
      fc.property(chains, (stages) => {
        const figureDb = cascadeNoiseFigureDb(stages);
        expect(Number.isFinite(figureDb)).toBe(true);
        expect(figureDb).toBeGreaterThanOrEqual((stages[0]?.noiseFigureDb ?? 0) - 1e-9);
      }),
      SEEDED,
    );
  });

  it("stays finite for the longest line with the most loss", () => {
    const worst = { gainDb: -300, noiseFigureDb: 400 };
    expect(cascadeNoiseFigureDb(Array.from({ length: 40 }, () => worst))).toBeCloseTo(12_100, 6);
  });

  it("refuses no stage, too many, and a value that is none", () => {
    expect(() => cascadeNoiseFigureDb([])).toThrow("cascadeNoiseFigureDb: stageCount");
    const many = Array.from({ length: 41 }, () => ({ gainDb: 0, noiseFigureDb: 0 }));
    expect(() => cascadeNoiseFigureDb(many)).toThrow(RangeError);
    expectRefused(
      "cascadeNoiseFigureDb",
      (bad) => cascadeNoiseFigureDb([amplifier, bad]),
      { gainDb: 0, noiseFigureDb: 5 },
      { gainDb: [-301, 301], noiseFigureDb: [-0.1, 401] },
    );
  });
});
