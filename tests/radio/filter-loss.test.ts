import Complex from "complex.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { bandOffsetRatio } from "../../src/radio/band-offset.ts";
import { butterworthLossDb } from "../../src/radio/butterworth-loss.ts";
import {
  halfPowerEdges,
  halfPowerOffsetRatio,
  rippleEdges,
} from "../../src/radio/chebyshev-edges.ts";
import { chebyshevLossDb } from "../../src/radio/chebyshev-loss.ts";
import {
  FILTER_ORDER_LIMITS,
  OFFSET_RATIO_LIMITS,
  RIPPLE_LIMITS_DB,
} from "../../src/radio/filter-limits.ts";
import { smallestFilterOrder } from "../../src/radio/filter-order.ts";
import { FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

/** 10·log10 2. */
const HALF_POWER_DB = 3.010299956639812;
const orders = fc.integer(FILTER_ORDER_LIMITS);
const ripples = within(RIPPLE_LIMITS_DB);
const offsets = within({ min: 0, max: 10 });

/** Element values of low-pass prototypes as printed; source and load of 1 ohm, cut-off at 1 rad/s. */
const MAXIMALLY_FLAT_5 = [0.618, 1.618, 2, 1.618, 0.618];
const HALF_DECIBEL_3 = [1.5963, 1.0967, 1.5963];

/**
 * Loss of a ladder of such elements between 1 ohm ends, by chain matrices: first a capacitor across,
 * then a coil in line, and so on. `reactance` is what jω becomes: for a low-pass ω itself.
 */
function ladderLossDb(elements: readonly number[], reactance: number): number {
  let [a, b, c, d] = [1, 0, 0, 1].map((value) => new Complex(value, 0));
  if (a === undefined || b === undefined || c === undefined || d === undefined)
    throw new Error("four entries of a chain matrix expected");
  for (const [place, g] of elements.entries()) {
    const x = new Complex(0, g * reactance);
    if (place % 2 === 0) [a, c] = [a.add(b.mul(x)), c.add(d.mul(x))];
    else [b, d] = [b.add(a.mul(x)), d.add(c.mul(x))];
  }
  return 20 * Math.log10(a.add(b).add(c).add(d).div(2).abs());
}

describe("butterworthLossDb", () => {
  it("is that of a circuit with printed element values, inside and outside the band", () => {
    // D. M. Pozar, Microwave Engineering, example 8.4 (p. 447), read second-hand: order 5, printed to 0.001.
    for (const offsetRatio of [0.5, 0.9, 1, 1.2, 1.5, 2, 3])
      expect(
        Math.abs(
          butterworthLossDb({ offsetRatio, order: 5, edgeLossDb: HALF_POWER_DB }) -
            ladderLossDb(MAXIMALLY_FLAT_5, offsetRatio),
        ),
      ).toBeLessThan(0.01);
  });

  it("has the stated loss at the edge and none in the middle, whatever the order", () => {
    fc.assert(
      fc.property(orders, within({ min: 0.001, max: 100 }), (order, edgeLossDb) => {
        expect(butterworthLossDb({ offsetRatio: 1, order, edgeLossDb })).toBeCloseTo(edgeLossDb, 9);
        expect(butterworthLossDb({ offsetRatio: 0, order, edgeLossDb })).toBe(0);
      }),
      SEEDED,
    );
  });

  it("falls off by 6.02 dB per order for each octave far outside", () => {
    const loss = (offsetRatio: number) =>
      butterworthLossDb({ offsetRatio, order: 4, edgeLossDb: HALF_POWER_DB });
    expect(loss(2000) - loss(1000)).toBeCloseTo(4 * 6.0206, 3);
  });

  it("is finite and 0 or more for everything that it takes, and refuses the rest", () => {
    fc.assert(
      fc.property(
        within(OFFSET_RATIO_LIMITS),
        orders,
        within({ min: 0.001, max: 100 }),
        (offsetRatio, order, edgeLossDb) => {
          const lossDb = butterworthLossDb({ offsetRatio, order, edgeLossDb });
          expect(Number.isFinite(lossDb) && lossDb >= 0).toBe(true);
        },
      ),
      SEEDED,
    );
    expectRefused(
      "butterworthLossDb",
      butterworthLossDb,
      { offsetRatio: 2, order: 5, edgeLossDb: 3 },
      { offsetRatio: [-1, 1e41], order: [0, -1, 2.5, 21], edgeLossDb: [0, -1, 101] },
    );
  });
});

describe("chebyshevLossDb", () => {
  it("is that of a circuit with printed element values, inside and outside the band", () => {
    // D. M. Pozar, Microwave Engineering, example 8.5 (p. 460), read second-hand: order 3, 0.5 dB ripple.
    for (const offsetRatio of [0, 0.3, 0.5, 0.866, 1, 1.5, 2, 4])
      expect(
        Math.abs(
          chebyshevLossDb({ offsetRatio, order: 3, rippleDb: 0.5 }) -
            ladderLossDb(HALF_DECIBEL_3, offsetRatio),
        ),
      ).toBeLessThan(0.01);
  });

  it("stays within the ripple up to the edge, reaches it there and leaves it for good", () => {
    fc.assert(
      fc.property(orders, ripples, within({ min: 0, max: 1 }), (order, rippleDb, inside) => {
        const loss = (offsetRatio: number) => chebyshevLossDb({ offsetRatio, order, rippleDb });
        expect(loss(1)).toBeCloseTo(rippleDb, 9);
        expect(loss(inside)).toBeLessThanOrEqual(rippleDb + 1e-9);
        expect(loss(1 + inside + 1e-6)).toBeGreaterThan(rippleDb);
      }),
      SEEDED,
    );
  });

  it("is the ripple in the middle for even orders and 0 for odd ones", () => {
    expect(chebyshevLossDb({ offsetRatio: 0, order: 4, rippleDb: 0.5 })).toBeCloseTo(0.5, 9);
    expect(chebyshevLossDb({ offsetRatio: 0, order: 5, rippleDb: 0.5 })).toBeCloseTo(0, 9);
  });

  it("loses more than Butterworth of the same order and edge loss, everywhere outside", () => {
    fc.assert(
      fc.property(orders, ripples, within({ min: 1, max: 1e6 }), (order, rippleDb, offsetRatio) => {
        const flat = butterworthLossDb({ offsetRatio, order, edgeLossDb: rippleDb });
        expect(chebyshevLossDb({ offsetRatio, order, rippleDb })).toBeGreaterThanOrEqual(
          flat - 1e-9,
        );
      }),
      SEEDED,
    );
  });

  it("comes near a chart's 20 dB for a coupled-line filter", () => {
    // D. M. Pozar, example 8.8 (p. 486), read second-hand: 2 GHz, 10 %, order 3, 0.5 dB, at 1.8 GHz. Read off
    // a chart, hence the dB of tolerance.
    const offsetRatio = bandOffsetRatio({
      frequencyMhz: 1800,
      lowEdgeMhz: 1900,
      highEdgeMhz: 2100,
    });
    const lossDb = chebyshevLossDb({ offsetRatio, order: 3, rippleDb: 0.5 });
    expect(Math.abs(lossDb - 20)).toBeLessThan(1);
  });

  it("is finite and 0 or more for everything that it takes, and refuses the rest", () => {
    fc.assert(
      fc.property(within(OFFSET_RATIO_LIMITS), orders, ripples, (offsetRatio, order, rippleDb) => {
        const lossDb = chebyshevLossDb({ offsetRatio, order, rippleDb });
        expect(Number.isFinite(lossDb) && lossDb >= 0).toBe(true);
      }),
      SEEDED,
    );
    expectRefused(
      "chebyshevLossDb",
      chebyshevLossDb,
      { offsetRatio: 2, order: 5, rippleDb: 0.5 },
      { offsetRatio: [-1, 1e41], order: [0, -1, 2.5, 21], rippleDb: [0, -1, 3.1] },
    );
  });
});

describe("halfPowerOffsetRatio, rippleEdges and halfPowerEdges", () => {
  it("are where the filter has lost half the power", () => {
    fc.assert(
      fc.property(orders, within({ min: 0.001, max: 2.9 }), (order, rippleDb) => {
        const offsetRatio = halfPowerOffsetRatio({ order, rippleDb });
        expect(offsetRatio).toBeGreaterThan(1);
        expect(chebyshevLossDb({ offsetRatio, order, rippleDb })).toBeCloseTo(HALF_POWER_DB, 6);
      }),
      SEEDED,
    );
  });

  it("turn 42.0 dB at twice the ripple edge into 44.9 dB at twice the 3 dB edge", () => {
    // Order 5 and 0.5 dB, worked out independently with scipy: 42.04 and 44.90 dB.
    const design = { order: 5, rippleDb: 0.5 };
    const atTwice = (scale: number) => chebyshevLossDb({ offsetRatio: 2 * scale, ...design });
    expect(Math.abs(atTwice(1) - 42.0)).toBeLessThan(0.05);
    expect(Math.abs(atTwice(halfPowerOffsetRatio(design)) - 44.9)).toBeLessThan(0.05);
  });

  it("give a band-pass that has lost half the power at the edges that were stated", () => {
    const design = { order: 4, rippleDb: 0.2 };
    const stated = { lowEdgeMhz: 470, highEdgeMhz: 608 };
    const edges = rippleEdges(stated, design);
    expect(edges.lowEdgeMhz).toBeGreaterThan(470);
    expect(edges.highEdgeMhz).toBeLessThan(608);
    for (const frequencyMhz of [470, 608]) {
      const offsetRatio = bandOffsetRatio({ frequencyMhz, ...edges });
      expect(chebyshevLossDb({ offsetRatio, ...design })).toBeCloseTo(HALF_POWER_DB, 6);
    }
  });

  it("undo each other around the same middle", () => {
    fc.assert(
      fc.property(
        within({ min: 1, max: 1000 }),
        within({ min: 1.001, max: 50 }),
        orders,
        within({ min: 0.01, max: 2.5 }),
        (lowEdgeMhz, ratio, order, rippleDb) => {
          const edges = { lowEdgeMhz, highEdgeMhz: lowEdgeMhz * ratio };
          const wider = halfPowerEdges(edges, { order, rippleDb });
          expect((wider.lowEdgeMhz * wider.highEdgeMhz) / (lowEdgeMhz ** 2 * ratio)).toBeCloseTo(
            1,
            9,
          );
          const back = rippleEdges(wider, { order, rippleDb });
          expect(back.lowEdgeMhz / lowEdgeMhz).toBeCloseTo(1, 9);
          expect(back.highEdgeMhz / edges.highEdgeMhz).toBeCloseTo(1, 9);
        },
      ),
      SEEDED,
    );
  });

  it("are finite and in order for everything that they take", () => {
    const frequencies = within(FREQUENCY_LIMITS_MHZ);
    fc.assert(
      fc.property(frequencies, frequencies, orders, ripples, (a, b, order, rippleDb) => {
        if (a === b) return;
        const edges = { lowEdgeMhz: Math.min(a, b), highEdgeMhz: Math.max(a, b) };
        for (const convert of [rippleEdges, halfPowerEdges]) {
          const { lowEdgeMhz, highEdgeMhz } = convert(edges, { order, rippleDb });
          expect(lowEdgeMhz > 0 && Number.isFinite(highEdgeMhz)).toBe(true);
          expect(highEdgeMhz).toBeGreaterThanOrEqual(lowEdgeMhz);
        }
      }),
      SEEDED,
    );
  });

  it("refuse ripple of half power and more, and edges that do not rise", () => {
    expectRefused(
      "halfPowerOffsetRatio",
      halfPowerOffsetRatio,
      { order: 5, rippleDb: 0.5 },
      { order: [0, 2.5, 21], rippleDb: [0, -1, 3.02] },
    );
    const design = { order: 5, rippleDb: 0.5 };
    for (const [name, convert] of [
      ["rippleEdges", rippleEdges],
      ["halfPowerEdges", halfPowerEdges],
    ] as const) {
      expectRefused(
        name,
        (edges) => convert(edges, design),
        { lowEdgeMhz: 470, highEdgeMhz: 608 },
        { lowEdgeMhz: [0, -1, 4e6], highEdgeMhz: [0, -1, 4e6] },
      );
      expect(() => convert({ lowEdgeMhz: 500, highEdgeMhz: 500 }, design)).toThrow(
        `${name}: highEdgeMhz`,
      );
    }
  });
});

describe("bandOffsetRatio", () => {
  const band = { lowEdgeMhz: 470, highEdgeMhz: 608 };
  const offset = (frequencyMhz: number) => bandOffsetRatio({ ...band, frequencyMhz });

  it("is 0 in the geometric middle and 1 at both edges", () => {
    expect(offset(Math.sqrt(470 * 608))).toBeCloseTo(0, 9);
    expect(offset(470)).toBeCloseTo(1, 9);
    expect(offset(608)).toBeCloseTo(1, 9);
  });

  it("is the same for two frequencies whose product is that of the edges", () => {
    fc.assert(
      fc.property(within({ min: 1, max: 10_000 }), (frequencyMhz) => {
        const mirrored = offset((470 * 608) / frequencyMhz);
        expect(mirrored / offset(frequencyMhz)).toBeCloseTo(1, 6);
      }),
      SEEDED,
    );
  });

  it("makes a real band-pass circuit of the prototype", () => {
    // Each element becomes a tuned circuit of coil and capacitor: L = g/(2π·B) in line with C = 1/((2π·f0)²·L).
    const bandwidth = 608 - 470;
    const middle = Math.sqrt(470 * 608);
    for (const frequencyMhz of [300, 430, 480, 520, 590, 650, 900]) {
      const coil = 1 / (2 * Math.PI * bandwidth);
      const capacitor = 1 / ((2 * Math.PI * middle) ** 2 * coil);
      const omega = 2 * Math.PI * frequencyMhz;
      const reactance = omega * coil - 1 / (omega * capacitor);
      expect(
        Math.abs(
          ladderLossDb(HALF_DECIBEL_3, reactance) -
            chebyshevLossDb({ offsetRatio: offset(frequencyMhz), order: 3, rippleDb: 0.5 }),
        ),
      ).toBeLessThan(0.01);
    }
  });

  it("is finite for everything that it takes, and refuses the rest", () => {
    const frequencies = within(FREQUENCY_LIMITS_MHZ);
    fc.assert(
      fc.property(frequencies, frequencies, frequencies, (frequencyMhz, a, b) => {
        if (a === b) return;
        const edges = { lowEdgeMhz: Math.min(a, b), highEdgeMhz: Math.max(a, b) };
        const offsetRatio = bandOffsetRatio({ frequencyMhz, ...edges });
        expect(Number.isFinite(offsetRatio) && offsetRatio >= 0).toBe(true);
        expect(offsetRatio).toBeLessThanOrEqual(OFFSET_RATIO_LIMITS.max);
      }),
      SEEDED,
    );
    expectRefused(
      "bandOffsetRatio",
      bandOffsetRatio,
      { frequencyMhz: 500, ...band },
      { frequencyMhz: [0, -1, 4e6], lowEdgeMhz: [0, -1, 4e6], highEdgeMhz: [0, -1, 4e6] },
    );
    expect(() => bandOffsetRatio({ frequencyMhz: 500, lowEdgeMhz: 608, highEdgeMhz: 470 })).toThrow(
      "bandOffsetRatio: highEdgeMhz must be above lowEdgeMhz 608, got 470",
    );
  });
});

describe("smallestFilterOrder", () => {
  it("finds that order 5 is enough for 15 dB at 3 GHz with a cut-off of 2 GHz", () => {
    // D. M. Pozar, Microwave Engineering, example 8.4 (p. 447), read second-hand.
    const lossOfOrderDb = (order: number) =>
      butterworthLossDb({ offsetRatio: 1.5, order, edgeLossDb: HALF_POWER_DB });
    expect(smallestFilterOrder(15, lossOfOrderDb)).toBe(5);
  });

  it("is the smallest that is enough", () => {
    fc.assert(
      fc.property(offsets, ripples, within({ min: 0.001, max: 300 }), (extra, rippleDb, wanted) => {
        const lossOfOrderDb = (order: number) =>
          chebyshevLossDb({ offsetRatio: 1.01 + extra, order, rippleDb });
        const order = smallestFilterOrder(wanted, lossOfOrderDb);
        if (order === null) {
          expect(lossOfOrderDb(FILTER_ORDER_LIMITS.max)).toBeLessThan(wanted);
          return;
        }
        expect(lossOfOrderDb(order)).toBeGreaterThanOrEqual(wanted);
        if (order > 1) expect(lossOfOrderDb(order - 1)).toBeLessThan(wanted);
      }),
      SEEDED,
    );
  });

  it("says so when no order is enough", () => {
    expect(smallestFilterOrder(10, () => 9.99)).toBeNull();
    expect(smallestFilterOrder(10, (order) => (order === 20 ? 10 : 0))).toBe(20);
  });

  it("refuses a wish that is none", () => {
    expectRefused(
      "smallestFilterOrder",
      ({ wantedLossDb }) => smallestFilterOrder(wantedLossDb, () => 50),
      { wantedLossDb: 40 },
      { wantedLossDb: [0, -1, 301] },
    );
  });
});
