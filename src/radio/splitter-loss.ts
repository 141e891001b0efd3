import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

const OUTPUT_COUNT_LIMITS: Limits = { min: 1, max: 1024 };
const EXCESS_LIMITS_DB: Limits = { min: 0, max: 100 };

/**
 * What each output of a passive splitter gets less than went in.
 *
 *     L = 10·log10 n + excess
 *
 * Assumes: equal outputs, all of them terminated. Not for: splitters with an amplifier inside, which
 * state a gain; taps with unequal outputs.
 *
 * @param outputCount   Outputs, terminated ones included. [none], 1 to 1024, whole
 * @param excessDb      Loss above the ideal split, from the data sheet. [dB], 0 to 100
 * @returns             Loss from input to one output. [dB], 0 or more
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              conservation of energy; the excess is a measured figure
 * @differs             none
 * @checkedBy           none published, see test
 */
export function splitterLossDb(outputCount: number, excessDb: number): number {
  requireWhole("splitterLossDb", OUTPUT_COUNT_LIMITS, { outputCount });
  requireRange("splitterLossDb", EXCESS_LIMITS_DB, { excessDb });
  return 10 * Math.log10(outputCount) + excessDb;
}
