import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { distanceForChangeM, levelChangeDb } from "../../src/radio/distance-ratio.ts";
import {
  DISTANCE_LIMITS_M,
  EXPONENT_LIMITS,
  LEVEL_CHANGE_LIMITS_DB,
} from "../../src/radio/limits.ts";
import { NEVER, SEEDED, within } from "./samples.ts";

const distances = within(DISTANCE_LIMITS_M);
const exponents = within(EXPONENT_LIMITS);

describe("levelChangeDb", () => {
  it("is positive when the new distance is nearer", () => {
    // Half the distance, four times the power: the inverse-square law. 10·log10 4 = 6.0206.
    expect(levelChangeDb({ fromM: 30, toM: 15, exponent: 2 })).toBeCloseTo(6.0206, 4);
  });

  it("is plainly 0 when nothing moves", () => {
    expect(levelChangeDb({ fromM: 30, toM: 30, exponent: 3 })).toBe(0);
  });

  it("is undone by moving back, and adds up over two moves", () => {
    fc.assert(
      fc.property(distances, distances, distances, exponents, (a, b, c, exponent) => {
        const change = (fromM: number, toM: number) => levelChangeDb({ fromM, toM, exponent });
        expect(change(a, b) + change(b, a)).toBeCloseTo(0, 8);
        expect(change(a, b) + change(b, c)).toBeCloseTo(change(a, c), 8);
      }),
      SEEDED,
    );
  });

  it("is finite for everything that it takes", () => {
    fc.assert(
      fc.property(distances, distances, exponents, (fromM, toM, exponent) => {
        expect(Number.isFinite(levelChangeDb({ fromM, toM, exponent }))).toBe(true);
      }),
      SEEDED,
    );
  });

  it.each(NEVER)("refuses %s for either distance and for the exponent, and says which", (bad) => {
    const good = { fromM: 30, toM: 15, exponent: 2 };
    for (const name of ["fromM", "toM", "exponent"]) {
      const call = () => levelChangeDb({ ...good, [name]: bad });
      expect(call).toThrow(RangeError);
      expect(call).toThrow(`levelChangeDb: ${name}`);
      expect(call).toThrow(`got ${bad}`);
    }
  });
});

describe("distanceForChangeM", () => {
  it("gives a shorter distance for a wished gain and a longer one for a wished loss", () => {
    expect(distanceForChangeM({ fromM: 30, changeDb: 20, exponent: 2 })).toBeCloseTo(3, 9);
    expect(distanceForChangeM({ fromM: 30, changeDb: -20, exponent: 2 })).toBeCloseTo(300, 9);
  });

  it("stays where it is when no change is wished", () => {
    expect(distanceForChangeM({ fromM: 30, changeDb: 0, exponent: 2.46 })).toBe(30);
  });

  it("is the inverse of levelChangeDb", () => {
    let returned = 0;
    fc.assert(
      fc.property(
        within({ min: 0.1, max: 2000 }),
        within({ min: -60, max: 60 }),
        within({ min: 1.2, max: 6 }),
        (fromM, changeDb, exponent) => {
          const toM = distanceForChangeM({ fromM, changeDb, exponent });
          if (toM < DISTANCE_LIMITS_M.min || toM > DISTANCE_LIMITS_M.max) return;
          expect(levelChangeDb({ fromM, toM, exponent })).toBeCloseTo(changeDb, 9);
          returned += 1;
        },
      ),
      SEEDED,
    );
    expect(returned).toBeGreaterThan(100);
  });

  it("is a finite distance above 0 for everything that it takes", () => {
    fc.assert(
      fc.property(
        distances,
        within(LEVEL_CHANGE_LIMITS_DB),
        exponents,
        (fromM, changeDb, exponent) => {
          const toM = distanceForChangeM({ fromM, changeDb, exponent });
          expect(Number.isFinite(toM) && toM > 0).toBe(true);
        },
      ),
      SEEDED,
    );
  });

  it.each(NEVER)("refuses %s for the distance and for the exponent, and says which", (bad) => {
    const good = { fromM: 30, changeDb: 6, exponent: 2 };
    for (const name of ["fromM", "exponent"]) {
      const call = () => distanceForChangeM({ ...good, [name]: bad });
      expect(call).toThrow(RangeError);
      expect(call).toThrow(`distanceForChangeM: ${name}`);
      expect(call).toThrow(`got ${bad}`);
    }
  });

  it.each([301, -301, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    "refuses a wished change of %s dB",
    (changeDb) => {
      expect(() => distanceForChangeM({ fromM: 30, changeDb, exponent: 2 })).toThrow(
        `distanceForChangeM: changeDb must be from -300 to 300, got ${changeDb}`,
      );
    },
  );
});
