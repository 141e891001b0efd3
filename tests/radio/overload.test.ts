import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { blockingLossDb } from "../../src/radio/blocking-loss.ts";
import { blockerForLossDbm, desensitisationDb } from "../../src/radio/desensitisation.ts";
import { gainCompressionDb, levelForCompressionDbm } from "../../src/radio/gain-compression.ts";
import { LEVEL_LIMITS_DBM } from "../../src/radio/level-limits.ts";
import { NOISE_RISE_LIMITS_DB, noiseRiseDb } from "../../src/radio/noise-rise.ts";
import {
  blockerForMixingNoiseDbm,
  reciprocalMixingNoiseDbm,
} from "../../src/radio/reciprocal-mixing.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const levels = within(LEVEL_LIMITS_DBM);
const offsets = within({ min: -60, max: 60 });

describe("gainCompressionDb", () => {
  it("is 1 dB at the compression point, by definition", () => {
    for (const pointDbm of [-30, 0, 17])
      expect(gainCompressionDb(pointDbm, pointDbm)).toBeCloseTo(1, 12);
  });

  it("is that of the saturation law with smoothness 1", () => {
    // v/√(1 + v²): at v = 1 the gain is down by √2, 3.0103 dB, and its 1 dB point is where 1 + v² is
    // 10^0.1 = 1.258925, v² = 0.258925: 5.8682 dB below v = 1.
    expect(gainCompressionDb(5.8682, 0)).toBeCloseTo(3.0103, 3);
  });

  it("never lets the output fall when the input rises", () => {
    fc.assert(
      fc.property(levels, within({ min: 0, max: 50 }), (levelDbm, step) => {
        const output = (dbm: number) => dbm - gainCompressionDb(dbm, -20);
        if (levelDbm + step > LEVEL_LIMITS_DBM.max) return;
        expect(output(levelDbm + step)).toBeGreaterThanOrEqual(output(levelDbm) - 1e-9);
      }),
      SEEDED,
    );
  });

  it("is finite, 0 or more, and undone by levelForCompressionDbm", () => {
    fc.assert(
      fc.property(levels, levels, (levelDbm, pointDbm) => {
        const lossDb = gainCompressionDb(levelDbm, pointDbm);
        expect(Number.isFinite(lossDb) && lossDb >= 0).toBe(true);
        if (lossDb < 1e-6 || lossDb > 300) return;
        expect(levelForCompressionDbm(lossDb, pointDbm)).toBeCloseTo(levelDbm, 6);
      }),
      SEEDED,
    );
    expect(levelForCompressionDbm(1, -12)).toBeCloseTo(-12, 12);
  });

  it("and its inverse refuse what is out of range", () => {
    const outside = {
      levelDbm: [-301, 301],
      compressionPointDbm: [-301, 301],
      compressionDb: [0, -1, 301],
    };
    expectRefused(
      "gainCompressionDb",
      ({ levelDbm, compressionPointDbm }) => gainCompressionDb(levelDbm, compressionPointDbm),
      { levelDbm: -20, compressionPointDbm: 0 },
      outside,
    );
    expectRefused(
      "levelForCompressionDbm",
      ({ compressionDb, compressionPointDbm }) =>
        levelForCompressionDbm(compressionDb, compressionPointDbm),
      { compressionDb: 1, compressionPointDbm: 0 },
      outside,
    );
  });
});

/**
 * Gain of a weak carrier beside a strong one through v/√(1 + |v|²), by numerical integration over one
 * turn of the phase between them.
 */
function weakGainDb(strongVolts: number): number {
  const weak = 1e-5 * strongVolts;
  const steps = 720;
  let re = 0;
  for (let n = 0; n < steps; n += 1) {
    const phase = (2 * Math.PI * n) / steps;
    const [x, y] = [strongVolts + weak * Math.cos(phase), weak * Math.sin(phase)];
    const gain = 1 / Math.sqrt(1 + x ** 2 + y ** 2);
    re += gain * (x * Math.cos(phase) + y * Math.sin(phase));
  }
  return 20 * Math.log10(re / steps / weak);
}

describe("blockingLossDb", () => {
  it.each([-20, -6, 0, 3, 6, 15])(
    "agrees with a simulated amplifier, blocker %s dB over the 1 dB point",
    (overDb) => {
      // The 1 dB point of v/√(1 + v²) lies at v² = 10^0.1 − 1.
      const volts = Math.sqrt(10 ** 0.1 - 1) * 10 ** (overDb / 20);
      expect(blockingLossDb(-10 + overDb, -10)).toBeCloseTo(-weakGainDb(volts), 4);
    },
  );

  it("is twice the blocker's own loss far below the point, as for any cubic law", () => {
    // B. Razavi, RF Microelectronics, desensitization, from memory: 1 − 2x against 1 − x.
    expect(blockingLossDb(-40, 0) / gainCompressionDb(-40, 0)).toBeCloseTo(2, 3);
  });

  it("is 6.02 dB more than the blocker's own loss far above it, as in an ideal limiter", () => {
    // J. J. Jones, IEEE Trans. Information Theory 9 (1963) 34: a weak signal is suppressed by 6 dB.
    expect(blockingLossDb(80, 0) - gainCompressionDb(80, 0)).toBeCloseTo(6.0206, 4);
  });

  it("is finite, never below the blocker's own loss, and grows with the blocker", () => {
    fc.assert(
      fc.property(levels, levels, offsets, (blockerDbm, pointDbm, step) => {
        const lossDb = blockingLossDb(blockerDbm, pointDbm);
        expect(Number.isFinite(lossDb)).toBe(true);
        expect(lossDb).toBeGreaterThanOrEqual(gainCompressionDb(blockerDbm, pointDbm) - 1e-9);
        const louder = Math.min(blockerDbm + Math.abs(step), LEVEL_LIMITS_DBM.max);
        expect(blockingLossDb(louder, pointDbm)).toBeGreaterThanOrEqual(lossDb - 1e-9);
      }),
      SEEDED,
    );
  });

  it("refuses what is out of range", () => {
    expectRefused(
      "blockingLossDb",
      ({ blockerDbm, compressionPointDbm }) => blockingLossDb(blockerDbm, compressionPointDbm),
      { blockerDbm: -20, compressionPointDbm: 0 },
      { blockerDbm: [-301, 301], compressionPointDbm: [-301, 301] },
    );
  });
});

