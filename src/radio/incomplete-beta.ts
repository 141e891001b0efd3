import type { Limits } from "./limits.ts";
import { logGamma } from "./log-gamma.ts";
import { requireRange } from "./require-range.ts";
import { solveRising } from "./solve-rising.ts";

const SHAPE_LIMITS: Limits = { min: 0.5, max: 20_000 };
const SHARE_LIMITS: Limits = { min: 0, max: 1 };
const WISHED_LIMITS: Limits = { min: 1e-12, max: 0.999_999 };

/**
 * Chance that a beta variable lies below a value; for whole shapes, the chance of a or more hits in
 * a + b − 1 independent tries that each hit with chance x.
 *
 *     I_x(a, b) = x^a·(1 − x)^b / (a·B(a, b)) · 1 / (1 + d₁ / (1 + d₂ / (1 + …)))
 *     d_(2m) = m·(b − m)·x / ((a + 2m − 1)·(a + 2m)), d_(2m+1) = −(a + m)·(a + b + m)·x / ((a + 2m)·(a + 2m + 1))
 *     I_x(a, b) = 1 − I_(1−x)(b, a) where x lies above (a + 1) / (a + b + 2)
 *
 * Assumes: nothing beside the ranges. Not for: a chance so near 1 that its distance from 1 matters:
 * ask for the opposite one.
 *
 * @param beta.a        First shape. [none], 0.5 to 20 000
 * @param beta.b        Second shape. [none], 0.5 to 20 000
 * @param beta.x        Value. [none], 0 to 1
 * @returns             I_x(a, b), from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            Relative, also where the result is tiny: 10⁻¹² for shapes up to 100, 10⁻⁹ up to 20 000
 * @source              NIST Digital Library of Mathematical Functions, eq. 8.17.22, 8.17.23 and 8.17.4.
 *                      From memory, to be verified.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function betaProbability(beta: {
  readonly a: number;
  readonly b: number;
  readonly x: number;
}): number {
  const { a, b, x } = beta;
  requireRange("betaProbability", SHAPE_LIMITS, { a, b });
  requireRange("betaProbability", SHARE_LIMITS, { x });
  if (x === 0 || x === 1) return x;
  return x > (a + 1) / (a + b + 2) ? 1 - lowerTail(b, a, 1 - x, x) : lowerTail(a, b, x, 1 - x);
}

function lowerTail(a: number, b: number, x: number, rest: number): number {
  const logLeading =
    a * Math.log(x) + b * Math.log(rest) + logGamma(a + b) - logGamma(a + 1) - logGamma(b);
  // Thompson and Barnett's form of Lentz's method: value is the product of the ratios c·d.
  let c = 1;
  let d = 0;
  let value = 1;
  for (let n = 1, isComplete = false; !isComplete; n += 1) {
    const m = Math.floor(n / 2);
    const upper = n % 2 === 0 ? m * (b - m) * x : -(a + m) * (a + b + m) * x;
    const term = upper / ((a + n - 1) * (a + n));
    d = 1 / (1 + term * d);
    c = 1 + term / c;
    value *= c * d;
    isComplete = Math.abs(c * d - 1) < 1e-15;
  }
  return Math.exp(logLeading) / value;
}

/**
 * The value that a beta variable stays below with a wished chance: the inverse of betaProbability.
 *
 *     I_x(a, b) = wished
 *
 * Assumes: as betaProbability. Not for: a result so near 1 that its distance from 1 matters.
 *
 * @param beta.a                  First shape. [none], 0.5 to 20 000
 * @param beta.b                  Second shape. [none], 0.5 to 20 000
 * @param beta.wishedProbability  Chance of lying below. [none], 10⁻¹² to 0.999999
 * @returns                       The value x, from 0 to 1. [none]
 * @throws RangeError             If an input lies outside its range or is NaN.
 * @accuracy                      relative, 10⁻¹⁰
 * @source                        as betaProbability, solved for x
 * @differs                       none
 * @checkedBy           none published, see test
 */
export function betaQuantile(beta: {
  readonly a: number;
  readonly b: number;
  readonly wishedProbability: number;
}): number {
  const { a, b, wishedProbability } = beta;
  requireRange("betaQuantile", SHAPE_LIMITS, { a, b });
  requireRange("betaQuantile", WISHED_LIMITS, { wishedProbability });
  return solveRising((x) => betaProbability({ a, b, x }), wishedProbability, SHARE_LIMITS);
}
