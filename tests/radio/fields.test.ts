import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fieldRatio } from "../../src/radio/field-ratio.ts";
import { eirpForFieldDbm, fieldDbuvPerM } from "../../src/radio/field-strength.ts";
import { fieldOfFluxDbuvPerM, fluxDbwPerM2 } from "../../src/radio/flux-density.ts";
import {
  FIELD_LIMITS_DBUV_PER_M,
  GAIN_LIMITS_DB,
  LEVEL_LIMITS_DBM,
} from "../../src/radio/level-limits.ts";
import { DISTANCE_LIMITS_M, FREQUENCY_LIMITS_MHZ } from "../../src/radio/limits.ts";
import { levelOfWattsDbm, powerW } from "../../src/radio/power-level.ts";
import { powerRatio } from "../../src/radio/power-ratio.ts";
import { fieldForLevelDbuvPerM, receivedDbm } from "../../src/radio/received-level.ts";
import { SEEDED, within } from "./samples.ts";
import { expectFinite, expectRefusals } from "./whole-range.ts";

interface Link {
  readonly eirpDbm: number;
  readonly distanceM: number;
  readonly frequencyMhz: number;
  readonly gainDbi: number;
}

/** From radiated power over field strength to the receiver: all of free space in two steps. */
const overTheFieldDbm = ({ eirpDbm, distanceM, frequencyMhz, gainDbi }: Link): number =>
  receivedDbm({ fieldDbuvPerM: fieldDbuvPerM(eirpDbm, distanceM), frequencyMhz, gainDbi });

describe("field strength and received level, one after the other", () => {
  const RAPPAPORT = { frequencyMhz: 900, gainDbi: 0, eirpDbm: levelOfWattsDbm(50) };

  // T. S. Rappaport, Wireless Communications, 2nd ed., examples 4.2 and 4.3, pp. 109 and 112; second-hand in
  // a textbook companion. Printed to 0.1 dB; a gain of 2 is 3.0103 dB.
  it.each([
    [100, 0, -24.5],
    [10_000, 0, -64.5],
    [10_000, 3.0103, -61.5],
  ])("give what a textbook prints at %s m with %s dBi", (distanceM, gainDbi, expected) => {
    const levelDbm = overTheFieldDbm({ ...RAPPAPORT, distanceM, gainDbi });
    expect(Math.abs(levelDbm - expected)).toBeLessThan(0.05);
  });

  it("give -75.31 dBm over 35 900 km", () => {
    // D. M. Pozar, Microwave Engineering, example 12.2, p. 666: 120 W, 42 dB and 31 dB, 6 GHz; second-hand in a
    // textbook companion. Printed to 0.01 dB; c rounded to 3e8 m/s there, which is 0.006 dB.
    const eirpDbm = levelOfWattsDbm(120) + 42;
    const link = { eirpDbm, distanceM: 35_900_000, frequencyMhz: 6000, gainDbi: 31 };
    expect(Math.abs(overTheFieldDbm(link) + 75.31)).toBeLessThan(0.015);
  });

  it("give 132.4478 dB of loss at 10 km and 10 GHz", () => {
    // Manual of a general maths program, function for free-space path loss, printed to 0.0001 dB.
    const link = { eirpDbm: 0, distanceM: 10_000, frequencyMhz: 10_000, gainDbi: 0 };
    expect(Math.abs(overTheFieldDbm(link) + 132.4478)).toBeLessThan(0.0001);
  });

  // Test suite of an open network simulator: 0.05035702 W at a wavelength of 0.125 m, printed to six digits.
  it.each([
    [100, 4.98265e-10],
    [500, 1.99306e-11],
    [1000, 4.98265e-12],
    [2000, 1.24566e-12],
  ])("give the watts that a simulator's tests print at %s m: %s", (distanceM, expectedW) => {
    const eirpDbm = levelOfWattsDbm(0.05035702);
    const link = { eirpDbm, distanceM, frequencyMhz: 2398.339664, gainDbi: 0 };
    expect(powerW(overTheFieldDbm(link)) / expectedW).toBeCloseTo(1, 5);
  });

  it("lose 6.02 dB for twice the distance and for twice the frequency", () => {
    const link = { eirpDbm: 17, distanceM: 20, frequencyMhz: 550, gainDbi: 0 };
    const plain = overTheFieldDbm(link);
    expect(plain - overTheFieldDbm({ ...link, distanceM: 40 })).toBeCloseTo(6.0206, 4);
    expect(plain - overTheFieldDbm({ ...link, frequencyMhz: 1100 })).toBeCloseTo(6.0206, 4);
  });
});

