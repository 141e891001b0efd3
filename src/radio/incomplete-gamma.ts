import type { Limits } from "./limits.ts";
import { logGamma } from "./log-gamma.ts";
import { requireRange } from "./require-range.ts";
import { solveRising } from "./solve-rising.ts";

const SHAPE_LIMITS: Limits = { min: 0.5, max: 20_000 };
const ARGUMENT_LIMITS: Limits = { min: 0, max: 1e6 };
const WISHED_LIMITS: Limits = { min: 1e-12, max: 0.999_999 };

/** A sum or product is complete when the next step moves it by less than this part. */
const COMPLETE = 1e-16;

/**
 * Chance that a gamma variable of scale 1 lies below a value; for whole shapes a, the chance that a
 * Poisson count of mean x is a or more.
 *
 *     P(a, x) = x^a·e^(−x) / Γ(a + 1) · (1 + x / (a + 1) + x² / ((a + 1)·(a + 2)) + …)
 *     1 − P(a, x) = x^a·e^(−x) / Γ(a) · 1 / (x + 1 − a − 1·(1 − a) / (x + 3 − a − 2·(2 − a) / (x + 5 − a − …)))
 *
 * Assumes: nothing beside the ranges. Not for: the chance of lying above, where that is below 10⁻⁶:
 * it would be lost beside the 1.
 *
 * @param shape         Shape a. [none], 0.5 to 20 000
 * @param x             Value. [none], 0 to 10⁶
 * @returns             P(a, x), from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            Relative, also where the result is tiny: 10⁻¹³ up to shape 100, 10⁻¹⁰ up to 20 000,
 *                      where the logarithms of the leading factor cancel
 * @source              NIST Digital Library of Mathematical Functions, eq. 8.7.1 and 8.9.2. From memory, to be verified.
 * @differs             The fraction is written out as its even part, which converges twice as fast.
 * @checkedBy           none published, see test
 */
export function gammaProbability(shape: number, x: number): number {
  requireRange("gammaProbability", SHAPE_LIMITS, { shape });
  requireRange("gammaProbability", ARGUMENT_LIMITS, { x });
  if (x === 0) return 0;
  const leading = Math.exp(shape * Math.log(x) - x - logGamma(shape + 1));
  if (x < shape + 1) {
    let term = 1;
    let sum = 1;
    for (let a = shape + 1; term > sum * COMPLETE; a += 1) {
      term *= x / a;
      sum += term;
    }
    return leading * sum;
  }
  return 1 - leading * shape * upperFraction(shape, x);
}

/** The continued fraction by Steed's recurrence; no denominator reaches 0 where x ≥ a + 1. */
function upperFraction(shape: number, x: number): number {
  let b = x + 1 - shape;
  let d = 1 / b;
  let step = d;
  let sum = d;
  for (let n = 1; Math.abs(step) > sum * COMPLETE; n += 1) {
    const a = n * (shape - n);
    b += 2;
    d = 1 / (b + a * d);
    step *= b * d - 1;
    sum += step;
  }
  return sum;
}

/**
 * The value that a gamma variable of scale 1 stays below with a wished chance: the inverse of
 * gammaProbability.
 *
 *     P(a, x) = wished
 *
 * Assumes: as gammaProbability. Not for: chances above 0.999999.
 *
 * @param shape              Shape a. [none], 0.5 to 20 000
 * @param wishedProbability  Chance of lying below. [none], 10⁻¹² to 0.999999
 * @returns                  The value x. [none], above 0
 * @throws RangeError        If an input lies outside its range or is NaN.
 * @accuracy                 relative, 10⁻¹⁰
 * @source                   as gammaProbability, solved for x
 * @differs                  none
 * @checkedBy           none published, see test
 */
export function gammaQuantile(shape: number, wishedProbability: number): number {
  requireRange("gammaQuantile", SHAPE_LIMITS, { shape });
  requireRange("gammaQuantile", WISHED_LIMITS, { wishedProbability });
  const max = shape + 10 * Math.sqrt(shape) + 20;
  return solveRising((x) => gammaProbability(shape, x), wishedProbability, { min: 0, max });
}
