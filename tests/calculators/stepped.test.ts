import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LengthUnit, NumberField } from "../../src/calculators/field.ts";
import { formatForField, readTyped, stepped } from "../../src/calculators/typed.ts";
import { SEEDED, within } from "../radio/samples.ts";
import { CASES, EXPONENT, FREQUENCY, LENGTH, LEVEL } from "./fields.ts";

/** The values that presses in one direction lead through, as shown, until one changes nothing. */
function presses(
  from: number,
  field: NumberField,
  direction: 1 | -1,
  unit: LengthUnit = "m",
): string[] {
  const shown: string[] = [];
  let value = from;
  for (let press = 0; press < 1000; press += 1) {
    const next = stepped(value, field, direction, unit);
    if (next === value) return shown;
    value = next;
    shown.push(formatForField(value, field, unit));
  }
  throw new Error("the stepper never came to an end");
}

describe("stepped, by a ratio", () => {
  it("climbs over round numbers, ten to a decade, to the end of the range", () => {
    expect(presses(30, LENGTH, 1).join(" ")).toBe(
      "40 50 60 80 100 120 150 200 250 300 400 500 600 800 1000 1200 1500 2000",
    );
  });

  it("descends over the same numbers", () => {
    expect(presses(12, LENGTH, -1).join(" ")).toBe(
      "10 8 6 5 4 3 2.5 2 1.5 1.2 1 0.8 0.6 0.5 0.4 0.3 0.25 0.2 0.15 0.12 0.1",
    );
  });

  it("lands on round numbers of feet where feet are shown, and stops short of the end", () => {
    expect(presses(30, LENGTH, 1, "ft").join(" ")).toBe(
      "100 120 150 200 250 300 400 500 600 800 1000 1200 1500 2000 2500 3000 4000 5000 6000",
    );
    expect(presses(1, LENGTH, -1, "ft").join(" ")).toBe("3 2.5 2 1.5 1.2 1 0.8 0.6 0.5 0.4");
  });

  it("goes from a value between two round numbers to the next one", () => {
    expect(stepped(33, LENGTH, 1, "m")).toBe(40);
    expect(stepped(33, LENGTH, -1, "m")).toBe(30);
  });

  it("reaches as far as the ratio of the field", () => {
    const doubling = { ...LENGTH, step: 2 };
    expect(stepped(10, doubling, 1, "m")).toBe(20);
    expect(stepped(10, doubling, -1, "m")).toBe(5);
    expect(stepped(12, doubling, 1, "m")).toBe(20);
  });
});

describe("stepped, by a sum", () => {
  it.each<[number, NumberField, 1 | -1, number]>([
    [550, FREQUENCY, 1, 560],
    [550, FREQUENCY, -1, 540],
    [556.125, FREQUENCY, 1, 560],
    [556.125, FREQUENCY, -1, 550],
    [6, LEVEL, 1, 7],
    [1, LEVEL, -1, 0],
    [-1, LEVEL, 1, 0],
    [0, LEVEL, -1, -1],
    [-59.7, LEVEL, -1, -60],
    [2, EXPONENT, 1, 2.1],
    [2.46, EXPONENT, -1, 2.4],
    [1.1, EXPONENT, 1, 1.2],
  ])(
    "leads from %s, for step by step of its field, to a multiple",
    (from, field, direction, to) => {
      expect(stepped(from, field, direction, "m")).toBe(to);
    },
  );

  it("passes every tenth of an exponent without stray digits", () => {
    const shown = presses(1, EXPONENT, 1);
    expect(shown).toHaveLength(50);
    expect(shown.slice(0, 4)).toEqual(["1.1", "1.2", "1.3", "1.4"]);
  });
});

describe("stepped", () => {
  it.each(CASES)("stays put at both ends of the range: %s in %s", (_quantity, unit, field) => {
    expect(stepped(field.max, field, 1, unit)).toBe(field.max);
    expect(stepped(field.min, field, -1, unit)).toBe(field.min);
  });

  it.each(CASES)(
    "keeps inside the range, moves the way it is told, and shows what it is: %s in %s",
    (_quantity, unit, field) => {
      let moved = 0;
      fc.assert(
        fc.property(within(field), fc.constantFrom(1 as const, -1 as const), (value, direction) => {
          const next = stepped(value, field, direction, unit);
          expect(next >= field.min && next <= field.max).toBe(true);
          if (next === value) return;
          moved += 1;
          expect(direction * (next - value)).toBeGreaterThan(0);
          // Round enough for the field to show it in full: what is shown is the value itself.
          const typed = readTyped(formatForField(next, field, unit), field, unit);
          if (typed.kind !== "ok") throw new Error(`${next} came back ${typed.kind}`);
          expect(typed.value).toBeCloseTo(next, 9);
        }),
        SEEDED,
      );
      expect(moved).toBeGreaterThan(50);
    },
  );

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 0, 2001])("refuses to step from %s", (bad) => {
    expect(() => stepped(bad, LENGTH, 1, "m")).toThrow(RangeError);
    expect(() => stepped(bad, LENGTH, 1, "m")).toThrow(`got ${bad}`);
  });
});