describe("fieldDbuvPerM", () => {
  // Root of 30 times the power over the distance, computed independently; printed to 0.01 V/m and to 0.1 V/m.
  it.each([
    [0.01, 1, 0.55, 0.005],
    [0.05, 1, 1.22, 0.005],
    [0.1, 1, 1.73, 0.005],
    [0.25, 1, 2.74, 0.005],
    [0.01, 0.2, 2.7, 0.05],
    [0.05, 0.2, 6.1, 0.05],
    [0.1, 0.2, 8.7, 0.05],
    [0.25, 0.2, 13.7, 0.05],
  ])("is for %s W at %s m as much as %s V/m", (eirpW, distanceM, expected, tolerance) => {
    const voltsPerM = fieldRatio(fieldDbuvPerM(levelOfWattsDbm(eirpW), distanceM) - 120);
    expect(Math.abs(voltsPerM - expected)).toBeLessThanOrEqual(tolerance);
  });
});

describe("fluxDbwPerM2 and fieldOfFluxDbuvPerM", () => {
  it("take 100 pW/m² for 194.2 µV/m", () => {
    // A. Ghasemi, Propagation Engineering in Wireless Communications, example 2.6, p. 38; second-hand in a
    // textbook companion. Printed to 0.1 µV/m, with 120π Ω, which is 0.07 µV/m more.
    expect(Math.abs(fieldRatio(fieldOfFluxDbuvPerM(-100)) - 194.2)).toBeLessThan(0.12);
  });

  it("do not halve the flux, as one textbook does that takes the rms field for a peak", () => {
    // A. Ghasemi, example 2.8, p. 45, prints 12.4 nW/m² for 3.06 mV/m; with rms it is 24.9 (computed
    // independently; 3.06 is rounded by 0.3 % of its square).
    const fluxNwPerM2 = powerRatio(fluxDbwPerM2(20 * Math.log10(3060))) * 1e9;
    expect(Math.abs(fluxNwPerM2 - 24.9)).toBeLessThan(0.1);
  });

  it("let the sphere around a transmitter carry all of its power", () => {
    const distances = within({ min: 1, max: 1e6 });
    fc.assert(
      fc.property(distances, within({ min: -50, max: 50 }), (distanceM, eirpDbm) => {
        const fluxWPerM2 = powerRatio(fluxDbwPerM2(fieldDbuvPerM(eirpDbm, distanceM)));
        const sphereM2 = 4 * Math.PI * distanceM ** 2;
        expect((fluxWPerM2 * sphereM2) / powerW(eirpDbm)).toBeCloseTo(1, 9);
      }),
      SEEDED,
    );
  });
});

