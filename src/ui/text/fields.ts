import type { LengthUnit, NumberField } from "../../calculators/field.ts";
import type { TypedProblem } from "../../calculators/typed.ts";
import type { FieldState } from "../../models/distance-model.ts";

const UNIT: Readonly<Record<NumberField["quantity"], string>> = {
  length: "",
  frequency: "MHz",
  "level-change": "dB",
  exponent: "",
};
const EXAMPLE: Readonly<Record<NumberField["quantity"], string>> = {
  length: "30 m, 98 ft or 30,5",
  frequency: "560 or 0.56 GHz",
  "level-change": "6 or \u22123.5",
  exponent: "2 or 2.7",
};

export function unitOf(field: NumberField, unit: LengthUnit): string {
  return field.quantity === "length" ? unit : UNIT[field.quantity];
}

/** Says what is wrong with a typed text, and the range that the field takes. */
export function problemText(
  problem: TypedProblem,
  { field, minText, maxText }: Pick<FieldState, "field" | "minText" | "maxText">,
  unit: LengthUnit,
): string {
  const suffix = unitOf(field, unit);
  const range = `${minText.replace("-", "\u2212")} to ${maxText}${suffix === "" ? "" : `\u00a0${suffix}`}`;
  const example = EXAMPLE[field.quantity];
  switch (problem) {
    case "empty":
      return `Type a number: ${range}.`;
    case "not-a-number":
      return `That is not a number. Type for example ${example}: ${range}.`;
    case "ambiguous-separator":
      return `Decimal mark or thousands? Type it with one decimal mark and nothing else: ${range}.`;
    case "wrong-unit":
      return `That unit does not fit here. Type for example ${example}: ${range}.`;
    case "below-range":
    case "above-range":
      return `Outside the range: ${range}.`;
  }
}
