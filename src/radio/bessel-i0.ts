import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const ARGUMENT_LIMITS: Limits = { min: 0, max: 10_000 };

/**
 * Modified Bessel function of the first kind and order zero, without its growth.
 *
 *     e^(−x)·I₀(x) = (1/π)·∫ e^(−2x·sin²(θ/2)) dθ from 0 to π, by the trapezoidal rule
 *
 * Assumes: nothing beside the range. Not for: other orders.
 *
 * @param x             Argument. [none], 0 to 10 000
 * @returns             e^(−x)·I₀(x), above 0 and at most 1. [none]
 * @throws RangeError   If the argument lies outside its range or is NaN.
 * @accuracy            Relative, 10⁻¹⁴. On a periodic integrand the rule with N steps to the turn errs by
 *                      2·e^(−x)·I_N(x) + …, which is below 10⁻¹⁶ of the result for the N taken
 * @source              NIST Digital Library of Mathematical Functions, eq. 10.32.1; for the rule, section
 *                      3.5(i). From memory, to be verified.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function scaledI0(x: number): number {
  requireRange("scaledI0", ARGUMENT_LIMITS, { x });
  const stepCount = Math.ceil(9 * Math.sqrt(x) + 20);
  let sum = 0;
  for (let n = 0; n < stepCount; n += 1)
    sum += Math.exp(-2 * x * Math.sin((Math.PI * n) / stepCount) ** 2);
  return sum / stepCount;
}
