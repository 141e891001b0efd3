import { describe, expect, it } from "vitest";
import {
  DISTANCE_FIELD_IDS,
  DISTANCE_FIELDS,
  EXPONENT_PRESETS,
} from "../../../src/calculators/distance/fields.ts";
import { formatForField, readTyped, stepped } from "../../../src/calculators/typed.ts";
import { LENGTH_UNITS } from "../fields.ts";

const FIELDS = DISTANCE_FIELD_IDS.map((id) => [id, DISTANCE_FIELDS[id]] as const);

describe("fields of the distance calculator", () => {
  it("are five", () => {
    expect(FIELDS).toHaveLength(5);
  });

  it.each(FIELDS)("carry their key as id and a unit in their name: %s", (id, field) => {
    expect(field.id).toBe(id);
    expect(id).toMatch(/^exponent$|(M|Mhz|Db)$/);
  });

  it.each(FIELDS)("start with a value that the field itself accepts: %s", (_id, field) => {
    for (const unit of LENGTH_UNITS)
      expect(readTyped(formatForField(field.initial, field, unit), field, unit).kind).toBe("ok");
  });

  it.each(FIELDS)("can be stepped both ways from the start: %s", (_id, field) => {
    for (const unit of LENGTH_UNITS) {
      expect(stepped(field.initial, field, 1, unit)).toBeGreaterThan(field.initial);
      expect(stepped(field.initial, field, -1, unit)).toBeLessThan(field.initial);
    }
  });
});

describe("presets of the exponent", () => {
  // Rec. ITU-R P.1238-11, Table 2, coefficient α; read second-hand at github.com/aajuvonen/octave-rxt.
  // Free space: power falls with the square of distance, Rec. ITU-R P.525.
  it("are the published ones", () => {
    expect(Object.fromEntries(EXPONENT_PRESETS.map(({ id, value }) => [id, value]))).toEqual({
      "free-space": 2,
      "office-los": 1.46,
      "office-nlos": 2.46,
      "industrial-los": 2.31,
      "industrial-nlos": 3.79,
    });
  });

  it("begin with the one that the field starts with", () => {
    expect(EXPONENT_PRESETS[0].value).toBe(DISTANCE_FIELDS.exponent.initial);
  });

  it.each(EXPONENT_PRESETS)("can be typed: $id", (preset) => {
    const field = DISTANCE_FIELDS.exponent;
    const text = formatForField(preset.value, field, "m");
    expect(readTyped(text, field, "m")).toEqual({ kind: "ok", value: preset.value });
  });
});
