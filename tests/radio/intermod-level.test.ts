import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  FIFTH_ORDER,
  INTERMOD_RECIPES,
  type IntermodKind,
  THIRD_ORDER,
} from "../../src/radio/intermod-kind.ts";
import {
  carriersForProductDbm,
  interceptFromProductDbm,
  intermodLevelDbm,
} from "../../src/radio/intermod-level.ts";
import { intermodLevelChangeDb } from "../../src/radio/intermod-level-change.ts";
import { LEVEL_LIMITS_DBM } from "../../src/radio/level-limits.ts";
import { spuriousFreeRangeDb } from "../../src/radio/spurious-free-range.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED, within } from "./samples.ts";

const ALL = [...THIRD_ORDER, ...FIFTH_ORDER];
const levels = within(LEVEL_LIMITS_DBM);
const levelsFor = (kind: IntermodKind, level: (place: number) => number) =>
  INTERMOD_RECIPES[kind].factors.map((_, place) => level(place));

/**
 * Voltage of one product when carriers of 1 V times `volts` go through v + v^order: one period of the
 * common frequency, sampled finely enough for the fifth power, and one line of its Fourier series.
 */
function simulatedVolts(kind: IntermodKind, volts: readonly number[]): number {
  const { order, factors } = INTERMOD_RECIPES[kind];
  // Far enough apart that no other product of the same order lands on the line.
  const lines = [211, 250, 337].slice(0, factors.length);
  const productLine = Math.abs(
    factors.reduce((sum, factor, place) => sum + factor * (lines[place] ?? 0), 0),
  );
  const samples = 8192;
  let sum = 0;
  for (let n = 0; n < samples; n += 1) {
    const turn = (2 * Math.PI * n) / samples;
    const v = volts.reduce(
      (total, each, place) => total + each * Math.cos((lines[place] ?? 0) * turn),
      0,
    );
    sum += v ** order * Math.cos(productLine * turn);
  }
  return (2 / samples) * sum;
}

describe("intermodLevelDbm", () => {
  it.each(ALL)("has the level of %s that a simulated characteristic has", (kind) => {
    const { order } = INTERMOD_RECIPES[kind];
    const twoCarriers = order === 3 ? "2A-B" : "3A-2B";
    // The intercept point by definition: where product and carriers of two equal carriers are alike.
    const perVolt = Math.abs(simulatedVolts(twoCarriers, [1, 1]));
    const interceptDbm = 20 * Math.log10((1 / perVolt) ** (1 / (order - 1)));
    const volts = levelsFor(kind, (place) => [0.02, 0.05, 0.03][place] ?? 0);
    const productDbm = 20 * Math.log10(Math.abs(simulatedVolts(kind, volts)));
    const levelsDbm = volts.map((each) => 20 * Math.log10(each));
    expect(intermodLevelDbm({ kind, levelsDbm, interceptDbm })).toBeCloseTo(productDbm, 6);
  });

  it("is 6.02 dB higher for three carriers than for two, not 3.5 dB", () => {
    // microwavejournal.com/articles/3377 (carrier triple beats), read 2026-12-01: 6 dB. A page at
    // rfessentials.com prints 3.5 dB.
    const two = intermodLevelDbm({ kind: "2A-B", levelsDbm: [-30, -30], interceptDbm: 10 });
    const three = intermodLevelDbm({ kind: "A+B-C", levelsDbm: [-30, -30, -30], interceptDbm: 10 });
    expect(three - two).toBeCloseTo(6.0206, 4);
  });

  it.each(ALL)(
    "of %s equals the carriers at the intercept point, but for the number of carriers",
    (kind) => {
      const levelsDbm = levelsFor(kind, () => 10);
      const { voltageRatio } = INTERMOD_RECIPES[kind];
      expect(intermodLevelDbm({ kind, levelsDbm, interceptDbm: 10 })).toBeCloseTo(
        10 + 20 * Math.log10(voltageRatio),
        9,
      );
    },
  );

  it("grows by 2 dB with each dB of the first carrier and by 1 dB with the second", () => {
    // CEPT handbook, page 505027: product = 2·E1 + E2 + a constant of the receiver.
    const level = (first: number, second: number) =>
      intermodLevelDbm({ kind: "2A-B", levelsDbm: [first, second], interceptDbm: 0 });
    expect(level(-39, -50) - level(-40, -50)).toBeCloseTo(2, 9);
    expect(level(-40, -49) - level(-40, -50)).toBeCloseTo(1, 9);
  });

  it("is undone by interceptFromProductDbm and carriersForProductDbm, and finite", () => {
    fc.assert(
      fc.property(fc.constantFrom(...ALL), levels, levels, levels, levels, (kind, a, b, c, ip) => {
        const levelsDbm = levelsFor(kind, (place) => [a, b, c][place] ?? 0);
        const productDbm = intermodLevelDbm({ kind, levelsDbm, interceptDbm: ip });
        expect(Number.isFinite(productDbm)).toBe(true);
        const equalDbm = carriersForProductDbm({ kind, productDbm: a, interceptDbm: ip });
        expect(Number.isFinite(equalDbm)).toBe(true);
        if (equalDbm >= LEVEL_LIMITS_DBM.min && equalDbm <= LEVEL_LIMITS_DBM.max) {
          const equal = levelsFor(kind, () => equalDbm);
          expect(intermodLevelDbm({ kind, levelsDbm: equal, interceptDbm: ip })).toBeCloseTo(a, 7);
        }
        if (productDbm < LEVEL_LIMITS_DBM.min || productDbm > LEVEL_LIMITS_DBM.max) return;
        expect(interceptFromProductDbm({ kind, levelsDbm, productDbm })).toBeCloseTo(ip, 7);
      }),
      SEEDED,
    );
  });

  it("and its inverses refuse what is out of range, and a wrong number of levels", () => {
    const pair = { kind: "2A-B" } as const;
    const outside = { levelDbm: [-301, 301], interceptDbm: [-301, 301], productDbm: [-301, 301] };
    expectRefused(
      "intermodLevelDbm",
      ({ levelDbm, interceptDbm }) =>
        intermodLevelDbm({ ...pair, levelsDbm: [-30, levelDbm], interceptDbm }),
      { levelDbm: -30, interceptDbm: 10 },
      outside,
    );
    expectRefused(
      "interceptFromProductDbm",
      ({ levelDbm, productDbm }) =>
        interceptFromProductDbm({ ...pair, levelsDbm: [levelDbm, -30], productDbm }),
      { levelDbm: -30, productDbm: -90 },
      outside,
    );
    expectRefused(
      "carriersForProductDbm",
      ({ productDbm, interceptDbm }) =>
        carriersForProductDbm({ ...pair, productDbm, interceptDbm }),
      { productDbm: -90, interceptDbm: 10 },
      outside,
    );
    const three = () => intermodLevelDbm({ ...pair, levelsDbm: [-30, -30, -30], interceptDbm: 10 });
    expect(three).toThrow("intermodLevelDbm: levelsDbm must be 2 levels, got 3");
  });
});