describe("desensitisationDb", () => {
  it("is 3 dB at the stated blocking level, by definition", () => {
    expect(desensitisationDb(-30, -30)).toBeCloseTo(3, 12);
  });

  it("is the rise of the floor by a source that grows dB for dB with the blocker", () => {
    // 3 dB stand for I/N = −0.02 dB (CEPT handbook); ten times the blocker make 1 + 9.95262, 10.395 dB.
    expect(desensitisationDb(-20, -30)).toBeCloseTo(10.395, 3);
    expect(desensitisationDb(-20, -30)).toBeCloseTo(noiseRiseDb(9.97937), 4);
  });

  it("is finite for everything that it takes, and undone by blockerForLossDbm", () => {
    fc.assert(
      fc.property(levels, levels, (blockerDbm, blockingLevelDbm) => {
        const lossDb = desensitisationDb(blockerDbm, blockingLevelDbm);
        expect(Number.isFinite(lossDb) && lossDb >= 0).toBe(true);
        if (lossDb < NOISE_RISE_LIMITS_DB.min || lossDb > NOISE_RISE_LIMITS_DB.max) return;
        expect(blockerForLossDbm(lossDb, blockingLevelDbm)).toBeCloseTo(blockerDbm, 7);
      }),
      SEEDED,
    );
  });

  it("and its inverse refuse what is out of range", () => {
    expectRefused(
      "desensitisationDb",
      ({ blockerDbm, blockingLevelDbm }) => desensitisationDb(blockerDbm, blockingLevelDbm),
      { blockerDbm: -40, blockingLevelDbm: -30 },
      { blockerDbm: [-301, 301], blockingLevelDbm: [-301, 301] },
    );
    expectRefused(
      "blockerForLossDbm",
      ({ lossDb, blockingLevelDbm }) => blockerForLossDbm(lossDb, blockingLevelDbm),
      { lossDb: 1, blockingLevelDbm: -30 },
      { lossDb: [0, -1, 401], blockingLevelDbm: [-301, 301] },
    );
  });
});

describe("reciprocalMixingNoiseDbm", () => {
  it("follows the blocker and the phase noise dB for dB, and is undone by blockerForMixingNoiseDbm", () => {
    fc.assert(
      fc.property(
        within({ min: -150, max: 60 }),
        within({ min: -180, max: -40 }),
        within({ min: 1, max: 1e9 }),
        offsets,
        (blockerDbm, phaseNoiseDbc, bandwidthHz, step) => {
          const mixing = { blockerDbm, phaseNoiseDbc, bandwidthHz };
          const noiseDbm = reciprocalMixingNoiseDbm(mixing);
          const louder = reciprocalMixingNoiseDbm({ ...mixing, blockerDbm: blockerDbm + step });
          expect(louder - noiseDbm).toBeCloseTo(step, 9);
          if (noiseDbm < LEVEL_LIMITS_DBM.min) return;
          expect(blockerForMixingNoiseDbm({ ...mixing, noiseDbm })).toBeCloseTo(blockerDbm, 9);
        },
      ),
      SEEDED,
    );
  });

  it("and its inverse are finite at the ends of their ranges, and refuse what lies beyond", () => {
    const outside = {
      blockerDbm: [-301, 301],
      noiseDbm: [-301, 301],
      phaseNoiseDbc: [-301, 0.1],
      bandwidthHz: [0, -1, 1e13],
    };
    for (const end of ["min", "max"] as const) {
      const ends = {
        phaseNoiseDbc: end === "min" ? -300 : 0,
        bandwidthHz: end === "min" ? 1 : 1e12,
      };
      const level = LEVEL_LIMITS_DBM[end];
      expect(Number.isFinite(reciprocalMixingNoiseDbm({ ...ends, blockerDbm: level }))).toBe(true);
      expect(Number.isFinite(blockerForMixingNoiseDbm({ ...ends, noiseDbm: level }))).toBe(true);
    }
    const good = { phaseNoiseDbc: -140, bandwidthHz: 2e5 };
    expectRefused(
      "reciprocalMixingNoiseDbm",
      reciprocalMixingNoiseDbm,
      { ...good, blockerDbm: -30 },
      outside,
    );
    expectRefused(
      "blockerForMixingNoiseDbm",
      blockerForMixingNoiseDbm,
      { ...good, noiseDbm: -117 },
      outside,
    );
  });
});
