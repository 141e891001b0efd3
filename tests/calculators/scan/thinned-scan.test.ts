import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ScanPoints } from "../../../src/calculators/scan/scan.ts";
import { thinnedScan } from "../../../src/calculators/scan/thinned-scan.ts";
import { SEEDED } from "../../radio/samples.ts";

const scan = (points: readonly (readonly [number, number])[]): ScanPoints => ({
  frequencyMhz: Float64Array.from(points, ([mhz]) => mhz),
  level: Float64Array.from(points, ([, level]) => level),
});

const anyScan = fc
  .uniqueArray(
    fc.tuple(fc.integer({ min: 4700, max: 6980 }), fc.integer({ min: -120, max: -20 })),
    {
      selector: ([tenthsOfMhz]) => tenthsOfMhz,
      maxLength: 200,
    },
  )
  .map((points) =>
    [...points]
      .sort(([one], [two]) => one - two)
      .map(([tenths, level]) => [tenths / 10, level] as const),
  );
const anyWindow = fc
  .record({
    ends: fc.uniqueArray(fc.integer({ min: 460, max: 710 }), { minLength: 2, maxLength: 2 }),
    columnCount: fc.integer({ min: 1, max: 400 }),
  })
  .map(({ ends, columnCount }) => ({
    fromMhz: Math.min(...ends),
    toMhz: Math.max(...ends),
    columnCount,
  }));

describe("thinnedScan", () => {
  it("keeps a single narrow carrier among a hundred thousand points", () => {
    const points = Array.from(
      { length: 100_000 },
      (_, n) => [470 + n / 1000, n === 61_803 ? -37 : -100] as const,
    );
    const { column, highest } = thinnedScan(scan(points), {
      fromMhz: 470,
      toMhz: 570,
      columnCount: 360,
    });
    expect(column).toHaveLength(360);
    expect(Math.max(...highest)).toBe(-37);
    // 61.803 of 100 MHz, of 360 columns.
    expect(column[highest.indexOf(-37)]).toBe(222);
  });

  it("draws the lowest and the highest of each column, both ends of the window included", () => {
    const points = scan([
      [469, -1],
      [470, -90],
      [471, -70],
      [474.9, -95],
      [475, -60],
      [480, -50],
      [481, -1],
    ]);
    const thinned = thinnedScan(points, { fromMhz: 470, toMhz: 480, columnCount: 2 });
    expect([...thinned.column]).toEqual([0, 1]);
    expect([...thinned.lowest]).toEqual([-95, -60]);
    expect([...thinned.highest]).toEqual([-70, -50]);
  });

  it("leaves columns without points out", () => {
    const points = scan([
      [470, -90],
      [479, -80],
    ]);
    const { column } = thinnedScan(points, { fromMhz: 470, toMhz: 480, columnCount: 10 });
    expect([...column]).toEqual([0, 9]);
  });

  it("shows nothing where there is nothing", () => {
    const window = { fromMhz: 600, toMhz: 700, columnCount: 100 };
    expect(thinnedScan(scan([]), window).column).toHaveLength(0);
    expect(thinnedScan(scan([[470, -90]]), window).column).toHaveLength(0);
  });

  it("is what sorting all points of the window into columns gives", () => {
    fc.assert(
      fc.property(anyScan, anyWindow, (points, window) => {
        const columns = new Map<number, number[]>();
        const widthMhz = (window.toMhz - window.fromMhz) / window.columnCount;
        for (const [mhz, level] of points) {
          if (mhz < window.fromMhz || mhz > window.toMhz) continue;
          const at =
            mhz === window.toMhz ? window.columnCount - 1 : (mhz - window.fromMhz) / widthMhz;
          // A point on the line between two columns may fall into either by rounding.
          if (Math.abs(at - Math.round(at)) < 1e-9 && mhz !== window.toMhz) return;
          columns.set(Math.floor(at), [...(columns.get(Math.floor(at)) ?? []), level]);
        }
        const thinned = thinnedScan(scan(points), window);
        expect([...thinned.column]).toEqual([...columns.keys()]);
        const levels = [...columns.values()];
        expect([...thinned.lowest]).toEqual(levels.map((some) => Math.min(...some)));
        expect([...thinned.highest]).toEqual(levels.map((some) => Math.max(...some)));
      }),
      SEEDED,
    );
  });

  it("has rising columns inside the picture, and keeps the highest level of the window", () => {
    fc.assert(
      fc.property(anyScan, anyWindow, (points, window) => {
        const { column, lowest, highest } = thinnedScan(scan(points), window);
        const inside = points.filter(([mhz]) => mhz >= window.fromMhz && mhz <= window.toMhz);
        const levels = inside.map(([, level]) => level);
        expect(Math.max(...highest)).toBe(Math.max(...levels));
        expect(Math.min(...lowest)).toBe(Math.min(...levels));
        for (const [n, at] of column.entries()) {
          expect(at < window.columnCount && at > (column[n - 1] ?? -1)).toBe(true);
        }
      }),
      SEEDED,
    );
  });

  it.each([
    [{ fromMhz: 480, toMhz: 470, columnCount: 10 }, "fromMhz must be below toMhz"],
    [{ fromMhz: 470, toMhz: 470, columnCount: 10 }, "fromMhz must be below toMhz"],
    [{ fromMhz: Number.NaN, toMhz: 470, columnCount: 10 }, "fromMhz must be from"],
    [{ fromMhz: 470, toMhz: Number.POSITIVE_INFINITY, columnCount: 10 }, "toMhz must be from"],
    [{ fromMhz: 470, toMhz: 480, columnCount: 0 }, "columnCount must be from"],
    [{ fromMhz: 470, toMhz: 480, columnCount: 1e6 }, "columnCount must be from"],
  ])("refuses a window that is none (%#)", (window, message) => {
    expect(() => thinnedScan(scan([[475, -90]]), window)).toThrow(RangeError);
    expect(() => thinnedScan(scan([[475, -90]]), window)).toThrow(message);
  });
});
