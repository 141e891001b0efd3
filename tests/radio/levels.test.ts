import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { gainDbd, gainDbi } from "../../src/radio/dipole-gain.ts";
import { eirpFromErpDbm, erpFromEirpDbm } from "../../src/radio/dipole-power.ts";
import { fieldRatio, fieldRatioDb } from "../../src/radio/field-ratio.ts";
import {
  GAIN_LIMITS_DB,
  IMPEDANCE_LIMITS_OHM,
  LEVEL_LIMITS_DBM,
  LOSS_LIMITS_DB,
  POWER_LIMITS_MW,
  POWER_LIMITS_W,
  RATIO_LIMITS,
  VOLTAGE_LIMITS_DBUV,
} from "../../src/radio/level-limits.ts";
import { LEVEL_CHANGE_LIMITS_DB } from "../../src/radio/limits.ts";
import { levelDbm, levelOfWattsDbm, powerMw, powerW } from "../../src/radio/power-level.ts";
import { powerRatio, powerRatioDb } from "../../src/radio/power-ratio.ts";
import { eirpDbm, powerForEirpDbm } from "../../src/radio/radiated-power.ts";
import { levelOfVoltageDbm, voltageDbuv } from "../../src/radio/voltage-level.ts";
import { SEEDED, within } from "./samples.ts";
import { expectFinite, expectRefusals } from "./whole-range.ts";

/** Functions of one number: limits, a good value, the call, and the inverse where there is one. */
const SINGLES = [
  ["powerRatioDb", "ratio", RATIO_LIMITS, powerRatioDb, powerRatio],
  ["powerRatio", "changeDb", LEVEL_CHANGE_LIMITS_DB, powerRatio, powerRatioDb],
  ["fieldRatioDb", "ratio", RATIO_LIMITS, fieldRatioDb, fieldRatio],
  ["fieldRatio", "changeDb", { min: -600, max: 600 }, fieldRatio, fieldRatioDb],
  ["levelDbm", "powerMw", POWER_LIMITS_MW, levelDbm, powerMw],
  ["powerMw", "powerDbm", LEVEL_LIMITS_DBM, powerMw, levelDbm],
  ["levelOfWattsDbm", "powerW", POWER_LIMITS_W, levelOfWattsDbm, powerW],
  ["powerW", "powerDbm", LEVEL_LIMITS_DBM, powerW, levelOfWattsDbm],
  ["gainDbi", "gainDbd", GAIN_LIMITS_DB, gainDbi, gainDbd],
  ["gainDbd", "gainDbi", GAIN_LIMITS_DB, gainDbd, gainDbi],
  ["eirpFromErpDbm", "erpDbm", LEVEL_LIMITS_DBM, eirpFromErpDbm, erpFromEirpDbm],
  ["erpFromEirpDbm", "eirpDbm", LEVEL_LIMITS_DBM, erpFromEirpDbm, eirpFromErpDbm],
] as const;

describe.each(SINGLES)("%s", (functionName, name, limits, call, inverse) => {
  it("is finite all over its range", () => {
    expectFinite({ [name]: limits }, (input) => call(input[name] ?? Number.NaN));
  });

  it("refuses what lies outside its range, and says so", () => {
    const good = { [name]: 1 };
    expectRefusals(functionName, { [name]: limits }, good, (input) =>
      call(input[name] ?? Number.NaN),
    );
  });

  it("rises with its argument, and is undone by its inverse", () => {
    // The middle part of every range, which the inverse takes too.
    const middle = within({ min: Math.max(limits.min, -90), max: Math.min(limits.max, 90) });
    fc.assert(
      fc.property(middle, middle, (one, other) => {
        if (one < other) expect(call(one)).toBeLessThanOrEqual(call(other));
        const back = inverse(call(one));
        expect(Math.abs(back - one)).toBeLessThanOrEqual(1e-12 * Math.max(Math.abs(one), 100));
      }),
      SEEDED,
    );
  });
});

