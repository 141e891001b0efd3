import { gammaProbability } from "./incomplete-gamma.ts";
import type { Limits } from "./limits.ts";
import { logGamma } from "./log-gamma.ts";
import { requireRange } from "./require-range.ts";

const STEADY_LIMITS: Limits = { min: 0.01, max: 26 };
const BOUND_LIMITS: Limits = { min: 1e-6, max: 90 };

/**
 * Chance that a steady signal in Gaussian noise, or a direct wave among reflected ones, has an
 * amplitude below a bound: one minus Marcum's Q function of order 1.
 *
 *     1 − Q₁(a, b) = Σ e^(−λ)·λ^k / k! · P(k + 1, y) for k = 0, 1, 2, …, λ = a² / 2, y = b² / 2
 *
 * Assumes: amplitudes in units of the standard deviation of either noise component. Not for: Q₁ itself
 * where it is below 10⁻⁶: it would be lost beside the 1.
 *
 * @param steadyRatio   a, the steady amplitude. [none], 0.01 to 26
 * @param boundRatio    b, the bound. [none], 10⁻⁶ to 90
 * @returns             1 − Q₁(a, b), above 0 and at most 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            Relative, 10⁻¹¹, also where the result is tiny: every term is above 0, and those
 *                      left out are together below 10⁻¹⁶ of the sum
 * @source              A. Gil, J. Segura, N. M. Temme, Computation of the Marcum Q-function (2013; ACM
 *                      Algorithm 939), arXiv 1311.0681; series in the incomplete gamma functions from
 *                      memory, to be verified.
 * @differs             The incomplete gamma functions come from each other, largest k first, which only
 *                      adds numbers above 0.
 * @checkedBy           none published, see test
 */
export function marcumProbability(steadyRatio: number, boundRatio: number): number {
  requireRange("marcumProbability", STEADY_LIMITS, { steadyRatio });
  requireRange("marcumProbability", BOUND_LIMITS, { boundRatio });
  const mean = steadyRatio ** 2 / 2;
  const y = boundRatio ** 2 / 2;
  // Where the terms are largest; from there on they fall faster than those of a Poisson count.
  const peak = Math.sqrt(mean * Math.min(mean, y));
  const last = Math.ceil(peak + 8 * Math.sqrt(peak) + 20);
  let share = poissonProbability(last, mean);
  let next = poissonProbability(last, y);
  let below = gammaProbability(last + 1, y);
  let sum = 0;
  for (let k = last; k >= 0; k -= 1) {
    sum += share * below;
    below += next;
    share *= k / mean;
    next *= k / y;
  }
  return sum;
}

function poissonProbability(k: number, mean: number): number {
  return Math.exp(k * Math.log(mean) - mean - logGamma(k + 1));
}