describe("the pairs of functions for fields", () => {
  const levels = within({ min: -150, max: 150 });

  it("undo each other", () => {
    const distances = within({ min: 0.1, max: 1e5 });
    const frequencies = within({ min: 1, max: 1e5 });
    fc.assert(
      fc.property(levels, distances, frequencies, (level, distanceM, frequencyMhz) => {
        expect(eirpForFieldDbm(fieldDbuvPerM(level, distanceM), distanceM)).toBeCloseTo(level, 9);
        expect(fluxDbwPerM2(fieldOfFluxDbuvPerM(level))).toBeCloseTo(level, 9);
        const antenna = { frequencyMhz, gainDbi: 3 };
        const field = fieldForLevelDbuvPerM({ ...antenna, receivedDbm: level });
        expect(receivedDbm({ ...antenna, fieldDbuvPerM: field })).toBeCloseTo(level, 9);
      }),
      SEEDED,
    );
  });

  const POWER_AND_DISTANCE = { eirpDbm: LEVEL_LIMITS_DBM, distanceM: DISTANCE_LIMITS_M };
  const FIELD_AND_DISTANCE = {
    fieldDbuvPerM: FIELD_LIMITS_DBUV_PER_M,
    distanceM: DISTANCE_LIMITS_M,
  };
  const FIELD_AND_GAIN = { fieldDbuvPerM: FIELD_LIMITS_DBUV_PER_M, gainDbi: GAIN_LIMITS_DB };
  const LEVEL_AND_GAIN = { receivedDbm: LEVEL_LIMITS_DBM, gainDbi: GAIN_LIMITS_DB };
  const FREQUENCY = { frequencyMhz: FREQUENCY_LIMITS_MHZ };
  const FLUX = { fluxDbwPerM2: { min: -700, max: 400 } };
  const FIELD = { fieldDbuvPerM: FIELD_LIMITS_DBUV_PER_M };

  it("are finite all over their range", () => {
    expectFinite(POWER_AND_DISTANCE, (it) => fieldDbuvPerM(it.eirpDbm, it.distanceM));
    expectFinite(FIELD_AND_DISTANCE, (it) => eirpForFieldDbm(it.fieldDbuvPerM, it.distanceM));
    expectFinite(FIELD, (it) => fluxDbwPerM2(it.fieldDbuvPerM));
    expectFinite(FLUX, (it) => fieldOfFluxDbuvPerM(it.fluxDbwPerM2));
    expectFinite({ ...FIELD_AND_GAIN, ...FREQUENCY }, receivedDbm);
    expectFinite({ ...LEVEL_AND_GAIN, ...FREQUENCY }, fieldForLevelDbuvPerM);
  });

  it("refuse what lies outside their range, and say which", () => {
    const power = { eirpDbm: 17, distanceM: 10 };
    expectRefusals("fieldDbuvPerM", POWER_AND_DISTANCE, power, (it) =>
      fieldDbuvPerM(it.eirpDbm, it.distanceM),
    );
    const field = { fieldDbuvPerM: 60, distanceM: 10 };
    expectRefusals("eirpForFieldDbm", FIELD_AND_DISTANCE, field, (it) =>
      eirpForFieldDbm(it.fieldDbuvPerM, it.distanceM),
    );
    expectRefusals("fluxDbwPerM2", FIELD, field, (it) => fluxDbwPerM2(it.fieldDbuvPerM));
    expectRefusals("fieldOfFluxDbuvPerM", FLUX, { fluxDbwPerM2: -100 }, (it) =>
      fieldOfFluxDbuvPerM(it.fluxDbwPerM2),
    );
    const antenna = { fieldDbuvPerM: 60, frequencyMhz: 550, gainDbi: 0 };
    expectRefusals("receivedDbm", FIELD_AND_GAIN, antenna, (it) =>
      receivedDbm({ ...antenna, ...it }),
    );
    expectRefusals("wavelengthM", FREQUENCY, antenna, (it) => receivedDbm({ ...antenna, ...it }));
    const wish = { receivedDbm: -60, frequencyMhz: 550, gainDbi: 0 };
    expectRefusals("fieldForLevelDbuvPerM", LEVEL_AND_GAIN, wish, (it) =>
      fieldForLevelDbuvPerM({ ...wish, ...it }),
    );
    expectRefusals("wavelengthM", FREQUENCY, wish, (it) =>
      fieldForLevelDbuvPerM({ ...wish, ...it }),
    );
  });
});
