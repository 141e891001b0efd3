import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { freeSpaceLossDb } from "../../src/radio/free-space-loss.ts";
import {
  hiddenCorrectionDb,
  LOCATION_LIMITS,
  sightCorrectionDb,
} from "../../src/radio/low-terminal-corrections.ts";
import { lowTerminalLossDb } from "../../src/radio/low-terminal-loss.ts";
import { sightDistanceM } from "../../src/radio/sight-distance.ts";
import { SEEDED, within } from "./samples.ts";
import { expectFinite, expectRefusals } from "./whole-range.ts";

const LOCATION = { locationProbability: LOCATION_LIMITS };
const SINGLES = [
  ["sightCorrectionDb", sightCorrectionDb],
  ["hiddenCorrectionDb", hiddenCorrectionDb],
  ["sightDistanceM", sightDistanceM],
] as const;

describe.each(SINGLES)("%s", (name, call) => {
  it("is finite all over its range, and refuses the rest", () => {
    expectFinite(LOCATION, (it) => call(it.locationProbability));
    expectRefusals(name, LOCATION, { locationProbability: 0.5 }, (it) =>
      call(it.locationProbability),
    );
  });
});

describe("the corrections for a share of places", () => {
  it("are 0 dB for half of the places", () => {
    // Table of Rec. ITU-R P.1411-11, section 4.3.1, from memory, to be verified: 0 dB at 50 %, printed to 0.1 dB.
    // The formula's 1.1774 is the rounded root of 2·ln 2.
    expect(sightCorrectionDb(0.5)).toBeCloseTo(0, 3);
    expect(hiddenCorrectionDb(0.5)).toBeCloseTo(0, 12);
  });

  it("rise with the share, out of sight alike on both sides", () => {
    fc.assert(
      fc.property(within(LOCATION_LIMITS), within(LOCATION_LIMITS), (one, other) => {
        if (one < other) {
          expect(sightCorrectionDb(one)).toBeLessThanOrEqual(sightCorrectionDb(other));
          expect(hiddenCorrectionDb(one)).toBeLessThanOrEqual(hiddenCorrectionDb(other));
        }
        expect(hiddenCorrectionDb(1 - one)).toBeCloseTo(-hiddenCorrectionDb(one), 9);
      }),
      SEEDED,
    );
  });
});

describe("sightDistanceM", () => {
  it.each([
    // Same table, printed in whole metres, so half a metre either way.
    [0.5, 44],
    [0.9, 16],
    [0.99, 10],
  ])("is for a share of %s about %s m", (share, metres) => {
    expect(Math.abs(sightDistanceM(share) - metres)).toBeLessThanOrEqual(0.5);
  });

  it("falls with the share, without a jump where its two parts meet", () => {
    expect(sightDistanceM(0.2)).toBeGreaterThan(sightDistanceM(0.3));
    expect(sightDistanceM(0.6)).toBeGreaterThan(sightDistanceM(0.7));
    expect(Math.abs(sightDistanceM(0.4499999) - sightDistanceM(0.45))).toBeLessThan(0.1);
  });
});

describe("lowTerminalLossDb", () => {
  const LIMITS = {
    distanceM: { min: 1, max: 3000 },
    frequencyMhz: { min: 300, max: 3000 },
    locationProbability: LOCATION_LIMITS,
    urbanDb: { min: 0, max: 30 },
    transitionM: { min: 1, max: 100 },
  };
  const GOOD = {
    distanceM: 100,
    frequencyMhz: 900,
    locationProbability: 0.5,
    urbanDb: 0,
    transitionM: 20,
  };

  it("is free space for half of the places in sight", () => {
    // The Recommendation's constant 32.45 against 32.4478 unrounded, and 1.1774 for a median: 0.01 dB.
    const loss = lowTerminalLossDb({ ...GOOD, distanceM: 20 });
    expect(Math.abs(loss - freeSpaceLossDb(20, 900))).toBeLessThan(0.01);
  });

  it("does not jump where sight ends, nor where the transition ends", () => {
    const sightM = sightDistanceM(GOOD.locationProbability);
    for (const edgeM of [sightM, sightM + GOOD.transitionM]) {
      const before = lowTerminalLossDb({ ...GOOD, distanceM: edgeM - 1e-6 });
      expect(lowTerminalLossDb({ ...GOOD, distanceM: edgeM + 1e-6 }) - before).toBeLessThan(0.001);
    }
  });

  it("grows with the distance and with the share of places", () => {
    const distances = within(LIMITS.distanceM);
    fc.assert(
      fc.property(distances, distances, within(LOCATION_LIMITS), (one, other, share) => {
        const loss = (distanceM: number, locationProbability = share) =>
          lowTerminalLossDb({ ...GOOD, distanceM, locationProbability });
        if (one < other) expect(loss(one)).toBeLessThanOrEqual(loss(other) + 1e-9);
        if (share < 0.9) expect(loss(one, share + 0.05)).toBeGreaterThan(loss(one));
      }),
      SEEDED,
    );
  });

  it("adds the loss of the town out of sight only", () => {
    const urban = { ...GOOD, urbanDb: 6.8 };
    expect(lowTerminalLossDb(urban) - lowTerminalLossDb(GOOD)).toBeCloseTo(6.8, 9);
    const near = { distanceM: 10 };
    expect(lowTerminalLossDb({ ...urban, ...near })).toBe(lowTerminalLossDb({ ...GOOD, ...near }));
  });

  it("is finite all over its range, and refuses the rest", () => {
    expectFinite(LIMITS, lowTerminalLossDb);
    expectRefusals("lowTerminalLossDb", LIMITS, GOOD, lowTerminalLossDb);
  });
});
