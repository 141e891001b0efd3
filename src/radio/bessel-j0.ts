import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const ARGUMENT_LIMITS: Limits = { min: 0, max: 6300 };

/**
 * Bessel function of the first kind and order zero: how a wave that comes from all sides at once
 * agrees with itself some way off.
 *
 *     J₀(x) = (1/π)·∫ cos(x·sin θ) dθ over half a turn, by the trapezoidal rule
 *
 * Assumes: nothing beside the range. Not for: other orders.
 *
 * @param x             Argument. [none], 0 to 6300
 * @returns             J₀(x), from −0.403 to 1. [none]
 * @throws RangeError   If the argument lies outside its range or is NaN.
 * @accuracy            2·10⁻¹⁵ up to x = 20, 10⁻¹³ up to 6300. On a periodic integrand the rule with N
 *                      steps errs by 2·J₂ₙ(x) + …, which is below 10⁻¹⁶ for the N taken
 * @source              NIST Digital Library of Mathematical Functions, eq. 10.9.1; for the rule, section
 *                      3.5(i). From memory, to be verified.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function besselJ0(x: number): number {
  requireRange("besselJ0", ARGUMENT_LIMITS, { x });
  const stepCount = Math.ceil(x / 2 + 6 * Math.cbrt(x) + 8);
  let sum = 0;
  for (let n = 0; n < stepCount; n += 1) sum += Math.cos(x * Math.sin((Math.PI * n) / stepCount));
  return sum / stepCount;
}
