import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { NumberField } from "../../src/calculators/field.ts";
import { readTyped } from "../../src/calculators/typed.ts";
import { SEEDED } from "../radio/samples.ts";
import { EXPONENT, FIELDS, FREQUENCY, LENGTH, LENGTH_UNITS, LEVEL } from "./fields.ts";

const NBSP = "\u00a0";
const NARROW_NBSP = "\u202f";
const MINUS = "\u2212";

const ok = (value: number) => ({ kind: "ok", value });
const metres = (text: string) => readTyped(text, LENGTH, "m");
const feet = (text: string) => readTyped(text, LENGTH, "ft");

describe("readTyped, plain numbers", () => {
  it.each([
    ["30", 30],
    ["30.5", 30.5],
    ["30,5", 30.5],
    ["0,125", 0.125],
    ["0.125", 0.125],
    ["1234,567", 1234.567],
    ["12.3456", 12.3456],
    [".5", 0.5],
    [",5", 0.5],
    ["12.", 12],
    ["12,", 12],
    ["+30", 30],
    ["007", 7],
    ["  30 ", 30],
    [`${NBSP}30${NARROW_NBSP}`, 30],
    ["\t30\n", 30],
  ])("reads %j as a length", (text, value) => {
    expect(metres(text)).toEqual(ok(value));
  });

  it.each([
    ["-6", -6],
    [`${MINUS}6`, -6],
    [`${MINUS}3,5`, -3.5],
    ["+6", 6],
    ["0", 0],
  ])("reads %j as a change of level", (text, value) => {
    expect(readTyped(text, LEVEL, "m")).toEqual(ok(value));
  });

  it("makes a plain 0 of minus 0", () => {
    expect(readTyped("-0", LEVEL, "m")).toEqual({ kind: "ok", value: 0 });
    expect(readTyped(`${MINUS}0.0`, LEVEL, "m")).toEqual(ok(0));
  });

  it("reads an exponent", () => {
    expect(readTyped("2,46", EXPONENT, "ft")).toEqual(ok(2.46));
  });
});

describe("readTyped, units of length", () => {
  it.each([
    ["30m", 30],
    ["30 m", 30],
    [`30${NBSP}m`, 30],
    ["30 M", 30],
    ["55 cm", 0.55],
    ["0,5 km", 500],
    ["1.001 km", 1001],
  ])("reads %j whatever the user's unit", (text, value) => {
    for (const unit of LENGTH_UNITS) expect(readTyped(text, LENGTH, unit)).toEqual(ok(value));
  });

  // 1 ft = 0.3048 m exactly: international yard and pound agreement, 1959.
  it.each(["1 ft", "1ft", "1 FT", "1 feet", "1'", "1 '", "1\u2032", "1\u2019"])(
    "reads %j as 0.3048 m whatever the user's unit",
    (text) => {
      for (const unit of LENGTH_UNITS) expect(readTyped(text, LENGTH, unit)).toEqual(ok(0.3048));
    },
  );

  it("takes a bare number in the unit that the user chose", () => {
    // 5000 ft: V. Garg, example 3.1 (distance); 1524 m by the definition of the foot.
    expect(feet("5000")).toEqual(ok(1524));
    expect(metres("500")).toEqual(ok(500));
  });

  it("lets a typed unit win over the chosen one", () => {
    expect(feet("30 m")).toEqual(ok(30));
  });
});

describe("readTyped, units of frequency and level", () => {
  it.each([
    ["550", 550],
    ["550 MHz", 550],
    ["550mhz", 550],
    ["0.55 GHz", 550],
    ["2,4GHz", 2400],
    ["1.001 GHz", 1001],
    ["614400 kHz", 614.4],
    ["614400000 Hz", 614.4],
    ["614.400", 614.4],
    ["614.400 MHz", 614.4],
    ["606.125", 606.125],
  ])("reads %j in megahertz", (text, value) => {
    for (const unit of LENGTH_UNITS) expect(readTyped(text, FREQUENCY, unit)).toEqual(ok(value));
  });

  it.each(["6 dB", "6dB", "6 db", `6${NBSP}dB`])("reads %j as 6 dB", (text) => {
    expect(readTyped(text, LEVEL, "m")).toEqual(ok(6));
  });
});