describe("ratios in decibels", () => {
  // log10 2 = 0.30103 from any table of logarithms.
  it("are 3.01 dB for twice the power and 6.02 dB for twice the voltage", () => {
    expect(powerRatioDb(2)).toBeCloseTo(3.0103, 4);
    expect(fieldRatioDb(2)).toBeCloseTo(6.0206, 4);
  });

  it("are plainly 0 dB for equal powers", () => {
    expect(powerRatioDb(1)).toBe(0);
    expect(fieldRatioDb(1)).toBe(0);
    expect(powerRatio(0)).toBe(1);
    expect(fieldRatio(0)).toBe(1);
  });

  it("add where the ratios multiply", () => {
    const ratios = within({ min: 1e-6, max: 1e6 });
    fc.assert(
      fc.property(ratios, ratios, (one, other) => {
        expect(powerRatioDb(one * other)).toBeCloseTo(powerRatioDb(one) + powerRatioDb(other), 9);
        expect(fieldRatioDb(one)).toBeCloseTo(powerRatioDb(one ** 2), 9);
      }),
      SEEDED,
    );
  });
});

describe("levels of power", () => {
  // Common practice, and the definition: a thousand times is 30 dB.
  it.each([
    [1, 0],
    [10, 10],
    [100, 20],
    [1000, 30],
    [0.001, -30],
  ])("are the powers of ten: %s mW is %s dBm", (milliwatts, dbm) => {
    expect(levelDbm(milliwatts)).toBeCloseTo(dbm, 12);
    expect(powerMw(dbm)).toBeCloseTo(milliwatts, 9);
    expect(levelOfWattsDbm(milliwatts / 1000)).toBeCloseTo(dbm, 12);
    expect(powerW(dbm)).toBeCloseTo(milliwatts / 1000, 12);
  });

  it.each([
    // Printed in whole milliwatts: 12 dBm and 14.15 dBm, limits of a set-up with 7 dBi and 2 dB of
    // cable; computed independently.
    [12, 16],
    [14.15, 26],
  ])("give %s dBm as %s mW, rounded", (dbm, milliwatts) => {
    expect(Math.round(powerMw(dbm))).toBe(milliwatts);
  });

  it("give 17.0 dBW for 50 W", () => {
    // T. S. Rappaport, Wireless Communications, 2nd ed., example 4.2, p. 109, printed to 0.1 dB;
    // second-hand in a textbook companion.
    expect(levelOfWattsDbm(50) - 30).toBeCloseTo(17.0, 1);
  });

  it("leave 116.6 dB of loss between 4 W and -80.6 dBm", () => {
    // V. Garg, Wireless Communications and Networking, 2nd ed., example 3.3, p. 58, printed to 0.1 dB;
    // second-hand in a textbook companion.
    expect(Math.abs(levelOfWattsDbm(4) + 80.6 - 116.6)).toBeLessThan(0.05);
  });
});

describe("voltageDbuv and levelOfVoltageDbm", () => {
  // 106.99 and 108.75 dB: computed independently with numpy; 107.0 is common practice.
  it.each([
    [50, 106.99],
    [75, 108.75],
  ])("lie apart by a constant: in %s ohm %s dB", (impedanceOhm, constantDb) => {
    expect(voltageDbuv(-60, impedanceOhm) + 60).toBeCloseTo(constantDb, 2);
    expect(levelOfVoltageDbm(constantDb - 60, impedanceOhm)).toBeCloseTo(-60, 2);
  });

  it("give half of the open-circuit voltage that a textbook prints", () => {
    // T. S. Rappaport, 2nd ed., example 4.3, p. 112: -61.5 dBm from a 50 ohm antenna, 0.375 mV rms open
    // circuit; -61.5 is rounded by 0.05 dB, which is 0.6 %. Across the load it is half of that.
    const acrossMv = fieldRatio(voltageDbuv(-61.5, 50)) / 1000;
    expect(Math.abs(2 * acrossMv - 0.375)).toBeLessThan(0.375 * 0.007);
  });

  it("undo each other", () => {
    fc.assert(
      fc.property(within(LEVEL_LIMITS_DBM), within(IMPEDANCE_LIMITS_OHM), (powerDbm, ohm) => {
        expect(levelOfVoltageDbm(voltageDbuv(powerDbm, ohm), ohm)).toBeCloseTo(powerDbm, 9);
      }),
      SEEDED,
    );
  });

  it("are finite all over their range, and refuse the rest", () => {
    const toVoltage = { powerDbm: LEVEL_LIMITS_DBM, impedanceOhm: IMPEDANCE_LIMITS_OHM };
    expectFinite(toVoltage, (it) => voltageDbuv(it.powerDbm, it.impedanceOhm));
    expectRefusals("voltageDbuv", toVoltage, { powerDbm: -60, impedanceOhm: 50 }, (it) =>
      voltageDbuv(it.powerDbm, it.impedanceOhm),
    );
    const toLevel = { voltageDbuv: VOLTAGE_LIMITS_DBUV, impedanceOhm: IMPEDANCE_LIMITS_OHM };
    expectFinite(toLevel, (it) => levelOfVoltageDbm(it.voltageDbuv, it.impedanceOhm));
    expectRefusals("levelOfVoltageDbm", toLevel, { voltageDbuv: 40, impedanceOhm: 50 }, (it) =>
      levelOfVoltageDbm(it.voltageDbuv, it.impedanceOhm),
    );
  });
});

