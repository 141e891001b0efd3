import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type LossPoint, tableLossDb } from "../../src/radio/loss-table.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const point = (frequencyMhz: number, lowDb: number, highDb = lowDb): LossPoint => ({
  frequencyMhz,
  lowDb,
  highDb,
});
const frequencies = within({ min: 0.1, max: 100_000 });

/** A table at whole frequencies that rise, with losses from conductor and dielectric. */
const tables = fc
  .record({
    frequenciesMhz: fc.uniqueArray(fc.integer({ min: 1, max: 6000 }), {
      minLength: 1,
      maxLength: 8,
    }),
    conductor: within({ min: 0.01, max: 5 }),
    dielectric: within({ min: 0, max: 0.1 }),
    spread: within({ min: 1, max: 2 }),
  })
  .map(({ frequenciesMhz, conductor, dielectric, spread }) =>
    frequenciesMhz
      .sort((a, b) => a - b)
      .map((mhz) => {
        const lossDb = conductor * Math.sqrt(mhz) + dielectric * mhz;
        return point(mhz, lossDb, lossDb * spread);
      }),
  );

describe("tableLossDb", () => {
  it("is exact at the points", () => {
    fc.assert(
      fc.property(tables, (points) => {
        for (const { frequencyMhz, lowDb, highDb } of points)
          expect(tableLossDb(points, frequencyMhz)).toEqual({ lowDb, highDb });
      }),
      SEEDED,
    );
  });

  it("doubles when the frequency goes up fourfold along a pure square-root law", () => {
    // Skin effect: 4 dB at 100 MHz and 16 dB at 1600 MHz, so 8 dB at 400 MHz.
    expect(tableLossDb([point(100, 4), point(1600, 16)], 400).highDb).toBeCloseTo(8, 12);
  });

  it("follows conductor and dielectric together between the points", () => {
    // a = 0.4·√f + 0.01·f, worked by hand: 5 at 100 MHz, 18 at 900 MHz, and 12 at 400 MHz.
    const { lowDb } = tableLossDb([point(100, 5), point(900, 21)], 400);
    expect(lowDb).toBeCloseTo(12, 12);
  });

  it("opens to both laws beyond the table", () => {
    const points = [point(100, 4), point(400, 10)];
    // Four times the highest frequency: twice by the square root, four times if all were dielectric.
    expect(tableLossDb(points, 1600)).toEqual({ lowDb: 20, highDb: 40 });
    // A quarter of the lowest: half by the square root, a quarter if all were dielectric.
    expect(tableLossDb(points, 25)).toEqual({ lowDb: 1, highDb: 2 });
  });

  it("holds the true loss of any two-term cable, inside the table and out", () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: 1, max: 6000 }), { minLength: 1, maxLength: 8 }),
        within({ min: 0.01, max: 5 }),
        within({ min: 0, max: 0.1 }),
        frequencies,
        (mhz, conductor, dielectric, frequencyMhz) => {
          const truth = (f: number) => conductor * Math.sqrt(f) + dielectric * f;
          const points = mhz.sort((a, b) => a - b).map((f) => point(f, truth(f)));
          const { lowDb, highDb } = tableLossDb(points, frequencyMhz);
          expect(lowDb).toBeLessThanOrEqual(truth(frequencyMhz) * (1 + 1e-9));
          expect(highDb).toBeGreaterThanOrEqual(truth(frequencyMhz) * (1 - 1e-9));
        },
      ),
      SEEDED,
    );
  });

  it("is finite, above 0 and in order everywhere, and rises with frequency", () => {
    fc.assert(
      fc.property(tables, frequencies, frequencies, (points, a, b) => {
        const [below, above] = [Math.min(a, b), Math.max(a, b)].map((f) => tableLossDb(points, f));
        if (below === undefined || above === undefined) throw new Error("two frequencies expected");
        for (const { lowDb, highDb } of [below, above]) {
          expect(Number.isFinite(highDb) && lowDb > 0).toBe(true);
          expect(highDb).toBeGreaterThanOrEqual(lowDb * (1 - 1e-12));
        }
        expect(above.lowDb).toBeGreaterThanOrEqual(below.lowDb * (1 - 1e-9));
        expect(above.highDb).toBeGreaterThanOrEqual(below.highDb * (1 - 1e-9));
      }),
      SEEDED,
    );
  });

  it("refuses a frequency and a table that are none", () => {
    const points = [point(100, 4), point(400, 10)];
    expectRefused(
      "tableLossDb",
      ({ frequencyMhz }) => tableLossDb(points, frequencyMhz),
      { frequencyMhz: 200 },
      { frequencyMhz: [0, -1, 0.09, 100_001] },
    );
    expect(() => tableLossDb([], 200)).toThrow("tableLossDb: points must not be empty");
    for (const bad of [
      [point(400, 10), point(100, 4)],
      [point(100, 4), point(100, 4)],
      [point(100, 4, 3.9)],
      [point(100, 0)],
      [point(100, Number.NaN)],
      [point(Number.NaN, 4)],
    ]) {
      expect(() => tableLossDb(bad, 200)).toThrow(RangeError);
      expect(() => tableLossDb(bad, 200)).toThrow(/^tableLossDb: points/);
    }
  });
});
