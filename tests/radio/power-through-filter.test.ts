import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { bandOffsetRatio } from "../../src/radio/band-offset.ts";
import { butterworthLossDb } from "../../src/radio/butterworth-loss.ts";
import { powerThroughFilter } from "../../src/radio/power-through-filter.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const received = fc.array(
  fc.record({
    frequencyMhz: within({ min: 0.003, max: 3e6 }),
    levelDbm: within({ min: -300, max: 300 }),
  }),
  { minLength: 1, maxLength: 12 },
);

describe("powerThroughFilter", () => {
  it("takes a strong neighbour out of the sum and leaves the wanted carrier", () => {
    const lossAtDb = (frequencyMhz: number) => (frequencyMhz > 600 ? 40 : 1.5);
    const list = [
      { frequencyMhz: 550, levelDbm: -60 },
      { frequencyMhz: 620, levelDbm: -20 },
    ];
    const { levelsDbm, beforeDbm, behindDbm } = powerThroughFilter(list, lossAtDb);
    expect(levelsDbm).toEqual([-61.5, -60]);
    // −60 dBm beside −20 dBm adds 0.0004 dB; −61.5 beside −60 dBm adds 2.3247 dB: 1 + 10^−0.15 = 1.70795.
    expect(beforeDbm).toBeCloseTo(-19.9996, 4);
    expect(behindDbm).toBeCloseTo(-60 + 2.3247, 3);
  });

  it("shifts everything alike through a plain attenuator", () => {
    fc.assert(
      fc.property(received, within({ min: 0, max: 100 }), (list, lossDb) => {
        const { levelsDbm, beforeDbm, behindDbm } = powerThroughFilter(list, () => lossDb);
        expect(behindDbm).toBeCloseTo(beforeDbm - lossDb, 9);
        for (const [place, { levelDbm }] of list.entries())
          expect(levelsDbm[place]).toBeCloseTo(levelDbm - lossDb, 9);
      }),
      SEEDED,
    );
  });

  it("is finite behind the steepest filter that there is, and never gains", () => {
    fc.assert(
      fc.property(received, (list) => {
        const lossAtDb = (frequencyMhz: number) => {
          const band = { frequencyMhz, lowEdgeMhz: 500, highEdgeMhz: 500.001 };
          return butterworthLossDb({
            offsetRatio: bandOffsetRatio(band),
            order: 20,
            edgeLossDb: 3,
          });
        };
        const { levelsDbm, beforeDbm, behindDbm } = powerThroughFilter(list, lossAtDb);
        expect([...levelsDbm, beforeDbm, behindDbm].every(Number.isFinite)).toBe(true);
        expect(behindDbm).toBeLessThanOrEqual(beforeDbm + 1e-9);
      }),
      SEEDED,
    );
  });

  it("refuses an empty list, and what is out of range", () => {
    expect(() => powerThroughFilter([], () => 0)).toThrow(RangeError);
    expectRefused(
      "powerThroughFilter",
      ({ frequencyMhz, levelDbm, lossDb }) =>
        powerThroughFilter([{ frequencyMhz, levelDbm }], () => lossDb),
      { frequencyMhz: 550, levelDbm: -60, lossDb: 1 },
      { frequencyMhz: [0, -1, 4e6], levelDbm: [-301, 301], lossDb: [-0.1, 17_001] },
    );
  });
});
