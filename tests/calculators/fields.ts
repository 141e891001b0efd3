import type { LengthUnit, NumberField } from "../../src/calculators/field.ts";

/** Four made-up fields, one of each quantity. */
export const LENGTH: NumberField = {
  id: "lengthM",
  quantity: "length",
  min: 0.1,
  max: 2000,
  initial: 30,
  step: 1.25,
  stepIs: "ratio",
};
export const FREQUENCY: NumberField = {
  id: "frequencyMhz",
  quantity: "frequency",
  min: 25,
  max: 7200,
  initial: 550,
  step: 10,
  stepIs: "sum",
};
export const LEVEL: NumberField = {
  id: "gainDb",
  quantity: "level-change",
  min: -60,
  max: 60,
  initial: 6,
  step: 1,
  stepIs: "sum",
};
export const EXPONENT: NumberField = {
  id: "exponent",
  quantity: "exponent",
  min: 1,
  max: 6,
  initial: 2,
  step: 0.1,
  stepIs: "sum",
};
export const FIELDS = [LENGTH, FREQUENCY, LEVEL, EXPONENT] as const;
export const LENGTH_UNITS: readonly LengthUnit[] = ["m", "ft"];
/** Every field in every unit of length. */
export const CASES = FIELDS.flatMap((field) =>
  LENGTH_UNITS.map((unit) => [field.quantity, unit, field] as const),
);
