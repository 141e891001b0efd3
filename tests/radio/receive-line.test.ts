import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { noiseFloorDbm } from "../../src/radio/noise-floor.ts";
import { noiseFigureFromTemperatureDb } from "../../src/radio/noise-temperature.ts";
import { alongLine, type LineElement } from "../../src/radio/receive-line.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const loss = (lossDb: number, temperatureK = 290): LineElement => ({
  kind: "loss",
  lossDb,
  temperatureK,
});
const amplifier = (gainDb: number, noiseFigureDb: number): LineElement => ({
  kind: "amplifier",
  gainDb,
  noiseFigureDb,
});
const LINE = { levelDbm: -70, bandwidthHz: 2e5, antennaNoiseDb: 0 };

const elements = fc.array(
  fc.oneof(
    fc.record({
      kind: fc.constant("loss" as const),
      lossDb: within({ min: 0, max: 300 }),
      temperatureK: within({ min: 0.001, max: 1e6 }),
    }),
    fc.record({
      kind: fc.constant("amplifier" as const),
      gainDb: within({ min: -300, max: 300 }),
      noiseFigureDb: within({ min: 0, max: 400 }),
    }),
  ),
  { minLength: 1, maxLength: 40 },
);

describe("alongLine", () => {
  it("agrees with a printed amplifier: 3.5 dB, 20 dB of gain and 2 GHz give −57.5 dBm", () => {
    // D. K. Mishra, example 2.10 (p. 38), read second-hand.
    const [point] = alongLine({
      ...LINE,
      bandwidthHz: 2e9,
      elements: [amplifier(20, 3.5)],
    });
    expect(Math.abs((point?.floorDbm ?? 0) + 57.5)).toBeLessThan(0.05);
    expect(point?.levelDbm).toBe(-50);
  });

  it("agrees with a printed line of 2 dB at 300 K before and behind an amplifier of 150 K", () => {
    // D. K. Mishra, example 2.11 (p. 42), read second-hand: 3.8468 dB and 1.8650 dB.
    const cable = loss(2, 300);
    const head = amplifier(15, noiseFigureFromTemperatureDb(150));
    const figureOf = (order: readonly LineElement[]) =>
      alongLine({ ...LINE, elements: order }).at(-1)?.noiseFigureDb;
    expect(figureOf([cable, head])).toBeCloseTo(3.8468, 4);
    expect(figureOf([head, cable])).toBeCloseTo(1.865, 4);
  });

  it("leaves the floor where it is along losses at 290 K, and lowers the level", () => {
    // Anything passive at the temperature of the source gives out as much noise as it takes in.
    const points = alongLine({ ...LINE, elements: [loss(3), loss(0.3), loss(6.5)] });
    for (const { floorDbm } of points) expect(floorDbm).toBeCloseTo(noiseFloorDbm(2e5, 0), 9);
    expect(points.map(({ levelDbm }) => levelDbm)).toEqual([-73, -73.3, -79.8]);
    expect(points.at(-1)?.noiseFigureDb).toBeCloseTo(9.8, 9);
    expect(points.at(-1)?.gainDb).toBeCloseTo(-9.8, 9);
  });

  it("loses less carrier-to-noise with the amplifier before the cable than behind it", () => {
    const cable = loss(10);
    const head = amplifier(12, 2);
    const receiver = amplifier(0, 8);
    const ratioOf = (order: readonly LineElement[]) => {
      const last = alongLine({ ...LINE, elements: order }).at(-1);
      return (last?.levelDbm ?? 0) - (last?.floorDbm ?? 0);
    };
    // Common practice: gain at the antenna, only as much as the cable loses.
    expect(ratioOf([head, cable, receiver])).toBeGreaterThan(ratioOf([cable, head, receiver]) + 5);
  });

  it("lets an amplifier gain nothing where the antenna brings in the noise", () => {
    const quiet = alongLine({ ...LINE, antennaNoiseDb: 40, elements: [amplifier(20, 3)] });
    // 40 dB over kT0B, 20 dB of gain: what the amplifier adds is 0.0004 dB.
    expect(quiet.at(-1)?.floorDbm).toBeCloseTo(noiseFloorDbm(2e5, 0) + 60, 3);
  });

  it("never improves carrier over noise, and is finite for everything that it takes", () => {
    fc.assert(
      fc.property(elements, within({ min: -100, max: 300 }), (line, antennaNoiseDb) => {
        const points = alongLine({ ...LINE, elements: line, antennaNoiseDb });
        expect(points).toHaveLength(line.length);
        let ratioDb = LINE.levelDbm - (noiseFloorDbm(LINE.bandwidthHz, 0) + antennaNoiseDb);
        for (const point of points) {
          expect(Object.values(point).every(Number.isFinite)).toBe(true);
          expect(point.levelDbm - point.floorDbm).toBeLessThanOrEqual(ratioDb + 1e-6);
          ratioDb = point.levelDbm - point.floorDbm;
        }
      }),
      SEEDED,
    );
  });

  it("refuses what is out of range, and a line without an element", () => {
    expectRefused(
      "alongLine",
      ({ levelDbm }) => alongLine({ ...LINE, elements: [loss(3)], levelDbm }),
      { levelDbm: -70 },
      { levelDbm: [-301, 301] },
    );
    expect(() => alongLine({ ...LINE, elements: [] })).toThrow("alongLine: elementCount");
    for (const bad of [Number.NaN, -1]) {
      expect(() => alongLine({ ...LINE, elements: [loss(bad)] })).toThrow(RangeError);
      expect(() => alongLine({ ...LINE, elements: [amplifier(0, bad)] })).toThrow(RangeError);
      expect(() => alongLine({ ...LINE, bandwidthHz: bad, elements: [loss(3)] })).toThrow(
        RangeError,
      );
    }
    const antennaNoiseDb = Number.NaN;
    expect(() => alongLine({ ...LINE, antennaNoiseDb, elements: [loss(3)] })).toThrow(RangeError);
  });
});
