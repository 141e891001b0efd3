import { gammaQuantile } from "./incomplete-gamma.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

export const EVENT_COUNT_LIMITS: Limits = { min: 0, max: 10_000 };
export const CONFIDENCE_LIMITS: Limits = { min: 0.5, max: 0.9999 };

/**
 * The fewest events that may be expected in a time in which some were counted: the lower end of the
 * exact interval, of which each tail has half of what the confidence leaves.
 *
 *     P(k, low) = (1 − confidence) / 2, P the incomplete gamma function; 0 for k = 0
 *
 * Assumes: events come independently at a steady rate (Poisson). Not for: dropouts in bursts, of which
 * a burst counts as one event. Divided by the time watched it is a rate.
 *
 * @param eventCount             Events counted. [none], 0 to 10 000
 * @param confidenceProbability  Confidence of the two-sided interval; a one-sided bound of confidence c has
 *                               2c − 1 here. [none], 0.5 to 0.9999
 * @returns                      Lower limit of the expected count. [none]
 * @throws RangeError            If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy                     relative, 10⁻¹⁰
 * @source                       F. Garwood, Fiducial limits for the Poisson distribution, Biometrika 28 (1936),
 *                               437-442; with the chi-squared distribution as read second-hand at
 *                               graphpad.com/support/faq, "How QuickCalcs computes the confidence interval of a
 *                               count", 2026-12-01.
 * @differs                      Gamma instead of chi-squared: half the value, half the degrees of freedom.
 * @checkedBy           garwood-25-90-low, garwood-25-95-low, garwood-25-99-low, rate-test-5-low,
 *                      rate-test-8-low, rate-test-13-low, rate-15-in-400-low, garwood-1-low,
 *                      garwood-5-low, garwood-10-low, horse-kick-low, count-4-low
 */
export function poissonLowCount(eventCount: number, confidenceProbability: number): number {
  requireWhole("poissonLowCount", EVENT_COUNT_LIMITS, { eventCount });
  requireRange("poissonLowCount", CONFIDENCE_LIMITS, { confidenceProbability });
  return eventCount === 0 ? 0 : gammaQuantile(eventCount, (1 - confidenceProbability) / 2);
}

/**
 * The most events that may be expected in a time in which some were counted: the upper end of the
 * exact interval, of which each tail has half of what the confidence leaves.
 *
 *     P(k + 1, high) = (1 + confidence) / 2, P the incomplete gamma function
 *
 * Assumes: as poissonLowCount. Not for: as poissonLowCount. After a quiet time it says how often
 * dropouts may still come: never "not at all".
 *
 * @param eventCount             Events counted. [none], 0 to 10 000
 * @param confidenceProbability  Confidence of the two-sided interval; a one-sided bound of confidence c has
 *                               2c − 1 here. [none], 0.5 to 0.9999
 * @returns                      Upper limit of the expected count. [none]
 * @throws RangeError            If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy                     relative, 10⁻¹⁰
 * @source                       as poissonLowCount
 * @differs                      as poissonLowCount
 * @checkedBy           garwood-25-90-high, garwood-25-95-high, garwood-25-99-high,
 *                      rate-test-5-high, rate-test-8-high, rate-test-13-high, rate-15-in-400-high,
 *                      garwood-1-high, garwood-5-high, garwood-10-high, horse-kick-high,
 *                      count-4-high, zero-count-two-sided, zero-count-one-sided
 */
export function poissonHighCount(eventCount: number, confidenceProbability: number): number {
  requireWhole("poissonHighCount", EVENT_COUNT_LIMITS, { eventCount });
  requireRange("poissonHighCount", CONFIDENCE_LIMITS, { confidenceProbability });
  return gammaQuantile(eventCount + 1, (1 + confidenceProbability) / 2);
}
