import type { DistanceCaution, DistanceOutcome } from "../../calculators/distance/outcome.ts";
import type { LengthUnit } from "../../calculators/field.ts";
import type { PresetId } from "../../models/distance-model.ts";
import { decibels, lengthIn, threeFigures } from "./format.ts";

export const title = "Distance";
export const surroundings = "Surroundings";
export const ownExponent = "Own exponent";
export const blank = "No answer while a field is empty or out of its range.";

export const FIELD_LABEL = {
  fromM: "From",
  toM: "To",
  frequencyMhz: "Carrier",
  exponent: "Exponent",
  wishedGainDb: "Wished gain",
} as const;

/** One line that says on site what the number means. */
export function changeMeaning(powerRatio: number): string {
  const isMore = powerRatio >= 1;
  const times = threeFigures(Number((isMore ? powerRatio : 1 / powerRatio).toPrecision(2)));
  if (times === "1") return "No change at the receiver.";
  return isMore
    ? `${times} times the power at the receiver.`
    : `1/${times} of the power at the receiver.`;
}

export function wishText(gainDb: number, metres: number, unit: LengthUnit): string {
  return `For ${decibels(gainDb)}: ${lengthIn(metres, unit)} apart.`;
}

export function distanceSentence(
  { fromM, toM, exponent }: { fromM: number; toM: number; exponent: number },
  changeDb: number,
  unit: LengthUnit,
): string {
  return `Moving from ${lengthIn(fromM, unit)} to ${lengthIn(toM, unit)} changes the level by ${decibels(changeDb)} (exponent ${threeFigures(exponent)}).`;
}

/** The published exponents, by where they were measured. */
export const PRESET_TEXT: Readonly<Record<PresetId, string>> = {
  "free-space": "Open air, in sight (2)",
  "office-los": "Small room, in sight (1.46)",
  "office-nlos": "Small room, out of sight (2.46)",
  "industrial-los": "Metal hall, in sight (2.31)",
  "industrial-nlos": "Metal hall, out of sight (3.79)",
};

export function noAnswerText(
  reason: Extract<DistanceOutcome, { kind: "no-answer" }>["reason"],
  nearZoneM: number,
  unit: LengthUnit,
): string {
  switch (reason) {
    case "inside-near-zone":
      return `Too close for this sum: it holds from one wavelength on, ${lengthIn(nearZoneM, unit)} at this carrier.`;
  }
}

export function distanceCautionText(
  code: DistanceCaution,
  nearZoneM: number,
  unit: LengthUnit,
): string {
  switch (code) {
    case "near-zone":
      return `Within two wavelengths (${lengthIn(2 * nearZoneM, unit)}) a directional antenna behaves otherwise.`;
    case "wish-inside-near-zone":
      return "The wished gain would put the antenna too close: not by distance alone.";
    case "wish-beyond-range":
      return "No distance between 0.1 m and 2 km gives the wished gain.";
  }
}
