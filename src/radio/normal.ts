import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const DEVIATION_LIMITS: Limits = { min: -1e6, max: 1e6 };
const NORMAL_PROBABILITY_LIMITS: Limits = { min: 1e-12, max: 1 - 1e-12 };
/** Up to here the series has lost no digits, from here on the continued fraction has all of them. */
const SERIES_UP_TO = 2;

const density = (deviations: number): number =>
  Math.exp(-(deviations ** 2) / 2) / Math.sqrt(2 * Math.PI);

/** Probability of lying more than so many deviations above the mean; −1 or more of them. */
function upperTail(deviations: number): number {
  if (deviations < SERIES_UP_TO) {
    let term = deviations;
    let sum = deviations;
    for (let odd = 3; odd < 60; odd += 2) {
      term *= deviations ** 2 / odd;
      sum += term;
    }
    return 0.5 - density(deviations) * sum;
  }
  let fraction = deviations;
  for (let depth = 60; depth > 0; depth -= 1) fraction = deviations + depth / fraction;
  return density(deviations) / fraction;
}

/**
 * How probable it is that a normally distributed quantity stays below a value.
 *
 *     Φ(x) = ∫ exp(−t² / 2) dt / √(2π),  t from −∞ to x
 *
 * Assumes: a normal distribution. Not for: few measurements with an estimated deviation.
 *
 * @param deviations    The value, in standard deviations above the mean. [none], −10⁶ to 10⁶
 * @returns             Probability. [none], 0 to 1
 * @throws RangeError   If the value lies outside that range or is NaN.
 * @accuracy            10⁻¹³ of the smaller of Φ and 1 − Φ, as far as doubles hold it
 * @source              M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions (1964), series 26.2.11,
 *                      continued fraction 26.2.14; from memory, to be verified
 * @differs             none
 * @checkedBy           garg-3-9
 */
export function normalProbability(deviations: number): number {
  requireRange("normalProbability", DEVIATION_LIMITS, { deviations });
  return deviations < 0 ? upperTail(-deviations) : 1 - upperTail(deviations);
}

/**
 * The value below which a normally distributed quantity stays with a wished probability: the
 * inverse of normalProbability.
 *
 *     x with Φ(x) = p
 *
 * Assumes: as normalProbability. Not for: certainty; no value is never exceeded.
 *
 * @param probability   Wished probability. [none], 10⁻¹² to 1 − 10⁻¹²
 * @returns             The value, in standard deviations above the mean. [none]
 * @throws RangeError   If the probability lies outside that range or is NaN.
 * @accuracy            10⁻¹² up to ±5; nearer certainty the rounding of the probability itself decides
 * @source              M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions (1964), approximation
 *                      26.2.23, from memory, to be verified; made exact by three steps of Halley's method
 * @differs             none
 * @checkedBy           ghasemi-6-5-95-percent, ghasemi-6-6-90-percent, ghasemi-6-6-97-percent
 */
export function normalQuantile(probability: number): number {
  requireRange("normalQuantile", NORMAL_PROBABILITY_LIMITS, { probability });
  const tail = Math.min(probability, 1 - probability);
  const start = Math.sqrt(-2 * Math.log(tail));
  let deviations =
    start -
    (2.515517 + start * (0.802853 + start * 0.010328)) /
      (1 + start * (1.432788 + start * (0.189269 + start * 0.001308)));
  for (let step = 0; step < 3; step += 1) {
    const miss = (upperTail(deviations) - tail) / density(deviations);
    deviations += miss / (1 - (deviations * miss) / 2);
  }
  return probability < 0.5 ? -deviations : deviations;
}