describe("the half-wave dipole", () => {
  it("has the gain that the integral over its pattern gives", () => {
    // Pattern of a thin half-wave dipole, (cos(π/2·cos θ) / sin θ)², from any antenna textbook. Gain of
    // the best direction: 2 over the integral of pattern times sin θ. Simpson's rule, 2000 strips.
    const strips = 2000;
    const strip = Math.PI / strips;
    let sum = 0;
    for (let index = 1; index < strips; index += 1) {
      const theta = index * strip;
      const weight = index % 2 === 1 ? 4 : 2;
      sum += (weight * Math.cos((Math.PI / 2) * Math.cos(theta)) ** 2) / Math.sin(theta);
    }
    const exactDbi = 10 * Math.log10(2 / ((sum * strip) / 3));
    expect(exactDbi).toBeCloseTo(2.151, 3); // computed independently with numpy: 2.151 dBi
    expect(Math.abs(gainDbi(0) - exactDbi)).toBeLessThan(0.002);
  });

  it("makes the factor 1.64 that rules print between ERP and EIRP", () => {
    expect(powerMw(eirpFromErpDbm(levelDbm(50)))).toBeCloseTo(50 * 1.64, 0);
    expect(powerRatio(gainDbi(0))).toBeCloseTo(1.64, 2);
  });

  it("lies 2.15 dB from isotropic in ERP as in gain, with the same sign", () => {
    expect(eirpFromErpDbm(10)).toBeCloseTo(gainDbi(10), 12);
    expect(erpFromEirpDbm(10)).toBeCloseTo(gainDbd(10), 12);
    expect(eirpFromErpDbm(10)).toBeGreaterThan(10);
  });
});

describe("eirpDbm and powerForEirpDbm", () => {
  const limits = { powerDbm: LEVEL_LIMITS_DBM, lossDb: LOSS_LIMITS_DB, gainDbi: GAIN_LIMITS_DB };
  const wishLimits = { eirpDbm: LEVEL_LIMITS_DBM, lossDb: LOSS_LIMITS_DB, gainDbi: GAIN_LIMITS_DB };

  it("go up with gain and down with loss", () => {
    const plain = { powerDbm: 10, lossDb: 0, gainDbi: 0 };
    expect(eirpDbm({ ...plain, gainDbi: 3 })).toBeGreaterThan(eirpDbm(plain));
    expect(eirpDbm({ ...plain, lossDb: 3 })).toBeLessThan(eirpDbm(plain));
  });

  it("undo each other", () => {
    fc.assert(
      fc.property(
        within({ min: -100, max: 100 }),
        within({ min: 0, max: 100 }),
        within({ min: -50, max: 50 }),
        (powerDbm, lossDb, gain) => {
          const line = { lossDb, gainDbi: gain };
          const sentDbm = eirpDbm({ ...line, powerDbm });
          expect(powerForEirpDbm({ ...line, eirpDbm: sentDbm })).toBeCloseTo(powerDbm, 9);
        },
      ),
      SEEDED,
    );
  });

  it("are finite all over their range, and refuse the rest, a negative loss too", () => {
    expectFinite(limits, eirpDbm);
    expectFinite(wishLimits, powerForEirpDbm);
    expectRefusals("eirpDbm", limits, { powerDbm: 17, lossDb: 2, gainDbi: 7 }, eirpDbm);
    const good = { eirpDbm: 17, lossDb: 2, gainDbi: 7 };
    expectRefusals("powerForEirpDbm", wishLimits, good, powerForEirpDbm);
    expect(() => eirpDbm({ powerDbm: 17, lossDb: -2, gainDbi: 7 })).toThrow("lossDb");
  });
});
