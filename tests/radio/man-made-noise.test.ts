import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { MAN_MADE_NOISE_LIMITS_MHZ, manMadeNoise } from "../../src/radio/man-made-noise.ts";
import { ANTENNA_NOISE_LIMITS_DB, systemNoiseFigureDb } from "../../src/radio/system-noise.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const KINDS = ["city", "residential", "rural", "quiet-rural"] as const;

describe("manMadeNoise", () => {
  // Rec. ITU-R P.372, Table 1 (second-hand), worked out independently with numpy.
  it.each([
    ["city", 100, 21.4],
    ["residential", 100, 17.1],
    ["rural", 100, 11.8],
    ["city", 250, 10.4],
    ["residential", 250, 6.1],
    ["rural", 250, 0.8],
    // c − d·log10 f is c itself at 1 MHz, and c − d at 10 MHz: read off the table.
    ["quiet-rural", 1, 53.6],
    ["quiet-rural", 10, 25],
  ] as const)("has the median of the table in %s surroundings at %s MHz", (kind, mhz, expected) => {
    expect(Math.abs(manMadeNoise(kind, mhz).medianLowDb - expected)).toBeLessThanOrEqual(0.051);
  });

  // The same at 500 and 600 MHz: the table's formula outside its range, and the form to 900 MHz of P.372-8.
  it.each([
    [500, 2.0, 11.1],
    [600, -0.2, 10.1],
  ])("gives both forms for a city at %s MHz, and says that one is stretched", (mhz, low, high) => {
    const noise = manMadeNoise("city", mhz);
    expect(Math.abs(noise.medianLowDb - low)).toBeLessThanOrEqual(0.051);
    expect(Math.abs(noise.medianHighDb - high)).toBeLessThanOrEqual(0.051);
    expect(noise.isPastTable).toBe(true);
  });

  it("has one median below the frequency where the forms part, and stretches nothing in the table", () => {
    const noise = manMadeNoise("city", 120);
    expect(noise.medianHighDb).toBe(noise.medianLowDb);
    expect(noise.isPastTable).toBe(false);
    expect(manMadeNoise("city", 200).medianHighDb).toBeGreaterThan(13.1);
    expect(manMadeNoise("city", 250).isPastTable).toBe(false);
  });

  it.each([
    // Deciles of Table 2 (P.372-10), read second-hand in the code of ITU-R Study Group 3.
    ["city", 6.7, 11],
    ["residential", 5.3, 10.6],
    ["rural", 4.6, 9.2],
  ] as const)("spreads by the deciles of %s surroundings", (kind, lower, upper) => {
    const noise = manMadeNoise(kind, 100);
    expect(noise.medianLowDb - noise.lowestDb).toBeCloseTo(lower, 9);
    expect(noise.highestDb - noise.medianHighDb).toBeCloseTo(upper, 9);
  });

  it.each(KINDS)("is finite, ordered and falls with frequency in %s surroundings", (kind) => {
    const frequencies = within(MAN_MADE_NOISE_LIMITS_MHZ[kind]);
    fc.assert(
      fc.property(frequencies, frequencies, (a, b) => {
        const below = manMadeNoise(kind, Math.min(a, b));
        const above = manMadeNoise(kind, Math.max(a, b));
        const values = [below.lowestDb, below.medianLowDb, below.medianHighDb, below.highestDb];
        expect(values.every(Number.isFinite)).toBe(true);
        expect([...values].sort((x, y) => x - y)).toEqual(values);
        expect(above.medianLowDb).toBeLessThanOrEqual(below.medianLowDb);
        expect(above.medianHighDb).toBeLessThanOrEqual(below.medianHighDb);
      }),
      SEEDED,
    );
  });

  it("refuses frequencies for which nothing is published", () => {
    for (const kind of KINDS)
      expectRefused(
        "manMadeNoise",
        ({ frequencyMhz }) => manMadeNoise(kind, frequencyMhz),
        { frequencyMhz: 200 },
        { frequencyMhz: [0.29, kind === "city" ? 901 : 251] },
      );
  });
});

describe("systemNoiseFigureDb", () => {
  it("is the receiver's own noise figure when the antenna sees 290 K", () => {
    // By definition of the noise figure.
    for (const figureDb of [0, 0.5, 4, 30])
      expect(systemNoiseFigureDb(0, figureDb)).toBeCloseTo(figureDb, 9);
  });

  it("is the antenna's noise for a receiver without any", () => {
    expect(systemNoiseFigureDb(11, 0)).toBe(11);
  });

  it("adds what the receiver adds", () => {
    // fa = 10 (10 dB), fr = 2 (3.0103 dB): f = 11, 10.4139 dB, worked by hand.
    expect(systemNoiseFigureDb(10, 3.0103)).toBeCloseTo(10.4139, 4);
  });

  it("is finite for everything that it takes, and grows with both", () => {
    fc.assert(
      fc.property(
        within(ANTENNA_NOISE_LIMITS_DB),
        within({ min: 0, max: 15_000 }),
        (antennaNoiseDb, noiseFigureDb) => {
          const noiseDb = systemNoiseFigureDb(antennaNoiseDb, noiseFigureDb);
          expect(Number.isFinite(noiseDb)).toBe(true);
          expect(noiseDb).toBeGreaterThanOrEqual(antennaNoiseDb);
          expect(systemNoiseFigureDb(antennaNoiseDb, 15_000)).toBeGreaterThanOrEqual(noiseDb);
        },
      ),
      SEEDED,
    );
  });

  it("refuses what is out of range", () => {
    expectRefused(
      "systemNoiseFigureDb",
      ({ antennaNoiseDb, noiseFigureDb }) => systemNoiseFigureDb(antennaNoiseDb, noiseFigureDb),
      { antennaNoiseDb: 3, noiseFigureDb: 4 },
      { antennaNoiseDb: [-101, 301], noiseFigureDb: [-0.1, 15_001] },
    );
  });
});
