import { describe, expect, it } from "vitest";
import { distanceForChangeM, levelChangeDb } from "../../src/radio/distance-ratio.ts";
import { farZoneStartM } from "../../src/radio/far-zone.ts";
import { freeSpaceLossDb } from "../../src/radio/free-space-loss.ts";
import { wavelengthM } from "../../src/radio/wavelength.ts";
import { ROWS, type Row } from "./rows.ts";

/** The named input of a row; a row without it is an error, not a pass. */
function take(row: Row, name: string): number {
  const value = row.input[name];
  if (value === undefined) throw new Error(`${row.id} lacks ${name}`);
  return value;
}

const FUNCTIONS: Readonly<Record<string, (row: Row) => number>> = {
  wavelengthM: (row) => wavelengthM(take(row, "frequencyMhz")),
  freeSpaceLossDb: (row) => freeSpaceLossDb(take(row, "distanceM"), take(row, "frequencyMhz")),
  levelChangeDb: (row) =>
    levelChangeDb({
      fromM: take(row, "fromM"),
      toM: take(row, "toM"),
      exponent: take(row, "exponent"),
    }),
  distanceForChangeM: (row) =>
    distanceForChangeM({
      fromM: take(row, "fromM"),
      changeDb: take(row, "changeDb"),
      exponent: take(row, "exponent"),
    }),
  farZoneStartM: (row) =>
    farZoneStartM({
      frequencyMhz: take(row, "frequencyMhz"),
      antennaLengthM: take(row, "antennaLengthM"),
    }),
};

describe("published figures", () => {
  it.each(Object.keys(FUNCTIONS))("include at least two for %s", (quantity) => {
    expect(ROWS.filter((row) => row.quantity === quantity).length).toBeGreaterThanOrEqual(2);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("agree: %s", (_id, row) => {
    const compute = FUNCTIONS[row.quantity];
    if (compute === undefined) throw new Error(`nothing computes ${row.quantity}`);
    expect(Math.abs(compute(row) - row.expected)).toBeLessThanOrEqual(row.tolerance);
  });
});

describe("rows of published figures", () => {
  it("have ids that are used once", () => {
    expect(new Set(ROWS.map(({ id }) => id)).size).toBe(ROWS.length);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("say all that %s rests on", (_id, row) => {
    expect(Object.keys(row).sort()).toEqual(
      "basis expected id input quantity source tolerance toleranceReason".split(" "),
    );
    expect(Object.keys(row.source).sort()).toEqual(
      "body document edition readAt readOn standing where".split(" "),
    );
    for (const text of [row.toleranceReason, row.basis, ...Object.values(row.source)])
      expect(text.trim()).not.toBe("");
    expect(["read", "second-hand", "common-practice", "from-memory"]).toContain(
      row.source["standing"],
    );
    expect(row.source["readOn"]).toMatch(/^\d{4}-\d\d-\d\d$/);
    // An exponent is a plain number; all else carries its unit at the end of its name.
    for (const name of Object.keys(row.input)) expect(name).toMatch(/^exponent$|(M|Mhz|Db)$/);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("allow little: %s", (_id, row) => {
    expect(row.tolerance).toBeGreaterThan(0);
    expect(row.tolerance).toBeLessThan(Math.abs(row.expected) / 100);
  });
});
