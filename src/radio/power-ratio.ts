import { RATIO_LIMITS } from "./level-limits.ts";
import { LEVEL_CHANGE_LIMITS_DB } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * A ratio of two powers in decibels.
 *
 *     L = 10·log10(p2 / p1)
 *
 * Assumes: powers, or anything that a power is proportional to. Not for: voltages and field
 * strengths, whose squares are the powers: fieldRatioDb.
 *
 * @param ratio         Second power over the first. [none], 10⁻³⁰ to 10³⁰
 * @returns             Level difference, negative below a ratio of 1. [dB]
 * @throws RangeError   If the ratio lies outside that range or is NaN.
 * @accuracy            exact
 * @source              ISO 80000-1:2022, logarithmic quantities: definition of the decibel; from memory, to
 *                      be verified
 * @differs             none
 * @checkedBy           balanis-2-11-half
 */
export function powerRatioDb(ratio: number): number {
  requireRange("powerRatioDb", RATIO_LIMITS, { ratio });
  return 10 * Math.log10(ratio);
}

/**
 * The ratio of two powers that differ by so many decibels: the inverse of powerRatioDb.
 *
 *     p2 / p1 = 10^(L / 10)
 *
 * Assumes: as powerRatioDb. Not for: ratios of voltages and field strengths: fieldRatio.
 *
 * @param changeDb      Level difference. [dB], −300 to 300
 * @returns             Second power over the first. [none], above 0
 * @throws RangeError   If the difference lies outside that range or is NaN.
 * @accuracy            exact
 * @source              as powerRatioDb, solved for the ratio
 * @differs             none
 * @checkedBy           ghasemi-6-6-step
 */
export function powerRatio(changeDb: number): number {
  requireRange("powerRatio", LEVEL_CHANGE_LIMITS_DB, { changeDb });
  return 10 ** (changeDb / 10);
}
