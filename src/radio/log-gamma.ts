import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const ARGUMENT_LIMITS: Limits = { min: 0.5, max: 1e6 };

/** B₂ₖ / (2k·(2k − 1)) for k = 1 to 6, of the Bernoulli numbers. */
const STIRLING = [1 / 12, -1 / 360, 1 / 1260, -1 / 1680, 1 / 1188, -691 / 360_360];

/**
 * Natural logarithm of the gamma function, the factorial for numbers between the whole ones.
 *
 *     ln Γ(z) = (z − ½)·ln z − z + ½·ln 2π + Σ B₂ₖ / (2k·(2k − 1)·z^(2k−1)), after Γ(z) = Γ(z + 1) / z
 *
 * Assumes: z of 0.5 or more. Not for: negative arguments.
 *
 * @param z             Argument. [none], 0.5 to 10⁶
 * @returns             ln Γ(z); ln (z − 1)! for whole z. [none]
 * @throws RangeError   If the argument lies outside its range or is NaN.
 * @accuracy            3·10⁻¹⁵, or that part of the result where it is above 1: the first term left out
 *                      is below 7·10⁻¹⁶ from z = 10 on, and smaller z are raised to there
 * @source              NIST Digital Library of Mathematical Functions, eq. 5.11.1 and 5.5.1. From memory, to be verified.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function logGamma(z: number): number {
  requireRange("logGamma", ARGUMENT_LIMITS, { z });
  let raised = z;
  let product = 1;
  for (; raised < 10; raised += 1) product *= raised;
  let sum = 0;
  for (const coefficient of [...STIRLING].reverse()) sum = sum / raised ** 2 + coefficient;
  return (
    (raised - 0.5) * Math.log(raised) -
    raised +
    Math.log(2 * Math.PI) / 2 +
    sum / raised -
    Math.log(product)
  );
}
