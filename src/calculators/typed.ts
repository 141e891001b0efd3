import { requireRange } from "../radio/require-range.ts";
import type { LengthUnit, NumberField, Typed } from "./field.ts";
import { perShownUnit, typedUnit } from "./units.ts";

export type TypedProblem = Exclude<Typed, { readonly kind: "ok" }>["kind"];

/** More than any number needs; what is longer was pasted by mistake. */
export const LONGEST_TYPED_TEXT = 80;

const NUMBER_AND_UNIT = /^([+-]?(?:\d+[.,]?\d*|[.,]\d+))([^\d.,]*)$/;
/** Digits in threes with marks between: "614,400", "1.234,5", "1 000", "1'000". */
const IN_THREES = /^[+-]?[1-9]\d{0,2}(?:[.,'\u2019\s]\d{3})+(?:[.,]\d*)?[^\d.,]*$/;

/**
 * Reads what a person typed or pasted into a field. Never throws and never guesses: a mark that may
 * stand for decimals or for thousands is asked about where both readings fit the field: "1.500" as a
 * length. Where the thousandfold lies outside the field the mark stands for decimals: in "614.400"
 * or "614,400", the usual ways to write a carrier in megahertz.
 *
 * @param text        As typed: point or comma, a unit behind it or none, spaces around it
 * @param field       Says the quantity and the range
 * @param lengthUnit  What a length without a unit is in
 * @returns           The value in the field's own unit, or what is wrong with the text
 */
export function readTyped(text: string, field: NumberField, lengthUnit: LengthUnit): Typed {
  const typed = text.trim().replace("\u2212", "-");
  if (typed === "") return { kind: "empty" };
  if (typed.length > LONGEST_TYPED_TEXT) return { kind: "not-a-number" };
  const inThrees = IN_THREES.test(typed);
  const [, digits, unitName] = NUMBER_AND_UNIT.exec(typed) ?? [];
  if (digits === undefined || unitName === undefined)
    return { kind: inThrees ? "ambiguous-separator" : "not-a-number" };
  const unit = typedUnit(unitName.trim(), field, lengthUnit);
  if (unit === undefined) return { kind: "wrong-unit" };
  // The exponent is applied by the number parser: 1.001 GHz is 1001 MHz, not 1000.9999999999999.
  // Adding 0 makes 0 of -0.
  const value = Number(`${digits.replace(",", ".")}e${unit.powerOfTen}`) * unit.factor + 0;
  if (inThrees && isInside(value * 1000, field)) return { kind: "ambiguous-separator" };
  if (isInside(value, field)) return { kind: "ok", value };
  return { kind: value < field.min ? "below-range" : "above-range" };
}

function isInside(value: number, field: NumberField): boolean {
  return value >= field.min && value <= field.max;
}

/** Digits behind the point that the field shows; of a length, about three figures in all. */
function decimalsShown(shown: number, quantity: NumberField["quantity"]): number {
  switch (quantity) {
    case "length":
      return shown < 10 ? 2 : shown < 100 ? 1 : 0;
    case "frequency":
      return 3;
    case "level-change":
      return 1;
    case "exponent":
      return 2;
  }
}

/**
 * The text of a value in its field, without unit. readTyped reads it back as the same value to
 * within the digits shown, and always as one inside the range: near its ends it rounds inwards.
 *
 * @param value       In the field's own unit, inside its range
 * @throws RangeError if the value lies outside the field's range or is NaN
 */
export function formatForField(value: number, field: NumberField, lengthUnit: LengthUnit): string {
  requireRange("formatForField", field, { value });
  const scale = perShownUnit(field, lengthUnit);
  const decimals = decimalsShown(value / scale, field.quantity);
  const rounded = Number((value / scale).toFixed(decimals));
  const inwards = rounded * scale > field.max ? -1 : rounded * scale < field.min ? 1 : 0;
  return String(Number((rounded + inwards * 10 ** -decimals).toFixed(decimals)) + 0);
}

/** A value that differs from a round number by no more than this part came from it by rounding. */
const NEARLY = 1e-9;

/** Steps that ratios land on: ten to a decade, ISO 3 series R″10 (from memory, to be verified). */
const ROUND_FIGURES = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8];

/** The round numbers within a decade of a value, rising. */
function roundNumbers(around: number): number[] {
  const decade = Math.floor(Math.log10(around));
  return [decade - 1, decade, decade + 1].flatMap((power) =>
    ROUND_FIGURES.map((figure) => Number(`${figure}e${power}`)),
  );
}

/** The two multiples of a step that enclose a value, or its neighbours if it is one itself. */
function multiples(around: number, step: number): number[] {
  const below = Math.ceil(around / step - NEARLY) - 1;
  const above = Math.floor(around / step + NEARLY) + 1;
  return [below, above].map((count) => Number((count * step).toPrecision(12)));
}

/**
 * One press of a field's stepper, always on to a round number in the shown unit: from a round one as
 * far as the field's step goes but at least to the next, from any other to the next. Where no round
 * number is left inside the range the value stays, which is how the end of the range shows.
 *
 * @param value       In the field's own unit, inside its range; above 0 where the step is a ratio
 * @param direction   1 for more, -1 for less
 * @returns           The new value, in the field's own unit, inside its range
 * @throws RangeError if the value lies outside the field's range or is NaN
 */
export function stepped(
  value: number,
  field: NumberField,
  direction: 1 | -1,
  lengthUnit: LengthUnit,
): number {
  requireRange("stepped", field, { value });
  const scale = perShownUnit(field, lengthUnit);
  const shown = value / scale;
  const isRatio = field.stepIs === "ratio";
  const reach = isRatio ? shown * field.step ** direction : shown + field.step * direction;
  const slack = Math.abs(shown) * NEARLY;
  const rounds = isRatio ? roundNumbers(shown) : multiples(shown, field.step);
  const ahead = rounds
    .filter((round) => direction * (round - shown) > slack && isInside(round * scale, field))
    .sort((a, b) => direction * (a - b));
  const isRound = rounds.some((round) => Math.abs(round - shown) <= slack);
  const within = isRound ? ahead.filter((round) => direction * (reach - round) >= -slack) : [];
  const next = within.at(-1) ?? ahead[0];
  return next === undefined ? value : next * scale;
}
