import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readTouchstone } from "../../../src/calculators/touchstone/read-touchstone.ts";
import { s21Gain } from "../../../src/calculators/touchstone/s21-gain.ts";
import { SEEDED, within } from "../../radio/samples.ts";

function networkIn(text: string) {
  const read = readTouchstone(text);
  if (read.kind !== "ok") throw new Error(`line ${read.line}: ${read.code}`);
  return read.network;
}

const sweep = (points: readonly (readonly [mhz: number, gainDb: number])[]) =>
  networkIn(
    `# MHz S DB R 50\n${points.map(([mhz, gain]) => `${mhz} -20 0 ${gain} 30 ${gain} 30 -20 0`).join("\n")}`,
  );
const FILTER = sweep([
  [470, -1.2],
  [500, -0.8],
  [520, -40.8],
]);

function gainDb(frequencyMhz: number, network = FILTER): number {
  const gain = s21Gain(network, frequencyMhz);
  if (gain.kind !== "ok") throw new Error(gain.kind);
  return gain.gainDb;
}

describe("s21Gain", () => {
  it("is exact at the points, the ends included", () => {
    expect(gainDb(470)).toBeCloseTo(-1.2, 9);
    expect(gainDb(500)).toBeCloseTo(-0.8, 9);
    expect(gainDb(520)).toBeCloseTo(-40.8, 9);
  });

  it("runs straight in dB between them, not in voltage", () => {
    // Half-way down 40 dB of skirt: −20.8 dB. Straight in voltage it would be −6.7 dB.
    expect(gainDb(510)).toBeCloseTo(-20.8, 9);
    // A fifth and a quarter of the way, by hand: −1.2 + 0.08 and −0.8 − 10.
    expect(gainDb(476)).toBeCloseTo(-1.12, 9);
    expect(gainDb(505)).toBeCloseTo(-10.8, 9);
  });

  it("is the gain of an amplifier, positive, from port 1 to port 2", () => {
    // Example 8 of the format's specification, Rev. 1.1: S21 3.57 at 2 GHz, 11.05 dB; S12 0.04.
    const amplifier = networkIn(
      "2 .95 -26 3.57 157 .04 76 .66 -14\n22 .60 -144 1.30 40 .14 40 .56 -85",
    );
    expect(gainDb(2000, amplifier)).toBeCloseTo(11.053, 3);
  });

  it("lies between its neighbours everywhere in the sweep", () => {
    fc.assert(
      fc.property(within({ min: 470, max: 520 }), (frequencyMhz) => {
        const [low, high] = frequencyMhz <= 500 ? [-1.2, -0.8] : [-40.8, -0.8];
        expect(gainDb(frequencyMhz)).toBeGreaterThanOrEqual(low - 1e-9);
        expect(gainDb(frequencyMhz)).toBeLessThanOrEqual(high + 1e-9);
      }),
      SEEDED,
    );
  });

  it("gives no figure beyond the sweep, for one port, or where nothing passes", () => {
    for (const outside of [0, 469.999, 520.001, 1e9])
      expect(s21Gain(FILTER, outside)).toEqual({ kind: "outside" });
    expect(s21Gain(networkIn("# MHz\n500 0.1 0"), 500)).toEqual({ kind: "one-port" });
    const open = networkIn("# MHz S RI\n1 1 0 0 0 0 0 1 0\n2 1 0 0.5 0 0.5 0 1 0");
    expect(s21Gain(open, 1)).toEqual({ kind: "nothing-passes" });
    expect(s21Gain(open, 1.5)).toEqual({ kind: "nothing-passes" });
    expect(s21Gain(open, 2).kind).toBe("ok");
  });

  it("has one frequency in a sweep of one point", () => {
    const single = sweep([[600, -3]]);
    expect(gainDb(600, single)).toBeCloseTo(-3, 9);
    expect(s21Gain(single, 601)).toEqual({ kind: "outside" });
  });

  it.each([-1, Number.NaN, Number.POSITIVE_INFINITY])("refuses a frequency of %s MHz", (bad) => {
    expect(() => s21Gain(FILTER, bad)).toThrow(RangeError);
    expect(() => s21Gain(FILTER, bad)).toThrow(`s21Gain: frequencyMhz`);
  });
});
