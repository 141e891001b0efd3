import { betaProbability, betaQuantile } from "./incomplete-beta.ts";
import type { Limits } from "./limits.ts";
import { CONFIDENCE_LIMITS, EVENT_COUNT_LIMITS } from "./poisson-interval.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

const WATCH_RATIO_LIMITS: Limits = { min: 1e-5, max: 1e5 };
/** A ratio to a rate of nothing has no upper end. */
const COUNT_TO_COMPARE_WITH_LIMITS: Limits = { min: 1, max: EVENT_COUNT_LIMITS.max };

/** What was counted before and after something was changed. */
export interface BeforeAndAfter {
  /** Events before. [none], 0 to 10 000 */
  readonly beforeCount: number;
  /** Events after. [none], 0 to 10 000 */
  readonly afterCount: number;
  /** Time watched after over time watched before. [none], 10⁻⁵ to 10⁵ */
  readonly watchRatio: number;
}

function requireCounts(functionName: string, counted: BeforeAndAfter): void {
  const { beforeCount, afterCount, watchRatio } = counted;
  requireWhole(functionName, EVENT_COUNT_LIMITS, { beforeCount, afterCount });
  requireRange(functionName, WATCH_RATIO_LIMITS, { watchRatio });
}

/** Chance of `hits` or more among all events, if each falls into a time with its share. */
function chanceOfAtLeast(hits: number, misses: number, share: number): number {
  return hits === 0 ? 1 : betaProbability({ a: hits, b: misses + 1, x: share });
}

/**
 * Chance of counting so few events after the change, or fewer, if the change did nothing: one-sided.
 *
 *     p = chance of k₂ or fewer hits in k₁ + k₂ tries of chance t₂ / (t₁ + t₂)
 *
 * Assumes: events come independently at a steady rate before and after (Poisson); the times were set
 * beforehand. Not for: a watch that was ended because it looked good.
 *
 * @param counted       beforeCount, afterCount [none], 0 to 10 000; watchRatio, time after over time
 *                      before [none], 10⁻⁵ to 10⁵
 * @returns             One-sided p-value, from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN, or a count is not whole.
 * @accuracy            relative, 10⁻⁹
 * @source              J. Przyborowski, H. Wilenski, Homogeneity of results in testing samples from Poisson
 *                      series, Biometrika 31 (1940), 313-323. As carried by the tests of an open statistics
 *                      library, github.com/statsmodels/statsmodels, test_rates_poisson.py, 2026-12-01.
 * @differs             none
 * @checkedBy           gu-2008-example-1
 */
export function rateDropProbability(counted: BeforeAndAfter): number {
  requireCounts("rateDropProbability", counted);
  const { beforeCount, afterCount, watchRatio } = counted;
  return chanceOfAtLeast(beforeCount, afterCount, 1 / (1 + watchRatio));
}

/**
 * Chance that two counts differ so much, in either direction, if the rates are the same: two-sided.
 *
 *     p = min(1, 2·min(chance of so few after, chance of so many after))
 *
 * Assumes: as rateDropProbability. Not for: as rateDropProbability. Convention: the smaller tail is
 * doubled, which goes with lowRateRatio and highRateRatio: p is below 0.05 exactly when their 95 % interval
 * leaves out 1. Programs that add up all outcomes no likelier than the one seen give other, often
 * smaller, values where the times differ.
 *
 * @param counted       beforeCount, afterCount [none], 0 to 10 000; watchRatio, time after over time
 *                      before [none], 10⁻⁵ to 10⁵
 * @returns             Two-sided p-value, from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN, or a count is not whole.
 * @accuracy            relative, 10⁻⁹
 * @source              M. P. Fay, vignette of the R package rateratio.test (9 May 2022), section 1, read
 *                      second-hand at rdrr.io, 2026-12-01.
 * @differs             none
 * @checkedBy           rateratio-vignette-p, rate-test-p, dodder-conditional-p, six-and-none-p,
 *                      five-and-none-p
 */
export function rateChangeProbability(counted: BeforeAndAfter): number {
  requireCounts("rateChangeProbability", counted);
  const { beforeCount, afterCount, watchRatio } = counted;
  const fewer = rateDropProbability(counted);
  const more = chanceOfAtLeast(afterCount, beforeCount, watchRatio / (1 + watchRatio));
  return Math.min(1, 2 * fewer, 2 * more);
}