describe("intermodLevelChangeDb", () => {
  it("takes 3 dB off a third-order product and 5 dB off a fifth-order one when all go down by 1 dB", () => {
    // The slope of a product of order n; fact of the trade.
    for (const kind of THIRD_ORDER)
      expect(
        intermodLevelChangeDb(
          kind,
          levelsFor(kind, () => -1),
        ),
      ).toBe(-3);
    for (const kind of FIFTH_ORDER)
      expect(
        intermodLevelChangeDb(
          kind,
          levelsFor(kind, () => -1),
        ),
      ).toBe(-5);
  });

  it("is the difference of two levels", () => {
    fc.assert(
      fc.property(fc.constantFrom(...ALL), levels, levels, levels, (kind, a, b, c) => {
        const changesDb = levelsFor(kind, (place) => ([a, b, c][place] ?? 0) / 2);
        const before = levelsFor(kind, () => -50);
        const after = before.map((level, place) => level + (changesDb[place] ?? 0));
        const level = (levelsDbm: readonly number[]) =>
          intermodLevelDbm({ kind, levelsDbm, interceptDbm: 20 });
        expect(intermodLevelChangeDb(kind, changesDb)).toBeCloseTo(level(after) - level(before), 7);
      }),
      SEEDED,
    );
  });

  it("refuses a change that is none, and a wrong number of them", () => {
    expectRefused(
      "intermodLevelChangeDb",
      ({ changeDb }) => intermodLevelChangeDb("2A-B", [0, changeDb]),
      { changeDb: -1 },
      { changeDb: [-301, 301] },
    );
    expect(() => intermodLevelChangeDb("A+B-C", [-1, -1])).toThrow("must be 3 changes, got 2");
  });
});

describe("spuriousFreeRangeDb", () => {
  it("is where the product of equal carriers comes up to the floor", () => {
    fc.assert(
      fc.property(
        within({ min: -60, max: 60 }),
        within({ min: -200, max: -80 }),
        (ip, floorDbm) => {
          const carriersDbm = floorDbm + spuriousFreeRangeDb(ip, floorDbm);
          const levelsDbm = [carriersDbm, carriersDbm];
          expect(intermodLevelDbm({ kind: "2A-B", levelsDbm, interceptDbm: ip })).toBeCloseTo(
            floorDbm,
            8,
          );
        },
      ),
      SEEDED,
    );
  });

  it("refuses what is out of range", () => {
    expectRefused(
      "spuriousFreeRangeDb",
      ({ interceptDbm, floorDbm }) => spuriousFreeRangeDb(interceptDbm, floorDbm),
      { interceptDbm: 5, floorDbm: -94 },
      { interceptDbm: [-301, 301], floorDbm: [-301, 301] },
    );
  });
});
