import type { FrequencyStep } from "../../src/radio/frequency-limit.ts";
import { readText } from "../architecture/tree.ts";

/** A rule of shared/reference/exposure-limits.json. */
export interface ExposureRule {
  readonly id: string;
  readonly group: string;
  readonly unit: string;
  readonly averagingMinutes: number;
  readonly steps: readonly FrequencyStep[];
  readonly doesNotCover: string;
}

export const EXPOSURE_RULES = JSON.parse(
  readText("shared/reference/exposure-limits.json"),
) as readonly ExposureRule[];

/** The rule of that id; an id that nobody has is an error, not a pass. */
export function exposureRule(id: string): ExposureRule {
  const rule = EXPOSURE_RULES.find((each) => each.id === id);
  if (rule === undefined) throw new Error(`no rule has the id ${id}`);
  return rule;
}