/**
 * The least by which the rate of events may have been multiplied: the lower end of the exact interval
 * of rate after over rate before.
 *
 *     ratio = p / (1 − p)·t₁ / t₂, I_p(k₂, k₁ + 1) = (1 − confidence) / 2; 0 for k₂ = 0
 *
 * Assumes: as rateDropProbability. Not for: counts of which the one before is 0.
 *
 * @param counted                beforeCount [none], 1 to 10 000; afterCount [none], 0 to 10 000;
 *                               watchRatio, time after over time before [none], 10⁻⁵ to 10⁵
 * @param confidenceProbability  Confidence of the two-sided interval. [none], 0.5 to 0.9999
 * @returns                      Lower limit of the ratio, 0 or more. [none]
 * @throws RangeError            If an input lies outside its range or is NaN, or a count is not whole.
 * @accuracy                     relative, 10⁻⁹
 * @source                       C. J. Clopper, E. S. Pearson, The use of confidence or fiducial limits illustrated
 *                               in the case of the binomial, Biometrika 26 (1934), 404-413, from memory, to be
 *                               verified; as used in the vignette named at rateChangeProbability.
 * @differs                      none
 * @checkedBy           rateratio-vignette-low
 */
export function lowRateRatio(counted: BeforeAndAfter, confidenceProbability: number): number {
  requireInterval("lowRateRatio", counted, confidenceProbability);
  const { beforeCount, afterCount, watchRatio } = counted;
  if (afterCount === 0) return 0;
  const tail = (1 - confidenceProbability) / 2;
  const share = betaQuantile({ a: afterCount, b: beforeCount + 1, wishedProbability: tail });
  return share / (1 - share) / watchRatio;
}

/**
 * The most by which the rate of events may have been multiplied: the upper end of the exact interval
 * of rate after over rate before. Below 1, the change has helped, at this confidence.
 *
 *     ratio = (1 − q) / q·t₁ / t₂, I_q(k₁, k₂ + 1) = (1 − confidence) / 2
 *
 * Assumes: as rateDropProbability. Not for: counts of which the one before is 0: no upper end.
 *
 * @param counted                beforeCount [none], 1 to 10 000; afterCount [none], 0 to 10 000;
 *                               watchRatio, time after over time before [none], 10⁻⁵ to 10⁵
 * @param confidenceProbability  Confidence of the two-sided interval. [none], 0.5 to 0.9999
 * @returns                      Upper limit of the ratio, above 0. [none]
 * @throws RangeError            If an input lies outside its range or is NaN, or a count is not whole.
 * @accuracy                     relative, 10⁻⁹
 * @source                       as lowRateRatio
 * @differs                      none
 * @checkedBy           rateratio-vignette-high
 */
export function highRateRatio(counted: BeforeAndAfter, confidenceProbability: number): number {
  requireInterval("highRateRatio", counted, confidenceProbability);
  const { beforeCount, afterCount, watchRatio } = counted;
  const tail = (1 - confidenceProbability) / 2;
  const rest = betaQuantile({ a: beforeCount, b: afterCount + 1, wishedProbability: tail });
  return (1 - rest) / rest / watchRatio;
}

function requireInterval(
  functionName: string,
  counted: BeforeAndAfter,
  confidenceProbability: number,
): void {
  requireCounts(functionName, counted);
  requireRange(functionName, COUNT_TO_COMPARE_WITH_LIMITS, { beforeCount: counted.beforeCount });
  requireRange(functionName, CONFIDENCE_LIMITS, { confidenceProbability });
}

/**
 * How long to watch without a single event before that shows an improvement.
 *
 *     t₂ / t₁ = ((1 − confidence) / 2)^(−1/k₁) − 1
 *
 * Assumes: as rateDropProbability, and the two-sided test of rateChangeProbability. Not for: deciding
 * to stop as soon as it looks good, nor a time in which there was an event (rateChangeProbability).
 *
 * @param beforeCount            Events before the change. [none], 1 to 10 000
 * @param confidenceProbability  Wished confidence, two-sided. [none], 0.5 to 0.9999
 * @returns                      Time to watch after over time watched before; what has been watched already
 *                               counts. [none]
 * @throws RangeError            If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy                     exact for the assumptions
 * @source                       as rateChangeProbability with no event after, solved for the time
 * @differs                      none
 * @checkedBy           six-and-none-watch, five-and-none-watch
 */
export function quietWatchRatio(beforeCount: number, confidenceProbability: number): number {
  requireWhole("quietWatchRatio", COUNT_TO_COMPARE_WITH_LIMITS, { beforeCount });
  requireRange("quietWatchRatio", CONFIDENCE_LIMITS, { confidenceProbability });
  return Math.expm1(-Math.log((1 - confidenceProbability) / 2) / beforeCount);
}
