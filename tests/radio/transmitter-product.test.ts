import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { spacingForProductM, transmitterProductDbm } from "../../src/radio/transmitter-product.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const PAIR = {
  neighbourDbm: 17,
  spacingM: 2,
  frequencyMhz: 550,
  gainDbi: 0,
  turnaroundLossDb: 10,
};

describe("transmitterProductDbm", () => {
  it("is the neighbour's carrier less free-space loss and turnaround loss", () => {
    // At one wavelength free space loses 20·log10 4π = 21.984 dB: 17 − 21.984 − 10 = −14.984 dBm.
    expect(transmitterProductDbm({ ...PAIR, spacingM: wavelengthM(550) })).toBeCloseTo(-14.984, 3);
  });

  it("falls by 6.02 dB each time the spacing doubles", () => {
    const near = transmitterProductDbm(PAIR);
    expect(near - transmitterProductDbm({ ...PAIR, spacingM: 4 })).toBeCloseTo(6.0206, 4);
  });

  it("follows the neighbour dB for dB, and the antenna that picks it up", () => {
    const product = transmitterProductDbm(PAIR);
    expect(transmitterProductDbm({ ...PAIR, neighbourDbm: 10 })).toBeCloseTo(product - 7, 9);
    expect(transmitterProductDbm({ ...PAIR, gainDbi: -10 })).toBeCloseTo(product - 10, 9);
  });

  it("is undone by spacingForProductM", () => {
    fc.assert(
      fc.property(
        within({ min: -20, max: 40 }),
        within({ min: 25, max: 6000 }),
        within({ min: 1.01, max: 1000 }),
        within({ min: -15, max: 10 }),
        within({ min: 0, max: 40 }),
        (neighbourDbm, frequencyMhz, wavelengths, gainDbi, turnaroundLossDb) => {
          const pair = { neighbourDbm, frequencyMhz, gainDbi, turnaroundLossDb };
          const spacingM = wavelengths * wavelengthM(frequencyMhz);
          const productDbm = transmitterProductDbm({ ...pair, spacingM });
          expect(Number.isFinite(productDbm)).toBe(true);
          expect(spacingForProductM({ ...pair, productDbm }) / spacingM).toBeCloseTo(1, 9);
        },
      ),
      SEEDED,
    );
  });

  it("is finite for everything that it takes", () => {
    fc.assert(
      fc.property(
        within({ min: -300, max: 300 }),
        within({ min: 0.003, max: 3e6 }),
        within({ min: 0, max: 1 }),
        within({ min: -100, max: 100 }),
        within({ min: 0, max: 200 }),
        (neighbourDbm, frequencyMhz, share, gainDbi, turnaroundLossDb) => {
          const nearestM = Math.max(0.001, wavelengthM(frequencyMhz));
          const spacingM = nearestM + share * (1e6 - nearestM);
          const pair = { neighbourDbm, spacingM, frequencyMhz, gainDbi, turnaroundLossDb };
          expect(Number.isFinite(transmitterProductDbm(pair))).toBe(true);
        },
      ),
      SEEDED,
    );
  });

  it("gives a finite spacing above 0 for everything that the inverse takes", () => {
    fc.assert(
      fc.property(
        within({ min: -300, max: 300 }),
        within({ min: -300, max: 300 }),
        within({ min: 0.003, max: 3e6 }),
        (neighbourDbm, productDbm, frequencyMhz) => {
          const spacingM = spacingForProductM({ ...PAIR, neighbourDbm, productDbm, frequencyMhz });
          expect(Number.isFinite(spacingM) && spacingM > 0).toBe(true);
        },
      ),
      SEEDED,
    );
  });

  it("refuses a spacing below one wavelength, where distance says nothing of coupling", () => {
    expect(() => transmitterProductDbm({ ...PAIR, spacingM: 0.54 })).toThrow(
      "transmitterProductDbm: spacingM",
    );
    expect(() => transmitterProductDbm({ ...PAIR, spacingM: 0.55 })).not.toThrow();
  });

  it("and its inverse refuse what is out of range", () => {
    const { frequencyMhz, ...rest } = PAIR;
    const outside = {
      neighbourDbm: [-301, 301],
      productDbm: [-301, 301],
      spacingM: [0, -1, 1e7],
      gainDbi: [-101, 101],
      turnaroundLossDb: [-1, 201],
    };
    expectRefused(
      "transmitterProductDbm",
      (inputs) => transmitterProductDbm({ ...inputs, frequencyMhz }),
      rest,
      outside,
    );
    const { spacingM, ...wish } = { ...rest, productDbm: -60 };
    expectRefused(
      "spacingForProductM",
      (inputs) => spacingForProductM({ ...inputs, frequencyMhz }),
      wish,
      outside,
    );
    expect(() => transmitterProductDbm({ ...PAIR, frequencyMhz: 0, spacingM })).toThrow(RangeError);
  });
});
