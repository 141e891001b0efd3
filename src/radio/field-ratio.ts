import { RATIO_LIMITS } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * A ratio of two voltages, currents or field strengths in decibels.
 *
 *     L = 20·log10(e2 / e1)
 *
 * Assumes: both across the same impedance, so that the powers go with the squares. Not for: powers
 * and power densities: powerRatioDb.
 *
 * @param ratio         Second field quantity over the first. [none], 10⁻³⁰ to 10³⁰
 * @returns             Level difference, negative below a ratio of 1. [dB]
 * @throws RangeError   If the ratio lies outside that range or is NaN.
 * @accuracy            exact
 * @source              ISO 80000-1:2022, logarithmic quantities: definition of the decibel; from memory, to
 *                      be verified
 * @differs             none
 * @checkedBy           singal-2-1-field-halved
 */
export function fieldRatioDb(ratio: number): number {
  requireRange("fieldRatioDb", RATIO_LIMITS, { ratio });
  return 20 * Math.log10(ratio);
}

/**
 * The ratio of two field quantities that differ by so many decibels: the inverse of fieldRatioDb.
 *
 *     e2 / e1 = 10^(L / 20)
 *
 * Assumes: as fieldRatioDb. Not for: ratios of powers: powerRatio.
 *
 * @param changeDb      Level difference. [dB], −600 to 600
 * @returns             Second field quantity over the first. [none], above 0
 * @throws RangeError   If the difference lies outside that range or is NaN.
 * @accuracy            exact
 * @source              as fieldRatioDb, solved for the ratio
 * @differs             none
 * @checkedBy           none published, see test
 */
export function fieldRatio(changeDb: number): number {
  requireRange("fieldRatio", { min: -600, max: 600 }, { changeDb });
  return 10 ** (changeDb / 20);
}