describe("readTyped, marks that may be decimal or thousands", () => {
  it.each([
    "1,234.5",
    "1.234,5",
    "1,234,567",
    "1.234.567",
    "1 234",
    `1${NBSP}234,5`,
    `1${NARROW_NBSP}234`,
    "1'234",
    "1\u2019234.5",
    "1,234.",
  ])("asks about %j", (text) => {
    for (const field of [LENGTH, FREQUENCY])
      expect(readTyped(text, field, "m")).toEqual({ kind: "ambiguous-separator" });
  });

  it("asks where the thousandfold alone lies in the field", () => {
    expect(readTyped("614,400 kHz", FREQUENCY, "m")).toEqual({ kind: "ambiguous-separator" });
  });

  it("takes a comma before three digits for decimals where the thousandfold lies outside", () => {
    // A carrier as it is written where the comma is the decimal mark: common practice, no source.
    for (const text of ["614,400", "614,400 MHz", "606,125"])
      expect(readTyped(text, FREQUENCY, "m").kind).toBe("ok");
    expect(readTyped("606,125", FREQUENCY, "m")).toEqual(ok(606.125));
  });

  it("asks about a point before three digits where both readings lie in the field", () => {
    expect(metres("1.500")).toEqual({ kind: "ambiguous-separator" });
    expect(feet("5.000 ft")).toEqual({ kind: "ambiguous-separator" });
  });

  it("takes the point for decimals where the thousandfold lies outside the field", () => {
    expect(metres("12.345")).toEqual(ok(12.345));
    expect(metres("1.234 km")).toEqual(ok(1234));
  });
});

describe("readTyped, what is no number or no unit of the field", () => {
  it.each(["", " ", `${NBSP}`, "\n\t"])("calls %j empty", (text) => {
    for (const field of FIELDS) expect(readTyped(text, field, "m")).toEqual({ kind: "empty" });
  });

  it.each([
    "abc",
    "1e3",
    "1e308",
    "1E3",
    "0x10",
    "0b1",
    "Infinity",
    "-Infinity",
    "NaN",
    "null",
    "m",
    "-",
    "+",
    ".",
    ",",
    "1..5",
    "1,,5",
    "1.2.3",
    "--5",
    "5-3",
    "1 2",
    "5'6",
    "\u{1F3A4}",
    "\u0663\u0660",
    "<b>30</b>",
    "distance: 30 m",
    "9".repeat(81),
    "30 m ".repeat(2000),
    "\ud83c",
  ])("calls %j not a number", (text) => {
    for (const field of FIELDS)
      expect(readTyped(text, field, "m")).toEqual({ kind: "not-a-number" });
  });

  it.each<[string, NumberField]>([
    ["30 kg", LENGTH],
    ["30 MHz", LENGTH],
    ["30 in", LENGTH],
    ["30 \u{1F3A4}", LENGTH],
    ["30 constructor", LENGTH],
    ["550 m", FREQUENCY],
    ["550 M", FREQUENCY],
    ["550 dB", FREQUENCY],
    ["6 dBm", LEVEL],
    ["6 m", LEVEL],
    ["2 m", EXPONENT],
    ["50 %", EXPONENT],
  ])("says of %j that the unit does not fit", (text, field) => {
    for (const unit of LENGTH_UNITS)
      expect(readTyped(text, field, unit)).toEqual({ kind: "wrong-unit" });
  });
});

describe("readTyped, ranges", () => {
  it.each<[string, NumberField, string]>([
    ["0", LENGTH, "below-range"],
    ["-3", LENGTH, "below-range"],
    ["0.09", LENGTH, "below-range"],
    ["7 cm", LENGTH, "below-range"],
    ["2000.1", LENGTH, "above-range"],
    ["3 km", LENGTH, "above-range"],
    ["9".repeat(80), LENGTH, "above-range"],
    [`-${"9".repeat(79)}`, LENGTH, "below-range"],
    ["24.999", FREQUENCY, "below-range"],
    ["7.3 GHz", FREQUENCY, "above-range"],
    ["0.99", EXPONENT, "below-range"],
    ["6,01", EXPONENT, "above-range"],
    [`${MINUS}60.1`, LEVEL, "below-range"],
    ["60.1", LEVEL, "above-range"],
  ])("says where %j lies", (text, field, kind) => {
    expect(readTyped(text, field, "m")).toEqual({ kind });
  });

  it.each(FIELDS)("takes both ends of the range of a $quantity", (field) => {
    expect(readTyped(String(field.min), field, "m")).toEqual(ok(field.min));
    expect(readTyped(String(field.max), field, "m")).toEqual(ok(field.max));
  });
});

describe("readTyped, any text at all", () => {
  const scraps = fc.constantFrom(
    ..."0123456789.,+-eExX '\u2019\u2212\u00a0\n",
    "m",
    "ft",
    "km",
    "GHz",
    "Hz",
    "dB",
    "Infinity",
    "\u{1F3A4}",
  );
  const texts = fc.oneof(
    fc.string({ unit: "binary", maxLength: 120 }),
    fc.array(scraps, { maxLength: 12 }).map((parts) => parts.join("")),
  );

  it("never throws, and gives a number only from inside the range", () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(
        texts,
        fc.constantFrom(...FIELDS),
        fc.constantFrom(...LENGTH_UNITS),
        (text, field, unit) => {
          const typed = readTyped(text, field, unit);
          seen.add(typed.kind);
          if (typed.kind === "ok")
            expect(typed.value >= field.min && typed.value <= field.max).toBe(true);
        },
      ),
      { ...SEEDED, numRuns: 5000 },
    );
    expect(seen).toContain("ok");
    expect(seen).toContain("not-a-number");
  });
});
