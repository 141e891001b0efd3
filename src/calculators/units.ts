import type { LengthUnit, NumberField } from "./field.ts";

/**
 * How many metres one unit of length has.
 * The foot: exact by the international yard and pound agreement of 1959 (NIST Special Publication 811;
 * Federal Register 84 FR 55562 of 2019-10-17 on giving up the survey foot), read second-hand.
 */
export const METRES_PER: Readonly<Record<LengthUnit, number>> = { m: 1, ft: 0.3048 };

/** How much of the field's own unit one shown unit is: the shown unit differs for lengths only. */
export function perShownUnit(field: NumberField, lengthUnit: LengthUnit): number {
  return field.quantity === "length" ? METRES_PER[lengthUnit] : 1;
}

/** A typed unit: a power of ten, kept apart because it can be applied without rounding, and a factor. */
interface TypedUnit {
  readonly powerOfTen: number;
  readonly factor: number;
}

const unit = (powerOfTen: number, factor = 1): TypedUnit => ({ powerOfTen, factor });
const FOOT = unit(0, METRES_PER.ft);

/** In small letters, because a phone's keyboard likes capitals; no two of these differ by case only. */
const TYPED_UNITS: Readonly<Record<NumberField["quantity"], ReadonlyMap<string, TypedUnit>>> = {
  length: new Map([
    ["m", unit(0)],
    ["cm", unit(-2)],
    ["km", unit(3)],
    ["ft", FOOT],
    ["feet", FOOT],
    ["'", FOOT],
    ["\u2032", FOOT],
    ["\u2019", FOOT],
  ]),
  frequency: new Map([
    ["", unit(0)],
    ["mhz", unit(0)],
    ["ghz", unit(3)],
    ["khz", unit(-3)],
    ["hz", unit(-6)],
  ]),
  "level-change": new Map([
    ["", unit(0)],
    ["db", unit(0)],
  ]),
  exponent: new Map([["", unit(0)]]),
};

/** The unit that stands behind a number; nothing there means the user's own unit of length, MHz or dB. */
export function typedUnit(
  name: string,
  field: NumberField,
  lengthUnit: LengthUnit,
): TypedUnit | undefined {
  const bare = field.quantity === "length" && name === "";
  return TYPED_UNITS[field.quantity].get(bare ? lengthUnit : name.toLowerCase());
}
