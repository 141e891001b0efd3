import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { NumberField } from "../../src/calculators/field.ts";
import { formatForField, readTyped } from "../../src/calculators/typed.ts";
import { SEEDED, within } from "../radio/samples.ts";
import { CASES, EXPONENT, FREQUENCY, LENGTH, LEVEL } from "./fields.ts";

/** Half of the last digit that each quantity shows, in its own unit; a foot is less than a metre. */
function halfADigit(field: NumberField, value: number): number {
  switch (field.quantity) {
    case "length":
      // Two decimals below 10, one below 100, none above; in feet the tens come three times sooner.
      return value < 3 ? 0.005 : value < 30 ? 0.05 : 0.5;
    case "frequency":
      return 0.0005;
    case "level-change":
      return 0.05;
    case "exponent":
      return 0.005;
  }
}

describe("formatForField", () => {
  it.each<[number, NumberField, "m" | "ft", string]>([
    [30, LENGTH, "m", "30"],
    [30.48, LENGTH, "ft", "100"],
    [1524, LENGTH, "ft", "5000"],
    [0.1, LENGTH, "m", "0.1"],
    [12.34, LENGTH, "m", "12.3"],
    [1.234, LENGTH, "m", "1.23"],
    [123.4, LENGTH, "m", "123"],
    [550, FREQUENCY, "m", "550"],
    [614.4, FREQUENCY, "ft", "614.4"],
    [606.125, FREQUENCY, "m", "606.125"],
    [-6, LEVEL, "m", "-6"],
    [-0.04, LEVEL, "m", "0"],
    [2.46, EXPONENT, "m", "2.46"],
  ])("writes %s as %j", (value, field, unit, text) => {
    expect(formatForField(value, field, unit)).toBe(text);
  });

  it("rounds inwards at the ends of a range, so that the text is accepted again", () => {
    // 2000 m is 6561.68 ft and 0.1 m is 0.328 ft: to the nearest they would fall outside.
    expect(formatForField(2000, LENGTH, "ft")).toBe("6561");
    expect(formatForField(0.1, LENGTH, "ft")).toBe("0.33");
  });

  it.each(CASES)(
    "is read back as what it was, to half a digit: %s in %s",
    (_quantity, unit, field) => {
      fc.assert(
        fc.property(within(field), (value) => {
          const typed = readTyped(formatForField(value, field, unit), field, unit);
          if (typed.kind !== "ok") throw new Error(`${value} came back ${typed.kind}`);
          const isAtEnd = value - field.min < 0.01 || field.max - value < 0.5;
          const allowed = halfADigit(field, value) * (isAtEnd ? 2 : 1);
          expect(Math.abs(typed.value - value)).toBeLessThanOrEqual(allowed + 1e-9);
        }),
        SEEDED,
      );
    },
  );

  it.each(CASES)("settles: what it wrote it writes again, %s in %s", (_quantity, unit, field) => {
    fc.assert(
      fc.property(within(field), (value) => {
        const text = formatForField(value, field, unit);
        const typed = readTyped(text, field, unit);
        if (typed.kind !== "ok") throw new Error(`${value} came back ${typed.kind}`);
        expect(formatForField(typed.value, field, unit)).toBe(text);
      }),
      SEEDED,
    );
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 0, 2001])("refuses to write %s", (bad) => {
    expect(() => formatForField(bad, LENGTH, "m")).toThrow(RangeError);
    expect(() => formatForField(bad, LENGTH, "m")).toThrow(`got ${bad}`);
  });
});
